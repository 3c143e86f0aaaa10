import psychrolib from 'psychrolib';
import { beforeAll, describe, expect, it } from 'vitest';
import { OutOfRangeError } from '../errors';
import { airAtTemperature, airState, dewPoint, humidityRatio, saturationPressure, vapourPressure } from '.';

const SEA_LEVEL = 101_325;

describe('moist air against a second implementation (psychrolib 1.1.1)', () => {
	beforeAll(() => psychrolib.SetUnitSystem(psychrolib.SI));

	it('has the same humidity ratio', () => {
		for (let t = -20; t <= 50; t += 5)
			for (const relativeHumidity of [0.1, 0.5, 1]) {
				const W = humidityRatio(vapourPressure({ temperature: t, relativeHumidity }), SEA_LEVEL);
				// The reference has 0.621945 for the ratio of the molar masses, 8 millionths less.
				expect(W / psychrolib.GetHumRatioFromRelHum(t, relativeHumidity, SEA_LEVEL)).toBeCloseTo(1, 4);
			}
	});

	it('has the same dew point, over water and over ice', () => {
		for (let t = -40; t <= 70; t += 5)
			for (const phi of [0.2, 0.6, 0.95]) {
				const pw = phi * saturationPressure(t);
				// The reference stops its search at 0.001 K.
				expect(Math.abs(dewPoint(pw) - psychrolib.GetTDewPointFromVapPres(t, pw)), `${t} ${phi}`).toBeLessThan(0.002);
			}
	});

	it('has the same density and humidity at another temperature', () => {
		for (const t of [10, 20, 35])
			for (const t2 of [25, 50, 75])
				for (const p of [80_000, SEA_LEVEL]) {
					const reference = { temperature: t, relativeHumidity: 0.4, pressure: p };
					const W = psychrolib.GetHumRatioFromRelHum(t, 0.4, p);
					const air = airAtTemperature(reference, t2);
					expect(air.density / psychrolib.GetMoistAirDensity(t2, W, p), `${t} to ${t2}`).toBeCloseTo(1, 5);
					expect(air.relativeHumidity / psychrolib.GetRelHumFromHumRatio(t2, W, p)).toBeCloseTo(1, 10);
				}
	});
});

describe('air cooled or warmed in a duct', () => {
	const reference = { temperature: 20, relativeHumidity: 0.5 };

	it('is saturated below its dew point, and says so', () => {
		const cold = airAtTemperature(reference, 5);
		expect(cold.relativeHumidity).toBe(1);
		expect(cold.note).toContain('dew point of 9.3 °C');
	});

	it('condenses exactly from the dew point on', () => {
		const t = dewPoint(vapourPressure(reference));
		expect(airAtTemperature(reference, t + 1e-6).note).toBeNull();
		expect(airAtTemperature(reference, t - 1e-6).note).not.toBeNull();
	});

	it('keeps saturated air as it is, and dry air dry', () => {
		expect(airAtTemperature({ temperature: 12, relativeHumidity: 1 }, 12).note).toBeNull();
		expect(airAtTemperature({ temperature: 12 }, -40)).toMatchObject({ relativeHumidity: 0, note: null });
	});

	it('takes the pressure of the site', () => {
		const high = airAtTemperature({ temperature: 20, elevation: 1500 }, 40);
		expect(high.density).toBe(airState({ temperature: 40, elevation: 1500 }).density);
	});

	it('refuses what is outside the formulas', () => {
		expect(() => airAtTemperature(reference, 81)).toThrow(OutOfRangeError);
		expect(() => airAtTemperature({ temperature: 20, relativeHumidity: 1.01 }, 20)).toThrow(OutOfRangeError);
		expect(() => airAtTemperature({ temperature: 20, pressure: 0 }, 20)).toThrow(OutOfRangeError);
		expect(() => humidityRatio(SEA_LEVEL, SEA_LEVEL)).toThrow(OutOfRangeError);
		expect(() => dewPoint(0)).toThrow(OutOfRangeError);
	});
});
