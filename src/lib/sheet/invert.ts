import type { UnitSystem } from '$lib/engine';
import type { Edit, SingleEdit, TypedCell } from './edit';
import { applyMany } from './apply';
import { entryOf, type Entry } from './entry';
import type { Cell, Sheet, SheetRow } from './sheet';
import { unitsOf } from './sheet';
import { storableText } from './storable-text';

type AnyCells = Readonly<Record<string, Cell<unknown> | undefined>>;
type SetEdit = Extract<SingleEdit, { kind: 'set' }>;

/**
 * The edit that undoes `edit` on `sheet`, the sheet before it: cells come back as they were typed. Null where there is
 * nothing to undo, as when all rows that it names are gone.
 */
export function inverseOf(sheet: Sheet, edit: Edit): Edit | null {
	const singles = edit.kind === 'batch' ? edit.edits : [edit];
	const inverses: SingleEdit[][] = [];
	let current = sheet;
	let sets: Entry[] = [];
	let cells = new CellsBefore(sheet);
	for (const single of singles) {
		const entry = entryOf(single);
		if (!entry) continue;
		// Runs of `set`, as a paste makes them, are applied in one pass.
		if (single.kind === 'set') {
			inverses.push(cells.inverseOf(single));
			sets.push(entry);
			continue;
		}
		current = applyMany(current, sets);
		sets = [];
		inverses.push(inverseOfRows(current, single));
		current = applyMany(current, [entry]);
		cells = new CellsBefore(current);
	}
	const edits = inverses.reverse().flat();
	const [only] = edits;
	if (!only) return null;
	return edits.length === 1 ? only : { kind: 'batch', edits };
}

/** The cells of a sheet as a run of `set` goes over them. */
class CellsBefore {
	readonly #settings: AnyCells;
	readonly #rows: ReadonlyMap<string, AnyCells>;
	readonly #units: UnitSystem;
	readonly #written = new Map<string, TypedCell | null>();

	constructor(sheet: Sheet) {
		this.#settings = sheet.settings;
		this.#rows = new Map(sheet.rows.map(({ id, cells }) => [id, cells]));
		this.#units = unitsOf(sheet);
	}

	inverseOf(edit: SetEdit): SingleEdit[] {
		const cells = edit.row === null ? this.#settings : this.#rows.get(edit.row);
		if (!cells) return [];
		const key = `${edit.row} ${edit.field}`;
		const written = this.#written.get(key);
		const old = written === undefined ? cells[edit.field] : written;
		const typed = storableText(edit.typed);
		this.#written.set(key, typed.trim() ? { typed, units: edit.units } : null);
		return [{ ...edit, typed: old?.typed ?? '', units: old?.units ?? this.#units }];
	}
}

function inverseOfRows(sheet: Sheet, edit: Exclude<SingleEdit, SetEdit>): SingleEdit[] {
	switch (edit.kind) {
		case 'insert': {
			const present = new Set(sheet.rows.map(({ id }) => id));
			const rows = [...new Set(edit.rows.map(({ id }) => id))].filter((id) => !present.has(id));
			return rows.length ? [{ kind: 'delete', rows }] : [];
		}
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
		if (run.length) edits.push(make(run.reverse(), before));
		run = [];
	};
	for (const row of [...sheet.rows].reverse()) {
		if (taken.has(row.id)) run.push(row);
		else {
			close();
			before = row.id;
		}
	}
	close();
	return edits;
}

function typedRow(row: SheetRow) {
	const cells: Record<string, TypedCell> = {};
	for (const [field, cell] of Object.entries(row.cells as AnyCells))
		if (cell) cells[field] = { typed: cell.typed, units: cell.units };
	return { id: row.id, cells };
}
