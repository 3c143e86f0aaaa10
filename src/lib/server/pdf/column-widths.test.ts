import fc from 'fast-check';
import { expect, it } from 'vitest';
import { columnWidths, figureWidth } from './column-widths';
import { CELL_SIDE } from './grid';

const figures = fc.array(
	fc.integer({ min: 0, max: 99_999 }).map((value) => (value / 10).toFixed(1)),
	{ minLength: 1, maxLength: 8 }
);

it('leaves every figure the room that it needs, and fills the width', () => {
	fc.assert(
		fc.property(fc.array(figures, { minLength: 1, maxLength: 16 }), (columns) => {
			const all = columns.map((texts) => ({ head: 'Rate', texts, holds: 'figures' }) as const);
			const { widths, fontSize } = columnWidths(
				[{ head: 'Serves', texts: [], holds: 'rest', least: 50 }, ...all],
				764,
				8.6
			);
			expect(widths.reduce((sum, one) => sum + one, 0)).toBeCloseTo(764, 6);
			columns.forEach((texts, place) =>
				texts.forEach((text) =>
					expect((widths[place + 1] ?? 0) - 2 * CELL_SIDE).toBeGreaterThanOrEqual(figureWidth(text, fontSize))
				)
			);
		})
	);
});

it('takes smaller type where the figures need it', () => {
	const columns = Array.from({ length: 16 }, () => ({ head: 'Rate', texts: ['123 456.7'], holds: 'figures' }) as const);
	expect(columnWidths(columns, 764, 8.6).fontSize).toBeLessThan(8.6);
});
