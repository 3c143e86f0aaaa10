// Methods of other authors for tees and wyes whose straight leg is as wide as the common leg.
import { cos, radians } from '../arithmetic';

/**
 * Branch of a dividing stream.
 *
 *   C = 1 + x^2 - 2 x cos(0.75 d), x = q/a
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @param angle d, deflection of the branch from the straight way [°], 15 to 90
 * @returns C on the velocity pressure of the common leg [-]
 * @source Bassett, Winterbone & Pearson (2001), separating flow, from memory
 * @check fixtures/published/junctions-diverging.json
 */
export function branchDivergingBassett2001(q: number, a: number, angle: number): number {
	const x = q / a;
	return 1 + x * (x - 2 * cos(radians(0.75 * angle)));
}

/**
 * Straight leg of a dividing stream.
 *
 *   C = r^2 - 1.5 r + 0.5, r = 1 - q
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @returns C on the velocity pressure of the common leg [-]
 * @source Bassett, Winterbone & Pearson (2001), separating flow, from memory
 * @check fixtures/published/junctions-diverging.json
 */
export function straightDivergingBassett2001(q: number): number {
	const r = 1 - q;
	return r * r - 1.5 * r + 0.5;
}

/**
 * Branch of uniting streams in a sharp tee of 90° with equal legs.
 *
 *   C = -0.92 (1 - q)^2 + 1.2 q^2 + q (1 - q)
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @returns C on the velocity pressure of the common leg [-]
 * @source Gardel (1957), from memory
 * @check fixtures/published/junctions-converging.json
 */
export function branchConvergingGardel1957(q: number): number {
	const r = 1 - q;
	return -0.92 * r * r + 1.2 * q * q + q * r;
}

/**
 * Straight leg of uniting streams in a sharp tee of 90° with equal legs.
 *
 *   C = 0.03 (1 - q)^2 + 0.62 q^2 + q (1 - q)
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @returns C on the velocity pressure of the common leg [-]
 * @source Gardel (1957), from memory
 * @check fixtures/published/junctions-converging.json
 */
export function straightConvergingGardel1957(q: number): number {
	const r = 1 - q;
	return 0.03 * r * r + 0.62 * q * q + q * r;
}

/**
 * Branch of a dividing stream in a sharp tee of 90° with equal legs.
 *
 *   C = 0.95 (1 - q)^2 + 1.3 q^2 + 0.8 q (1 - q)
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @returns C on the velocity pressure of the common leg [-]
 * @source Gardel (1957), from memory
 * @check fixtures/published/junctions-diverging.json
 */
export function branchDivergingGardel1957(q: number): number {
	const r = 1 - q;
	return 0.95 * r * r + 1.3 * q * q + 0.8 * q * r;
}

/**
 * Straight leg of a dividing stream in a sharp tee of 90° with equal legs.
 *
 *   C = 0.03 (1 - q)^2 + 0.35 q^2 - 0.2 q (1 - q)
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @returns C on the velocity pressure of the common leg [-]
 * @source Gardel (1957), from memory
 * @check fixtures/published/junctions-diverging.json
 */
export function straightDivergingGardel1957(q: number): number {
	const r = 1 - q;
	return 0.03 * r * r + 0.35 * q * q - 0.2 * q * r;
}
