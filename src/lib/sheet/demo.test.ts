import { describe, expect, it } from 'vitest';
import larkmoor from '../../../fixtures/demo/larkmoor.json';
import { sheetOf, type TypedRow, type TypedSettings } from '../../../tests/sheet/any-sheet';
import type { Solution } from '$lib/engine';
import { isComplete, solveSheet } from './solve-sheet';

/**
 * Invented demonstration data. The figures below are a second calculation of it by spreadsheet-like arithmetic: total
 * pressure by Colebrook on the circular equivalent diameter at equal flow, air of 1.20 kg/m3. The engine computes on
 * the hydraulic diameter and with air of 20 degC and 50 % (1.199 kg/m3), and the second calculation prints one
 * decimal: hence a tolerance of 1 % of each figure, and of 0.1 Pa where that is more.
 */
const NEAR = 0.01;

const closeTo = (value: number | undefined, expected: number) =>
	expect(Math.abs((value ?? NaN) - expected)).toBeLessThanOrEqual(Math.max(0.1, NEAR * expected));

function solved(name: string) {
	const design = larkmoor.designs.find((one) => one.name === name);
	if (!design) throw new Error(`no design ${name}`);
	return solveSheet(sheetOf(design.rows as TypedRow[], design.settings as TypedSettings));
}

function solutionOf(name: string): Solution {
	const { solution } = solved(name);
	if (!solution) throw new Error(`no figures of ${name}`);
	return solution;
}

const pathOf = ({ paths }: Solution, outlet: string) => paths.find((path) => path.outlet === outlet);
/** Rows that a rule flags. */
const flagged = ({ flags }: Solution, rule: string) => flags.filter((one) => one.rule === rule).map(({ row }) => row);

describe.each(larkmoor.designs)('the demonstration’s $name', ({ name, rows }) => {
	it('is understood as typed: no problem, and every row counts', () => {
		const sheet = solved(name);
		expect(sheet.problems).toEqual([]);
		expect(isComplete(sheet)).toBe(true);
		expect(Object.keys(sheet.solution?.rows ?? {})).toHaveLength(rows.length);
	});
});

describe('AHU-1 against a second calculation of its paths', () => {
	const solution = solutionOf('AHU-1');

	// Terminal, its row, rows from the fan, total of the path [Pa], excess over what it needs [Pa].
	it.each<[string, string, string[], number, number]>([
		['T1', 'S07', ['S01', 'S02', 'S06', 'S07'], 105.5, 34.6],
		['T2', 'S09', ['S01', 'S02', 'S06', 'S08', 'S09'], 109.1, 31.0],
		['T3', 'S11', ['S01', 'S02', 'S06', 'S08', 'S10', 'S11'], 113.6, 26.5],
		['T4', 'S12', ['S01', 'S02', 'S06', 'S08', 'S10', 'S12'], 103.2, 36.9],
		['T5', 'S15', ['S01', 'S13', 'S14', 'S15'], 103.1, 37.0],
		['T6', 'S16', ['S01', 'S13', 'S14', 'S16'], 100.9, 39.2],
		['T7', 'S18', ['S01', 'S13', 'S17', 'S18'], 112.6, 27.5],
		['T8', 'S19', ['S01', 'S13', 'S17', 'S19'], 113.7, 26.4],
		['T9', 'S04', ['S01', 'S02', 'S03', 'S04'], 108.6, 31.5],
		['T10', 'S05', ['S01', 'S02', 'S03', 'S05'], 140.1, 0.0]
	])('%s: %s', (_terminal, outlet, rows, total, excess) => {
		const path = pathOf(solution, outlet);
		expect(path?.rows).toEqual(rows);
		closeTo(path?.loss, total);
		// A difference of two totals bears the tolerance of both.
		expect(Math.abs((path?.spare ?? NaN) - excess)).toBeLessThanOrEqual(NEAR * (140.1 + total));
	});

	// Section, flow [L/s], velocity [m/s], loss of the section [Pa].
	it.each([
		['S01', 1200, 5.71, 49.1],
		['S02', 740, 4.7, 4.5],
		['S03', 140, 4.46, 21.0],
		['S04', 80, 3.98, 34.1],
		['S05', 60, 4.89, 65.6],
		['S06', 600, 4.44, 4.4],
		['S07', 150, 4.77, 47.6],
		['S10', 300, 3.85, 4.5],
		['S12', 150, 3.06, 37.2],
		['S13', 460, 3.83, 17.6],
		['S17', 220, 4.48, 16.5],
		['S20', 1200, 3.75, 31.6]
	])('section %s', (tag, flow, velocity, loss) => {
		const row = solution.rows[tag];
		expect(row?.flow).toBeCloseTo(flow / 1000, 9);
		expect(row?.velocity).toBeCloseTo(velocity, 2);
		closeTo(row?.loss, loss);
	});

	it('has its index outlet in the row of T10, and the fan’s external total pressure', () => {
		expect(solution.index).toEqual({ supply: 'S05', return: 'S20' });
		closeTo(solution.fan.supplyPressure, 140.1);
		closeTo(solution.fan.returnPressure, 31.6);
		closeTo(solution.fan.totalPressure, 171.8);
		expect(solution.fan.flow).toBeCloseTo(1.2, 9);
	});

	it('has its three seeded faults flagged, and no other row by those rules', () => {
		expect(flagged(solution, 'flexible-length')).toEqual(['S12']);
		expect(flagged(solution, 'damper-missing')).toEqual(['S11']);
		expect(flagged(solution, 'friction-rate')).toEqual(['S05']);
	});

	it('keeps to the velocities of its basis', () => {
		expect(flagged(solution, 'velocity-main')).toEqual([]);
		expect(flagged(solution, 'velocity-run-out')).toEqual([]);
	});

	it('moves its index to T3, once its seeded faults are mended', () => {
		const [design] = larkmoor.designs;
		const mended = (design?.rows as TypedRow[]).map((row): TypedRow => {
			if (row.tag === 'S05') return { ...row, size: 'Ø160' };
			if (row.tag === 'S12') return { ...row, length: '9.8', flex: '1.2' };
			return row.tag === 'S11' ? { ...row, parts: `${row.parts}, VCD C0.20` } : row;
		});
		const { solution: after } = solveSheet(sheetOf(mended, design?.settings as TypedSettings));
		expect(after?.index.supply).toBe('S11');
		closeTo(after?.fan.totalPressure, 148.0);
		closeTo(after?.fan.supplyPressure, 116.3);
		for (const rule of ['flexible-length', 'damper-missing', 'friction-rate'])
			expect(after?.flags.filter((one) => one.rule === rule)).toEqual([]);
	});
});

describe('EF-1 against a second calculation of its paths', () => {
	const solution = solutionOf('EF-1');

	it.each<[string, string, string[], number]>([
		['E1', 'X01', ['X09', 'X05', 'X03', 'X01'], 79.4],
		['E2', 'X02', ['X09', 'X05', 'X03', 'X02'], 65.7],
		['E3', 'X04', ['X09', 'X05', 'X04'], 68.5],
		['E4', 'X06', ['X09', 'X08', 'X06'], 69.1],
		['E5', 'X07', ['X09', 'X08', 'X07'], 65.1]
	])('%s: %s', (_inlet, outlet, rows, total) => {
		const path = pathOf(solution, outlet);
		expect(path?.rows).toEqual(rows);
		closeTo(path?.loss, total);
	});

	it('has its duty: suction, discharge, total and static', () => {
		expect(solution.index.return).toBe('X01');
		closeTo(solution.fan.returnPressure, 79.4);
		closeTo(solution.fan.supplyPressure, 29.5);
		closeTo(solution.fan.totalPressure, 108.9);
		closeTo(solution.fan.staticPressure ?? NaN, 98.9);
	});

	it('has its seeded word flagged: a room named kitchen, until the service is named', () => {
		const cautions = solution.flags.filter(({ rule }) => rule === 'service-caution');
		expect(cautions.map(({ row }) => row)).toEqual(['X07']);
	});
});
