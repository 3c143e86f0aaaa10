import type { Entry } from './entry';
import type { Cell, Sheet, SheetRow } from './sheet';

/**
 * The sheet after an entry; the old one is left as it was. Total: an entry that names a row which is no longer
 * there does what can still be done, since the order of the log decides between people.
 */
export function applyEntry(sheet: Sheet, entry: Entry): Sheet {
	switch (entry.kind) {
		case 'set':
			return entry.row === null
				? { ...sheet, settings: withCell(sheet.settings, entry.field, entry.cell) }
				: { ...sheet, rows: withRowCell(sheet.rows, entry.row, entry.field, entry.cell) };
		case 'insert': {
			const present = new Set(sheet.rows.map(({ id }) => id));
			const isNew = ({ id }: SheetRow) => !present.has(id) && present.add(id);
			return {
				...sheet,
				rows: insertBefore(sheet.rows, entry.rows.filter(isNew), entry.before)
			};
		}
		case 'delete': {
			const gone = new Set(entry.rows);
			return { ...sheet, rows: sheet.rows.filter(({ id }) => !gone.has(id)) };
		}
		case 'move': {
			const moved = new Set(entry.rows);
			const rows = sheet.rows.filter(({ id }) => moved.has(id));
			const rest = sheet.rows.filter(({ id }) => !moved.has(id));
			const byId = new Map(rows.map((row) => [row.id, row]));
			const ordered = [...moved].flatMap((id) => byId.get(id) ?? []);
			return { ...sheet, rows: insertBefore(rest, ordered, entry.before) };
		}
		case 'batch':
			return applyMany(sheet, entry.entries);
		case 'replace':
			return entry.sheet;
	}
}

/** Entries in their order. Runs of `set` on rows, as a paste makes them, are applied in one pass. */
export function applyMany(sheet: Sheet, entries: readonly Entry[]): Sheet {
	let result = sheet;
	let place: Map<string, number> | null = null;
	let rows: SheetRow[] | null = null;
	for (const entry of entries) {
		if (entry.kind === 'set' && entry.row !== null) {
			rows ??= [...result.rows];
			place ??= new Map(rows.map(({ id }, at) => [id, at]));
			const at = place.get(entry.row);
			const row = at === undefined ? undefined : rows[at];
			if (row && at !== undefined) rows[at] = { ...row, cells: withCell(row.cells, entry.field, entry.cell) };
			continue;
		}
		if (entry.kind === 'set') {
			// A setting touches no row, so that the run goes on behind it.
			result = { ...result, settings: withCell(result.settings, entry.field, entry.cell) };
			continue;
		}
		if (rows) result = { ...result, rows };
		rows = place = null;
		result = applyEntry(result, entry);
	}
	return rows ? { ...result, rows } : result;
}

function withCell<C extends object>(cells: C, field: string, cell: Cell<unknown> | null): C {
	const { [field]: _old, ...rest } = cells as Record<string, unknown>;
	return (cell === null ? rest : { ...rest, [field]: cell }) as C;
}

function withRowCell(rows: readonly SheetRow[], id: string, field: string, cell: Cell<unknown> | null) {
	return rows.map((row) => (row.id === id ? { ...row, cells: withCell(row.cells, field, cell) } : row));
}

function insertBefore(rows: readonly SheetRow[], added: readonly SheetRow[], before: string | null) {
	const at = before === null ? -1 : rows.findIndex(({ id }) => id === before);
	return at < 0 ? [...rows, ...added] : [...rows.slice(0, at), ...added, ...rows.slice(at)];
}
