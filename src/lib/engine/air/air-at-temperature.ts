import { requireInRange } from '../errors';
import type { AirState } from './air-state';
import { AIR_TEMPERATURE } from './humid-air-density';
import { saturationPressure } from './saturation-pressure';
import { standardPressure } from './standard-atmosphere';
import { sutherlandViscosity } from './viscosity';

/** The condition of air, from which its state at another temperature follows. */
export interface AirCondition {
	/** °C */
	readonly temperature: number;
	readonly relativeHumidity?: number | undefined;
	/** m */
	readonly elevation?: number | undefined;
	/** Absolute [Pa] */
	readonly pressure?: number | undefined;
}

const DRY_AIR = 287.042; // J/(kg K)
const VAPOUR = 461.52; // J/(kg K)

/**
 * Air of the same pressure and moisture at another temperature; below the dew point it is saturated.
 *
 *   rho = (p - pw)/(287.042 T) + pw/(461.52 T), pw = min(phi ps(t0), ps(t))
 *
 * @param condition t0 [°C], phi [-], and elevation [m] or pressure p [Pa]
 * @param t temperature [°C], -50 to 80
 * @returns density [kg/m3], viscosity [Pa s], and whether water falls out
 * @throws {OutOfRangeError} when a temperature or the pressure leaves its range
 * @source Ideal-gas mixture; saturation by Hyland & Wexler (1983)
 * @check fixtures/published/air.json
 */
export function airAtTemperature(condition: AirCondition, t: number): AirState & { readonly condenses: boolean } {
	requireInRange('airAtTemperature', 't', t, AIR_TEMPERATURE);
	const p = condition.pressure ?? standardPressure(condition.elevation ?? 0);
	const vapour = Math.min((condition.relativeHumidity ?? 0) * saturationPressure(condition.temperature), p);
	const saturated = saturationPressure(t);
	const pw = Math.min(vapour, saturated);
	const T = t + 273.15;
	return {
		density: (p - pw) / (DRY_AIR * T) + pw / (VAPOUR * T),
		viscosity: sutherlandViscosity(t),
		condenses: vapour > saturated
	};
}
