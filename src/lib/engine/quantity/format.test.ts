import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { COLUMNS } from './columns';
import { fixedDigits } from './digits';
import * as q from './index';
import type { FigureName, Reader, UnitSystem } from './index';
import { fromSI } from './units';

describe('figures as the look has them', () => {
	it.each([
		[q.formatFlow(1.2, 'SI'), '1\u2009200'],
		[q.formatFlow(1.205825717376, 'IP'), '2,555'],
		[q.formatFlow(0.0015, 'SI'), '1.5'],
		[q.formatFlow(0.002, 'SI'), '2'],
		[q.formatFlow(0.0125, 'SI'), '13'],
		[q.formatFlow(1_234.5678, 'SI'), '1\u2009234\u2009568'],
		[q.formatVelocity(5.714, 'SI'), '5.71'],
		[q.formatVelocity(6.096, 'IP'), '1,200'],
		[q.formatPressure(171.84, 'SI'), '171.8'],
		[q.formatPressure(-23.76, 'SI'), '−23.8'],
		[q.formatPressure(-0.01, 'SI'), '0.0'],
		[q.formatPressure(-0, 'SI'), '0.0'],
		[q.formatPressure(171.84, 'IP'), '0.690'],
		[q.formatRate(2.756, 'SI'), '2.76'],
		[q.formatRate(0.6537766666666667, 'IP'), '0.080'],
		[q.formatLength(6.5, 'SI'), '6.5'],
		[q.formatLength(3.81, 'IP'), '12.5'],
		[q.formatDensity(1.204, 'SI'), '1.20'],
		[q.formatDensity(1.2013847530470105, 'IP'), '0.0750'],
		[q.formatViscosity(1.82e-5, 'SI'), '18.20'],
		// 1.82e-5 Pa s × 2419.088 lb/(ft h) to 1 Pa s
		[q.formatViscosity(1.82e-5, 'IP'), '0.0440'],
		[q.formatTemperature(20, 'SI'), '20'],
		[q.formatTemperature(-5.25, 'SI'), '−5.3'],
		[q.formatTemperature(20, 'IP'), '68'],
		[q.formatElevation(1600, 'SI'), '1\u2009600'],
		[q.formatElevation(1609.344, 'IP'), '5,280'],
		[q.formatHumidity(0.5, 'SI'), '50'],
		[q.formatRoughness(0.00009, 'SI'), '0.090'],
		[q.formatRoughness(0.00009144, 'IP'), '0.00030'],
		[q.formatArea(124.31, 'SI'), '124.3'],
		[q.formatCoefficient(0.23), '0.23'],
		[q.formatCoefficient(-0.1), '−0.10'],
		[q.formatSize({ shape: 'rectangular', width: 0.6, height: 0.35 }, 'SI'), '600×350'],
		[q.formatSize({ shape: 'round', diameter: 0.2 }, 'SI'), 'Ø200'],
		[q.formatSize({ shape: 'rectangular', width: 0.6096, height: 0.3048 }, 'IP'), '24×12'],
		[q.formatSize({ shape: 'round', diameter: 0.2032 }, 'IP'), 'Ø8'],
		[q.formatSize({ shape: 'round', diameter: 0.3048 }, 'SI'), 'Ø305'],
		[q.formatSize({ shape: 'round', diameter: 0.315 }, 'IP'), 'Ø12.4'],
		[q.formatSize({ shape: 'oval', width: 0.51, height: 0.255 }, 'SI'), 'oval 510×255']
	])('%s', (shown, expected) => expect(shown).toBe(expected));

	it('shows an en rule for nothing', () => {
		for (const nothing of [null, undefined, NaN, Infinity]) {
			expect(q.formatFlow(nothing, 'SI')).toBe('–');
			expect(q.formatTemperature(nothing, 'IP')).toBe('–');
			expect(q.formatPressure(nothing, 'SI')).toBe('–');
		}
		expect(q.formatSize(null, 'SI')).toBe('–');
	});

	it.each([
		['flow', 'L/s', 'cfm'],
		['velocity', 'm/s', 'fpm'],
		['pressure', 'Pa', 'in. wg'],
		['rate', 'Pa/m', 'in./100 ft'],
		['size', 'mm', 'in'],
		['length', 'm', 'ft'],
		['density', 'kg/m³', 'lb/ft³'],
		['viscosity', 'µPa s', 'lb/ft h'],
		['temperature', '°C', '°F']
	] as const)('heads %s with %s or %s', (name, si, ip) => {
		expect([q.unitOf(name, 'SI'), q.unitOf(name, 'IP')]).toEqual([si, ip]);
	});
});

/** Half a unit of the last digit shown, SI, and the range in which the column is used. */
const columns: [FigureName, Reader<number>, number, number, Record<UnitSystem, number>][] = [
	['flow', q.readFlow, 0.01, 50, { SI: 0.0005, IP: 0.00024 }],
	['velocity', q.readVelocity, 0.1, 60, { SI: 0.005, IP: 0.00255 }],
	['pressure', q.readPressure, 0, 5000, { SI: 0.05, IP: 0.125 }],
	['rate', q.readRate, 0, 50, { SI: 0.005, IP: 0.0041 }],
	['length', q.readLength, 0, 99, { SI: 0.05, IP: 0.0153 }],
	['temperature', q.readTemperature, -40, 400, { SI: 0.05, IP: 0.028 }],
	['density', q.readDensity, 0.5, 2, { SI: 0.005, IP: 0.00081 }],
	['elevation', q.readElevation, -400, 5000, { SI: 0.5, IP: 0.153 }]
];

describe('shown and read again', () => {
	it.each(columns)('%s comes back within half of its last digit', (name, read, min, max, half) => {
		fc.assert(
			fc.property(fc.double({ min, max, noNaN: true }), fc.constantFrom<UnitSystem>('SI', 'IP'), (value, units) => {
				const reading = read(q.formatQuantity(name, value, units), units);
				if (!reading.ok) throw new Error(reading.message);
				expect(Math.abs(reading.value - value)).toBeLessThanOrEqual(half[units]);
			})
		);
	});

	it.each(columns)(
		'%s keeps its value to the last bit through the text for editing, in either system',
		(name, read, min, max) => {
			fc.assert(
				fc.property(fc.double({ min, max, noNaN: true }), fc.constantFrom<UnitSystem>('SI', 'IP'), (value, units) => {
					fc.pre(Math.abs(value) > 1e-9);
					const reading = read(q.editText(name, value, units), units);
					if (!reading.ok) throw new Error(reading.message);
					expect(reading.value).toBe(value);
				})
			);
		}
	);

	it('points align: every figure of a column has the same decimals', () => {
		const decimals = (text: string) => text.split('.')[1]?.length ?? 0;
		fc.assert(
			fc.property(
				fc.double({ min: -1e6, max: 1e6, noNaN: true }),
				fc.constantFrom<UnitSystem>('SI', 'IP'),
				(value, units) => {
					for (const name of ['velocity', 'pressure', 'rate', 'length'] as const) {
						const shown = q.formatQuantity(name, value, units);
						expect(decimals(shown)).toBe(decimals(q.formatQuantity(name, 0, units)));
						expect(shown).toMatch(/^−?\d/);
						expect(shown).not.toMatch(/^−[0.]*$/);
					}
				}
			)
		);
	});
});

describe('without decimal arithmetic', () => {
	const exact = (name: FigureName, value: number, units: UnitSystem) => {
		const { unit, decimals } = COLUMNS[name][units];
		return fixedDigits(fromSI(value, unit), decimals, units);
	};
	const names = ['velocity', 'pressure', 'rate', 'length', 'density', 'roughness', 'power'] as const;
	const systems = ['SI', 'IP'] as const;

	it('shows the digits that decimal arithmetic shows', () => {
		fc.assert(
			fc.property(
				fc.constantFrom(...names),
				fc.constantFrom(...systems),
				fc.double({ min: -1e7, max: 1e7, noNaN: true }),
				(name, units, value) => {
					expect(q.formatQuantity(name, value, units)).toBe(exact(name, value, units));
				}
			),
			{ numRuns: 2_000 }
		);
	});

	it('rounds ties, and what lies beside them, as decimal arithmetic does', () => {
		fc.assert(
			fc.property(
				fc.constantFrom(...names),
				fc.constantFrom(...systems),
				fc.integer({ min: -20_000, max: 20_000 }),
				fc.integer({ min: -2, max: 2 }),
				(name, units, half, ulps) => {
					const { unit, decimals } = COLUMNS[name][units];
					const tie = ((half + 0.5) / 10 ** decimals / Number(unit.over)) * Number(unit.times);
					const value = tie * (1 + ulps * Number.EPSILON);
					expect(q.formatQuantity(name, value, units)).toBe(exact(name, value, units));
				}
			),
			{ numRuns: 2_000 }
		);
	});
});
