import { requireInRange, type Range } from '../errors';
import { saturationPressure } from './saturation-pressure';

/** Where the ideal-gas mixture is good for ducts [°C]. */
export const AIR_TEMPERATURE: Range = { min: -50, max: 80 };
export const RELATIVE_HUMIDITY: Range = { min: 0, max: 1 };
/** From the highest site to a little above the lowest [Pa]. */
export const AIR_PRESSURE: Range = { min: 10_000, max: 200_000 };

/** Gas constants [J/(kg K)] */
export const DRY_AIR = 287.042;
export const VAPOUR = 461.52;

/**
 * Density of an ideal mixture of dry air and vapour.
 *
 *   rho = (p - pw)/(287.042 T) + pw/(461.52 T)
 *
 * @param t temperature [°C], above -273.15
 * @param pw pressure of the vapour [Pa], 0 to p
 * @param p absolute pressure [Pa]
 * @returns rho density, of the mixture [kg/m3]
 * @source Ideal-gas mixture, as in Hyland & Wexler (1983) without its virial terms
 * @check fixtures/published/air.json
 */
export function mixtureDensity(t: number, pw: number, p: number): number {
	const T = t + 273.15;
	return (p - pw) / (DRY_AIR * T) + pw / (VAPOUR * T);
}

/**
 * Density of humid air, an ideal mixture of dry air and vapour.
 *
 *   rho = (p - pw)/(287.042 T) + pw/(461.52 T), pw = phi ps(t)
 *
 * @param t temperature [°C], -50 to 80
 * @param phi relative humidity [-], 0 to 1
 * @param p absolute pressure [Pa], 10 000 to 200 000
 * @returns rho density, of the mixture [kg/m3]
 * @throws {OutOfRangeError} when t, phi or p leaves its range
 * @source Ideal-gas mixture, as in Hyland & Wexler (1983) without its virial terms
 * @check fixtures/published/air.json
 */
export function humidAirDensity(t: number, phi: number, p: number): number {
	requireInRange('humidAirDensity', 't', t, AIR_TEMPERATURE);
	requireInRange('humidAirDensity', 'phi', phi, RELATIVE_HUMIDITY);
	requireInRange('humidAirDensity', 'p', p, AIR_PRESSURE);
	// Vapour cannot hold more than the whole pressure.
	return mixtureDensity(t, Math.min(phi * saturationPressure(t), p), p);
}
