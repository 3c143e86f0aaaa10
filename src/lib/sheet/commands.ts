/** What the keys and buttons of the sheet do, as edits. Pure: sheet and selection in, edit out. */
import type { UnitSystem } from '$lib/engine';
import type { Edit, SingleEdit, TypedCell } from './edit';
import { ROW_READERS } from './fields';
import { linksOf } from './links';
import { newId } from './new-id';
import { byHeader, headerOf } from './paste-header';
import { valueOf, type Cell, type RowField, type Sheet, type SheetRow } from './sheet';

const together = (edits: SingleEdit[]): Edit | null => {
	const [only] = edits;
	return !only ? null : edits.length === 1 ? only : { kind: 'batch', edits };
};

/** Writes one cell. A tag that changes takes the rows that join it along, unless another row has the new tag. */
export function writeCell(sheet: Sheet, row: SheetRow, field: RowField, typed: string, units: UnitSystem): Edit | null {
	const set: SingleEdit = { kind: 'set', row: row.id, field, typed, units };
	if (field !== 'tag') return set;
	const reading = ROW_READERS.tag(typed, units);
	const [old, wanted] = [valueOf(row, 'tag'), reading.ok ? reading.value : ''];
	const tags = sheet.rows.map((one) => valueOf(one, 'tag'));
	const alone = tags.filter((tag) => tag === old).length === 1;
	if (old === null || !alone || !wanted || tags.includes(wanted)) return set;
	const followers = linksOf(sheet.rows).children.get(row.id) ?? [];
	return together([
		set,
		...followers.map(({ id }): SingleEdit => ({ kind: 'set', row: id, field: 'joins', typed: wanted, units }))
	]);
}

/** A new row with some cells, before another or at the end. */
export function newRow(cells: Partial<Record<RowField, string>>, units: UnitSystem, before: string | null) {
	const id = newId();
	const edit: Edit = { kind: 'insert', rows: [{ id, cells: typedCells(cells, units) }], before };
	return { id, edit };
}

/**
 * Writes a block from a cell to the right and down; rows that are lacking are added at the end. Where its first line
 * names columns, that line is left out and each column goes where it is named.
 */
export function pasteBlock(
	sheet: Sheet,
	at: { readonly row: number; readonly fields: readonly RowField[] },
	cells: readonly (readonly string[])[],
	units: UnitSystem
): Edit | null {
	const header = headerOf(cells);
	if (!header && !at.fields.length) return null;
	const edits: SingleEdit[] = [];
	const added: { id: string; cells: Record<string, TypedCell> }[] = [];
	cells.slice(header ? 1 : 0).forEach((line, down) => {
		const row = sheet.rows[at.row + down];
		const texts: readonly (readonly [RowField, string])[] = header
			? byHeader(header, line)
			: at.fields.slice(0, line.length).map((field, right) => [field, line[right] ?? ''] as const);
		if (row) for (const [field, typed] of texts) edits.push({ kind: 'set', row: row.id, field, typed, units });
		else added.push({ id: newId(), cells: typedCells(Object.fromEntries(texts), units) });
	});
	if (added.length) edits.push({ kind: 'insert', rows: added, before: null });
	return together(edits);
}

/** Clears a block of cells. */
export function clearCells(rows: readonly SheetRow[], fields: readonly RowField[], units: UnitSystem): Edit | null {
	return together(
		rows.flatMap((row) =>
			fields
				.filter((field) => row.cells[field])
				.map((field): SingleEdit => ({ kind: 'set', row: row.id, field, typed: '', units }))
		)
	);
}

/** Copies the first row of a block into those below it. */
export function fillDown(rows: readonly SheetRow[], fields: readonly RowField[], units: UnitSystem): Edit | null {
	const [from, ...below] = rows;
	if (!from) return null;
	return together(
		below.flatMap((row) =>
			fields.map((field): SingleEdit => {
				const cell = from.cells[field] as Cell<unknown> | undefined;
				return { kind: 'set', row: row.id, field, typed: cell?.typed ?? '', units: cell?.units ?? units };
			})
		)
	);
}

/** Moves rows up or down by one place. */
export function moveRows(sheet: Sheet, rows: readonly SheetRow[], by: 1 | -1): Edit | null {
	const places = rows.map((row) => sheet.rows.indexOf(row)).sort((a, b) => a - b);
	const [first, last] = [places[0], places.at(-1)];
	if (first === undefined || last === undefined) return null;
	const ids = places.flatMap((place) => sheet.rows[place]?.id ?? []);
	if (by < 0) {
		const before = sheet.rows[first - 1];
		return before ? { kind: 'move', rows: ids, before: before.id } : null;
	}
	return sheet.rows[last + 1] ? { kind: 'move', rows: ids, before: sheet.rows[last + 2]?.id ?? null } : null;
}

/** Sets the rows in the order of the tree, from the fan outward. Null when they stand so already. */
export function arrangeFromFan(sheet: Sheet): Edit | null {
	const { fromFan } = linksOf(sheet.rows);
	const reached = new Set(fromFan);
	const order = [...fromFan, ...sheet.rows.filter((row) => !reached.has(row))].map(({ id }) => id);
	if (order.every((id, at) => id === sheet.rows[at]?.id)) return null;
	return { kind: 'move', rows: order, before: null };
}

function typedCells(cells: Partial<Record<RowField, string>>, units: UnitSystem): Record<string, TypedCell> {
	return Object.fromEntries(
		Object.entries(cells).flatMap(([field, typed]) => (typed?.trim() ? [[field, { typed, units }]] : []))
	);
}
