import { describe, expect, it } from 'vitest';
import { sheetOf, type TypedRow } from '../../../tests/sheet/any-sheet';
import { solveSheet } from './solve-sheet';

/** A main of Ø400 with 400 L/s that divides into a branch of Ø200 and a straight way of Ø355. */
const DIVIDING: TypedRow[] = [
	{ tag: 'A', size: 'Ø400', length: '5' },
	{ tag: 'B', joins: 'A', size: 'Ø200', length: '4', flow: '100', outlet: '10', parts: 'tee branch' },
	{ tag: 'C', joins: 'A', size: 'Ø355', length: '6', flow: '300', outlet: '10', parts: 'tee straight' }
];
const solved = (rows: readonly TypedRow[]) => {
	const { solution, problems } = solveSheet(sheetOf(rows));
	if (!solution) throw new Error(problems.map(({ message }) => message).join(' '));
	return solution;
};

describe('a junction of the catalogue in the sheet', () => {
	it('takes flow and area ratio from the rows that meet, and refers to the velocity pressure of the common leg', () => {
		const { rows } = solved(DIVIDING);
		const item = rows.B?.items.find(({ part }) => part === 'junction');
		expect(item?.reference).toMatchObject({ leg: 'common', row: 'A', flowRatio: 0.25, areaRatio: 0.25 });
		expect(item?.reference?.velocityPressure).toBe(rows.A?.velocityPressure);
		expect(item?.loss).toBe((item?.reference?.coefficient ?? NaN) * (rows.A?.velocityPressure ?? NaN));
		expect(item?.coefficient).toBeCloseTo((item?.loss ?? NaN) / (rows.B?.velocityPressure ?? NaN), 12);
		expect(rows.B?.junctionLoss).toBe(item?.loss);
	});

	it('gives the two streams their own losses, and keeps a negative one', () => {
		const rows: TypedRow[] = [
			{ tag: 'A', side: 'exhaust', size: 'Ø400', length: '5' },
			{ tag: 'B', joins: 'A', size: 'Ø400', length: '4', flow: '40', outlet: '10', parts: 'tee branch' },
			{ tag: 'C', joins: 'A', size: 'Ø400', length: '6', flow: '360', outlet: '10', parts: 'tee straight' }
		];
		const { rows: uniting } = solved(rows);
		// 90 degrees, equal legs, q = 0.1: branch -0.494, straight 0.145 on the common leg (Idelchik 7-4).
		const pv = uniting.A?.velocityPressure ?? NaN;
		expect((uniting.B?.junctionLoss ?? NaN) / pv).toBeCloseTo(-0.494, 3);
		expect((uniting.C?.junctionLoss ?? NaN) / pv).toBeCloseTo(0.145, 3);
	});

	it('has one straight way at a node: a second one is told at its cell and does not count', () => {
		const [a, b, c] = DIVIDING as [TypedRow, TypedRow, TypedRow];
		const { solution, problems, uncounted } = solveSheet(sheetOf([a, { ...b, parts: 'tee straight' }, c]));
		expect(problems).toHaveLength(1);
		expect(problems[0]).toMatchObject({
			field: 'parts',
			message: 'Another row goes straight on at this junction already.'
		});
		expect(uncounted).toHaveLength(1);
		expect(Object.keys(solution?.rows ?? {})).toEqual(['A', 'B']);
	});

	it('is flagged, and costs nothing, where the row meets the fan', () => {
		const [a, b, c] = DIVIDING as [TypedRow, TypedRow, TypedRow];
		const { rows, flags } = solved([{ ...a, parts: 'tee branch' }, b, c]);
		expect(rows.A?.junctionLoss).toBe(0);
		expect(flags.map(({ rule, row }) => [rule, row])).toContainEqual(['junction-at-fan', 'A']);
	});
});
