import { describe, expect, it } from 'vitest';
import { applyEntry } from './apply';
import type { SingleEdit } from './edit';
import { entryOf } from './entry';
import { newId } from './new-id';
import { EMPTY_SHEET } from './sheet';
import { solveSheet } from './solve-sheet';

/** A single run of 0 m, so that its loss is that of its end alone. */
function solved(row: Record<string, string>, settings: Record<string, string> = {}) {
	const cell = (typed: string) => ({ typed, units: 'SI' as const });
	const cells = Object.entries({ tag: 'S1', flow: '150', size: 'Ø200', length: '0', ...row }).map(
		([field, typed]) => [field, cell(typed)] as const
	);
	const edits: SingleEdit[] = [
		...Object.entries(settings).map(([field, typed]) => ({ kind: 'set' as const, row: null, field, ...cell(typed) })),
		{ kind: 'insert', rows: [{ id: newId(), cells: Object.fromEntries(cells) }], before: null }
	];
	const entry = entryOf({ kind: 'batch', edits });
	if (!entry) throw new Error('not an entry');
	return solveSheet(applyEntry(EMPTY_SHEET, entry));
}

const density = { density: '1.2 kg/m³' };
/** V = 0.15/(π 0.1²) = 4.775 m/s, pv = 0.6 V² = 13.68 Pa, by hand. */
const PV = 0.6 * (0.15 / (Math.PI * 0.01)) ** 2;

describe('the end of a run', () => {
	it.each([
		['an open end', {}, PV],
		['a plain exit', { parts: 'plain exit' }, PV],
		['a flush entry', { parts: 'flush entry', side: 'exhaust' }, 0.5 * PV],
		['a flush entry and a grille', { parts: 'flush entry', side: 'exhaust', outlet: '10' }, 0.5 * PV + 10]
	])('that is %s is counted once', (_name, row, loss) => {
		const { solution } = solved(row, density);
		expect(solution?.rows['S1']?.loss).toBeCloseTo(loss, 6);
	});

	it('is flagged where an exit and an open end are both asked for', () => {
		const { solution } = solved({ parts: 'plain exit', outlet: 'open' }, density);
		expect(solution?.flags.map(({ rule }) => rule)).toContain('end-counted-twice');
	});
});

describe('thermal gravity', () => {
	const rise = { length: '30', rise: '30' };

	it('is nothing where the air around the ducts is as warm as inside', () =>
		expect(solved(rise, { surroundings: '20' }).solution?.rows['S1']?.thermalGravity).toBe(0));

	it('asks for the elevation where a density was given', () => {
		const { problems } = solved(rise, { density: '0.99', surroundings: '20' });
		expect(problems).toEqual([
			{ row: null, field: 'elevation', message: expect.stringMatching(/elevation/), expected: 'the elevation, as 0 m' }
		]);
	});
});
