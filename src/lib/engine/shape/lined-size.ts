import { requireInRange } from '../errors';
import type { Size } from './size';

/** What the size of a lined duct means: the free space inside the liner, or the inside of the metal around it. */
export type LinedBasis = 'clear' | 'metal';

function leastOf(size: Size): number {
	return size.shape === 'round' ? size.diameter : Math.min(size.width, size.height);
}

/**
 * Clear inside size of a lined duct, the one that air flows through.
 *
 *   clear = metal - 2 s, on each side or on the diameter
 *
 * @param size as named: clear, or inside the metal [m]
 * @param thickness s of the liner [m], from 0 to less than half the least side of the metal
 * @param basis which size is named, clear or metal
 * @returns clear inside size [m]
 * @throws {OutOfRangeError} when the thickness is negative or leaves no free space
 * @source Plane geometry; a lined flat oval stays a flat oval
 * @check none: geometry, tested in lined-size.test.ts
 */
export function linedSize(size: Size, thickness: number, basis: LinedBasis): Size {
	if (basis === 'clear') {
		requireInRange('linedSize', 'thickness', thickness, { min: 0, max: Number.MAX_VALUE });
		return size;
	}
	requireInRange('linedSize', 'thickness', thickness, { min: 0, max: (leastOf(size) / 2) * (1 - 1e-9) });
	const both = 2 * thickness;
	if (size.shape === 'round') return { shape: 'round', diameter: size.diameter - both };
	return { shape: size.shape, width: size.width - both, height: size.height - both };
}
