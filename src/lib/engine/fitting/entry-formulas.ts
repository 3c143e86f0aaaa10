import { cos, radians } from '../arithmetic';
import type { Range } from '../errors';
import { interpolate, interpolateTable } from './interpolate';

/** Relative lengths and wall thicknesses of a projecting entry [-]. */
export const PROJECTION: Range = { min: 0, max: 1 };
export const EDGE_THICKNESS: Range = { min: 0, max: 0.05 };
/** Relative radii of the bellmouths [-]; beyond, the last value stays. */
export const BELLMOUTH_RADIUS: Range = { min: 0, max: 0.2 };
/** Angles between duct and wall for which the formula is reliable [°]. */
export const ENTRY_ANGLE: Range = { min: 20, max: 90 };

const LENGTHS = [0, 0.002, 0.01, 0.05, 0.2, 0.5, 1];
const THICKNESSES = [0, 0.02, 0.05];
const PROJECTING = [
	[0.5, 0.57, 0.68, 0.8, 0.92, 1, 1],
	[0.5, 0.51, 0.52, 0.55, 0.66, 0.72, 0.72],
	[0.5, 0.5, 0.5, 0.5, 0.5, 0.5, 0.5]
];
const FREE_RADII = [0, 0.01, 0.02, 0.03, 0.04, 0.05, 0.06, 0.08, 0.1, 0.12, 0.16, 0.2];
const FREE = [1, 0.87, 0.74, 0.61, 0.51, 0.4, 0.32, 0.2, 0.15, 0.1, 0.06, 0.03];
const WALL_RADII = [0, 0.01, 0.02, 0.03, 0.04, 0.05, 0.06, 0.08, 0.12, 0.16, 0.2];
const WALL = [0.5, 0.44, 0.37, 0.31, 0.26, 0.22, 0.2, 0.15, 0.09, 0.06, 0.03];

/**
 * Sharp entry of a duct that projects through a wall.
 *
 * @param thickness wall thickness over diameter [-], 0 to 0.05
 * @param length projection over diameter [-], 0 to 1
 * @returns C on the velocity pressure in the duct [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 3-1
 * @check fixtures/published/entries.json
 */
export function projectingEntryIdelchik(thickness: number, length: number): number {
	return interpolateTable(THICKNESSES, LENGTHS, PROJECTING, thickness, length);
}

/**
 * Bellmouth at the end of a duct, no wall beside it.
 *
 * @param radiusRatio radius of the lip over diameter [-], 0 to 0.2
 * @returns C on the velocity pressure in the duct [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 3-4
 * @check fixtures/published/entries.json
 */
export function freeBellmouthIdelchik(radiusRatio: number): number {
	return interpolate(FREE_RADII, FREE, radiusRatio);
}

/**
 * Rounded entry in a wall: the table that rivals the formula of Rennels & Hudson.
 *
 * @param radiusRatio radius of the edge over diameter [-], 0 to 0.2
 * @returns C on the velocity pressure in the duct [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, chapter 3
 * @check fixtures/published/entries.json
 */
export function roundedEntryIdelchik(radiusRatio: number): number {
	return interpolate(WALL_RADII, WALL, radiusRatio);
}

/**
 * Rounded entry in a wall.
 *
 *   K = 0.0696 (1 - 0.569 x) l^2 + (l - 1)^2, l = 1 + 0.622 (1 - 0.30 sqrt(x) - 0.70 x)^4, x = r/D; 0.03 above x = 1
 *
 * @param radiusRatio x, radius of the edge over diameter [-], from 0
 * @returns K on the velocity pressure in the duct [-]
 * @source Rennels & Hudson, Pipe Flow (2012)
 * @check fixtures/published/entries.json
 */
export function roundedEntryRennels2012(radiusRatio: number): number {
	const x = Math.min(radiusRatio, 1);
	const s = 1 - 0.3 * Math.sqrt(x) - 0.7 * x;
	const l = 1 + 0.622 * s * s * s * s;
	return 0.0696 * (1 - 0.569 * x) * l * l + (l - 1) * (l - 1);
}

/**
 * Sharp entry flush with a wall, the duct at an angle to it.
 *
 *   C = 0.57 + 0.30 cos t + 0.20 cos^2 t
 *
 * @param angle t, between duct and wall [°], 20 to 90 (square to the wall)
 * @returns C on the velocity pressure in the duct [-]
 * @source Idelchik, Handbook of Hydraulic Resistance (1966), as recommended by Rennels & Hudson (2012)
 * @check fixtures/published/entries.json
 */
export function angledEntryIdelchik(angle: number): number {
	const c = cos(radians(angle));
	return 0.57 + c * (0.3 + 0.2 * c);
}
