import { radians, sin } from '../arithmetic';
import type { Range } from '../errors';
import { interpolate } from './interpolate';

/** Angles of the tabulated factor A [°]. */
export const MITRE_ANGLE: Range = { min: 20, max: 90 };
const ANGLES = [20, 30, 45, 60, 75, 90];
const A = [2.5, 2.22, 1.87, 1.5, 1.28, 1.2];
/** Aspect ratios H/W of the factor [-]. */
export const MITRE_ASPECT: Range = { min: 0.25, max: 8 };
const ASPECT = [0.25, 0.5, 0.75, 1, 1.5, 2, 3, 4, 6, 8];
const ASPECT_FACTOR = [1.1, 1.07, 1.04, 1, 0.95, 0.9, 0.83, 0.78, 0.72, 0.7];

/**
 * Mitred elbow, round or square, without vanes.
 *
 *   C = A [0.95 sin^2(d/2) + 2.05 sin^4(d/2)], A = 2.50, 2.22, 1.87, 1.50, 1.28, 1.20 at 20, 30, 45, 60, 75, 90°
 *
 * @param d angle of the elbow [°], 20 to 90
 * @returns C on the velocity pressure in the duct [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 6-7; A from memory, the product agrees with
 * SMACNA, HVAC Systems Duct Design, 4th ed. (2006), table A-7, to rounding
 * @check fixtures/published/elbows.json
 */
export function mitreIdelchik(d: number): number {
	const s = sin(radians(d / 2));
	return interpolate(ANGLES, A, d) * s * s * (0.95 + 2.05 * s * s);
}

/**
 * Factor C1 for a rectangular mitred elbow.
 *
 * @param aspect H/W, side parallel to the axis of the bend over side in its plane [-], 0.25 to 8
 * @returns factor on C [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 6-7, from memory; agrees with SMACNA, HVAC
 * Systems Duct Design, 4th ed. (2006), table A-7, to rounding
 * @check fixtures/published/elbows.json
 */
export function mitreAspectFactorIdelchik(aspect: number): number {
	return interpolate(ASPECT, ASPECT_FACTOR, aspect);
}
