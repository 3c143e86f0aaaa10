import { pow } from '../arithmetic';
import { requireInRange, type Range } from '../errors';

/** Elevation of the first layer, as used for building sites [m]. */
export const ELEVATION: Range = { min: -5_000, max: 11_000 };

/**
 * Pressure of the standard atmosphere.
 *
 *   p = 101325 (1 - 2.25577e-5 z)^5.2559
 *
 * @param z elevation above sea level [m], -5000 to 11 000, taken as geopotential
 * @returns p pressure [Pa]
 * @throws {OutOfRangeError} when z leaves the range
 * @source U.S. Standard Atmosphere, 1976, eq. 33a with its constants drawn together
 * @check fixtures/published/air.json
 */
export function standardPressure(z: number): number {
	requireInRange('standardPressure', 'z', z, ELEVATION);
	return 101_325 * pow(1 - 2.25577e-5 * z, 5.2559);
}

/**
 * Temperature of the standard atmosphere.
 *
 *   t = 15 - 0.0065 z
 *
 * @param z elevation above sea level [m], -5000 to 11 000
 * @returns t temperature [°C]
 * @throws {OutOfRangeError} when z leaves the range
 * @source U.S. Standard Atmosphere, 1976, eq. 23
 * @check fixtures/published/air.json
 */
export function standardTemperature(z: number): number {
	requireInRange('standardTemperature', 'z', z, ELEVATION);
	return 15 - 0.0065 * z;
}
