import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { plainSigns, validateDocument, type UnitSystem } from '$lib/engine';
import { anySteps, anyText, anyTree, done, rowId, sheetOf, type TypedRow } from '../../../tests/sheet/any-sheet';
import { shownText, textToEdit } from './cell-text';
import { arrangeFromFan } from './commands';
import type { SingleEdit } from './edit';
import { cellOf } from './entry';
import { ROW_FIELDS, SETTING_FIELDS } from './fields';
import { settingEdits, settingsToEdit } from './settings';
import { EMPTY_SHEET, unitsOf, valueOf, type Sheet } from './sheet';
import { isComplete, solveSheet } from './solve-sheet';

const inUnits = (sheet: Sheet, units: UnitSystem) =>
	done(sheet, { kind: 'set', row: null, field: 'units', typed: units, units: unitsOf(sheet) });

/** What the sheet comes to, without what follows the order of its rows. */
function figuresOf(sheet: Sheet) {
	const { solution, problems } = solveSheet(sheet);
	if (!solution) return { solution, problems };
	const { paths, flags, ...rest } = solution;
	const byText = (list: readonly unknown[]) => list.map((one) => JSON.stringify(one)).sort();
	return { ...rest, paths: byText(paths), flags: byText(flags), problems };
}

describe('a sheet of rows that all count', { timeout: 30_000 }, () => {
	it('has figures for each of them, and no problem', () => {
		fc.assert(
			fc.property(anyTree, (rows) => {
				const solved = solveSheet(sheetOf(rows));
				expect(solved.problems).toEqual([]);
				expect(isComplete(solved)).toBe(true);
				expect(Object.keys(solved.solution?.rows ?? {}).sort()).toEqual(rows.map(({ tag }) => tag).sort());
			}),
			{ numRuns: 100 }
		);
	});

	it('has the same figures to the last bit in any order of its rows, also from the farthest room inward', () => {
		const treeAndOrder = anyTree.chain((rows) =>
			fc.record({
				rows: fc.constant(rows),
				order: fc.oneof(
					fc.constant([...rows].reverse()),
					fc.shuffledSubarray(rows, { minLength: rows.length, maxLength: rows.length })
				)
			})
		);
		fc.assert(
			fc.property(treeAndOrder, ({ rows, order }) => {
				expect(figuresOf(sheetOf(order))).toEqual(figuresOf(sheetOf(rows)));
			}),
			{ numRuns: 100 }
		);
	});

	it('comes back into the order of the tree, with the same figures', () => {
		fc.assert(
			fc.property(anyTree, (rows) => {
				const inward = sheetOf([...rows].reverse());
				const edit = arrangeFromFan(inward);
				const arranged = edit ? done(inward, edit) : inward;
				const seen = new Set<string | null>([null]);
				for (const row of arranged.rows) {
					expect(seen.has(valueOf(row, 'joins'))).toBe(true);
					seen.add(valueOf(row, 'tag'));
				}
				expect(arrangeFromFan(arranged)).toBeNull();
				expect(figuresOf(arranged)).toEqual(figuresOf(inward));
			}),
			{ numRuns: 50 }
		);
	});
});

describe('switching units', { timeout: 30_000 }, () => {
	it('changes no cell of a row and no figure, to the last bit', () => {
		fc.assert(
			fc.property(anyTree, fc.constantFrom<UnitSystem>('SI', 'IP'), (rows, units) => {
				const sheet = sheetOf(rows);
				const other = inUnits(sheet, units);
				expect(other.rows).toBe(sheet.rows);
				expect(solveSheet(other)).toEqual(solveSheet(sheet));
				expect(inUnits(other, 'SI').rows).toBe(sheet.rows);
			}),
			{ numRuns: 50 }
		);
	});

	it('shows the same cells in other figures', () => {
		const [row] = sheetOf([{ tag: 'A', size: '600x350', length: '6.5', flow: '1200', outlet: '25', rise: '-3' }]).rows;
		const shown = (units: UnitSystem) =>
			(['flow', 'size', 'length', 'rise', 'outlet'] as const).map((field) => (row ? shownText(row, field, units) : ''));
		// 600 mm = 23.62 in, 6.5 m = 21.33 ft, 1200 L/s = 2543 cfm, 25 Pa = 0.1004 in. w.g., by the exact inch and foot.
		expect(shown('SI').map(plainSigns)).toEqual(['1 200', '600x350', '6.5', '-3.0', '25.0']);
		expect(shown('IP').map(plainSigns)).toEqual(['2,543', '23.6x13.8', '21.3', '-9.8', '0.100']);
	});

	it('lets a cell be opened in other units and closed again without another value', () => {
		const fields = ['flow', 'size', 'length', 'rise', 'flex', 'outlet', 'pressure'] as const;
		const typed = fc.record({
			flow: fc.double({ min: 0.1, max: 9000, noNaN: true }).map(String),
			size: fc.tuple(fc.integer({ min: 50, max: 2000 }), fc.integer({ min: 50, max: 2000 })).map((s) => s.join('x')),
			length: fc.double({ min: 0, max: 99, noNaN: true }).map((value) => value.toFixed(3)),
			rise: fc.double({ min: -99, max: 99, noNaN: true }).map((value) => value.toFixed(2)),
			flex: fc.constantFrom('1.2', '3.35'),
			outlet: fc.constantFrom('16', '12 static', '18.3?', 'open'),
			pressure: fc.constantFrom('-7.5', '10', '0')
		});
		fc.assert(
			fc.property(typed, (cells) => {
				const [row] = sheetOf([cells]).rows;
				if (!row) throw new Error('no row');
				for (const field of fields) {
					const again = cellOf(true, field, textToEdit(row, field, 'IP'), 'IP');
					expect([field, again?.value]).toEqual([field, row.cells[field]?.value]);
				}
			}),
			{ numRuns: 200 }
		);
	});

	it('leaves the settings alone when their form is sent back as it came', () => {
		const settings = { temperature: '20', elevation: '1600', mainVelocity: '6', frictionRate: '1.5', flexFactor: '4' };
		const sheet = inUnits(sheetOf([], settings), 'IP');
		const fields = Object.keys(settings) as (keyof typeof settings)[];
		const form = settingsToEdit(sheet, fields);
		expect(form.typedIn).toBe('IP');
		expect(settingEdits(sheet, form, 'IP', fields)).toBeNull();
	});
});

describe('rows that do not count', () => {
	const main: TypedRow = { tag: 'A', size: '400x300', length: '5' };
	const good: TypedRow = { tag: 'B', joins: 'A', size: 'Ø200', length: '4', flow: '100', outlet: '10' };
	const other: TypedRow = { tag: 'C', joins: 'A', size: 'Ø160', length: '9', flow: '60', outlet: '16' };

	it.each<[string, TypedRow]>([
		['a cell that is not understood', { ...other, size: '24xx12' }],
		['no size', { tag: 'C', joins: 'A', length: '9', flow: '60' }],
		['no flow at its end', { tag: 'C', joins: 'A', size: 'Ø160', length: '9' }],
		['a tag that no row has', { ...other, joins: 'Z' }],
		['itself to join', { ...other, joins: 'C' }],
		['another direction of the air', { ...other, side: 'exhaust' }],
		['a flow of zero', { ...other, flow: '0' }],
		['a part that does not suit its shape', { ...other, parts: 'vaned elbow' }],
		['nothing at all', {}]
	])('are named, with %s, and the others keep the figures they have alone', (_what, bad) => {
		const alone = solveSheet(sheetOf([main, good]));
		const solved = solveSheet(sheetOf([main, good, bad]));
		expect(solved.uncounted).toEqual([rowId(2)]);
		expect(solved.problems.length).toBeGreaterThan(0);
		expect(solved.problems.every(({ row }) => row === rowId(2))).toBe(true);
		expect(alone.solution).not.toBeNull();
		expect(solved.solution).toEqual(alone.solution);
		expect(isComplete(solved)).toBe(false);
	});

	it('take the rows beyond them along, each fault being told once, where it is', () => {
		const chain = (tag: string, joins: string): TypedRow => ({ ...main, tag, joins });
		const rows = [main, good, { ...chain('D', 'A'), side: 'return' }, chain('E', 'D'), { ...other, joins: 'E' }];
		const solved = solveSheet(sheetOf(rows));
		expect(solved.uncounted).toEqual([rowId(2), rowId(3), rowId(4)]);
		expect(solved.problems.map(({ row, field }) => [row, field])).toEqual([[rowId(2), 'side']]);
	});

	it('say one thing of a row with nothing in it, wherever it stands', () => {
		for (const rows of [
			[{}, main, good],
			[main, {}, good],
			[main, good, {}]
		] as TypedRow[][]) {
			const { problems, uncounted } = solveSheet(sheetOf(rows));
			const blank = rowId(rows.findIndex(({ tag }) => !tag));
			const message = 'Nothing is entered in this row yet.';
			expect(problems).toEqual([
				{ row: blank, field: 'tag', message, expected: 'its tag first, as S01; or delete the row' }
			]);
			expect(uncounted).toEqual([blank]);
		}
		expect(solveSheet(sheetOf([main, good, { serves: 'Store' }])).problems).toHaveLength(3);
	});

	it('say nothing of the side where the link is at fault', () => {
		const twice = { ...main, side: 'exhaust' };
		const solved = solveSheet(
			sheetOf([twice, twice, { ...main, tag: 'D', joins: 'A' }, { ...other, joins: 'D', side: 'exhaust' }])
		);
		expect(solved.problems.map(({ field }) => field)).toEqual(['tag', 'tag']);
	});
});

describe('whatever is typed', { timeout: 30_000 }, () => {
	it('is kept in its cell, and never throws', () => {
		fc.assert(
			fc.property(
				fc.boolean(),
				fc.oneof(fc.constantFrom<string>(...ROW_FIELDS, ...SETTING_FIELDS), fc.string({ maxLength: 12 })),
				anyText,
				fc.constantFrom<UnitSystem>('SI', 'IP'),
				(row, field, typed, units) => {
					const cell = cellOf(row, field, typed, units);
					if (cell) expect(cell).toMatchObject({ units, typed: typed.replaceAll('\0', '').toWellFormed() });
					else expect(typed.replaceAll('\0', '').trim()).toBe('');
				}
			),
			{ numRuns: 2_000 }
		);
	});

	it('comes to figures or to problems at cells that are there, and to a document that its own format takes', () => {
		let solutions = 0;
		fc.assert(
			fc.property(anyTree, anySteps, (rows, steps) => {
				let sheet = rows.length % 3 ? sheetOf(rows) : EMPTY_SHEET;
				let id = 100;
				const edits: SingleEdit[] = [];
				for (const move of steps.flat()) {
					const edit = move(sheet, () => id++);
					edits.push(edit);
					sheet = done(sheet, edit);
				}
				const solved = solveSheet(sheet);
				const ids = new Set(sheet.rows.map((row) => row.id));
				for (const { row, field, message, expected } of solved.problems) {
					expect(row === null ? SETTING_FIELDS : ROW_FIELDS).toContain(field);
					if (row !== null) expect(ids.has(row)).toBe(true);
					expect(message.length * expected.length).toBeGreaterThan(0);
				}
				if (!solved.document) return;
				expect(validateDocument(solved.document)).toMatchObject({ ok: true });
				// Every row that counts has figures: what is not understood is left out before.
				expect(Object.keys(solved.solution?.rows ?? {})).toHaveLength(solved.document.rows.length);
				expect(solved.document.rows.length + solved.uncounted.length).toBe(sheet.rows.length);
				solutions++;
			}),
			{ numRuns: 250 }
		);
		expect(solutions).toBeGreaterThan(20);
	});

	it.each([
		['flow', '0.00000001'],
		['parts', Array.from({ length: 60 }, () => '50 coil 1 Pa').join(', ')],
		['flow', '1e-9 m3/s'],
		['size', '10'],
		['length', '9999'],
		['outlet', '100000']
	])('at the edge of what %s takes, still makes a document that its own format takes', (field, typed) => {
		const row = { tag: 'A', size: 'Ø200', length: '5', flow: '100', [field]: typed };
		const { document, solution } = solveSheet(
			sheetOf([row, { ...row, tag: 'B', [field]: '' }, { tag: 'C', size: '200', length: '1', flow: '9' }])
		);
		expect(validateDocument(document)).toMatchObject({ ok: true });
		expect(solution).not.toBeNull();
	});

	it.each([
		['temperature', '-50', '80'],
		['surroundings', '-50', '80'],
		['flexFactor', '1', '100'],
		['flexCompression', '0', '60 %'],
		['aspectRatio', '1', '1000'],
		['elevation', '-500', '9000'],
		['density', '0.01', '100'],
		['humidity', '0', '100']
	])('as %s, the engine takes from %s to %s', (field, ...ends) => {
		const row = { tag: 'A', size: '300x200', length: '5', flex: '1', flow: '100' };
		for (const typed of ends) {
			const solved = solveSheet(sheetOf([row], { [field]: typed }));
			expect(solved.problems).toEqual([]);
			expect(validateDocument(solved.document)).toMatchObject({ ok: true });
			expect(solved.solution).not.toBeNull();
		}
	});
});
