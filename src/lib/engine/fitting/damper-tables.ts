import { exp, log } from '../arithmetic';
import type { Range } from '../errors';
import { interpolate } from './interpolate';

/** Blade angles from open of the tables [°]. */
export const BUTTERFLY_ANGLE: Range = { min: 0, max: 60 };
export const BLADES_ANGLE: Range = { min: 0, max: 80 };

const BUTTERFLY_ANGLES = [0, 10, 20, 30, 40, 50, 60];
const BUTTERFLY_ROUND = [0.2, 0.52, 1.5, 4.5, 11, 29, 108];
const BUTTERFLY_RECTANGULAR = [0.04, 0.33, 1.2, 3.3, 9, 26, 70];
const BLADES_ANGLES = [0, 10, 20, 30, 40, 50, 60, 70, 80];
const PARALLEL = [0.52, 0.79, 1.4, 2.3, 5, 9, 14, 32, 116];
const OPPOSED = [0.52, 0.85, 2.1, 4.1, 9, 21, 73, 284, 807];

const logarithms = (values: readonly number[]): readonly number[] => values.map(log);
const LOG_ROUND = logarithms(BUTTERFLY_ROUND);
const LOG_RECTANGULAR = logarithms(BUTTERFLY_RECTANGULAR);
const LOG_PARALLEL = logarithms(PARALLEL);
const LOG_OPPOSED = logarithms(OPPOSED);

/**
 * Butterfly damper.
 *
 *   ln C is nearly a straight line against the angle, and is taken as one between the points of the table
 *
 * @param angle of the blade from open [°], 0 to 60
 * @param section round or rectangular
 * @returns C on the velocity pressure in the duct [-]
 * @source SMACNA, HVAC Systems Duct Design, after Idelchik, from memory; log-linear by Legg (1986)
 * @check fixtures/published/dampers.json
 */
export function butterflyDamper(angle: number, section: 'round' | 'rectangular'): number {
	return exp(interpolate(BUTTERFLY_ANGLES, section === 'round' ? LOG_ROUND : LOG_RECTANGULAR, angle));
}

/**
 * Damper of several blades, total blade length over perimeter 0.3.
 *
 * @param angle of the blades from open [°], 0 to 80
 * @param blades parallel or opposed
 * @returns C on the velocity pressure in the duct [-]
 * @source SMACNA, HVAC Systems Duct Design, multi-blade dampers, from memory
 * @check none: no checked value is at hand
 */
export function bladeDamper(angle: number, blades: 'parallel' | 'opposed'): number {
	return exp(interpolate(BLADES_ANGLES, blades === 'parallel' ? LOG_PARALLEL : LOG_OPPOSED, angle));
}

/** Openings of the gate tables, height over that of the duct [-]. */
export const GATE_OPENING: Range = { min: 0.2, max: 1 };
const GATE_OPENINGS = [0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9];
const GATE_ROUND = logarithms([35, 10, 4.6, 2.1, 0.98, 0.44, 0.17, 0.06]);
const GATE_RECTANGULAR = logarithms([45, 18, 8.1, 4, 2.1, 0.95, 0.39, 0.09]);
const LAST_OPENING = 0.9;

/**
 * Gate or slide damper.
 *
 *   ln C is taken as a straight line between the points of the table, C as one from the last of them to nothing
 *
 * @param opening free height over that of the duct [-], 0.2 to 1
 * @param section round or rectangular
 * @returns C on the velocity pressure in the duct [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, gate valves, from memory
 * @check none: no checked value is at hand
 */
export function gateDamper(opening: number, section: 'round' | 'rectangular'): number {
	const C = exp(interpolate(GATE_OPENINGS, section === 'round' ? GATE_ROUND : GATE_RECTANGULAR, opening));
	return opening <= LAST_OPENING ? C : (C * (1 - opening)) / (1 - LAST_OPENING);
}
