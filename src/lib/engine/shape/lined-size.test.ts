import { describe, expect, it } from 'vitest';
import { OutOfRangeError } from '../errors';
import { linedSize, sectionOf, type Size } from '.';

const METAL: readonly Size[] = [
	{ shape: 'round', diameter: 0.4 },
	{ shape: 'rectangular', width: 0.6, height: 0.3 },
	{ shape: 'oval', width: 0.6, height: 0.3 }
];

describe('the clear size of a lined duct', () => {
	it('is the one named, when it is named so', () => {
		for (const size of METAL) expect(linedSize(size, 0.025, 'clear')).toEqual(size);
	});

	it('is less by the liner on both sides, when the metal is named', () => {
		expect(linedSize({ shape: 'round', diameter: 0.5 }, 0.125, 'metal')).toEqual({ shape: 'round', diameter: 0.25 });
		expect(linedSize({ shape: 'rectangular', width: 0.75, height: 0.5 }, 0.125, 'metal')).toEqual({
			shape: 'rectangular',
			width: 0.5,
			height: 0.25
		});
	});

	it('is the metal itself without a liner', () => {
		for (const size of METAL) expect(linedSize(size, 0, 'metal')).toEqual(size);
	});

	// A band of even thickness along a convex wall: dA/ds = -P.
	it.each(METAL)('takes from a $shape section the area of the liner along its wall', (size) => {
		const s = 1e-6;
		const loss = sectionOf(size).area - sectionOf(linedSize(size, s, 'metal')).area;
		expect(loss / (sectionOf(size).perimeter * s)).toBeCloseTo(1, 4);
	});

	it('must leave free space', () => {
		for (const size of METAL) {
			expect(() => linedSize(size, 0.2, 'metal')).toThrow(OutOfRangeError);
			expect(() => linedSize(size, -0.01, 'metal')).toThrow(OutOfRangeError);
			expect(() => linedSize(size, NaN, 'clear')).toThrow(OutOfRangeError);
		}
	});
});
