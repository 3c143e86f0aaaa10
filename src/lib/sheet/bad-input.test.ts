import { describe, expect, it } from 'vitest';
import { validateDocument } from '$lib/engine';
import { done, rowId, sheetOf, type TypedRow, type TypedSettings } from '../../../tests/sheet/any-sheet';
import { readBlock } from './clipboard';
import { editsBodySchema, editSchema, sentEditSchema } from './edit';
import { entryOf } from './entry';
import { MOST_ROWS, valueOf, type RowField, type SettingField } from './sheet';
import { isComplete, solveSheet } from './solve-sheet';

/** What was tried, where, and what was answered. Everything typed stays in its cell, and sound rows keep their figures. */

const MAIN: TypedRow = { tag: 'S01', size: '400x300', length: '5' };
const GOOD: TypedRow = { tag: 'S02', joins: 'S01', size: 'Ø200', length: '4', flow: '100', outlet: '10' };
const TRIED: TypedRow = { tag: 'S03', joins: 'S01', size: 'Ø160', length: '9', flow: '60', outlet: '16' };
const A_SIZE = 'a size, such as 600x350, ø200, oval 510x255 or 12"';
const A_LENGTH = 'a length, such as 6.5, 6.5 m or 6500 mm';
const A_FLOW = 'a flow, such as 200, 200 L/s or 720 m³/h';

type Answer = readonly [tried: string, field: RowField, typed: string, message: string, expected: string];

const cells: readonly Answer[] = [
	['a size with a figure missing', 'size', '24xx12', '“24xx12”: a figure of the size is missing', A_SIZE],
	['a size of zero', 'size', '0x300', '“0x300”: a duct cannot have a size of zero', A_SIZE],
	['a size that no duct has', 'size', '0.5', '“0.5”: 0.5 mm is too small for a duct (least 10 mm)', A_SIZE],
	['a size of three figures', 'size', '600x300x200', '“600x300x200”: a size has one figure or two', A_SIZE],
	['a size in pascal', 'size', '5 Pa', '“5 Pa”: “pa” is not understood', A_SIZE],
	['a negative length', 'length', '-3', '“-3”: a length cannot be negative', A_LENGTH],
	['a length in kilograms', 'length', '3 kg', '“3 kg”: kg is not a unit of a length', A_LENGTH],
	['a length that is no number', 'length', 'NaN', '“NaN”: “nan” is not a figure', A_LENGTH],
	['a length without end', 'length', 'Infinity', '“Infinity”: “infinity” is not a figure', A_LENGTH],
	['a length of too many digits', 'length', '1e999', '“1e999”: too great for a length (most 10\u2009000 m)', A_LENGTH],
	['a sum that divides by zero', 'length', '=3/0', '“=3/0”: the sum divides by zero', A_LENGTH],
	['a sum without its sign', 'length', '3+4', '“3+4”: a sum starts with an equals sign', A_LENGTH],
	['a flow of zero', 'flow', '0', '“0”: an outlet without a flow moves no air', 'a flow above zero, such as 200 L/s'],
	['a negative flow', 'flow', '-5', '“-5”: a flow cannot be negative', A_FLOW],
	['a flow in metres', 'flow', '5 m', '“5 m”: m is not a unit of a flow', A_FLOW],
	[
		'an outlet’s loss in words',
		'outlet',
		'lots',
		'“lots”: “lots” is not a figure',
		'a pressure, such as 25, 25 Pa or 0.1 in wg, “open”, or a word before it, such as grille 25 Pa or louvre C 1.2'
	],
	[
		'a side that is none',
		'side',
		'sideways',
		'“sideways” is none of the choices here.',
		'Supply, Return, Exhaust, Outdoor'
	],
	[
		'another direction of the air than the row it joins',
		'side',
		'exhaust',
		'Air cannot run toward the fan and away from it in one run.',
		'supply, as the row it joins'
	],
	['a row that joins itself', 'joins', 'S03', 'S03 joins itself.', 'another row, or a blank where it meets the fan'],
	['a tag that no row has', 'joins', 'S99', 'No row has the tag S99.', 'the tag of the row on the fan’s side'],
	['a tag in small letters', 'joins', 's01', 'No row has the tag s01.', 'S01, as that row has it'],
	['a tag too long to print', 'tag', 'x'.repeat(41), 'This tag has 41 characters.', 'at most 40'],
	['no tag', 'tag', '', 'This row has no tag.', 'a tag of its own, as S01'],
	['no size', 'size', '', 'This row has no size.', 'a size, as 600x300 or Ø250'],
	['no length', 'length', '', 'This row has no length.', 'the length on the centre line; 0 for none'],
	[
		'no flow at the end of a run',
		'flow',
		'',
		'Nothing joins S03, so it needs an outlet.',
		'the flow of its outlet, or a row that joins it'
	],
	[
		'a part that is none',
		'parts',
		'elbw',
		'“elbw” is not a known part',
		'known words nearest to it: elbow, elbows, ell'
	],
	[
		'a junction without its coefficient',
		'parts',
		'tee branch',
		'“tee branch”: a junction needs its coefficient C, that of this row’s own stream on the velocity pressure of this row',
		'C, such as tee branch C0.8'
	],
	[
		'equipment without its loss',
		'parts',
		'silencer',
		'“silencer”: its coefficient or its pressure is missing: what the maker states at the design flow, or C',
		'silencer 25 Pa, or silencer C0.6'
	],
	[
		'equipment with a figure of no unit',
		'parts',
		'silencer 25',
		'“25” is a figure without a sign',
		'25 Pa for a pressure, or C25 for a coefficient'
	],
	[
		'equipment that gives pressure',
		'parts',
		'silencer -25 Pa',
		'“silencer -25 Pa”: “-25 pa”: a pressure cannot be negative',
		'a pressure, such as 25, 25 Pa or 0.1 in wg'
	],
	[
		'a coefficient that is none',
		'parts',
		'elbow C99999999',
		'“elbow C99999999”: the coefficient is too great',
		'at most 1000000, such as C0.23'
	],
	[
		'a fitting outside its table',
		'parts',
		'elbow r99',
		'Elbow: Radius to centre line over diameter 99 is outside 0.5 to 10',
		'Radius to centre line over diameter 0.5 to 10; Angle 0 to 180, or C, such as C0.23'
	],
	[
		'a fitting of another shape',
		'parts',
		'vaned elbow',
		'Vaned elbow is made for rectangular duct; this row is round',
		'another part, or its coefficient, such as C0.23'
	],
	[
		'more equipment than a row holds',
		'parts',
		Array.from({ length: 11 }, () => '50 coil 1 Pa').join(', '),
		'550 losses of equipment in one row',
		'at most 500'
	]
];

describe('tried in a cell', () => {
	const alone = solveSheet(sheetOf([MAIN, GOOD]));

	it.each(cells)('%s: %s “%s”', (_tried, field, typed, message, expected) => {
		const sheet = sheetOf([MAIN, GOOD, { ...TRIED, [field]: typed }]);
		const solved = solveSheet(sheet);
		expect(solved.problems).toEqual([{ row: rowId(2), field, message, expected }]);
		expect(sheet.rows[2]?.cells[field]?.typed ?? '').toBe(typed);
		expect(solved.uncounted).toEqual([rowId(2)]);
		expect(solved.solution).toEqual(alone.solution);
		expect(isComplete(solved)).toBe(false);
	});

	it.each(cells)('%s: mended, the row counts', (_tried, field, typed) => {
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

const SETTINGS: readonly (readonly [SettingField, string, string, string])[] = [
	[
		'temperature',
		'900',
		'“900”: outside −50 to 80 °C, for which the density of air is computed',
		'−50 to 80 °C; for other air, leave it blank and give the density'
	],
	['surroundings', '-90', '“-90”: outside −50 to 80 °C, for which the density of air is computed', '−50 to 80 °C'],
	[
		'humidity',
		'150',
		'“150”: too great for a relative humidity (most 100 %)',
		'a relative humidity, such as 50 or 50 %'
	],
	['density', '-1', '“-1”: a density cannot be negative', 'a density, such as 1.2 or 1.2 kg/m³'],
	[
		'flexFactor',
		'-3',
		'“-3”: flexible duct loses 1 to 100 times what rigid duct does',
		'a number from 1 to 100, such as 4'
	],
	['aspectRatio', '0.5', '“0.5”: the longer side over the shorter is 1 or more', 'a number from 1 to 1000, such as 4'],
	['mainVelocity', 'fast', '“fast”: “fast” is not a figure', 'a velocity, such as 6 or 6 m/s'],
	['damperAtOutlet', 'perhaps', '“perhaps” is neither yes nor no.', 'yes or no'],
	['units', 'metric', '“metric” is none of the choices here.', 'SI, IP'],
	['title', 'x'.repeat(121), 'This title has 121 characters.', 'at most 120']
];

describe('tried in a setting', () => {
	it.each(SETTINGS)('%s “%s”', (field, typed, message, expected) => {
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
			message: '“200”: outside −58 to 176 °F, for which the density of air is computed',
			expected: '−58 to 176 °F; for other air, leave it blank and give the density'
		});
	});
});

describe('tried through the clipboard', () => {
	it('a million rows: refused at once, nothing pasted', () => {
		const begun = performance.now();
		expect(readBlock('S1\tS2\t24x12\n'.repeat(1_000_000), MOST_ROWS)).toEqual({
			ok: false,
			message: 'The clipboard holds 1000000 rows; there is room for 5000 more. Nothing was pasted.'
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
