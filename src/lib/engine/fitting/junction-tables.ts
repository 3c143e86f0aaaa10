// Conical take-offs of round ducts where the stream divides, by tables.
import { interpolate } from './interpolate';

/** Velocity in the branch over that upstream, of the two tables [-]. */
export const TAKE_OFF_SPEEDS = { 90: { min: 0, max: 1.4 }, 45: { min: 0, max: 1.2 } };

const SPEEDS = [0, 0.2, 0.4, 0.6, 0.8, 1, 1.2, 1.4];
const SQUARE = [1, 0.85, 0.74, 0.62, 0.52, 0.42, 0.36, 0.32];
const OBLIQUE_SPEEDS = [0, 0.2, 0.4, 0.6, 0.8, 1, 1.2];
const OBLIQUE = [1, 0.84, 0.61, 0.41, 0.27, 0.17, 0.12];
const MAIN_SPEEDS = [0, 0.2, 0.4, 0.6, 0.8, 1];
const MAIN = [0.35, 0.22, 0.13, 0.06, 0.02, 0];

/**
 * Branch of a conical take-off at 90°.
 *
 * @param x velocity in the branch over that in the common leg [-], 0 to 1.4; held beyond
 * @returns C on the velocity pressure of the common leg, which is the one upstream [-]
 * @source Tables of duct fittings, from memory
 * @check none: the table is from memory; compared with the sharp tee by a test
 */
export function conicalTakeOffSquare(x: number): number {
	return interpolate(SPEEDS, SQUARE, x);
}

/**
 * Branch of a conical lateral at 45°.
 *
 * @param x velocity in the branch over that in the common leg [-], 0 to 1.2; held beyond
 * @returns C on the velocity pressure of the common leg, which is the one upstream [-]
 * @source Tables of duct fittings, from memory
 * @check none: the table is from memory; compared with the sharp wye by a test
 */
export function conicalTakeOffOblique(x: number): number {
	return interpolate(OBLIQUE_SPEEDS, OBLIQUE, x);
}

/**
 * Main path past a conical take-off.
 *
 * @param v velocity in the straight leg over that in the common leg [-], 0 to 1; 0 above 1
 * @returns C on the velocity pressure of the common leg [-]
 * @source SMACNA, HVAC Systems Duct Design (1990), worked example, from 0.8 to 1; below, from memory
 * @check fixtures/published/junctions-diverging.json
 */
export function conicalTakeOffMain(v: number): number {
	return interpolate(MAIN_SPEEDS, MAIN, v);
}
