import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Solution, UnitSystem } from '$lib/engine';
import { sheetOf, type TypedRow } from '../../../tests/sheet/any-sheet';
import { solveSheet } from './solve-sheet';

// Exact by definition, but for the inch of water: 0.0254 m of water of 1000 kg/m3 under 9.80665 m/s2.
const [INCH, FOOT, CFM, INCH_OF_WATER] = [25.4, 0.3048, (0.3048 ** 3 / 60) * 1000, 0.0254 * 9806.65];

const whole = (min: number, max: number) => fc.integer({ min, max });
/** A row as both hands type it: whole inches, feet, cfm and hundredths of an inch of water. */
const anyRow = fc.record({
	width: whole(8, 40),
	height: fc.option(whole(8, 30), { nil: null }),
	length: whole(1, 90),
	rise: whole(-20, 20),
	flow: whole(150, 4_000),
	outlet: whole(1, 30),
	parts: fc.constantFrom('', 'elbow', 'elbow r1', 'elbow, damper', 'tee branch')
});
type Row = typeof anyRow extends fc.Arbitrary<infer T> ? T : never;

function typed(rows: readonly Row[], units: UnitSystem): TypedRow[] {
	const size = (inches: number) => String(units === 'IP' ? inches : inches * INCH);
	return rows.map(({ width, height, length, rise, flow, outlet, parts }, at) => ({
		tag: `S${at}`,
		...(at > 0 && { joins: 'S0' }),
		size: height === null ? `Ø${size(width)}` : `${size(width)}x${size(height)}`,
		length: String(units === 'IP' ? length : length * FOOT),
		rise: String(units === 'IP' ? rise : rise * FOOT),
		...(at > 0 && {
			flow: String(units === 'IP' ? flow : flow * CFM),
			outlet: String(units === 'IP' ? outlet / 100 : (outlet / 100) * INCH_OF_WATER),
			parts
		})
	}));
}

function solved(rows: readonly Row[], units: UnitSystem): Solution {
	const air = units === 'IP' ? { temperature: '86', elevation: '1000' } : { temperature: '30', elevation: '304.8' };
	const { solution, problems } = solveSheet(sheetOf(typed(rows, units), air, units));
	if (!solution || problems.length > 0) throw new Error(JSON.stringify(problems));
	return solution;
}

const numbersOf = (value: unknown): number[] => {
	if (typeof value === 'number') return [value];
	return typeof value === 'object' && value !== null ? Object.values(value).flatMap(numbersOf) : [];
};

describe('a sheet typed in inch-pound units', () => {
	it('has the figures of the same sheet typed in SI', () => {
		fc.assert(
			fc.property(fc.array(anyRow, { minLength: 2, maxLength: 8 }), (rows) => {
				const [si, ip] = [solved(rows, 'SI'), solved(rows, 'IP')];
				for (const [tag, row] of Object.entries(si.rows)) {
					const scale = 1 + row.items.reduce((sum, { loss }) => sum + Math.abs(loss), 0);
					const [one, other] = [numbersOf(row), numbersOf(ip.rows[tag])];
					expect(one.length).toBe(other.length);
					one.forEach((value, at) =>
						expect(Math.abs(value - (other[at] ?? NaN)), tag).toBeLessThanOrEqual(
							1e-11 * Math.max(scale, Math.abs(value))
						)
					);
				}
				expect(ip.index).toEqual(si.index);
				expect(ip.flags.map(({ rule, row }) => [rule, row])).toEqual(si.flags.map(({ rule, row }) => [rule, row]));
			}),
			{ numRuns: 60 }
		);
	});
});
