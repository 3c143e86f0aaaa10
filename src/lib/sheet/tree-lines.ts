/** The tree of ducts that is drawn in the first column: for each row its depth and the lines that cross it. */
import { linksOf } from './links';
import { valueOf, type SheetRow } from './sheet';

export interface TreeLine {
	readonly depth: number;
	/** Where the parent's trunk comes from; null where the row's link is at fault. */
	readonly from: 'above' | 'below' | null;
	/** Depths whose trunks run through the whole height of this row. */
	readonly through: readonly number[];
	/** Of those, the ones on the index path. */
	readonly indexThrough: readonly number[];
	/** The parent's trunk goes on past this row. */
	readonly goesOn: boolean;
	/** The index path goes on past this row along the parent's trunk. */
	readonly indexGoesOn: boolean;
	/** Rows below, or above, hang on this row's own trunk. */
	readonly ownBelow: boolean;
	readonly ownAbove: boolean;
	/** The index path leaves along this row's own trunk. */
	readonly indexBelow: boolean;
}

interface Span {
	top: number;
	bottom: number;
	indexTop: number;
	indexBottom: number;
}

/** Lines of all rows, in the order of the rows. The fan stands above the first one. */
export function treeLines(rows: readonly SheetRow[], onIndex: (row: SheetRow) => boolean): TreeLine[] {
	const { parent, fromFan } = linksOf(rows);
	const place = new Map(rows.map(({ id }, at) => [id, at]));
	const depth = new Map<string, number>();
	for (const row of fromFan) {
		const above = parent.get(row.id);
		depth.set(row.id, above ? (depth.get(above.id) ?? 0) + 1 : 0);
	}
	const spans = new Map<number, Span>();
	rows.forEach((row, at) => {
		const above = parent.get(row.id);
		if (above === undefined) return;
		const start = above ? (place.get(above.id) ?? -1) : -1;
		const span = spans.get(start) ?? { top: start, bottom: start, indexTop: start, indexBottom: start };
		span.top = Math.min(span.top, at);
		span.bottom = Math.max(span.bottom, at);
		if (onIndex(row)) {
			span.indexTop = Math.min(span.indexTop, at);
			span.indexBottom = Math.max(span.indexBottom, at);
		}
		spans.set(start, span);
	});
	const through: number[][] = rows.map(() => []);
	const indexThrough: number[][] = rows.map(() => []);
	const laneOf = (start: number) => (start < 0 ? 0 : (depth.get(rows[start]?.id ?? '') ?? 0) + 1);
	for (const [start, { top, bottom, indexTop, indexBottom }] of spans)
		for (let at = Math.max(0, top + 1); at < bottom; at++) {
			if (at === start || parentPlace(at) === start) continue;
			through[at]?.push(laneOf(start));
			if (at > indexTop && at < indexBottom) indexThrough[at]?.push(laneOf(start));
		}
	function parentPlace(at: number): number | null {
		const above = parent.get(rows[at]?.id ?? '');
		return above === undefined ? null : above ? (place.get(above.id) ?? null) : -1;
	}
	return rows.map((row, at) => {
		const start = parentPlace(at);
		const around = start === null ? undefined : spans.get(start);
		const own = spans.get(at);
		const below = start !== null && start > at;
		return {
			depth: depth.get(row.id) ?? 0,
			from: start === null ? null : below ? 'below' : 'above',
			through: [...new Set(through[at])],
			indexThrough: [...new Set(indexThrough[at])],
			goesOn: around !== undefined && (below ? around.top < at : around.bottom > at),
			indexGoesOn: around !== undefined && (below ? around.indexTop < at : around.indexBottom > at),
			ownBelow: own !== undefined && own.bottom > at,
			ownAbove: own !== undefined && own.top < at,
			indexBelow: own !== undefined && own.indexBottom > at
		};
	});
}

const same = (a: TreeLine, b: TreeLine | undefined) => b !== undefined && JSON.stringify(a) === JSON.stringify(b);
const sameCells = (a: SheetRow, b: SheetRow | undefined) =>
	a === b || (b !== undefined && a.id === b.id && a.cells.tag === b.cells.tag && a.cells.joins === b.cells.joins);

/**
 * Draws the lines anew only where tags, links, their order or the index path have changed, and hands on the line that a
 * row had before where it is still the same, so that the row is not drawn anew.
 */
export function linesKept(): (rows: readonly SheetRow[], onIndex: ReadonlySet<string>) => readonly TreeLine[] {
	let lastRows: readonly SheetRow[] = [];
	let lastIndex: ReadonlySet<string> = new Set();
	let last: readonly TreeLine[] = [];
	return (rows, onIndex) => {
		const sameRows = rows.length === lastRows.length && rows.every((row, at) => sameCells(row, lastRows[at]));
		lastRows = rows;
		if (sameRows && sameMembers(onIndex, lastIndex)) return last;
		lastIndex = onIndex;
		const lines = treeLines(rows, (row) => onIndex.has(valueOf(row, 'tag') ?? ''));
		return (last = lines.map((line, at) => (same(line, last[at]) ? (last[at] ?? line) : line)));
	};
}

export const sameMembers = (a: ReadonlySet<string>, b: ReadonlySet<string>): boolean =>
	a === b || (a.size === b.size && [...a].every((one) => b.has(one)));
