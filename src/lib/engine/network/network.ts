import type { DesignDocument, DesignRow, Problem } from '../document/types';
import { readTree } from '../document/tree';
import { locate } from '../document/fault';
import { linedSize } from '../shape';

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
	const { parents, problems } = readTree(document);
	if (problems.length > 0) return { ok: false, problems: locate(problems, document) };
	const rows = document.rows.map(clearOf);
	const joined = new Uint8Array(rows.length);
	for (const parent of parents) if (parent >= 0) joined[parent] = 1;
	return { ok: true, network: { rows, parents, order: orderOf(rows, parents), joined } };
}

/** A lined row with the size that the air has; every other as it is. */
function clearOf(row: DesignRow): DesignRow {
	return row.lining === undefined
		? row
		: { ...row, size: linedSize(row.size, row.lining.thickness, row.lining.sizeIs) };
}

/** From the fan outward, rows that join the same one by their tags: sums then run alike for any order of rows. */
function orderOf(rows: readonly DesignRow[], parents: Int32Array): Int32Array {
	const fan = rows.length;
	const firstChild = new Int32Array(rows.length + 1).fill(-1);
	const nextChild = new Int32Array(rows.length).fill(-1);
	for (let i = rows.length - 1; i >= 0; i -= 1) {
		const parent = parents[i] ?? -1;
		const under = parent < 0 ? fan : parent;
		nextChild[i] = firstChild[under] ?? -1;
		firstChild[under] = i;
	}
	const byTag = (a: number, b: number) => ((rows[a]?.tag ?? '') < (rows[b]?.tag ?? '') ? -1 : 1);
	const order = new Int32Array(rows.length);
	let filled = 0;
	const append = (parent: number) => {
		const start = filled;
		for (let child = firstChild[parent] ?? -1; child >= 0; child = nextChild[child] ?? -1) order[filled++] = child;
		if (filled - start > 1) order.subarray(start, filled).sort(byTag);
	};
	append(fan);
	for (let next = 0; next < filled; next += 1) append(order[next] ?? 0);
	return order;
}
