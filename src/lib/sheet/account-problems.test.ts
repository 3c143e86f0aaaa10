import { describe, expect, it } from 'vitest';
import { rowId, sheetOf } from '../../../tests/sheet/any-sheet';
import { accountProblems } from './account-problems';
import { solveSheet } from './solve-sheet';

describe('the problems of the account', () => {
	const rows = [
		{ tag: 'S1', size: '0x0', length: 'x', flow: 'much', outlet: 'lots' },
		{ tag: 'S2', size: 'Ø200', length: '4', flow: '-1' }
	];
	const { problems } = solveSheet(sheetOf(rows, { temperature: '900' }));
	const fieldsAt = (row: string | null, field: string | null) =>
		accountProblems(problems, row, field).map((one) => one.field);

	it('begin with that of the selected cell, and end with those of the settings', () => {
		expect(fieldsAt(rowId(0), 'outlet')).toEqual(['outlet', 'size', 'length', 'flow', 'temperature']);
		expect(fieldsAt(rowId(0), 'length')[0]).toBe('length');
	});

	it('are those of the row where the cell has none', () =>
		expect(fieldsAt(rowId(1), 'tag')).toEqual(['flow', 'temperature']));

	it('are those of the settings where no row is selected', () => expect(fieldsAt(null, null)).toEqual(['temperature']));
});
