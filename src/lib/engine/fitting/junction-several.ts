// Junctions of two branches opposite one another, and the chamber from which several legs start.
import { suddenContractionIdelchik, suddenExpansion } from './area-change-idelchik';
import { unitingFactor } from './junction-factors';
import { branchIdelchik, straightIdelchik, type Branching } from './junction-stream';

/**
 * One leg of a bullhead tee in which two opposite streams unite and leave at 90°.
 *
 *   C = A [1 + 1/a^2 + (3/a^2)(q^2 - q)], A as unitingFactor
 *
 * @param q flow of this leg over that of the common leg [-], 0 to 1
 * @param a area of either leg over that of the common leg [-], above 0 to 1
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 7-29
 * @check fixtures/published/junctions-converging.json
 */
export function bullheadConvergingIdelchik(q: number, a: number): number {
	return unitingFactor(q, a) * (1 + (1 + 3 * q * (q - 1)) / (a * a));
}

/**
 * One leg of a bullhead tee in which a stream divides into two opposite legs.
 *
 *   C = 1 + k x^2, x = q/a
 *
 * @param q flow of this leg over that of the common leg [-], 0 to 1
 * @param a area of this leg over that of the common leg [-], above 0 to 1
 * @param k 1.5 with sharp edges, 0.3 well rounded [-]
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 7-29; k = 0.3 from memory
 * @check fixtures/published/junctions-diverging.json
 */
export function bullheadDivergingIdelchik(q: number, a: number, k: number): number {
	const x = q / a;
	return 1 + k * x * x;
}

/**
 * Branch of a cross, as if the opposite branch were not there.
 *
 * @param junction direction, q and a of this branch, s of the straight leg, heightRatio [-], angle [°]
 * @returns C on the velocity pressure of the common leg [-]
 * @source common practice; each branch by Idelchik, section 7
 * @check fixtures/published/junctions-diverging.json
 */
export function crossBranch(junction: Branching): number {
	return branchIdelchik({ ...junction, s: (1 + junction.s) / 2 });
}

/**
 * Straight leg of a cross: two junctions in series on the same velocity pressure, each with half of the branch flow and
 * half of the narrowing.
 *
 *   C = 2 C_straight(q/2, a, (1 + s)/2)
 *
 * @param junction direction, q of both branches together, a of the greater, s of the straight leg [-], angle [°]
 * @returns C on the velocity pressure of the common leg [-]
 * @source common practice; each junction by Idelchik, section 7
 * @check fixtures/published/junctions-diverging.json
 */
export function crossStraight(junction: Branching): number {
	return 2 * straightIdelchik({ ...junction, q: junction.q / 2, s: (1 + junction.s) / 2 });
}

/**
 * One leg of a chamber: sudden expansion of what enters the chamber, sharp entry of what leaves it.
 *
 *   dividing: C = (1 - r)^2 + 0.5 (1 - a r)^0.75 x^2; uniting: C = (1 - a r)^2 x^2 + 0.5 (1 - r)^0.75, x = q/a
 *
 * @param direction diverging or converging
 * @param q flow of this leg over that of the common leg [-]
 * @param a area of this leg over that of the common leg [-], above 0
 * @param r area of the common leg over the section of the chamber [-], above 0 to 1, a r to 1
 * @returns C on the velocity pressure of the common leg [-]
 * @source Borda & Carnot; Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagrams 4-1 and 4-9
 * @check fixtures/published/area-changes.json
 */
export function plenumLeg(direction: Branching['direction'], q: number, a: number, r: number): number {
	const x = q / a;
	const leg = Math.min(a * r, 1);
	return direction === 'diverging'
		? suddenExpansion(r) + suddenContractionIdelchik(leg) * x * x
		: suddenExpansion(leg) * x * x + suddenContractionIdelchik(r);
}
