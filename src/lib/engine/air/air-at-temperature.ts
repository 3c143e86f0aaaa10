import { requireInRange } from '../errors';
import type { AirState } from './air-state';
import { AIR_TEMPERATURE, mixtureDensity } from './humid-air-density';
import { dewPoint, pressureOf, vapourPressure, type AirCondition } from './moist-air';
import { saturationPressure } from './saturation-pressure';
import { sutherlandViscosity } from './viscosity';

export interface AirAtTemperature extends AirState {
	/** 0 to 1 */
	readonly relativeHumidity: number;
	/** Colder than its dew point: water falls out */
	readonly condenses: boolean;
	/** The same in words, with the dew point; null when nothing condenses */
	readonly note: string | null;
}

/**
 * Air of the same pressure and moisture at another temperature; below the dew point it is saturated.
 *
 *   rho = (p - pw)/(287.042 T) + pw/(461.52 T), pw = min(phi ps(t0), ps(t))
 *
 * @param condition t0 [°C], phi [-], and elevation [m] or pressure p [Pa]
 * @param t temperature [°C], -50 to 80
 * @returns density [kg/m3], viscosity of dry air [Pa s], relative humidity [-], and whether water falls out
 * @throws {OutOfRangeError} when a temperature, the humidity or the pressure leaves its range
 * @source Ideal-gas mixture; saturation by Hyland & Wexler (1983), viscosity by Sutherland
 * @check fixtures/published/air.json
 */
export function airAtTemperature(condition: AirCondition, t: number): AirAtTemperature {
	requireInRange('airAtTemperature', 't', t, AIR_TEMPERATURE);
	const p = pressureOf(condition);
	const vapour = vapourPressure(condition);
	// At a low pressure water boils within the range: then vapour alone is saturated.
	const saturated = Math.min(saturationPressure(t), p);
	const pw = Math.min(vapour, saturated);
	const condenses = vapour > saturated;
	return {
		density: mixtureDensity(t, pw, p),
		viscosity: sutherlandViscosity(t),
		relativeHumidity: pw / saturated,
		condenses,
		note: condenses
			? `The air is below its dew point of ${dewPoint(vapour).toFixed(1)} °C: water falls out, saturated air is taken.`
			: null
	};
}
