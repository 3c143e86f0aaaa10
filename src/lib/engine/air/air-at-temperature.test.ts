import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import published from '../../../../fixtures/published/air.json';
import { airAtTemperature, airState } from '.';

describe('air at another temperature', () => {
	it('is the air itself at its own', () => {
		fc.assert(
			fc.property(
				fc.double({ min: -40, max: 70, noNaN: true }),
				fc.double({ min: 0, max: 1, noNaN: true }),
				fc.double({ min: 0, max: 3000, noNaN: true }),
				(temperature, relativeHumidity, elevation) => {
					const condition = { temperature, relativeHumidity, elevation };
					const { density, viscosity, condenses } = airAtTemperature(condition, temperature);
					expect({ density, viscosity }).toEqual(airState(condition));
					expect(condenses).toBe(false);
				}
			)
		);
	});

	it('keeps its moisture when it is warmed: density goes as 1/T', () => {
		const cold = { temperature: 10, relativeHumidity: 0.8 };
		const ratio = airAtTemperature(cold, 35).density / airState(cold).density;
		expect(ratio).toBeCloseTo(283.15 / 308.15, 14);
	});

	it('is saturated below its dew point', () => {
		const humid = { temperature: 30, relativeHumidity: 0.9 };
		const cooled = airAtTemperature(humid, 10);
		expect(cooled.condenses).toBe(true);
		expect(cooled.density).toBeCloseTo(airState({ temperature: 10, relativeHumidity: 1 }).density, 14);
	});

	// Published pairs of one moisture: dry air at 20 and 21.11 °C.
	it('meets the published densities of dry air', () => {
		const density = (t: number) =>
			published.checks.find(({ inputs }) => 't_C' in inputs && inputs.t_C === t && 'rh' in inputs && inputs.rh === 0)
				?.expected;
		for (const t of [20, 21.11])
			expect(airAtTemperature({ temperature: 0 }, t).density).toBeCloseTo(Number(density(t)), 3);
	});
});
