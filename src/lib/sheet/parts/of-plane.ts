import type { CatalogueEntry, RowSize } from '$lib/engine';
import type { PartFitting } from './parts';

/** The side in the plane of a bend, as an oval's elbows have it: easy with the short axis there, hard with the long one. */
export function ofPlane(typed: PartFitting['parameters'], entry: CatalogueEntry, size: RowSize) {
	const { plane, ...rest } = typed;
	if (plane === undefined || size.shape === 'round' || !entry.parameters.some(({ name }) => name === 'bend'))
		return typed;
	const [there, other] = plane === 'width' ? [size.width, size.height] : [size.height, size.width];
	return { ...rest, bend: there > other ? 'hard' : 'easy' };
}
