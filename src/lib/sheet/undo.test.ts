import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anySteps, done, rowId, sheetOf, type Move } from '../../../tests/sheet/any-sheet';
import { applyEntry, applyMany } from './apply';
import { editSchema, type Edit, type SingleEdit } from './edit';
import { entryOf, type Entry } from './entry';
import { inverseOf } from './invert';
import { EMPTY_SHEET, MOST_ROWS, type Sheet } from './sheet';

type Step = readonly (Move extends fc.Arbitrary<infer M> ? M : never)[];

/** The edits that a hand makes one after the other, and the sheet after each. */
function walk(steps: readonly Step[]) {
	let id = 0;
	let sheet: Sheet = EMPTY_SHEET;
	const way: { edit: Edit; before: Sheet; after: Sheet }[] = [];
	for (const step of steps) {
		const before = sheet;
		const edits: SingleEdit[] = [];
		for (const move of step) {
			const single = move(sheet, () => id++);
			edits.push(single);
			sheet = done(sheet, single);
		}
		const [only] = edits;
		const edit: Edit = edits.length === 1 && only ? only : { kind: 'batch', edits };
		way.push({ edit, before, after: sheet });
	}
	return way;
}

describe('undo', { timeout: 30_000 }, () => {
	it('brings back every cell as it was typed, whatever the edit', () => {
		fc.assert(
			fc.property(anySteps, (steps) => {
				for (const { edit, before } of walk(steps)) {
					const after = done(before, edit);
					const inverse = inverseOf(before, edit);
					expect(inverse ? done(after, inverse) : after).toEqual(before);
				}
			}),
			{ numRuns: 150 }
		);
	});

	it('of all edits ends at the start, and redo of all at the end', () => {
		fc.assert(
			fc.property(anySteps, (steps) => {
				const way = walk(steps);
				let sheet = way.at(-1)?.after ?? EMPTY_SHEET;
				const end = sheet;
				const redo: Edit[] = [];
				for (const { edit, before } of [...way].reverse()) {
					const inverse = inverseOf(before, edit);
					if (!inverse) continue;
					const again = inverseOf(sheet, inverse);
					sheet = done(sheet, inverse);
					if (again) redo.unshift(again);
				}
				expect(sheet).toEqual(EMPTY_SHEET);
				for (const edit of redo) sheet = done(sheet, edit);
				expect(sheet).toEqual(end);
			}),
			{ numRuns: 100 }
		);
	});

	it('is an edit that the server takes', () => {
		fc.assert(
			fc.property(anySteps, (steps) => {
				for (const { edit, before } of walk(steps)) {
					const inverse = inverseOf(before, edit);
					if (inverse) expect(editSchema.safeParse(inverse).error).toBeUndefined();
				}
			}),
			{ numRuns: 100 }
		);
	});

	it('has nothing to do where all rows that an edit names are gone', () => {
		const gone = rowId(9);
		const sheet = sheetOf([{ tag: 'A' }]);
		expect(inverseOf(sheet, { kind: 'delete', rows: [gone] })).toBeNull();
		expect(inverseOf(sheet, { kind: 'move', rows: [gone], before: null })).toBeNull();
		expect(inverseOf(sheet, { kind: 'set', row: gone, field: 'tag', typed: 'B', units: 'SI' })).toBeNull();
		expect(inverseOf(sheet, { kind: 'insert', rows: [{ id: rowId(0), cells: {} }], before: null })).toBeNull();
	});

	it('of a paste over a whole sheet takes less than three seconds', () => {
		const sheet = sheetOf(Array.from({ length: MOST_ROWS }, (_, n) => ({ tag: `R${n}` })));
		const fields = ['tag', 'joins', 'serves', 'size', 'length', 'flow'];
		const edits = sheet.rows.flatMap(({ id }) =>
			fields.map((field): SingleEdit => ({ kind: 'set', row: id, field, typed: '5', units: 'SI' }))
		);
		const begun = performance.now();
		const inverse = inverseOf(sheet, { kind: 'batch', edits });
		expect(performance.now() - begun).toBeLessThan(3_000);
		expect(inverse).toMatchObject({ kind: 'batch' });
	});
});

/** Entries of one log, as several people make them: each names rows that may be gone by then. */
const anyLog = anySteps.map((steps) => walk(steps).flatMap(({ edit }) => (entryOf(edit) ?? []) as Entry | []));

describe('the log', { timeout: 30_000 }, () => {
	it('makes the same sheet in any batching', () => {
		fc.assert(
			fc.property(anyLog, fc.array(fc.nat(3)), (log, cuts) => {
				const one = log.reduce(applyEntry, EMPTY_SHEET);
				let several: Sheet = EMPTY_SHEET;
				let from = 0;
				for (const cut of [...cuts, log.length]) {
					several = applyMany(several, log.slice(from, from + cut));
					from += cut;
				}
				expect(several).toEqual(one);
				expect(applyMany(EMPTY_SHEET, log)).toEqual(one);
				expect(applyEntry(EMPTY_SHEET, { kind: 'batch', entries: log })).toEqual(one);
			}),
			{ numRuns: 100 }
		);
	});

	it('goes on past entries that name rows which are gone, and never has a row twice', () => {
		fc.assert(
			fc.property(anyLog, anyLog, fc.array(fc.nat(), { maxLength: 10 }), (mine, theirs, order) => {
				const log = [...mine];
				theirs.forEach((entry, n) => log.splice((order[n] ?? n) % (log.length + 1), 0, entry));
				const sheet = applyMany(EMPTY_SHEET, log);
				expect(new Set(sheet.rows.map(({ id }) => id)).size).toBe(sheet.rows.length);
			}),
			{ numRuns: 100 }
		);
	});

	it('leaves the sheet before an entry as it was', () => {
		fc.assert(
			fc.property(anyLog, (log) => {
				let sheet: Sheet = EMPTY_SHEET;
				for (const entry of log) {
					const kept = structuredClone(sheet);
					const next = applyEntry(sheet, entry);
					expect(sheet).toEqual(kept);
					sheet = next;
				}
			}),
			{ numRuns: 50 }
		);
	});

	it('takes a row once, though an entry names it twice', () => {
		const sheet = sheetOf([{ tag: 'A' }, { tag: 'B' }]);
		const [a, b] = [rowId(0), rowId(1)];
		expect(applyEntry(sheet, { kind: 'move', rows: [a, a], before: null }).rows.map(({ id }) => id)).toEqual([b, a]);
		const twice = { id: rowId(5), cells: {} };
		expect(applyEntry(sheet, { kind: 'insert', rows: [twice, twice], before: a }).rows).toHaveLength(3);
	});

	it('is replaced as a whole by a version that is brought back', () => {
		const old = sheetOf([{ tag: 'OLD' }]);
		const now = sheetOf([{ tag: 'A' }, { tag: 'B' }]);
		expect(
			applyMany(now, [
				{ kind: 'delete', rows: [rowId(1)] },
				{ kind: 'replace', sheet: old, from: 'x' }
			])
		).toBe(old);
	});
});
