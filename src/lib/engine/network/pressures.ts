import type { Network } from './network';

/** Total pressures at both ends of each row [Pa], gauge. */
export interface Pressures {
	readonly fanEnd: Float64Array;
	readonly farEnd: Float64Array;
}

/**
 * Pressure line with the duty just met: supply falls from its requirement, the other side rises from minus its own.
 * A row starts from the far end of the one it joins; the loss of the junction is the joining row's.
 */
export function pressuresOf(
	{ rows, parents, order }: Network,
	losses: Float64Array,
	required: { readonly supply: number | null; readonly return: number | null }
): Pressures {
	const fanEnd = new Float64Array(rows.length);
	const farEnd = new Float64Array(rows.length);
	for (const place of order) {
		const supply = rows[place]?.side === 'supply';
		const parent = parents[place] ?? -1;
		const atFan = supply ? (required.supply ?? 0) : 0 - (required.return ?? 0);
		const start = parent < 0 ? atFan : (farEnd[parent] ?? 0);
		const loss = losses[place] ?? 0;
		fanEnd[place] = start;
		farEnd[place] = supply ? start - loss : start + loss;
	}
	return { fanEnd, farEnd };
}
