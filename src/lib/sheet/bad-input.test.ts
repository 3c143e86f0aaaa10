import { describe, expect, it } from 'vitest';
import { validateDocument } from '$lib/engine';
import { done, rowId, sheetOf, type TypedRow, type TypedSettings } from '../../../tests/sheet/any-sheet';
import { BAD_CELLS, BAD_SETTINGS, GOOD, MAIN, TRIED } from '../../../tests/sheet/bad-input-table';
import { readBlock } from './clipboard';
import { editsBodySchema, editSchema, sentEditSchema } from './edit';
import { entryOf } from './entry';
import { MOST_ROWS, valueOf } from './sheet';
import { isComplete, solveSheet } from './solve-sheet';

/** Everything typed stays in its cell, and sound rows keep their figures. */

describe('tried in a cell', () => {
	const alone = solveSheet(sheetOf([MAIN, GOOD]));

	it.each(BAD_CELLS)('%s: %s “%s”', (_tried, field, typed, message, expected) => {
		const sheet = sheetOf([MAIN, GOOD, { ...TRIED, [field]: typed }]);
		const solved = solveSheet(sheet);
		expect(solved.problems).toEqual([{ row: rowId(2), field, message, expected }]);
		expect(sheet.rows[2]?.cells[field]?.typed ?? '').toBe(typed);
		expect(solved.uncounted).toEqual([rowId(2)]);
		expect(solved.solution).toEqual(alone.solution);
		expect(isComplete(solved)).toBe(false);
	});

	it.each(BAD_CELLS)('%s: mended, the row counts', (_tried, field, typed) => {
		const tried = sheetOf([MAIN, GOOD, { ...TRIED, [field]: typed }]);
		const sound = sheetOf([MAIN, GOOD, TRIED]);
		const mended = done(tried, {
			...{ kind: 'set', row: rowId(2), field, typed: TRIED[field] ?? '', units: 'SI' }
		});
		expect(solveSheet(mended)).toEqual(solveSheet(sound));
		expect(isComplete(solveSheet(mended))).toBe(true);
	});
});

describe('tried in several rows', () => {
	const answers = (...rows: TypedRow[]) =>
		solveSheet(sheetOf(rows)).problems.map(({ row, field, message, expected }) => ({
			...{ row: rows.findIndex((_, n) => rowId(n) === row), field, message, expected }
		}));

	it('two rows with one tag: each is told', () => {
		const told = {
			...{ field: 'tag', message: '2 rows have the tag S02.', expected: 'a tag that no other row has' }
		};
		expect(answers(MAIN, GOOD, { ...TRIED, tag: 'S02' })).toEqual([
			{ row: 1, ...told },
			{ row: 2, ...told }
		]);
	});

	it('a ring: each of its rows is told, with the way round', () => {
		const ring = [
			{ ...MAIN, tag: 'R1', joins: 'R2' },
			{ ...MAIN, tag: 'R2', joins: 'R3' },
			{ ...MAIN, tag: 'R3', joins: 'R1' }
		];
		const told = answers(MAIN, GOOD, ...ring);
		expect(told.map(({ row, field }) => [row, field])).toEqual([2, 3, 4].map((row) => [row, 'joins']));
		expect(told[0]).toMatchObject({
			message: 'R1 leads back to itself: R1 joins R2 joins R3 joins R1.',
			expected: 'runs that end at the fan'
		});
		expect(solveSheet(sheetOf([MAIN, GOOD, ...ring])).solution).toEqual(solveSheet(sheetOf([MAIN, GOOD])).solution);
	});

	it.each([
		['flow', 'Rows join S02, so its flow is their sum.', 'a blank; type flows at the outlets only'],
		['outlet', 'Rows join S02, so no outlet stands at its end.', 'a blank; an outlet stands where no row joins'],
		['pressure', 'Rows join S02, so no room is at its end.', 'a blank; the pressure of a room stands at its outlet']
	])('an outlet in the middle, by its %s: the row is told', (field, message, expected) => {
		const { flow: _flow, outlet: _outlet, ...middle } = GOOD;
		expect(answers(MAIN, { ...middle, [field]: '10' }, { ...TRIED, joins: 'S02' })).toEqual([
			{ row: 1, field, message, expected }
		]);
	});
});

describe('tried in a setting', () => {
	it.each(BAD_SETTINGS)('%s “%s”', (field, typed, message, expected) => {
		const settings: TypedSettings = { [field]: typed };
		const sheet = sheetOf([MAIN, GOOD], settings);
		const solved = solveSheet(sheet);
		expect(solved.problems).toEqual([{ row: null, field, message, expected }]);
		expect(sheet.settings[field]?.typed).toBe(typed);
		// The figures stand on the default meanwhile, and do not pass for complete.
		expect(solved.solution).toEqual(solveSheet(sheetOf([MAIN, GOOD])).solution);
		expect(isComplete(solved)).toBe(false);
	});

	it('in the other units, in their words', () => {
		const [problem] = solveSheet(sheetOf([MAIN], { temperature: '200' }, 'IP')).problems;
		expect(problem).toMatchObject({
			message:
				'Temperature of the air – “200”: outside −58 to 176 °F, for which the density of air is computed. Meanwhile the air is taken at 20 °C (68 °F).',
			expected: '−58 to 176 °F; for other air, leave it blank and give the density'
		});
	});
});

describe('tried through the clipboard', () => {
	it('a million rows: refused at once, nothing pasted', () => {
		const begun = performance.now();
		expect(readBlock('S1\tS2\t24x12\n'.repeat(1_000_000), MOST_ROWS)).toEqual({
			ok: false,
			message: 'Nothing was pasted: the clipboard holds 1000000 rows, and the sheet has room for 5000 more.'
		});
		expect(performance.now() - begun).toBeLessThan(2_000);
	});
});

describe('tried through the address that takes edits', () => {
	const cell = { kind: 'set', row: rowId(0), field: 'serves', typed: 'x', units: 'SI' };
	const sent = (edit: unknown) => ({ base: 0, edits: [{ id: rowId(1), edit }] });
	const faultsOf = (body: unknown) => {
		const read = editsBodySchema.safeParse(body);
		return read.success ? [] : read.error.issues.map(({ path, message }) => `${path.join('.')}: ${message}`);
	};

	it.each<[string, unknown, string]>([
		[
			'a text of 10 MB in a cell',
			{ ...cell, typed: 'x'.repeat(10_000_000) },
			'expected string to have <=2000 characters'
		],
		['a NaN for a text', { ...cell, typed: NaN }, 'expected string, received NaN'],
		['a number for a text', { ...cell, typed: 5 }, 'expected string, received number'],
		['units of nobody', { ...cell, units: 'CGS' }, 'expected one of "SI"|"IP"'],
		['a row that is no id', { ...cell, row: '1; drop table' }, 'Invalid UUID'],
		['a kind that is none', { kind: 'explode' }, 'Invalid'],
		['a value behind the text’s back', { kind: 'replace', sheet: {} }, 'Invalid'],
		['no rows to delete', { kind: 'delete', rows: [] }, 'expected array to have >=1 items'],
		['an empty batch', { kind: 'batch', edits: [] }, 'expected array to have >=1 items'],
		[
			'more rows than a sheet holds',
			{
				kind: 'insert',
				rows: Array.from({ length: MOST_ROWS + 1 }, (_, n) => ({ id: rowId(n), cells: {} })),
				before: null
			},
			'expected array to have <=5000 items'
		]
	])('%s: refused, with its place', (_tried, edit, why) => {
		const faults = faultsOf(sent(edit));
		expect(faults.join('\n')).toContain(why);
		for (const fault of faults) expect(fault).toMatch(/^edits\.0\.edit/);
	});

	it.each<[string, unknown]>([
		['nothing', null],
		['a list', []],
		['a base below zero', { base: -1, edits: [] }],
		['a base that is no whole number', { base: 0.5, edits: [] }],
		['a thousand and one edits', { base: 0, edits: Array(1_001).fill({ id: rowId(1), edit: cell }) }]
	])('%s: refused', (_tried, body) => expect(faultsOf(body)).not.toEqual([]));

	it('NUL and half a surrogate pair: taken without them, the rest of the text kept', () => {
		const read = sentEditSchema.parse({ id: rowId(1), edit: { ...cell, typed: 'a\0b\ud800c 😀' } });
		expect(read.edit).toMatchObject({ typed: 'ab\ufffdc 😀' });
	});

	it.each(['no such column', '__proto__', 'constructor', 'units'])('the column “%s” in a row: no entry', (field) => {
		const edit = editSchema.parse({ ...cell, field });
		expect(entryOf(edit)).toBeNull();
		expect(entryOf({ kind: 'batch', edits: [editSchema.parse(cell), edit] as never })).toBeNull();
	});

	it('a value sent beside the text: the text alone is read', () => {
		const edit = editSchema.parse({ ...cell, field: 'length', typed: '3', value: 999, cell: { value: 999 } });
		const sheet = done(sheetOf([MAIN]), edit);
		expect(sheet.rows[0] && valueOf(sheet.rows[0], 'length')).toBe(3);
	});
});

describe('tried as a document', () => {
	const { document } = solveSheet(sheetOf([MAIN, GOOD]));
	const withGood = (keys: object) => ({ ...document, rows: [document?.rows[0], { ...document?.rows[1], ...keys }] });
	const told = (input: unknown) => {
		const result = validateDocument(input);
		return result.ok ? [] : result.problems.map(({ path, row, message, expected }) => [path, row, message, expected]);
	};

	it('the one that the sheet makes: taken', () => expect(told(document)).toEqual([]));

	it.each<[string, unknown, (string | null)[]]>([
		[
			'of another format',
			{ ...document, format: 'elsewhere/ducts@3' },
			['format', null, 'is "elsewhere/ducts@3"', '"evendraft/design@1"']
		],
		['of no format', { rows: [] }, ['format', null, 'is missing', '"evendraft/design@1"']],
		['with a NaN', withGood({ length: NaN }), ['rows[1].length', 'S02', 'is NaN', 'a finite number']],
		['with Infinity', withGood({ length: Infinity }), ['rows[1].length', 'S02', 'is Infinity', 'a finite number']],
		['with a text for a length', withGood({ length: '4 m' }), ['rows[1].length', 'S02', 'is "4 m"', 'a number in m']],
		['with a negative length', withGood({ length: -4 }), ['rows[1].length', 'S02', 'is negative: -4', 'at least 0 m']],
		[
			'with a flow of zero',
			withGood({ outlet: { flow: 0 } }),
			['rows[1].outlet.flow', 'S02', 'is zero', 'a flow above 0 m3/s']
		],
		[
			'with a row that joins itself',
			withGood({ joins: 'S02' }),
			['rows[1].joins', 'S02', 'joins itself', 'another row, or null']
		]
	])('%s: refused, with its place', (_tried, input, answer) => expect(told(input)).toContainEqual(answer));
});
