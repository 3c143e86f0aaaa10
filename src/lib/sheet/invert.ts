import type { UnitSystem } from '$lib/engine';
import type { Edit, SingleEdit, TypedCell } from './edit';
import { applyEntry } from './apply';
import { entryOf } from './entry';
import type { Cell, Sheet, SheetRow } from './sheet';
import { unitsOf } from './sheet';

type AnyCells = Readonly<Record<string, Cell<unknown> | undefined>>;

/** The edit that undoes `edit` on `sheet`, the sheet before it: cells come back as they were typed. */
export function inverseOf(sheet: Sheet, edit: Edit): Edit {
	if (edit.kind !== 'batch') return flat(inverseOfSingle(sheet, edit));
	const inverses: SingleEdit[] = [];
	let current = sheet;
	for (const single of edit.edits) {
		inverses.unshift(...inverseOfSingle(current, single));
		const entry = entryOf(single);
		if (entry) current = applyEntry(current, entry);
	}
	return flat(inverses);
}

const flat = (edits: SingleEdit[]): Edit => {
	const [only] = edits;
	return edits.length === 1 && only ? only : { kind: 'batch', edits };
};

function inverseOfSingle(sheet: Sheet, edit: SingleEdit): SingleEdit[] {
	switch (edit.kind) {
		case 'set': {
			const cells: AnyCells = edit.row === null ? sheet.settings : (rowOf(sheet, edit.row)?.cells ?? {});
			const old = cells[edit.field];
			return [{ ...edit, typed: old?.typed ?? '', units: old?.units ?? unitsOf(sheet) }];
		}
		case 'insert':
			return [{ kind: 'delete', rows: edit.rows.map(({ id }) => id) }];
		case 'delete':
			return backInPlace(sheet, edit.rows, (rows, before) => ({ kind: 'insert', rows: rows.map(typedRow), before }));
		case 'move':
			return backInPlace(sheet, edit.rows, (rows, before) => ({
				kind: 'move',
				rows: rows.map(({ id }) => id),
				before
			}));
	}
}

/** Rows that stood together come back together, before the first row after them that stayed; last runs first. */
function backInPlace(
	sheet: Sheet,
	ids: readonly string[],
	make: (rows: SheetRow[], before: string | null) => SingleEdit
) {
	const taken = new Set(ids);
	const edits: SingleEdit[] = [];
	let run: SheetRow[] = [];
	let before: string | null = null;
	const close = () => {
		if (run.length) edits.push(make(run, before));
		run = [];
	};
	for (const row of [...sheet.rows].reverse()) {
		if (taken.has(row.id)) run.unshift(row);
		else {
			close();
			before = row.id;
		}
	}
	close();
	return edits;
}

const rowOf = (sheet: Sheet, id: string) => sheet.rows.find((row) => row.id === id);

function typedRow(row: SheetRow) {
	const cells: Record<string, TypedCell> = {};
	for (const [field, cell] of Object.entries(row.cells as AnyCells))
		if (cell) cells[field] = { typed: cell.typed, units: cell.units as UnitSystem };
	return { id: row.id, cells };
}
