import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { MOST_CELLS, readBlock, writeBlock } from './clipboard';
import { MOST_ROWS } from './sheet';
import { MOST_TYPED } from './storable-text';

const cellsOf = (text: string, room = MOST_ROWS) => {
	const block = readBlock(text, room);
	if (!block.ok) throw new Error(block.message);
	return block.cells;
};
const refusalOf = (text: string, room = MOST_ROWS) => {
	const block = readBlock(text, room);
	return block.ok ? null : block.message;
};

const oddCell = fc.oneof(
	fc.constantFrom('', ' ', '"', '""', '12"', '24"x12"', 'a\tb', 'a\nb', '\n', '\t', "'", '=1+1', '6 1/2"'),
	fc.string({ maxLength: 8 })
);

describe('the clipboard', () => {
	it('gives back what was copied, with tabs, quotes and lines in cells', () => {
		const block = fc
			.integer({ min: 1, max: 5 })
			.chain((width) =>
				fc.array(fc.array(oddCell, { minLength: width, maxLength: width }), { minLength: 1, maxLength: 6 })
			);
		fc.assert(
			fc.property(block, (cells) => {
				expect(cellsOf(writeBlock(cells))).toEqual(cells);
			}),
			{ numRuns: 1_000 }
		);
	});

	it.each([
		[
			'lines of other systems',
			'a\tb\r\nc\td\r\n',
			[
				['a', 'b'],
				['c', 'd']
			]
		],
		['no line at the end', 'a\tb\nc', [['a', 'b'], ['c']]],
		[
			'inches at the start of a cell',
			'"\t5\n12"x6"\t7',
			[
				['"', '5'],
				['12"x6"', '7']
			]
		],
		['a quoted cell of two lines', '"a\nb"\tc\n', [['a\nb', 'c']]],
		['nothing', '', []]
	])('reads %s', (_what, text, cells) => {
		const read = cellsOf(text).filter((row) => row.length > 1 || row[0] !== '');
		expect(read).toEqual(cells);
	});

	it('refuses a million rows at once, and says so', () => {
		const million = 'S1\tA\t600x350\n'.repeat(1_000_000);
		const begun = performance.now();
		expect(refusalOf(million)).toBe(
			'Nothing was pasted: the clipboard holds 1000000 rows, and the sheet has room for 5000 more.'
		);
		expect(performance.now() - begun).toBeLessThan(2_000);
	});

	it('refuses what is left of a full sheet', () =>
		expect(refusalOf('a\nb\n', 0)).toBe(
			'Nothing was pasted: the clipboard holds 2 rows, and the sheet has room for no more.'
		));

	it('takes as many rows as there is room for, also where cells have lines', () => {
		expect(cellsOf('"a\nb"\n'.repeat(10), 10)).toHaveLength(10);
		expect(refusalOf('"a\nb"\n'.repeat(11), 10)).toContain('room for 10 more');
	});

	it('refuses more cells than a sheet has, and a cell that no cell can hold', () => {
		expect(refusalOf(`${'\t'.repeat(MOST_CELLS)}\n`)).toContain(`at most ${MOST_CELLS} are pasted`);
		expect(refusalOf('x'.repeat(MOST_TYPED + 1))).toBe(
			'Nothing was pasted: the clipboard holds a cell of 2001 characters, and a cell of the sheet holds at most 2000.'
		);
	});
});
