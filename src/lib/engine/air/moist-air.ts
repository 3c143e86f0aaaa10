import { requireInRange } from '../errors';
import { DRY_AIR, VAPOUR, AIR_PRESSURE, RELATIVE_HUMIDITY } from './humid-air-density';
import { SATURATION_TEMPERATURE, saturationPressure } from './saturation-pressure';
import { standardPressure } from './standard-atmosphere';

/** Air by its condition. */
export interface AirCondition {
	/** °C */
	readonly temperature: number;
	/** 0 to 1; dry without it */
	readonly relativeHumidity?: number | undefined;
	/** m above sea level; 0 without it */
	readonly elevation?: number | undefined;
	/** Absolute [Pa]; that of the elevation without it */
	readonly pressure?: number | undefined;
}

/**
 * Absolute pressure of the air: as given, or that of the elevation.
 *
 * @param condition pressure [Pa] or elevation [m]
 * @returns p [Pa]
 * @throws {OutOfRangeError} when the elevation leaves its range
 * @source standardPressure
 * @check fixtures/published/air.json
 */
export function pressureOf({ pressure, elevation }: AirCondition): number {
	return pressure ?? standardPressure(elevation ?? 0);
}

/**
 * Pressure of the vapour in the air.
 *
 *   pw = phi ps(t), at most p
 *
 * @param condition temperature [°C], relative humidity [-], elevation [m] or pressure [Pa]
 * @returns pw [Pa]
 * @throws {OutOfRangeError} when a part of the condition leaves its range
 * @source Definition of relative humidity; ps of Hyland & Wexler (1983)
 * @check none: compared with psychrolib 1.1.1 in moist-air.test.ts
 */
export function vapourPressure(condition: AirCondition): number {
	const phi = condition.relativeHumidity ?? 0;
	const p = pressureOf(condition);
	requireInRange('vapourPressure', 'phi', phi, RELATIVE_HUMIDITY);
	requireInRange('vapourPressure', 'p', p, AIR_PRESSURE);
	return Math.min(phi * saturationPressure(condition.temperature), p);
}

/**
 * Vapour by dry air.
 *
 *   W = 0.62195 pw/(p - pw), the first figure the ratio of the gas constants 287.042 and 461.52
 *
 * @param pw pressure of the vapour [Pa], below p
 * @param p absolute pressure [Pa]
 * @returns W humidity ratio [-], kg of vapour in a kg of dry air
 * @throws {OutOfRangeError} when pw is negative or not below p
 * @source Ideal-gas mixture
 * @check none: compared with psychrolib 1.1.1 in moist-air.test.ts
 */
export function humidityRatio(pw: number, p: number): number {
	requireInRange('humidityRatio', 'pw', pw, { min: 0, max: p * (1 - 1e-9) });
	return ((DRY_AIR / VAPOUR) * pw) / (p - pw);
}

/**
 * Temperature at which the vapour starts to condense, or to freeze.
 *
 *   ps(t) = pw, by halving
 *
 * @param pw pressure of the vapour [Pa], from that of ice at -100 °C to that of water at 200 °C
 * @returns t dew point [°C]
 * @throws {OutOfRangeError} when pw is no saturation pressure of the range
 * @source Inverse of Hyland & Wexler (1983)
 * @check none: compared with psychrolib 1.1.1 in moist-air.test.ts
 */
export function dewPoint(pw: number): number {
	let { min: low, max: high } = SATURATION_TEMPERATURE;
	requireInRange('dewPoint', 'pw', pw, { min: saturationPressure(low), max: saturationPressure(high) });
	while (high - low > 1e-9) {
		const middle = (low + high) / 2;
		if (saturationPressure(middle) < pw) low = middle;
		else high = middle;
	}
	return high;
}
