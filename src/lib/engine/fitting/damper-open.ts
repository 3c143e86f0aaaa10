import { pow } from '../arithmetic';

/** Approach velocity of the formula, 1000 fpm [m/s]. */
export const REFERENCE_VELOCITY = 5.08;

export interface OpenDamper {
	/** Free area over duct area [-] */
	readonly freeRatio: number;
	/** Loss at the velocity asked [Pa] */
	readonly loss: number;
}

/**
 * Damper of several blades fully open, its frame smaller than the duct or equal to it.
 *
 *   ratio = (0.0798 Ad)^0.1007 Ad/Au (parallel), (0.0180 Ad)^0.0849 Ad/Au (opposed);
 *   dp at 5.08 m/s = 3.114 (ratio^-4.274 - 1) when ratio > 0.5, else 11.64 (ratio^-2.562 - 1); with the square of V
 *
 * @param blades parallel or opposed
 * @param Ad area of the damper [m2]
 * @param Au area of the duct [m2], not less than Ad
 * @param V velocity in the duct [m/s], standard air
 * @returns free-area ratio [-] and loss [Pa]
 * @source Honeywell, Engineering Manual of Automatic Control, damper selection, tables 6 and 7
 * @check fixtures/published/dampers.json
 */
export function openBladeDamper(blades: 'parallel' | 'opposed', Ad: number, Au: number, V: number): OpenDamper {
	const free = blades === 'parallel' ? pow(0.0798 * Ad, 0.1007) : pow(0.018 * Ad, 0.0849);
	const freeRatio = (free * Ad) / Au;
	const reference = freeRatio > 0.5 ? 3.114 * (pow(freeRatio, -4.274) - 1) : 11.64 * (pow(freeRatio, -2.562) - 1);
	const ratio = V / REFERENCE_VELOCITY;
	return { freeRatio, loss: reference * ratio * ratio };
}

/** Density of the formula's air, 0.075 lb/ft3 [kg/m3]. */
const REFERENCE_DENSITY = 1.2014;

/**
 * The same as a coefficient; nothing where the formula, of a damper larger than it was made for, would give a gain.
 *
 * @param damper what openBladeDamper gives at 5.08 m/s: free-area ratio [-] and loss [Pa]
 * @returns C on the velocity pressure in the duct [-]
 * @source Definition of the loss coefficient
 * @check fixtures/published/dampers.json
 */
export function openDamperCoefficient(damper: OpenDamper): number {
	return Math.max(0, damper.loss / (0.5 * REFERENCE_DENSITY * REFERENCE_VELOCITY * REFERENCE_VELOCITY));
}
