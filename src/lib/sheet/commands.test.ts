import { describe, expect, it } from 'vitest';
import { done, rowId, sheetOf, type TypedRow } from '../../../tests/sheet/any-sheet';
import { arrangeFromFan, clearCells, fillDown, moveRows, newRow, pasteBlock, writeCell } from './commands';
import type { Edit } from './edit';
import { inverseOf } from './invert';
import type { RowField, Sheet } from './sheet';

const three: TypedRow[] = [
	{ tag: 'A', size: '400x300' },
	{ tag: 'B', joins: 'A', size: 'Ø200' },
	{ tag: 'C', joins: 'A' }
];
const sheet = sheetOf(three);
const rowAt = (of: Sheet, at: number) => {
	const row = of.rows[at];
	if (!row) throw new Error(`no row ${at}`);
	return row;
};
const after = (edit: Edit | null, of = sheet) => (edit ? done(of, edit) : of);
const typed = (of: Sheet, field: RowField) => of.rows.map((row) => row.cells[field]?.typed ?? '');
const rename = (of: Sheet, at: number, tag: string) => after(writeCell(of, rowAt(of, at), 'tag', tag, 'SI'), of);

describe('a tag that is renamed', () => {
	it('takes the rows that join it along, in one step', () => {
		const edit = writeCell(sheet, rowAt(sheet, 0), 'tag', ' M 1 ', 'SI');
		const renamed = after(edit);
		expect(typed(renamed, 'joins')).toEqual(['', 'M 1', 'M 1']);
		const inverse = edit && inverseOf(sheet, edit);
		expect(inverse && done(renamed, inverse)).toEqual(sheet);
	});

	it.each([
		['another row has', 'B'],
		['another row has but for its blanks', ' B '],
		['is blank', ' '],
		['is too long to be one', 'x'.repeat(41)]
	])('leaves them where the new tag %s', (_what, tag) =>
		expect(typed(rename(sheet, 0, tag), 'joins')).toEqual(['', 'A', 'A'])
	);

	it('leaves them where two rows have the old tag', () => {
		const twice = sheetOf([...three, { tag: 'A' }]);
		expect(typed(rename(twice, 0, 'M'), 'joins')).toEqual(['', 'A', 'A', '']);
	});
});

describe('a block that is pasted', () => {
	const paste = (row: number, fields: RowField[], ...cells: string[][]) =>
		pasteBlock(sheet, { row, fields }, cells, 'SI');

	it('writes from its cell to the right and down', () => {
		const pasted = after(paste(1, ['size', 'length'], ['Ø250', '3'], ['Ø160', '4']));
		expect(typed(pasted, 'size')).toEqual(['400x300', 'Ø250', 'Ø160']);
		expect(typed(pasted, 'length')).toEqual(['', '3', '4']);
	});

	it('grows the sheet by the rows that are lacking', () => {
		const pasted = after(paste(2, ['tag', 'joins'], ['C', 'B'], ['D', 'C'], ['E', 'C']));
		expect(typed(pasted, 'tag')).toEqual(['A', 'B', 'C', 'D', 'E']);
		expect(typed(pasted, 'joins')).toEqual(['', 'A', 'B', 'C', 'C']);
	});

	it('clears where it is blank, and leaves out what stands right of the last column', () => {
		const pasted = after(paste(0, ['size'], ['', 'beyond'], ['Ø125', 'beyond']));
		expect(typed(pasted, 'size')).toEqual(['', 'Ø125', '']);
		expect(typed(pasted, 'length')).toEqual(['', '', '']);
	});

	it('adds no rows where no column of its place is entered', () => {
		expect(paste(3, [], ['1', '2'], ['3', '4'])).toBeNull();
	});
});

describe('the commands of the sheet', () => {
	it('fill the first row of a block down, with the units it was typed in', () => {
		const inInches = sheetOf([{ size: '24x12' }, {}, {}], {}, 'IP');
		const filled = after(fillDown(inInches.rows, ['size'], 'SI'), inInches);
		expect(filled.rows.map(({ cells }) => cells.size)).toEqual(Array(3).fill(rowAt(inInches, 0).cells.size));
		expect(fillDown(sheet.rows.slice(0, 1), ['size'], 'SI')).toBeNull();
	});

	it('fill a blank down too', () =>
		expect(typed(after(fillDown([rowAt(sheet, 2), rowAt(sheet, 0)], ['size'], 'SI')), 'size')).toEqual([
			'',
			'Ø200',
			''
		]));

	it('clear what stands there, and nothing else', () => {
		expect(typed(after(clearCells(sheet.rows, ['size'], 'SI')), 'size')).toEqual(['', '', '']);
		expect(clearCells(sheet.rows, ['rise'], 'SI')).toBeNull();
	});

	it('add a row before another, without its blank cells', () => {
		const { id, edit } = newRow({ tag: 'N', size: ' ' }, 'SI', rowId(1));
		const added = after(edit);
		expect(added.rows.map((row) => row.id)).toEqual([rowId(0), id, rowId(1), rowId(2)]);
		expect(Object.keys(rowAt(added, 1).cells)).toEqual(['tag']);
	});

	it('move rows by one place, and stop at both ends', () => {
		const order = (edit: Edit | null) => typed(after(edit), 'tag').join('');
		const [a, b, c] = [rowAt(sheet, 0), rowAt(sheet, 1), rowAt(sheet, 2)];
		expect(order(moveRows(sheet, [b, c], -1))).toBe('BCA');
		expect(order(moveRows(sheet, [a, b], 1))).toBe('CAB');
		expect(moveRows(sheet, [a], -1)).toBeNull();
		expect(moveRows(sheet, [c], 1)).toBeNull();
		expect(moveRows(sheet, [], 1)).toBeNull();
	});

	it('arrange the rows from the fan, and rows of a ring after them', () => {
		const mixed = sheetOf([{ tag: 'X', joins: 'Y' }, { tag: 'Y', joins: 'X' }, { tag: 'B', joins: 'A' }, { tag: 'A' }]);
		expect(typed(after(arrangeFromFan(mixed), mixed), 'tag')).toEqual(['A', 'B', 'X', 'Y']);
		expect(arrangeFromFan(sheet)).toBeNull();
	});
});
