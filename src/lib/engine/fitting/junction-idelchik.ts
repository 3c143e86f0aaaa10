// Idelchik, straight leg as wide as the common leg. q = Qb/Qc, a = Ab/Ac, x = q/a = Vb/Vc; on the common leg.
// Uniting: C = (pt leg - pt common)/pv common; dividing: C = (pt common - pt leg)/pv common. Negative values are real.
// Every function is finite for any finite q, and without a jump.
import { cos, radians, sin } from '../arithmetic';
import { dividingFactor, passageFactor, unitingFactor } from './junction-factors';
import { mixed, stepAbove } from './junction-smooth';

/** Angles between which the straight leg of uniting streams goes over to its form for 90° [°]. */
const UNITING = { oblique: 60, square: 90 };
/** The same for the branch of a dividing stream [°]. */
const DIVIDING = { oblique: 75, square: 90 };
/** Height of the branch over that of the common leg, between which the branch at 90° goes from free to equal [-]. */
const FREE_HEIGHT = 2 / 3;

/** Share of the form for 90°. */
function squareShare(angle: number, { oblique, square }: { oblique: number; square: number }): number {
	return Math.min(Math.max((angle - oblique) / (square - oblique), 0), 1);
}

/**
 * Branch of uniting streams.
 *
 *   C = A [1 + (q/a)^2 - 2 (1 - q)^2 - 2 cos(angle) q^2/a], A as unitingFactor
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @param angle between branch and straight leg [°], 15 to 90
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagrams 7-1 to 7-4
 * @check fixtures/published/junctions-converging.json
 */
export function branchConvergingIdelchik(q: number, a: number, angle: number): number {
	const x = q / a;
	return unitingFactor(q, a) * (1 + x * x - 2 * (1 - q) * (1 - q) - 2 * cos(radians(angle)) * q * x);
}

/**
 * Straight leg of uniting streams.
 *
 *   up to 60°: C = 1 - (1 - q)^2 - 2 cos(angle) q^2/a; at 90°: C = 1.55 q - q^2; straight lines between
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @param angle between branch and straight leg [°], 15 to 90
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagrams 7-1 to 7-4
 * @check fixtures/published/junctions-converging.json
 */
export function straightConvergingIdelchik(q: number, a: number, angle: number): number {
	const oblique = 1 - (1 - q) * (1 - q) - (2 * cos(radians(Math.min(angle, UNITING.oblique))) * q * q) / a;
	return mixed(oblique, 1.55 * q - q * q, squareShare(angle, UNITING));
}

/**
 * Straight leg of uniting streams by the general equation of the same book, which differs from its diagrams.
 *
 *   C = 1 - (1 - q)^2 - (1.4 - q) q^2 sin(angle) - 2 K' (q/a) cos(angle),
 *   K' = 0.8 q for a <= 0.35; above, 0.5 for q <= 0.6 and 0.8 q beyond
 *   Smoothed (ours): a 0.35 to 0.39, q 0.60 to 0.64
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @param angle between branch and straight leg [°], 15 to 90
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., p. 417 and table 7-3
 * @check fixtures/published/junctions-converging.json
 */
export function straightConvergingGeneralIdelchik(q: number, a: number, angle: number): number {
	const r = radians(angle);
	const wide = mixed(0.5, 0.8 * q, stepAbove(q, 0.6));
	const K = mixed(0.8 * q, wide, stepAbove(a, 0.35));
	return 1 - (1 - q) * (1 - q) - (1.4 - q) * q * q * sin(r) - (2 * K * q * cos(r)) / a;
}

/**
 * Branch of a dividing stream.
 *
 *   up to 75°: C = A' (1 + x^2 - 2 x cos(angle)), x = q/a, A' as dividingFactor
 *   at 90°:    C = 1 + k x^2, k = 1 for h <= 2/3, 0.3 for h = 1; straight lines between, in the angle and in h (ours)
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @param angle between branch and straight leg [°], 15 to 90
 * @param heightRatio h, height or diameter of the branch over that of the common leg [-], above 0 to 1
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., section 7 and diagram 7-21; equal heights from memory
 * @check fixtures/published/junctions-diverging.json
 */
export function branchDivergingIdelchik(q: number, a: number, angle: number, heightRatio: number): number {
	const x = q / a;
	const c = cos(radians(Math.min(angle, DIVIDING.oblique)));
	const oblique = dividingFactor(q, a) * (1 + x * (x - 2 * c));
	const equal = Math.min(Math.max((heightRatio - FREE_HEIGHT) / (1 - FREE_HEIGHT), 0), 1);
	return mixed(oblique, 1 + mixed(1, 0.3, equal) * x * x, squareShare(angle, DIVIDING));
}

/**
 * Straight leg of a dividing stream, at any angle of the branch.
 *
 *   C = tau q^2, tau as passageFactor
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 7-20
 * @check fixtures/published/junctions-diverging.json
 */
export function straightDivergingIdelchik(q: number, a: number): number {
	return passageFactor(q, a) * q * q;
}
