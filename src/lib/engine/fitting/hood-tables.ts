import type { Range } from '../errors';
import { interpolate } from './interpolate';

/** Included angles of the tapered hoods [°]. */
export const HOOD_ANGLE: Range = { min: 15, max: 180 };
/** Distances of a cap from the duct's end, over its diameter [-]. */
export const CAP_DISTANCE: Range = { min: 0.1, max: 1 };

const ANGLES = [15, 30, 45, 60, 90, 120, 150, 180];
const ROUND = [0.15, 0.08, 0.06, 0.08, 0.15, 0.26, 0.4, 0.5];
const RECTANGULAR = [0.25, 0.16, 0.15, 0.17, 0.25, 0.35, 0.48, 0.5];

/**
 * Tapered hood at the entry of an exhaust duct, its face at least twice the duct's area.
 *
 * @param angle included angle of the taper [°], 15 to 180 (a flange)
 * @param face round or rectangular
 * @returns C on the velocity pressure in the duct [-]
 * @source ACGIH, Industrial Ventilation, hood entry loss, from memory
 * @check none: no checked value is at hand
 */
export function taperedHoodAcgih(angle: number, face: 'round' | 'rectangular'): number {
	return interpolate(ANGLES, face === 'round' ? ROUND : RECTANGULAR, angle);
}

const DISTANCES = [0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1];
const INTAKE = [2.6, 1.8, 1.5, 1.4, 1.3, 1.2, 1.2, 1.1, 1.1, 1.1];
const EXHAUST = [4, 2.3, 1.9, 1.6, 1.4, 1.3, 1.2, 1.1, 1, 1];

/**
 * Flat cap over the open end of a round duct.
 *
 * @param distance of the cap from the end over the diameter [-], 0.1 to 1
 * @param way intake or exhaust
 * @returns C on the velocity pressure in the duct, for an exhaust that pressure included [-]
 * @source SMACNA, HVAC Systems Duct Design, after Idelchik, from memory
 * @check none: no checked value is at hand
 */
export function flatCapSmacna(distance: number, way: 'intake' | 'exhaust'): number {
	return interpolate(DISTANCES, way === 'intake' ? INTAKE : EXHAUST, distance);
}
