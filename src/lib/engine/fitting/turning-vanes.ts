import type { Range } from '../errors';
import { interpolate } from './interpolate';

/** Velocities in the duct for which double-thickness vanes are tabulated [m/s]. */
export const VANE_VELOCITY: Range = { min: 5, max: 20 };
/** Radius and spacing of the vanes [mm]. */
export const SINGLE_VANES = ['50/38', '114/57', '114/83'] as const;
export const DOUBLE_VANES = ['50/38', '50/57', '114/83'] as const;

const SINGLE: Readonly<Record<string, number>> = { '50/38': 0.12, '114/57': 0.15, '114/83': 0.18 };
const VELOCITIES = [5, 10, 15, 20];
const DOUBLE: Readonly<Record<string, readonly number[]>> = {
	'50/38': [0.27, 0.22, 0.19, 0.17],
	'50/57': [0.33, 0.29, 0.26, 0.23],
	'114/83': [0.38, 0.31, 0.27, 0.24]
};

/**
 * Mitred rectangular elbow of 90° with turning vanes of one sheet.
 *
 * @param vanes radius over spacing in mm: 50/38, 114/57 or 114/83
 * @returns C on the velocity pressure in the duct [-]
 * @source SMACNA, HVAC Systems Duct Design, elbow with turning vanes, from memory; other printings give 0.11 to 0.33
 * @check none: the printings disagree, so that only the order is tested
 */
export function singleVanesSmacna(vanes: string): number {
	return SINGLE[vanes] ?? NaN;
}

/**
 * Mitred rectangular elbow of 90° with hollow turning vanes of double thickness.
 *
 * @param vanes radius over spacing in mm: 50/38, 50/57 or 114/83
 * @param V velocity in the duct [m/s], 5 to 20
 * @returns C on the velocity pressure in the duct [-]
 * @source SMACNA, HVAC Systems Duct Design, elbow with turning vanes, from memory
 * @check none: no checked value is at hand
 */
export function doubleVanesSmacna(vanes: string, V: number): number {
	return interpolate(VELOCITIES, DOUBLE[vanes] ?? [], V);
}
