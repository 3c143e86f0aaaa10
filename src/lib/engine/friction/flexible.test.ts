import { describe, expect, it } from 'vitest';
import published from '../../../../fixtures/published/friction.json';
import { OutOfRangeError } from '../errors';
import { flexibleCompressionFactor, flexibleStretchFactor } from '.';

const checks = published.checks.filter(({ topic }) => topic === 'friction.flex-compression');

describe('flexible duct as installed', () => {
	it('has published checks', () => expect(checks.length).toBe(3));

	it.each(checks)('meets $id, by $source', ({ inputs, expected, tolerance }) => {
		const { compression_percent = NaN, D_mm = NaN } = inputs as { compression_percent?: number; D_mm?: number };
		const { factor, note } = flexibleStretchFactor(D_mm / 1000, compression_percent / 100);
		expect(Math.abs(factor / Number(expected) - 1)).toBeLessThanOrEqual(tolerance.value);
		expect(note).toBeNull();
	});

	it('is the same factor by per cent and by fraction', () => {
		for (const D of [0.15, 0.25, 0.4])
			for (const K of [0, 4, 15, 30, 45])
				expect(flexibleStretchFactor(D, K / 100).factor).toBeCloseTo(flexibleCompressionFactor(K, D), 12);
	});

	it('is 1 when stretched, rises with compression and falls with the diameter', () => {
		for (const D of [0.1, 0.2, 0.5]) {
			expect(flexibleStretchFactor(D, 0)).toMatchObject({ factor: 1 });
			for (let K = 0; K < 0.55; K += 0.05) {
				const { factor } = flexibleStretchFactor(D, K);
				expect(flexibleStretchFactor(D, K + 0.05).factor).toBeGreaterThan(factor);
				expect(flexibleStretchFactor(D + 0.1, K + 0.05).factor).toBeLessThan(flexibleStretchFactor(D, K + 0.05).factor);
			}
		}
	});

	// Abstract of Abushakra, Walker & Sherman (2004): about four when moderately, close to ten when severely compressed.
	it('has the magnitudes of the measurements', () => {
		expect(flexibleStretchFactor(0.2, 0.15).factor).toBeGreaterThan(3.5);
		expect(flexibleStretchFactor(0.2, 0.15).factor).toBeLessThan(5);
		expect(flexibleStretchFactor(0.152, 0.3).factor).toBeCloseTo(9.2, 1);
	});

	it.each([
		[0.1, 0.1, '150 to 400 mm'],
		[0.5, 0.1, '150 to 400 mm'],
		[0.2, 0.35, '30 %'],
		[0.2, 0.5, '45 %']
	])('says what was not measured at %d m and %d', (D, K, words) =>
		expect(flexibleStretchFactor(D, K).note).toContain(words)
	);

	it('refuses what is no flexible duct', () => {
		expect(() => flexibleStretchFactor(0.2, -0.01)).toThrow(OutOfRangeError);
		expect(() => flexibleStretchFactor(0.2, 0.61)).toThrow(OutOfRangeError);
		expect(() => flexibleStretchFactor(0, 0.1)).toThrow(OutOfRangeError);
	});
});
