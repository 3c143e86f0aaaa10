import type { DesignDocument, DesignRow, Solution } from '$lib/engine';

/** Rows in the order of the tree, from the fan outward, branches in the order in which they were entered. */
export function rowsFromFan(document: DesignDocument): DesignRow[] {
	const joining = new Map<string | null, DesignRow[]>();
	for (const row of document.rows) {
		const siblings = joining.get(row.joins);
		if (siblings) siblings.push(row);
		else joining.set(row.joins, [row]);
	}
	const ordered: DesignRow[] = [];
	const waiting = [...(joining.get(null) ?? [])].reverse();
	for (let row = waiting.pop(); row !== undefined; row = waiting.pop()) {
		ordered.push(row);
		waiting.push(...[...(joining.get(row.tag) ?? [])].reverse());
	}
	return ordered;
}

/** Tags of the rows on the index path of either side. */
export function indexRows(solution: Solution): ReadonlySet<string> {
	const outlets = [solution.index.supply, solution.index.return];
	return new Set(solution.paths.filter(({ outlet }) => outlets.includes(outlet)).flatMap(({ rows }) => rows));
}

/** What a path asks of the fan [Pa]: its loss, and the pressure of its room against the outside. */
export function requirementOf(path: Solution['paths'][number]): number {
	return path.side === 'supply' ? path.loss + path.roomPressure : path.loss - path.roomPressure;
}

/** Room, or name of the outlet, that a row serves. */
export function servesOf(row: DesignRow | undefined): string {
	return (row?.serves ?? row?.outlet?.name ?? '').trim();
}
