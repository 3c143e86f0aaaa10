import { describe, expect, it } from 'vitest';
import { done, rowId, sheetOf } from '../../../tests/sheet/any-sheet';
import { readBlock } from './clipboard';
import { pasteBlock } from './commands';
import { EMPTY_SHEET, valueOf, type RowField, type Sheet } from './sheet';
import { headerOf } from './paste-header';

function pasted(text: string, sheet: Sheet = EMPTY_SHEET, row = sheet.rows.length): Sheet {
	const block = readBlock(text, 5_000);
	if (!block.ok) throw new Error(block.message);
	const fields: RowField[] = ['tag', 'joins', 'side', 'serves'];
	const edit = pasteBlock(sheet, { row, fields }, block.cells, 'SI');
	return edit ? done(sheet, edit) : sheet;
}
const typedOf = ({ rows }: Sheet) =>
	rows.map(({ cells }) => Object.fromEntries(Object.entries(cells).map(([field, cell]) => [field, cell?.typed])));

describe('a paste with names of columns in its first line', () => {
	it('leaves that line out, and writes each column where it is named', () => {
		const sheet = pasted('Size\tSection\tLength\tTotal\tJoins\n400x300\tS01\t5\t12.3\t\nØ200\tS02\t4\t8.1\tS01\n');
		expect(typedOf(sheet)).toEqual([
			{ tag: 'S01', size: '400x300', length: '5' },
			{ tag: 'S02', size: 'Ø200', length: '4', joins: 'S01' }
		]);
	});

	it('gives figures alone the unit of their head', () => {
		const sheet = pasted('Tag\tLength (mm)\tAirflow, m³/h\tSize [in]\nS01\t650\t720\t24x12\nS02\t7 m\t200 L/s\t12"\n');
		expect(typedOf(sheet)).toEqual([
			{ tag: 'S01', length: '650 mm', flow: '720 m³/h', size: '24x12 in' },
			{ tag: 'S02', length: '7 m', flow: '200 L/s', size: '12"' }
		]);
		const [first] = sheet.rows;
		expect(first && [valueOf(first, 'length'), valueOf(first, 'flow')]).toEqual([0.65, 0.2]);
		expect(first && valueOf(first, 'size')).toEqual({ shape: 'rectangular', width: 0.6096, height: 0.3048 });
	});

	it('writes over the rows from the selected one on, and leaves other columns alone', () => {
		const before = sheetOf([{ tag: 'A', serves: 'Store', length: '1' }, { tag: 'B' }]);
		const after = pasted('length\ttag\n9\tC\n', before, 0);
		expect(typedOf(after)).toEqual([{ tag: 'C', serves: 'Store', length: '9' }, { tag: 'B' }]);
		expect(after.rows[0]?.id).toBe(rowId(0));
	});

	it.each([
		['rows without names', 'S01\tS02\tsupply\nS03\tS01\tsupply\n'],
		['one column', 'Length\n5\n'],
		['names with nothing below', 'Tag\tLength\n'],
		['a line that is a name by half', 'Tag\tS01\nS02\tS01\n'],
		['a name twice', 'Length\tLength\n1\t2\n']
	])('does not take %s for one', (_what, text) => {
		const block = readBlock(text, 10);
		expect(block.ok && headerOf(block.cells)).toBeNull();
	});

	it('does not count that line where room is short', () => {
		const text = 'Tag\tLength\nA\t1\nB\t2\n';
		expect(readBlock(text, 2).ok).toBe(true);
		expect(readBlock(text, 1)).toMatchObject({
			message: 'Nothing was pasted: the clipboard holds 2 rows, and the sheet has room for 1 more.'
		});
	});
});
