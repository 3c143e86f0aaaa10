import type { DesignDocument, DesignRow, Problem } from '../document/types';
import { treeProblems } from '../document/tree';
import { locate } from '../document/fault';

/** Rows as trees: places in the document's list of rows stand for the rows. */
export interface Network {
	readonly rows: readonly DesignRow[];
	/** Place of the row that each one joins; -1 where it meets the fan. */
	readonly parents: Int32Array;
	/** All places, each after the one it joins; the same whatever the order in the document. */
	readonly order: Int32Array;
	/** Of each row: whether another joins it. */
	readonly joined: Uint8Array;
}

export type BuildResult =
	{ readonly ok: true; readonly network: Network } | { readonly ok: false; readonly problems: readonly Problem[] };

/** Rows -> network. Rows that are no trees from the fan become problems; nothing is written into the document. */
export function buildNetwork(document: DesignDocument): BuildResult {
	const problems = treeProblems(document);
	if (problems.length > 0) return { ok: false, problems: locate(problems, document) };
	const { rows } = document;
	const places = new Map(rows.map((row, i) => [row.tag, i]));
	const parents = new Int32Array(rows.length).fill(-1);
	const joined = new Uint8Array(rows.length);
	rows.forEach((row, i) => {
		const parent = row.joins === null ? -1 : (places.get(row.joins) ?? -1);
		parents[i] = parent;
		if (parent >= 0) joined[parent] = 1;
	});
	return { ok: true, network: { rows, parents, order: orderOf(rows, parents), joined } };
}

/** From the fan outward, rows that join the same one by their tags: sums then run alike for any order of rows. */
function orderOf(rows: readonly DesignRow[], parents: Int32Array): Int32Array {
	const children: number[][] = rows.map(() => []);
	const roots: number[] = [];
	parents.forEach((parent, i) => (parent < 0 ? roots : (children[parent] ?? roots)).push(i));
	const byTag = (a: number, b: number) => ((rows[a]?.tag ?? '') < (rows[b]?.tag ?? '') ? -1 : 1);
	const order = new Int32Array(rows.length);
	let filled = 0;
	const append = (places: number[]) => {
		if (places.length > 1) places.sort(byTag);
		for (const place of places) order[filled++] = place;
	};
	append(roots);
	for (let next = 0; next < filled; next += 1) append(children[order[next] ?? 0] ?? []);
	return order;
}
