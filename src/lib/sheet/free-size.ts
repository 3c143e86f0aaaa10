import type { RowSize } from '$lib/engine';
import { valueOf, type SheetRow } from './sheet';

/** The size that the air has in a row: a lining inside the metal takes its thickness twice. Null without a size, or where it is filled. */
export function freeSizeOf(row: SheetRow): RowSize | null {
	const size = valueOf(row, 'size');
	const lining = valueOf(row, 'lining');
	if (!size || lining?.sizeIs !== 'metal') return size;
	const taken = 2 * lining.thickness;
	const sides = size.shape === 'round' ? [size.diameter] : [size.width, size.height];
	// The engine’s own bound, with the last bits of a fraction left out.
	if (!(taken < Math.min(...sides) * (1 - 1e-6))) return null;
	if (size.shape === 'round') return { shape: 'round', diameter: size.diameter - taken };
	return { shape: size.shape, width: size.width - taken, height: size.height - taken };
}
