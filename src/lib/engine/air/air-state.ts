import { humidAirDensity } from './humid-air-density';
import { pressureOf, type AirCondition } from './moist-air';
import { sutherlandViscosity } from './viscosity';

/** Air by its condition, or with its properties given. */
export type AirSpec = AirCondition | { readonly density: number; readonly viscosity?: number | undefined };

export interface AirState {
	/** kg/m3 */
	readonly density: number;
	/** Pa s */
	readonly viscosity: number;
}

/**
 * Density and viscosity of the air in the ducts.
 *
 * @param spec condition: temperature [°C], relative humidity [-], elevation [m] or pressure [Pa]; or density [kg/m3] and
 * viscosity [Pa s], the latter that of 20 °C when not given
 * @returns density [kg/m3] and viscosity [Pa s]
 * @throws {OutOfRangeError} when a part of the condition leaves the range of its formula
 * @source The formulas of this room
 * @check fixtures/published/air.json
 */
export function airState(spec: AirSpec): AirState {
	if ('density' in spec) return { density: spec.density, viscosity: spec.viscosity ?? sutherlandViscosity(20) };
	return {
		density: humidAirDensity(spec.temperature, spec.relativeHumidity ?? 0, pressureOf(spec)),
		viscosity: sutherlandViscosity(spec.temperature)
	};
}
