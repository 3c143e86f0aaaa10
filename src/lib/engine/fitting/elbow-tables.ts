import type { Range } from '../errors';
import { interpolate, interpolateTable } from './interpolate';

const ANGLES = [0, 20, 30, 45, 60, 75, 90, 110, 130, 150, 180];
// The point at 0° is ours: a bend of no angle is a straight duct.
const ANGLE_FACTORS = [0, 0.31, 0.45, 0.6, 0.78, 0.9, 1, 1.13, 1.2, 1.28, 1.4];
const STAMPED_RADII = [0.5, 0.75, 1, 1.5, 2, 2.5];
const STAMPED = [0.71, 0.33, 0.22, 0.15, 0.13, 0.12];
const RE = [1e4, 2e4, 3e4, 4e4, 6e4, 8e4, 1e5, 1.4e5];
const RE_FACTORS = [1.4, 1.26, 1.19, 1.14, 1.09, 1.06, 1.04, 1];

interface SegmentTable {
	readonly radii: readonly number[];
	readonly coefficients: readonly number[];
}
const THREE: SegmentTable = { radii: [0.5, 0.75, 1, 1.5, 2], coefficients: [0.98, 0.54, 0.42, 0.34, 0.33] };
const FOUR: SegmentTable = { radii: [0.75, 1, 1.5, 2], coefficients: [0.5, 0.37, 0.27, 0.24] };
const FIVE: SegmentTable = { radii: [0.75, 1, 1.5, 2], coefficients: [0.46, 0.33, 0.24, 0.19] };

/** Radii of the die-stamped elbows [-]. */
export const STAMPED_RADIUS: Range = { min: 0.5, max: 2.5 };
/** Radii of the rectangular elbows [-]. */
export const RECTANGULAR_RADIUS: Range = { min: 0.5, max: 2 };
/** Angles of the tabulated factor [°]. */
export const TABLE_ANGLE: Range = { min: 20, max: 180 };
/** Radii of the segmented elbows, by number of pieces [-]. */
export const segmentRadii = (pieces: number): Range => ({ min: pieces === 3 ? 0.5 : 0.75, max: 2 });

/**
 * Factor of a round elbow of another angle than 90°.
 *
 * @param angle [°], 20 to 180
 * @returns factor on the coefficient of 90° [-]
 * @source SMACNA, HVAC Systems Duct Design, 4th ed. (2006), table A-7
 * @check fixtures/published/elbows.json
 */
export function elbowAngleFactorSmacna(angle: number): number {
	return interpolate(ANGLES, ANGLE_FACTORS, angle);
}

/**
 * Round elbow, die-stamped, smooth radius: the table that rivals bendIdelchik.
 *
 * @param radiusRatio centre-line radius over diameter [-], 0.5 to 2.5
 * @param angle [°], 20 to 180
 * @returns C on the velocity pressure in the elbow [-]
 * @source SMACNA, HVAC Systems Duct Design, 4th ed. (2006), table A-7
 * @check fixtures/published/elbows.json
 */
export function roundElbowSmacna(radiusRatio: number, angle: number): number {
	return interpolate(STAMPED_RADII, STAMPED, radiusRatio) * elbowAngleFactorSmacna(angle);
}

/**
 * Round elbow of straight pieces.
 *
 * @param pieces number of pieces [-], 3, 4 or 5
 * @param radiusRatio centre-line radius over diameter [-], 0.75 (0.5 with three pieces) to 2
 * @param angle [°], 20 to 180; other angles than 90° by the factor of smooth elbows (from memory)
 * @returns C on the velocity pressure in the elbow [-]
 * @source SMACNA, HVAC Systems Duct Design, 4th ed. (2006), table A-7
 * @check fixtures/published/elbows.json
 */
export function segmentedElbowSmacna(pieces: number, radiusRatio: number, angle: number): number {
	const table = pieces >= 5 ? FIVE : pieces === 4 ? FOUR : THREE;
	return interpolate(table.radii, table.coefficients, radiusRatio) * elbowAngleFactorSmacna(angle);
}

/**
 * Factor of a mitred elbow below a Reynolds number of 1.4e5.
 *
 * @param Re Reynolds number [-], from 10 000
 * @returns factor on C [-]
 * @source SMACNA, HVAC Systems Duct Design, 4th ed. (2006), table A-7
 * @check fixtures/published/elbows.json
 */
export function mitreReynoldsFactorSmacna(Re: number): number {
	return interpolate(RE, RE_FACTORS, Re);
}

const RECTANGULAR_RADII = [0.5, 0.75, 1, 1.5, 2];
const RECTANGULAR_ASPECTS = [0.25, 0.5, 0.75, 1, 1.5, 2, 3, 4, 5, 6, 8];
// The table as remembered has 0.27 at (1.0, 6), an evident misprint; 0.20 stands there.
const RECTANGULAR = [
	[1.5, 1.4, 1.3, 1.2, 1.1, 1, 1, 1.1, 1.1, 1.2, 1.2],
	[0.57, 0.52, 0.48, 0.44, 0.4, 0.39, 0.39, 0.4, 0.42, 0.43, 0.44],
	[0.27, 0.25, 0.23, 0.21, 0.19, 0.18, 0.18, 0.19, 0.2, 0.2, 0.21],
	[0.22, 0.2, 0.19, 0.17, 0.15, 0.14, 0.14, 0.15, 0.16, 0.17, 0.17],
	[0.2, 0.18, 0.16, 0.15, 0.14, 0.13, 0.13, 0.14, 0.14, 0.15, 0.15]
];

/**
 * Rectangular elbow, smooth radius, 90°: the table that rivals bendIdelchik.
 *
 * @param radiusRatio centre-line radius over the side in the plane of the bend [-], 0.5 to 2
 * @param aspect H/W, side parallel to the axis of the bend over side in its plane [-], 0.25 to 8
 * @returns C on the velocity pressure in the elbow [-]
 * @source SMACNA, HVAC Systems Duct Design, rectangular smooth-radius elbow without vanes, from memory
 * @check fixtures/published/elbows.json
 */
export function rectangularElbowSmacna(radiusRatio: number, aspect: number): number {
	return interpolateTable(RECTANGULAR_RADII, RECTANGULAR_ASPECTS, RECTANGULAR, radiusRatio, aspect);
}
