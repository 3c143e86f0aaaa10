import type { Range } from '../errors';
import { pow } from '../arithmetic';
import { interpolate, interpolateTable } from './interpolate';

/** Included angles of the tables of pyramids [°]. */
export const PYRAMID_TABLE_ANGLE: Range = { min: 16, max: 180 };
export const NOZZLE_TABLE_ANGLE: Range = { min: 10, max: 180 };

const CONE_ANGLES = [3, 6, 8, 10, 12, 14, 16, 20, 24, 30, 40, 60, 90, 180];
const CONE_AREAS = [0, 0.05, 0.075, 0.1, 0.15, 0.2, 0.25, 0.3, 0.4, 0.5, 0.6, 1];
// The line of equal areas is ours: nothing is lost.
const CONE = [
	[0.03, 0.08, 0.11, 0.15, 0.19, 0.23, 0.27, 0.36, 0.47, 0.65, 0.92, 1.15, 1.1, 1.02],
	[0.03, 0.07, 0.1, 0.14, 0.16, 0.2, 0.24, 0.32, 0.42, 0.58, 0.83, 1.04, 0.99, 0.92],
	[0.03, 0.07, 0.09, 0.13, 0.16, 0.19, 0.23, 0.3, 0.4, 0.55, 0.79, 0.99, 0.95, 0.88],
	[0.03, 0.07, 0.09, 0.12, 0.15, 0.18, 0.22, 0.29, 0.38, 0.52, 0.75, 0.93, 0.89, 0.83],
	[0.02, 0.06, 0.08, 0.11, 0.14, 0.17, 0.2, 0.26, 0.34, 0.46, 0.67, 0.84, 0.79, 0.74],
	[0.02, 0.05, 0.07, 0.1, 0.12, 0.15, 0.17, 0.23, 0.3, 0.41, 0.59, 0.74, 0.7, 0.65],
	[0.02, 0.05, 0.06, 0.08, 0.1, 0.13, 0.15, 0.2, 0.26, 0.35, 0.47, 0.65, 0.62, 0.58],
	[0.02, 0.04, 0.05, 0.07, 0.09, 0.11, 0.13, 0.18, 0.23, 0.31, 0.4, 0.57, 0.54, 0.5],
	[0.01, 0.03, 0.04, 0.06, 0.07, 0.08, 0.1, 0.13, 0.17, 0.23, 0.33, 0.41, 0.39, 0.37],
	[0.01, 0.02, 0.03, 0.04, 0.05, 0.06, 0.07, 0.09, 0.12, 0.16, 0.23, 0.29, 0.28, 0.26],
	[0.01, 0.01, 0.02, 0.03, 0.03, 0.04, 0.05, 0.06, 0.08, 0.1, 0.15, 0.18, 0.17, 0.16],
	[0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0]
];

/**
 * Conical expansion, local part, by the table that rivals the fitted formula.
 *
 * @param angle included angle [°], 3 to 180
 * @param a smaller/larger area [-], 0 to 1; the table ends at 0.6, beyond it is drawn straight to nothing at 1
 * @returns C on the velocity pressure in the smaller leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, conical diffusers, table at second hand
 * @check fixtures/published/area-changes.json
 */
export function conicalExpansionTableIdelchik(angle: number, a: number): number {
	return interpolateTable(CONE_AREAS, CONE_ANGLES, CONE, a, angle);
}

const PYRAMID_ANGLES = [16, 20, 30, 45, 60, 90, 120, 180];
const PYRAMID_AREAS = [0.1, 1 / 6, 0.25, 0.5, 1];
const PYRAMID = [
	[0.42, 0.49, 0.59, 0.7, 0.8, 0.87, 0.85, 0.86],
	[0.42, 0.47, 0.58, 0.68, 0.72, 0.76, 0.76, 0.75],
	[0.36, 0.43, 0.5, 0.56, 0.61, 0.63, 0.63, 0.63],
	[0.18, 0.22, 0.25, 0.29, 0.31, 0.32, 0.33, 0.3],
	[0, 0, 0, 0, 0, 0, 0, 0]
];

/**
 * Pyramidal expansion of rectangular duct.
 *
 * @param angle included angle [°], 16 to 180
 * @param a smaller/larger area [-], 0.1 to 1; from 0.5 it is drawn straight to nothing at 1
 * @returns C on the velocity pressure in the smaller leg [-]
 * @source SMACNA, HVAC Systems Duct Design, pyramidal transition, diverging, from memory
 * @check none: Idelchik's table is of the same order from 45°, in a test
 */
export function pyramidalExpansionSmacna(angle: number, a: number): number {
	return interpolateTable(PYRAMID_AREAS, PYRAMID_ANGLES, PYRAMID, a, angle);
}

const SHOCK_ANGLES = [0, 5, 10, 15, 20, 25, 30, 40, 45, 50, 60, 80, 140, 180];
const SHOCK_SLOW = [0, 0.1, 0.2, 0.28, 0.36, 0.48, 0.6, 0.84, 0.89, 0.97, 1.04, 1.1, 1.09, 1.06];
const SHOCK_FAST = [0, 0.05, 0.12, 0.23, 0.3, 0.45, 0.6, 0.84, 0.89, 0.97, 1.04, 1.1, 1.09, 1.06];
/** Reynolds numbers between which the shock coefficient falls [-]. */
const SLOW = 0.5e5;
const FAST = 2e5;

/**
 * Pyramidal expansion with a uniform velocity at its entry, local part.
 *
 *   C = phi (1 - a)^1.76; phi by a table of the angle for Re to 0.5e5 and from 2e5, straight lines between
 *
 * @param angle included angle [°], 0 to 180
 * @param a smaller/larger area [-], 0 to 1
 * @param Re Reynolds number in the smaller leg [-]
 * @returns C on the velocity pressure in the smaller leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 5-4, table at second hand
 * @check none: no checked value is at hand; the conical table is of the same order, in a test
 */
export function pyramidalExpansionIdelchik(angle: number, a: number, Re: number): number {
	const slow = interpolate(SHOCK_ANGLES, SHOCK_SLOW, angle);
	const phi = interpolate([SLOW, FAST], [slow, interpolate(SHOCK_ANGLES, SHOCK_FAST, angle)], Re);
	return phi * pow(1 - a, 1.76);
}

const NOZZLE_ANGLES = [10, 15, 40, 50, 60, 90, 120, 150, 180];
const NOZZLE_AREAS = [0.1, 1 / 6, 0.25, 0.5, 1];
const NOZZLE = [
	[0.05, 0.05, 0.05, 0.08, 0.08, 0.19, 0.29, 0.37, 0.43],
	[0.05, 0.04, 0.04, 0.07, 0.07, 0.18, 0.28, 0.36, 0.42],
	[0.05, 0.04, 0.04, 0.07, 0.07, 0.17, 0.27, 0.35, 0.41],
	[0.05, 0.05, 0.05, 0.06, 0.06, 0.12, 0.18, 0.24, 0.26],
	[0, 0, 0, 0, 0, 0, 0, 0, 0]
];

/**
 * Gradual contraction, round or rectangular: the table that rivals the polynomial of Idelchik.
 *
 * @param angle included angle [°], 10 to 180
 * @param a smaller/larger area [-], 0.1 to 1; from 0.5 it is drawn straight to nothing at 1
 * @returns C on the velocity pressure in the smaller leg [-]
 * @source SMACNA, HVAC Systems Duct Design, transition, converging, from memory
 * @check none: the polynomial of Idelchik is of the same order, in a test
 */
export function gradualContractionSmacna(angle: number, a: number): number {
	return interpolateTable(NOZZLE_AREAS, NOZZLE_ANGLES, NOZZLE, a, angle);
}
