import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyTree, rowId, sheetOf, type TypedRow } from '../../../tests/sheet/any-sheet';
import type { SheetProblem } from './sheet-problem';
import { linksOf } from './links';
import { MOST_ROWS, valueOf } from './sheet';
import { treeLines } from './tree-lines';

const rowsOf = (...links: [tag: string, joins?: string][]) =>
	sheetOf(links.map(([tag, joins = '']) => ({ tag, joins }))).rows;

function faultsOf(...links: [tag: string, joins?: string][]) {
	const problems: SheetProblem[] = [];
	linksOf(rowsOf(...links), problems);
	return problems;
}

/** Rows that name any tag at all: rings, tags twice, tags of nobody. */
const anyLinks = fc
	.array(
		fc.record({
			tag: fc.constantFrom('A', 'B', 'C', 'D', 'E', ''),
			joins: fc.constantFrom('A', 'B', 'C', 'D', 'Z', '')
		}),
		{
			maxLength: 12
		}
	)
	.map((rows: TypedRow[]) => sheetOf(rows).rows);

describe('links between rows', { timeout: 30_000 }, () => {
	it('name a tag that several rows have, at each of them', () => {
		expect(faultsOf(['A'], ['B', 'A'], ['B', 'A'])).toEqual(
			[1, 2].map((n) => ({
				...{ row: rowId(n), field: 'tag', message: '2 rows have the tag B.', expected: 'a tag that no other row has' }
			}))
		);
	});

	it('name a row that joins itself', () => {
		expect(faultsOf(['A', 'A'])).toEqual([
			{
				row: rowId(0),
				field: 'joins',
				message: 'A joins itself.',
				expected: 'another row, or a blank where it meets the fan'
			}
		]);
	});

	it('name every row of a ring, and only those', () => {
		const problems = faultsOf(['A', 'C'], ['B', 'A'], ['C', 'B'], ['D', 'C'], ['E']);
		expect(problems.map(({ row, field }) => [row, field])).toEqual([0, 2, 1].map((n) => [rowId(n), 'joins']));
		expect(problems[0]?.message).toBe('A leads back to itself: A joins C joins B joins A.');
	});

	it('tell a long ring in short', () => {
		const tags = Array.from({ length: 30 }, (_, n) => `R${n}`);
		const problems = faultsOf(...tags.map((tag, n): [string, string] => [tag, tags[(n + 1) % 30] ?? '']));
		expect(problems).toHaveLength(30);
		expect(problems[0]?.message).toBe(
			'R0 leads back to itself: R0 joins R1 joins R2 joins R3 joins R4 joins R5 joins ….'
		);
	});

	it.each([
		['Z9', 'the tag of the row on the fan’s side'],
		['s01', 'S01, as that row has it'],
		['S-01', 'S01, as that row has it']
	])('name the tag %s that no row has, and the one that was meant', (joins, expected) => {
		expect(faultsOf(['S01'], ['S02', joins])).toEqual([
			{ row: rowId(1), field: 'joins', message: `No row has the tag ${joins}.`, expected }
		]);
	});

	it('may name a row that comes later', () => {
		const rows = rowsOf(['C', 'B'], ['B', 'A'], ['A']);
		expect(linksOf(rows).fromFan.map((row) => valueOf(row, 'tag'))).toEqual(['A', 'B', 'C']);
		expect(faultsOf(['C', 'B'], ['B', 'A'], ['A'])).toEqual([]);
	});

	it('reach each row once, after the one it joins; rings are never reached', () => {
		fc.assert(
			fc.property(anyLinks, (rows) => {
				const problems: SheetProblem[] = [];
				const { fromFan, parent, faulty } = linksOf(rows, problems);
				const seen = new Set<string>();
				for (const row of fromFan) {
					const above = parent.get(row.id);
					if (above) expect(seen.has(above.id)).toBe(true);
					expect(seen.has(row.id)).toBe(false);
					seen.add(row.id);
				}
				expect([...faulty].sort()).toEqual([...new Set(problems.map(({ row }) => row))].sort());
				// What cannot be reached hangs on a ring.
				for (const row of rows) {
					if (seen.has(row.id)) continue;
					let at = row;
					for (let n = 0; n < rows.length && !faulty.has(at.id); n++) at = parent.get(at.id) ?? at;
					expect(faulty.has(at.id)).toBe(true);
				}
			}),
			{ numRuns: 500 }
		);
	});

	it.each<[string, (n: number) => [string, string]]>([
		['as a star', (n) => [`R${n}`, n ? 'R0' : '']],
		['one after another', (n) => [`R${n}`, n ? `R${n - 1}` : '']],
		['in one ring', (n) => [`R${n}`, `R${(n + 1) % MOST_ROWS}`]],
		['all with one tag', () => ['R0', 'R0']]
	])('of a full sheet, %s, are read in less than two seconds', (_shape, link) => {
		const rows = rowsOf(...Array.from({ length: MOST_ROWS }, (_, n) => link(n)));
		const begun = performance.now();
		linksOf(rows, []);
		expect(performance.now() - begun).toBeLessThan(2_000);
	});
});

describe('the tree in the first column', { timeout: 30_000 }, () => {
	const depths = (rows: readonly TypedRow[]) => {
		const sheet = sheetOf(rows);
		return new Map(treeLines(sheet.rows, () => false).map(({ depth }, at) => [valueOf(sheet.rows[at]!, 'tag'), depth]));
	};

	it('puts each row one deeper than the row it joins, in any order of the rows', () => {
		fc.assert(
			fc.property(
				anyTree.chain((rows) => fc.shuffledSubarray(rows, { minLength: rows.length, maxLength: rows.length })),
				(rows) => {
					const depth = depths(rows);
					for (const { tag = '', joins } of rows)
						expect(depth.get(tag)).toBe(joins ? (depth.get(joins) ?? NaN) + 1 : 0);
				}
			),
			{ numRuns: 100 }
		);
	});

	it('draws no line up where a row’s link is at fault, and never throws', () => {
		fc.assert(
			fc.property(anyLinks, fc.func(fc.boolean()), (rows, onIndex) => {
				const { parent } = linksOf(rows);
				const lines = treeLines(rows, (row) => onIndex(row.id));
				expect(lines).toHaveLength(rows.length);
				lines.forEach(({ from }, at) => expect(from === null).toBe(!parent.has(rows[at]!.id)));
			}),
			{ numRuns: 300 }
		);
	});

	it('joins every trunk: a line that goes on is met on the next row', () => {
		fc.assert(
			fc.property(
				anyTree.chain((rows) => fc.shuffledSubarray(rows, { minLength: rows.length, maxLength: rows.length })),
				(typed) => {
					const { rows } = sheetOf(typed);
					const lines = treeLines(rows, () => false);
					const { parent } = linksOf(rows);
					/** Lanes whose trunk touches the upper, or the lower, edge of a row. */
					const edges = lines.map((line, at) => {
						const lane = parent.get(rows[at]!.id) ? line.depth : 0;
						const above = new Set(line.through);
						const below = new Set(line.through);
						if (line.from === 'above' || line.goesOn) above.add(lane);
						if (line.from === 'below' || line.goesOn) below.add(lane);
						if (line.ownAbove) above.add(line.depth + 1);
						if (line.ownBelow) below.add(line.depth + 1);
						return { above, below };
					});
					edges.forEach(({ below }, at) => {
						const next = edges[at + 1];
						expect([...below].sort()).toEqual([...(next?.above ?? [])].sort());
					});
				}
			),
			{ numRuns: 200 }
		);
	});
});
