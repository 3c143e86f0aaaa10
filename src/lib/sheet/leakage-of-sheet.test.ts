import { describe, expect, it } from 'vitest';
import { sheetOf, type TypedRow, type TypedSettings } from '../../../tests/sheet/any-sheet';
import { SETTING_READERS } from './fields';
import { LEAKAGES } from './read-leakage';
import { solveSheet } from './solve-sheet';

const ROWS: TypedRow[] = [
	{ tag: 'A', size: '600x300', length: '20' },
	{ tag: 'B', joins: 'A', size: 'Ø250', length: '8', flow: '300', outlet: '120' }
];
const solved = (settings: TypedSettings) => {
	const { solution, problems } = solveSheet(sheetOf(ROWS, settings));
	if (!solution) throw new Error(problems.map(({ message }) => message).join(' '));
	return solution;
};

describe('leakage and the basis of flows in the sheet', () => {
	it('read every class by its key and by its name, and no other', () => {
		for (const { key, name } of LEAKAGES)
			for (const typed of [key, name, key.toLowerCase()])
				expect(SETTING_READERS.leakage(typed, 'SI')).toMatchObject({ ok: true, value: key });
		expect(SETTING_READERS.leakage('class Z', 'SI').ok).toBe(false);
	});

	it('count nothing where no class is named, and more the looser the class', () => {
		expect(solved({}).leakage).toBeNull();
		const [tight, loose] = [solved({ leakage: 'C' }), solved({ leakage: 'A' })];
		expect(tight.leakage?.flow).toBeGreaterThan(0);
		expect(loose.leakage?.flow).toBeGreaterThan(8 * (tight.leakage?.flow ?? NaN));
		expect(loose.fan.flow).toBeCloseTo(0.3 + (loose.leakage?.flow ?? NaN), 12);
		expect(solved({ leakage: 'CL24' }).leakage?.flow).toBeGreaterThan(loose.leakage?.flow ?? NaN);
	});

	it('take the flows of outlets as standard air where that is the basis', () => {
		const high: TypedSettings = { elevation: '1500', temperature: '20', humidity: '0' };
		const [actual, standard] = [solved(high), solved({ ...high, flowBasis: 'standard' })];
		expect(actual.fan.flow).toBeCloseTo(0.3, 12);
		expect(standard.fan.flow).toBeCloseTo((0.3 * 1.204) / standard.air.density, 12);
	});
});
