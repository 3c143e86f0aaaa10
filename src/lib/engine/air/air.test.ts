import fc from 'fast-check';
import psychrolib from 'psychrolib';
import { beforeAll, describe, expect, it } from 'vitest';
import published from '../../../../fixtures/published/air.json';
import { describePublished } from '../../../../fixtures/published/published-checks';
import { OutOfRangeError } from '../errors';
import { airState, humidAirDensity, saturationPressure, standardPressure, sutherlandViscosity } from '.';
import { airChecks } from '../published/air';

describePublished('air against published values', published, airChecks);

describe('air against a second implementation (psychrolib 1.1.1)', () => {
	beforeAll(() => psychrolib.SetUnitSystem(psychrolib.SI));

	it('has the same saturation pressure from -100 to 200 °C', () => {
		for (let t = -100; t <= 200; t += 0.5)
			expect(saturationPressure(t) / psychrolib.GetSatVapPres(t), `${t} °C`).toBeCloseTo(1, 12);
	});

	it('has the same standard pressure from -5000 to 11 000 m', () => {
		for (let z = -5000; z <= 11_000; z += 100)
			expect(standardPressure(z) / psychrolib.GetStandardAtmPressure(z), `${z} m`).toBeCloseTo(1, 12);
	});

	it('has the same density over temperature, humidity and pressure', () => {
		for (let t = -50; t <= 60; t += 5)
			for (let phi = 0; phi <= 1; phi += 0.25)
				for (const p of [60_000, 80_000, 101_325, 110_000]) {
					const W = psychrolib.GetHumRatioFromRelHum(t, phi, p);
					const reference = psychrolib.GetMoistAirDensity(t, W, p);
					// The reference rounds its gas constants to six figures, and keeps at least 1e-7 of humidity.
					expect(humidAirDensity(t, phi, p) / reference, `${t} °C, ${phi}, ${p} Pa`).toBeCloseTo(1, 5);
				}
	});
});

describe('viscosity to the digits of the U.S. Standard Atmosphere, 1976', () => {
	it.each([
		[0, 1.71608e-5],
		[15, 1.78938e-5],
		[40, 1.90757e-5],
		[60, 1.99882e-5]
	])('at %d °C is %d Pa s', (t, mu) => expect(Math.abs(sutherlandViscosity(t) - mu)).toBeLessThanOrEqual(0.51e-10));
});

describe('the state of the air', () => {
	it('is dry air at sea level when only the temperature is given', () => {
		expect(airState({ temperature: 20 }).density).toBe(humidAirDensity(20, 0, 101_325));
	});

	it('takes the pressure of the elevation, unless the pressure is given', () => {
		expect(airState({ temperature: 20, elevation: 1500 }).density).toBe(humidAirDensity(20, 0, standardPressure(1500)));
		const given = airState({ temperature: 20, elevation: 1500, pressure: 101_325 });
		expect(given.density).toBe(humidAirDensity(20, 0, 101_325));
	});

	it('keeps a given density and viscosity, and takes the viscosity of 20 °C without one', () => {
		expect(airState({ density: 1.2, viscosity: 2e-5 })).toEqual({ density: 1.2, viscosity: 2e-5 });
		expect(airState({ density: 1.2 })).toEqual({ density: 1.2, viscosity: sutherlandViscosity(20) });
	});

	it('is lighter when warmer, more humid or higher', () => {
		fc.assert(
			fc.property(
				fc.double({ min: -40, max: 70, noNaN: true }),
				fc.double({ min: 0, max: 0.9, noNaN: true }),
				fc.double({ min: 0, max: 4000, noNaN: true }),
				(temperature, relativeHumidity, elevation) => {
					const { density } = airState({ temperature, relativeHumidity, elevation });
					expect(airState({ temperature: temperature + 5, relativeHumidity, elevation }).density).toBeLessThan(density);
					expect(airState({ temperature, relativeHumidity: relativeHumidity + 0.1, elevation }).density).toBeLessThan(
						density
					);
					expect(airState({ temperature, relativeHumidity, elevation: elevation + 50 }).density).toBeLessThan(density);
				}
			)
		);
	});

	it.each([
		() => airState({ temperature: 81 }),
		() => airState({ temperature: -51 }),
		() => airState({ temperature: 20, relativeHumidity: 1.01 }),
		() => airState({ temperature: 20, elevation: 11_001 }),
		() => airState({ temperature: NaN })
	])('refuses what leaves the range of a formula (%#)', (ask) => {
		expect(ask).toThrow(OutOfRangeError);
	});
});
