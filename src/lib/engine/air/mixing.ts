import { requireInRange } from '../errors';
import { DRY_AIR, VAPOUR } from './humid-air-density';
import { humidityRatio, vapourPressure } from './moist-air';
import { saturationPressure } from './saturation-pressure';

/** A stream that joins others. */
export interface MixingStream {
	/** °C */
	readonly temperature: number;
	/** 0 to 1; dry without it */
	readonly relativeHumidity?: number | undefined;
	/** Of the moist air [kg/s] */
	readonly massFlow: number;
}

export interface MixedAir {
	/** °C */
	readonly temperature: number;
	/** kg of vapour in a kg of dry air */
	readonly humidityRatio: number;
	/** kg/s */
	readonly massFlow: number;
	/** Where the mixture holds more vapour than saturated air; null otherwise */
	readonly note: string | null;
}

const HEAT_OF_AIR = 1006; // J/(kg K)
const HEAT_OF_VAPOUR = 1860; // J/(kg K)
const EVAPORATION = 2_501_000; // J/kg, at 0 °C

/**
 * Enthalpy of moist air by dry air, zero for dry air and water at 0 °C.
 *
 *   h = 1006 t + W (2 501 000 + 1860 t)
 *
 * @param t temperature [°C]
 * @param W humidity ratio [-]
 * @returns h [J/kg], by dry air
 * @source Ideal-gas mixture with constant heats, the form of psychrometric practice
 * @check none: compared with psychrolib 1.1.1 in mixing.test.ts
 */
export function enthalpy(t: number, W: number): number {
	return HEAT_OF_AIR * t + W * (EVAPORATION + HEAT_OF_VAPOUR * t);
}

/**
 * Air that several streams make together, without heat from elsewhere.
 *
 *   W = sum(ma W)/sum(ma), h = sum(ma h)/sum(ma), ma = m/(1 + W) the dry air of each stream
 *   t = (h - 2 501 000 W)/(1006 + 1860 W)
 *
 * @param streams temperature [°C], relative humidity [-] and mass flow [kg/s] of each
 * @param pressure absolute pressure p of all [Pa]
 * @returns temperature [°C], humidity ratio [-], mass flow [kg/s] and a note where the mixture is above saturation
 * @throws {OutOfRangeError} when a condition leaves its range or no mass flows
 * @source Balance of dry air, vapour and enthalpy (adiabatic mixing)
 * @check none: compared with psychrolib 1.1.1 and laws in mixing.test.ts
 */
export function mixedTemperature(streams: readonly MixingStream[], pressure = 101_325): MixedAir {
	let [dry, water, heat, massFlow] = [0, 0, 0, 0];
	for (const stream of streams) {
		requireInRange('mixedTemperature', 'massFlow', stream.massFlow, { min: 0, max: Number.MAX_VALUE });
		const W = humidityRatio(vapourPressure({ ...stream, pressure }), pressure);
		const ma = stream.massFlow / (1 + W);
		dry += ma;
		water += ma * W;
		heat += ma * enthalpy(stream.temperature, W);
		massFlow += stream.massFlow;
	}
	requireInRange('mixedTemperature', 'sum of the mass flows', massFlow, {
		min: Number.MIN_VALUE,
		max: Number.MAX_VALUE
	});
	const W = water / dry;
	const temperature = (heat / dry - EVAPORATION * W) / (HEAT_OF_AIR + HEAT_OF_VAPOUR * W);
	const pw = (W * pressure) / (DRY_AIR / VAPOUR + W);
	const foggy = pw > saturationPressure(temperature) * (1 + 1e-9);
	const note = foggy ? 'The mixture is above saturation: mist forms, and the air ends a little warmer.' : null;
	return { temperature, humidityRatio: W, massFlow, note };
}
