// Idelchik, areas of straight leg and branch adding up to that of the common leg: As + Ab = Ac. q = Qb/Qc, a = Ab/Ac,
// s = As/Ac, x = q/a = Vb/Vc, v = (1 - q)/s = Vs/Vc; on the common leg. Finite for any finite q, and without a jump.
import { cos, radians } from '../arithmetic';
import { interpolate, interpolateTable } from './interpolate';

const ANGLES = [15, 30, 45, 60, 90];
/** Additions for the branch and for the straight leg: a row for each angle, a column for each a. */
const BRANCH_AREAS = [0, 0.1, 0.2, 0.33, 0.5];
const BRANCH = [
	[0, 0, 0, 0, 0],
	[0, 0, 0, 0, 0],
	[0, 0, 0, 0, 0],
	[0, 0, 0, 0, 0.1],
	[0, 0, 0.1, 0.2, 0.25]
];
const STRAIGHT = [
	[0, 0, 0, 0.14, 0.4],
	[0, 0, 0, 0.17, 0.35],
	[0, 0.05, 0.14, 0.14, 0.3],
	[0, 0, 0, 0.1, 0.25],
	[0, 0, 0, 0, 0]
];
const DIVIDING_ANGLES = [0, 15, 30, 45, 60, 90];
const DIVIDING = [0, 0.04, 0.16, 0.36, 0.64, 1];
/** Straight leg faster than the common one: Vs/Vc, and C from memory. */
const FAST = [1, 1.2, 1.4, 1.6, 1.8, 2];
const FAST_LOSS = [0, 0.07, 0.39, 0.9, 1.78, 3.2];

/**
 * Branch of uniting streams, areas adding up.
 *
 *   C = 1 + (q/a)^2 - 2 (1/s)(1 - q)^2 - 2 cos(angle) q^2/a + K1, K1 by table, straight lines between
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 0.5 for K1
 * @param s area of the straight leg over that of the common leg [-], above 0
 * @param angle between branch and straight leg [°], 15 to 90
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., p. 417 and table 7-2
 * @check none: no value of C was found in print; held to the printed additions, to momentum and to energy by tests
 */
export function branchConvergingAddingIdelchik(q: number, a: number, s: number, angle: number): number {
	const x = q / a;
	const K = interpolateTable(ANGLES, BRANCH_AREAS, BRANCH, angle, a);
	return 1 + x * x - (2 * (1 - q) * (1 - q)) / s - 2 * cos(radians(angle)) * q * x + K;
}

/**
 * Straight leg of uniting streams, areas adding up.
 *
 *   C = 1 + (1/s)^2 (1 - q)^2 - 2 (1/s)(1 - q)^2 - 2 cos(angle) q^2/a + K2, K2 by table, straight lines between
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 0.5 for K2
 * @param s area of the straight leg over that of the common leg [-], above 0
 * @param angle between branch and straight leg [°], 15 to 90
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., p. 417 and table 7-2
 * @check none: no value of C was found in print; held to the printed additions, to momentum and to energy by tests
 */
export function straightConvergingAddingIdelchik(q: number, a: number, s: number, angle: number): number {
	const v = (1 - q) / s;
	const K = interpolateTable(ANGLES, BRANCH_AREAS, STRAIGHT, angle, a);
	return 1 + v * v - 2 * (1 - q) * v - (2 * cos(radians(angle)) * q * q) / a + K;
}

/**
 * Branch of a dividing stream, areas adding up.
 *
 *   C = 1 + x^2 - 2 x cos(angle) - K x^2, x = q/a; K = 0.04, 0.16, 0.36, 0.64, 1 at 15, 30, 45, 60, 90°
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @param angle between branch and straight leg [°], 15 to 90
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., p. 418 and table 7-5
 * @check none: no value of C was found in print; held to the printed factors by a test
 */
export function branchDivergingAddingIdelchik(q: number, a: number, angle: number): number {
	const x = q / a;
	return 1 + x * (x * (1 - interpolate(DIVIDING_ANGLES, DIVIDING, angle)) - 2 * cos(radians(angle)));
}

/**
 * Straight leg of a dividing stream, areas adding up.
 *
 *   C = (1 - v)^2 for v <= 1; above, a table from memory: 0.07, 0.39, 0.90, 1.78, 3.20 at v = 1.2, 1.4, 1.6, 1.8, 2
 *
 * @param v velocity in the straight leg over that in the common leg [-], 0 to 2; held at 2 beyond
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 7-20, from memory
 * @check none: the table is from memory; compared with the parabola that others fitted to the same diagram
 */
export function straightDivergingAddingIdelchik(v: number): number {
	return v <= 1 ? (1 - v) * (1 - v) : interpolate(FAST, FAST_LOSS, v);
}
