import fc from 'fast-check';
import psychrolib from 'psychrolib';
import { beforeAll, describe, expect, it } from 'vitest';
import { OutOfRangeError } from '../errors';
import { enthalpy, mixedTemperature } from '.';

const SEA_LEVEL = 101_325;
const OUTDOOR = { temperature: -10, relativeHumidity: 0.8, massFlow: 1 };
const RETURN = { temperature: 22, relativeHumidity: 0.4, massFlow: 3 };

describe('mixed air', () => {
	beforeAll(() => psychrolib.SetUnitSystem(psychrolib.SI));

	it('has the enthalpy of a second implementation (psychrolib 1.1.1)', () => {
		for (let t = -30; t <= 60; t += 10)
			for (const W of [0.0001, 0.005, 0.02])
				expect(enthalpy(t, W)).toBeCloseTo(psychrolib.GetMoistAirEnthalpy(t, W), 6);
	});

	it('has the temperature of a second implementation (psychrolib 1.1.1)', () => {
		const parts = [OUTDOOR, RETURN].map(({ temperature, relativeHumidity, massFlow }) => {
			const W = psychrolib.GetHumRatioFromRelHum(temperature, relativeHumidity, SEA_LEVEL);
			return { dry: massFlow / (1 + W), W, h: psychrolib.GetMoistAirEnthalpy(temperature, W) };
		});
		const dry = parts.reduce((sum, part) => sum + part.dry, 0);
		const W = parts.reduce((sum, part) => sum + part.dry * part.W, 0) / dry;
		const h = parts.reduce((sum, part) => sum + part.dry * part.h, 0) / dry;
		const mixed = mixedTemperature([OUTDOOR, RETURN]);
		expect(mixed.temperature).toBeCloseTo(psychrolib.GetTDryBulbFromEnthalpyAndHumRatio(h, W), 4);
		expect(mixed.humidityRatio / W).toBeCloseTo(1, 4);
		expect(mixed.massFlow).toBe(4);
	});

	it('is one stream by itself, however it is split', () => {
		expect(mixedTemperature([RETURN]).temperature).toBeCloseTo(22, 12);
		const half = { ...RETURN, massFlow: 1.5 };
		expect(mixedTemperature([half, half]).temperature).toBeCloseTo(22, 12);
	});

	it('weighs dry streams by their mass', () => {
		const mixed = mixedTemperature([
			{ temperature: 10, massFlow: 1 },
			{ temperature: 30, massFlow: 3 }
		]);
		expect(mixed.temperature).toBeCloseTo(25, 12);
	});

	it('lies between its streams, in any order', () => {
		const stream = fc.record({
			temperature: fc.double({ min: -30, max: 60, noNaN: true }),
			relativeHumidity: fc.double({ min: 0, max: 1, noNaN: true }),
			massFlow: fc.double({ min: 0.01, max: 10, noNaN: true })
		});
		fc.assert(
			fc.property(fc.array(stream, { minLength: 1, maxLength: 5 }), (streams) => {
				const temperatures = streams.map((one) => one.temperature);
				const { temperature } = mixedTemperature(streams);
				expect(temperature).toBeGreaterThan(Math.min(...temperatures) - 1e-9);
				expect(temperature).toBeLessThan(Math.max(...temperatures) + 1e-9);
				expect(mixedTemperature([...streams].reverse()).temperature).toBeCloseTo(temperature, 9);
			})
		);
	});

	it('says where mist forms', () => {
		expect(mixedTemperature([OUTDOOR, RETURN]).note).toBeNull();
		const damp = [
			{ temperature: -15, relativeHumidity: 0.9, massFlow: 1 },
			{ temperature: 28, relativeHumidity: 0.95, massFlow: 1 }
		];
		expect(mixedTemperature(damp).note).toContain('mist');
	});

	it('wants mass that flows', () => {
		expect(() => mixedTemperature([])).toThrow(OutOfRangeError);
		expect(() => mixedTemperature([{ temperature: 20, massFlow: 0 }])).toThrow(OutOfRangeError);
		expect(() => mixedTemperature([{ temperature: 20, massFlow: -1 }, RETURN])).toThrow(OutOfRangeError);
	});
});
