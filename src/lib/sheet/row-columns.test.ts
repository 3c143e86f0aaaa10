import { describe, expect, it } from 'vitest';
import { validateDocument } from '$lib/engine';
import { done, rowId, sheetOf, type TypedRow, type TypedSettings } from '../../../tests/sheet/any-sheet';
import { shownText, textToEdit } from './cell-text';
import { COLUMNS } from './columns';
import { ROW_READERS, SETTING_READERS } from './fields';
import { solveSheet } from './solve-sheet';

const A: TypedRow = { tag: 'A', size: '600x300', length: '20' };
const B: TypedRow = { tag: 'B', joins: 'A', size: 'Ø250', length: '8', flow: '300', outlet: '120' };
const solved = (rows: TypedRow[], settings: TypedSettings = {}) => {
	const found = solveSheet(sheetOf(rows, settings));
	if (!found.solution) throw new Error(found.problems.map(({ message }) => message).join(' '));
	return { ...found, solution: found.solution };
};

describe('temperature, lining and leakage class of a row', () => {
	it('are columns that are off until a person asks for them', () => {
		for (const key of ['temperature', 'lining', 'leakage'])
			expect(COLUMNS.find((column) => column.key === key)).toMatchObject({ group: 'entered', optional: true });
	});

	it('stand in the document as the engine reads them', () => {
		const { document } = solved([
			{ ...A, lining: '25 metal', leakage: 'ATC 3', temperature: '14' },
			{ ...B, lining: '13', leakage: 'cl 6' }
		]);
		expect(document?.rows).toMatchObject([
			{ lining: { thickness: 0.025, sizeIs: 'metal' }, leakage: { class: 'ATC3' }, temperature: 14 },
			{ lining: { thickness: 0.013, sizeIs: 'clear' }, leakage: { cl: 6 } }
		]);
		expect(validateDocument(document).ok).toBe(true);
	});

	it('count: cold air is denser, a lining takes room, a leaky row asks more of the fan', () => {
		const { solution } = solved([A, B]);
		const cold = solved([A, { ...B, temperature: '5' }]).solution;
		expect(cold.rows.B?.density).toBeGreaterThan(solution.rows.B?.density ?? NaN);
		expect(cold.rows.A?.density).toBe(solution.rows.A?.density);
		const lined = solved([{ ...A, lining: '25 metal' }, B]).solution;
		expect(lined.rows.A?.area).toBeCloseTo(0.55 * 0.25, 12);
		expect(solved([{ ...A, lining: '25' }, B]).solution.rows.A?.area).toBeCloseTo(0.18, 12);
		expect(solved([{ ...A, leakage: 'A' }, B]).solution.fan.flow).toBeGreaterThan(solution.fan.flow);
		const tight = solved([{ ...A, leakage: 'none' }, B], { leakage: 'A' }).solution;
		expect(tight.rows.A?.leakage ?? 0).toBe(0);
		expect(tight.rows.B?.leakage).toBeGreaterThan(0);
	});

	it.each([
		['25', 'SI', { thickness: 0.025, sizeIs: 'clear' }, '25'],
		['25 mm metal', 'SI', { thickness: 0.025, sizeIs: 'metal' }, '25 metal'],
		['0.05 m', 'SI', { thickness: 0.05, sizeIs: 'clear' }, '50'],
		['1', 'IP', { thickness: 0.0254, sizeIs: 'clear' }, '1'],
		['1/2" metal', 'IP', { thickness: 0.0127, sizeIs: 'metal' }, '0.5 metal']
	] as const)('a lining of %s in %s', (typed, units, value, shown) => {
		expect(ROW_READERS.lining(typed, units)).toMatchObject({ ok: true, value });
		const [row] = sheetOf([{ lining: typed }], {}, units).rows;
		expect(row && shownText(row, 'lining', units)).toBe(shown);
		const other = units === 'SI' ? 'IP' : 'SI';
		const again = row && ROW_READERS.lining(textToEdit(row, 'lining', other), other);
		expect(again).toMatchObject({ ok: true, value });
	});

	it('a temperature is converted where the units are switched, and a class printed by its name', () => {
		const [row] = sheetOf([{ temperature: '59', leakage: 'atc3' }], {}, 'IP').rows;
		if (!row) throw new Error('no row');
		expect(shownText(row, 'temperature', 'SI')).toBe('15');
		expect(ROW_READERS.temperature(textToEdit(row, 'temperature', 'SI'), 'SI')).toMatchObject({ value: 15 });
		expect(shownText(row, 'leakage', 'SI')).toBe('ATC 3');
	});

	it.each([
		['CL 30', 'CL30'],
		['cl24', 'CL24'],
		['CL 4,5', 'CL4.5'],
		['a', 'A'],
		['Class D', 'D'],
		['ATC-1', 'ATC1'],
		['none', 'CL0']
	])('a leakage class “%s” is %s', (typed, value) => {
		for (const read of [ROW_READERS.leakage, SETTING_READERS.leakage])
			expect(read(typed, 'SI')).toMatchObject({ ok: true, value });
	});

	it('a temperature of a row has no place beside a given density: told at its cell, also after the density came', () => {
		const rows = [A, { ...B, temperature: '14' }];
		expect(solveSheet(sheetOf(rows)).problems).toEqual([]);
		expect(solveSheet(sheetOf(rows, { density: '1.2' })).problems).toMatchObject([
			{ field: 'temperature', message: expect.stringContaining('given by its density') }
		]);
	});
});

describe('standard flows and the test of the ductwork', () => {
	it('write the density of standard air only where flows are of it', () => {
		const high: TypedSettings = { elevation: '1500', humidity: '0', standardDensity: '1.2' };
		expect(solved([A, B], high).document).not.toHaveProperty('standardDensity');
		const { document, solution } = solved([A, B], { ...high, flowBasis: 'standard' });
		expect(document?.standardDensity).toBe(1.2);
		expect(solution.fan.flow).toBeCloseTo((0.3 * 1.2) / solution.air.density, 12);
	});

	it('tell what may leak at the test pressure', () => {
		const { document, solution } = solved([A, B], { leakage: 'C', testPressure: '400' });
		expect(document?.leakage).toEqual({ class: 'C', testPressure: 400 });
		// 0.003 L/(s m2 Pa^0.65), EN 1507 and EN 12237.
		const asked = (0.003 / 1000) * 400 ** 0.65 * (solution.leakage?.surface ?? NaN);
		expect(solution.leakage?.allowable).toBeCloseTo(asked, 9);
	});

	it('ask for the class of a test pressure', () => {
		expect(solveSheet(sheetOf([A, B], { testPressure: '400' })).problems).toEqual([
			{
				...{ row: null, field: 'leakage', expected: 'the leakage class, as C; or no test pressure' },
				message: 'What may leak at the test pressure goes by a leakage class, and none is named.'
			}
		]);
	});
});

describe('a transition in the sheet', () => {
	const main: TypedRow = { tag: 'A', size: '600x300', length: '5' };
	const end: TypedRow = { tag: 'B', joins: 'A', size: '400x300', length: '5', flow: '500', outlet: '10' };
	const kindOf = (rows: TypedRow[]) => solved(rows).document?.rows[1]?.fittings?.[0];

	it('narrows away from the fan and widens toward it, by the sizes of the two rows', () => {
		expect(kindOf([main, { ...end, parts: 'reducer' }])).toMatchObject({
			...{ kind: 'gradual-contraction', leg: 'smaller' }
		});
		const exhaust = [
			{ ...main, side: 'exhaust' },
			{ ...end, parts: 'transition 20°' }
		];
		expect(kindOf(exhaust)).toMatchObject({ kind: 'gradual-expansion', leg: 'smaller', angle: 20 });
	});

	it('goes by the free sizes', () => {
		const fitting = kindOf([
			{ ...main, lining: '25 metal' },
			{ ...end, parts: 'reducer' }
		]);
		expect(fitting?.['areaRatio' as keyof typeof fitting]).toBeCloseTo((0.4 * 0.3) / (0.55 * 0.25), 11);
	});

	it('follows the size of the other row when that alone is edited', () => {
		const sheet = sheetOf([main, { ...end, parts: 'reducer' }]);
		expect(solveSheet(sheet).document?.rows[1]?.fittings).toMatchObject([{ kind: 'gradual-contraction' }]);
		const edited = done(sheet, { kind: 'set', row: rowId(0), field: 'size', typed: '300x200', units: 'SI' });
		expect(edited.rows[1]).toBe(sheet.rows[1]);
		expect(solveSheet(edited).document?.rows[1]?.fittings).toMatchObject([{ kind: 'gradual-expansion' }]);
	});

	it('asks where the row meets the fan', () => {
		const { problems } = solveSheet(sheetOf([{ ...main, flow: '500', outlet: '10', parts: 'transition' }]));
		expect(problems).toMatchObject([
			{ field: 'parts', message: expect.stringContaining('no size of a row that it joins is known') }
		]);
	});
});
