import type { Path } from '../document/types';
import type { Network } from './network';

/** Greatest requirement of each side of the fan [Pa]; null without a path. `return` is all that is not supply. */
export interface Required {
	readonly supply: number | null;
	readonly return: number | null;
}

export interface PathsResult {
	readonly paths: readonly Path[];
	readonly required: Required;
	readonly index: { readonly supply: string | null; readonly return: string | null };
	/** Of each row: the least spare of all paths through it [Pa]. */
	readonly spares: Float64Array;
}

type HalfKey = 'supply' | 'return';

/**
 * What each path asks of the fan, the index path of each side, and what the others have to spare.
 *
 * @param along sum of the losses from the fan to the far end of each row [Pa]
 */
export function pathsOf(network: Network, along: Float64Array): PathsResult {
	const { rows, parents, order, joined } = network;
	const required: Record<HalfKey, number | null> = { supply: null, return: null };
	const index: Record<HalfKey, string | null> = { supply: null, return: null };
	// In the order of the tree, so that of equal paths the same one governs for any order of rows.
	for (let i = 0; i < order.length; i += 1) {
		const place = order[i] ?? 0;
		const row = rows[place];
		if (row === undefined || joined[place] === 1) continue;
		const half = row.side === 'supply' ? 'supply' : 'return';
		const requirement = requirementOf(network, along, place);
		const greatest = required[half];
		if (greatest !== null && requirement <= greatest) continue;
		required[half] = requirement;
		index[half] = row.tag;
	}

	const spares = new Float64Array(rows.length).fill(Infinity);
	const paths: Path[] = [];
	rows.forEach((row, place) => {
		if (joined[place] === 1) return;
		const greatest = required[row.side === 'supply' ? 'supply' : 'return'] ?? 0;
		const spare = greatest - requirementOf(network, along, place) + 0;
		spares[place] = spare;
		paths.push({
			outlet: row.tag,
			side: row.side,
			rows: tagsFromFan(network, place),
			loss: (along[place] ?? 0) + 0,
			roomPressure: row.outlet?.pressure ?? 0,
			spare
		});
	});
	for (let i = order.length - 1; i >= 0; i -= 1) {
		const place = order[i] ?? 0;
		const parent = parents[place] ?? -1;
		if (parent >= 0) spares[parent] = Math.min(spares[parent] ?? Infinity, spares[place] ?? Infinity);
	}
	return { paths, required, index, spares };
}

/** Sum of the losses from the fan to the far end of each row [Pa]. */
export function lossesFromFan({ parents, order }: Network, losses: Float64Array): Float64Array {
	const along = new Float64Array(losses.length);
	for (let i = 0; i < order.length; i += 1) {
		const place = order[i] ?? 0;
		const parent = parents[place] ?? -1;
		along[place] = (parent < 0 ? 0 : (along[parent] ?? 0)) + (losses[place] ?? 0);
	}
	return along;
}

/** A room under pressure asks more of a supply fan, and less of one that draws from it. */
function requirementOf({ rows }: Network, along: Float64Array, place: number): number {
	const row = rows[place];
	const pressure = row?.outlet?.pressure ?? 0;
	return (along[place] ?? 0) + (row?.side === 'supply' ? pressure : -pressure);
}

function tagsFromFan({ rows, parents }: Network, place: number): string[] {
	let depth = 0;
	for (let at = place; at >= 0; at = parents[at] ?? -1) depth += 1;
	const tags = new Array<string>(depth);
	for (let at = place; at >= 0; at = parents[at] ?? -1) tags[(depth -= 1)] = rows[at]?.tag ?? '';
	return tags;
}
