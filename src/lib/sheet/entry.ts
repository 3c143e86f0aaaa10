/** An entry of the edit log: an edit with its cells as they were understood when it was accepted. */
import type { UnitSystem } from '$lib/engine';
import type { Edit, SingleEdit, TypedCell } from './edit';
import { isRowField, isSettingField, ROW_READERS, SETTING_READERS } from './fields';
import type { Cell, RowCells, RowField, Sheet, SheetRow, SettingField } from './sheet';
import { storableText } from './storable-text';

export type Entry =
	| {
			readonly kind: 'set';
			readonly row: string | null;
			readonly field: RowField | SettingField;
			readonly cell: Cell<unknown> | null;
	  }
	| { readonly kind: 'insert'; readonly rows: readonly SheetRow[]; readonly before: string | null }
	| { readonly kind: 'delete'; readonly rows: readonly string[] }
	| { readonly kind: 'move'; readonly rows: readonly string[]; readonly before: string | null }
	| { readonly kind: 'batch'; readonly entries: readonly Entry[] }
	| { readonly kind: 'replace'; readonly sheet: Sheet; readonly from: string };

/** An entry with its place in the log. */
export interface LoggedEntry {
	readonly seq: number;
	readonly id: string;
	readonly entry: Entry;
}

/** The cell that a typed text makes; null for a blank. */
export function cellOf(row: boolean, field: string, text: string, units: UnitSystem): Cell<unknown> | null {
	const typed = storableText(text);
	if (typed.trim() === '') return null;
	const reading = row
		? isRowField(field) && ROW_READERS[field](typed, units)
		: isSettingField(field) && SETTING_READERS[field]?.(typed, units);
	return { typed, units, value: reading && reading.ok ? reading.value : null };
}

function cellsOf(cells: Record<string, TypedCell>): RowCells {
	const read: Record<string, Cell<unknown>> = {};
	for (const [field, { typed, units }] of Object.entries(cells)) {
		const cell = isRowField(field) ? cellOf(true, field, typed, units) : null;
		if (cell) read[field] = cell;
	}
	return read as RowCells;
}

function entryOfSingle(edit: SingleEdit): Entry | null {
	switch (edit.kind) {
		case 'set': {
			if (edit.row === null ? !isSettingField(edit.field) : !isRowField(edit.field)) return null;
			const cell = cellOf(edit.row !== null, edit.field, edit.typed, edit.units);
			return { kind: 'set', row: edit.row, field: edit.field as RowField | SettingField, cell };
		}
		case 'insert':
			return { ...edit, rows: edit.rows.map(({ id, cells }) => ({ id, cells: cellsOf(cells) })) };
		case 'delete':
		case 'move':
			return edit;
	}
}

/** Reads the typed texts of an edit. Null when it names a column or setting that does not exist. */
export function entryOf(edit: Edit): Entry | null {
	if (edit.kind !== 'batch') return entryOfSingle(edit);
	const entries = edit.edits.map(entryOfSingle);
	return entries.some((entry) => entry === null) ? null : { kind: 'batch', entries: entries as Entry[] };
}
