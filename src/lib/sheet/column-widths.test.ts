import { describe, expect, it } from 'vitest';
import { sheetOf } from '../../../tests/sheet/any-sheet';
import { longestTexts, widthOf } from './column-widths';
import { COLUMNS } from './columns';
import { solveSheet } from './solve-sheet';
import { treeLines } from './tree-lines';

const widthIn = (rows: Parameters<typeof sheetOf>[0], key: string, units: 'SI' | 'IP' = 'SI') => {
	const sheet = sheetOf(rows);
	const lines = treeLines(sheet.rows, () => false);
	const column = COLUMNS.find((one) => one.key === key);
	if (!column) throw new Error(key);
	return {
		is: widthOf(column, longestTexts(sheet.rows, lines, solveSheet(sheet).solution, units)),
		usual: column.width
	};
};
const run = (tag: string, flow: string) => [
	{ tag: 'A', size: '1200x900', length: '5' },
	{ tag, joins: 'A', size: '1200x900', length: '4', flow, outlet: '10' }
];

describe('column widths', () => {
	it('stay as they are for what fits', () => {
		for (const key of ['tag', 'joins', 'flow', 'total', 'size'])
			expect(widthIn(run('B', '900'), key).is, key).toBe(widthIn(run('B', '900'), key).usual);
	});

	it('grow with a tag, as deep as it stands, but not without end', () => {
		const long = widthIn(run('SUPPLY-EAST-12', '900'), 'tag');
		expect(long.is).toBeGreaterThan(long.usual);
		expect(widthIn(run('T'.repeat(30), '900'), 'tag').is).toBe(230);
	});

	it('grow with the figures of a large system', () => {
		const large = widthIn(run('B', '123456'), 'flow');
		expect(large.is).toBeGreaterThan(large.usual);
		const steep = [{ tag: 'A', size: 'Ø200', length: '90', flow: '9000', outlet: '10' }];
		expect(widthIn(steep, 'total').is).toBeGreaterThan(widthIn(steep, 'total').usual);
	});
});
