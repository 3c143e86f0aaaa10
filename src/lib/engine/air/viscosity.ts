import { requireInRange, type Range } from '../errors';

/** Temperature of Sutherland's formula, 170 to 1900 K [°C]. */
export const VISCOSITY_TEMPERATURE: Range = { min: -103.15, max: 1626.85 };

/**
 * Dynamic viscosity of dry air.
 *
 *   mu = 1.458e-6 T^1.5/(T + 110.4)
 *
 * @param t temperature [°C], -103.15 to 1626.85; moisture lowers mu by less than 1 % below 40 °C
 * @returns mu dynamic viscosity [Pa s]
 * @throws {OutOfRangeError} when t leaves the range
 * @source U.S. Standard Atmosphere, 1976, eq. 51 (Sutherland)
 * @check fixtures/published/air.json
 */
export function sutherlandViscosity(t: number): number {
	requireInRange('sutherlandViscosity', 't', t, VISCOSITY_TEMPERATURE);
	const T = t + 273.15;
	return (1.458e-6 * T * Math.sqrt(T)) / (T + 110.4);
}
