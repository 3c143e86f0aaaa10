import { quoted, type Flag, type Reading } from '$lib/engine';
import { readBlock, writeBlock } from './clipboard';
import { textToCopy, textToEdit } from './cell-text';
import { COLUMNS, type Column } from './columns';
import * as commands from './commands';
import { END_FIELDS } from './design-document';
import { doubtsOf } from './doubts';
import type { Edit } from './edit';
import { isRowField, ROW_READERS } from './fields';
import type { OpenSheet } from './open-sheet.svelte';
import { Selection } from './selection.svelte';
import { MOST_ROWS, valueOf, type RowField, type SheetRow } from './sheet';
import type { SheetProblem } from './sheet-problem';
import { MOST_TYPED } from './storable-text';
import { sameMembers } from './tree-lines';

export interface Editing {
	/** Where the row stands now. */
	readonly row: number;
	/** The row itself, wherever others move it; null on the blank line. */
	readonly id: string | null;
	readonly field: RowField;
	readonly text: string;
	/** `replace`: typed over the cell, arrows leave it; `amend`: arrows move in the text. */
	readonly mode: 'replace' | 'amend';
}

/** The gravest first. */
const GRAVITY = { fault: 0, caution: 1, note: 2 } as const;

/** What the grid needs of a sheet: the open one, or a saved version that only shows. */
export type GridSource = Pick<
	OpenSheet,
	'sheet' | 'units' | 'solved' | 'whatIf' | 'isConfirmed' | 'mayUndo' | 'mayRedo' | 'do' | 'undo' | 'redo' | 'tryOut'
>;

/** One and the same for every row that has nothing to say, so that it is not drawn anew. */
export const NONE: readonly never[] = [];

/** The run sheet under a person's hands: selection, editing, clipboard, and what each row has to say. */
export class RunGrid {
	readonly open: GridSource;
	readonly selection: Selection;
	readonly mayEdit: boolean;
	#editing = $state.raw<Editing | null>(null);
	#optional = $state.raw<ReadonlySet<string>>(new Set());
	#notice = $state.raw({ text: '', row: 0, column: 0 });

	constructor(open: GridSource, mayEdit: boolean) {
		this.open = open;
		this.mayEdit = mayEdit;
		this.selection = new Selection({ rows: () => this.rows.length - (mayEdit ? 0 : 1), columns: () => this.columns });
	}

	get rows(): readonly SheetRow[] {
		return this.open.sheet.rows;
	}
	readonly columns: readonly Column[] = $derived.by(() =>
		COLUMNS.filter(({ key, optional }) => !optional || this.#optional.has(key))
	);
	get optional() {
		return this.#optional;
	}
	/** Told to the person, until the hands go on: a refused paste and the like. */
	get notice(): string {
		const { text, row, column } = this.#notice;
		const { active } = this.selection;
		return active.row === row && active.column === column ? text : '';
	}
	set notice(text: string) {
		this.#notice = { ...this.selection.active, text };
	}
	get editing(): Editing | null {
		const now = this.#editing;
		return now && { ...now, row: this.#placeOf(now) };
	}
	/** The active row; undefined on the blank line. */
	get activeRow(): SheetRow | undefined {
		return this.rows[this.selection.active.row];
	}
	get activeField(): RowField | null {
		const key = this.columns[this.selection.active.column]?.key ?? '';
		return isRowField(key) ? key : null;
	}

	readonly problemsOf = $derived.by(() => groupBy(this.open.solved.problems, ({ row }) => row ?? ''));
	readonly flagsOf = $derived.by(() => {
		const flags = [...(this.open.solved.solution?.flags ?? [])];
		return groupBy(
			flags.sort((a, b) => GRAVITY[a.severity] - GRAVITY[b.severity]),
			({ row }) => row ?? ''
		);
	});
	#lastIndex: ReadonlySet<string> = new Set();
	/** Tags of the rows on the index paths. */
	readonly onIndex: ReadonlySet<string> = $derived.by(() => {
		const solution = this.open.solved.solution;
		const ends = [solution?.index.supply, solution?.index.return];
		const now = new Set(solution?.paths.filter(({ outlet }) => ends.includes(outlet)).flatMap(({ rows }) => rows));
		return sameMembers(now, this.#lastIndex) ? this.#lastIndex : (this.#lastIndex = now);
	});

	/** What is to be mended in a row. */
	problems(row: SheetRow): readonly SheetProblem[] {
		return this.problemsOf.get(row.id) ?? NONE;
	}
	/** What is to be looked at in a row, gravest first. */
	flags(row: SheetRow): readonly Flag[] {
		return this.flagsOf.get(valueOf(row, 'tag') ?? '') ?? NONE;
	}

	showColumn(key: string, shown: boolean): void {
		const next = new Set(this.#optional);
		if (shown) next.add(key);
		else next.delete(key);
		this.#optional = next;
	}

	/** Opens the editor on the active cell. */
	edit(text: string | null): void {
		const field = this.activeField;
		const refusal = this.#refusal();
		if (refusal || !field) {
			this.notice = refusal;
			return;
		}
		const row = this.activeRow;
		const kept = row ? textToEdit(row, field, this.open.units) : '';
		this.#editing = {
			row: this.selection.active.row,
			id: row?.id ?? null,
			field,
			text: text ?? kept,
			mode: text === null ? 'amend' : 'replace'
		};
		this.type(this.#editing.text);
	}

	/** Why the active cell takes no text; blank where it does. */
	#refusal(): string {
		const [field, row] = [this.activeField, this.activeRow];
		if (!this.mayEdit) return 'You may read this sheet, not write in it.';
		if (!field) return 'This column is computed.';
		if (this.isWritable(row, field)) return '';
		const tag = row ? valueOf(row, 'tag') : '';
		return `Rows join ${tag}: its ${field === 'flow' ? 'flow is their sum' : 'end is not an outlet'}. Type at the ends of the run.`;
	}

	/** Flow, outlet and room belong to the ends of runs; what stands in the middle already can still be taken out. */
	isWritable(row: SheetRow | undefined, field: RowField): boolean {
		if (!END_FIELDS.some((one) => one === field) || !row || row.cells[field]) return true;
		const tag = valueOf(row, 'tag');
		return tag === null || !this.joined.has(tag);
	}
	readonly joined = $derived.by(() => new Set(this.rows.map((row) => valueOf(row, 'joins'))));

	/** Takes the text of the editor and computes what it would do. */
	type(text: string): void {
		if (!this.#editing) return;
		this.#editing = { ...this.#editing, text };
		const edit = this.reading?.ok ? this.#editOf(this.#editing) : null;
		this.open.tryOut(edit);
	}

	/** How the text in the editor is read; null while it is blank. */
	get reading(): Reading<unknown> | null {
		const now = this.#editing;
		return now && now.text.trim() ? ROW_READERS[now.field](now.text, this.open.units) : null;
	}

	/** From typing over, where arrows leave the cell, to amending, where they move in its text, and back. */
	switchMode(): void {
		const now = this.#editing;
		if (now) this.#editing = { ...now, mode: now.mode === 'amend' ? 'replace' : 'amend' };
	}

	/** Writes the text into its cell, if it differs, and closes the editor. False where no cell can hold the text. */
	accept(): boolean {
		const now = this.#editing;
		if (now && now.text.length > MOST_TYPED) {
			this.notice = `This text has ${now.text.length} characters; a cell holds at most ${MOST_TYPED}.`;
			return false;
		}
		this.leave();
		if (!now) return true;
		const row = this.#rowOf(now);
		const before = row ? textToEdit(row, now.field, this.open.units) : '';
		const isReadNow = row?.cells[now.field]?.value === null && now.text.trim() !== '' && this.#reads(now);
		if (now.text !== before || isReadNow) this.#do(this.#editOf(now));
		if (now.id !== null && !row)
			this.notice = `The row was deleted meanwhile; ${quoted(now.text)} could not be written into it.`;
		return true;
	}

	/** What an older program did not understand is read when it is entered again. */
	#reads({ field, text }: Editing): boolean {
		return ROW_READERS[field](text, this.open.units).ok;
	}

	/** Closes the editor and leaves the cell as it was. */
	leave(): void {
		this.#editing = null;
		this.open.tryOut(null);
	}

	clear(): void {
		this.#do(commands.clearCells(this.#rangeRows(), this.#rangeFields(), this.open.units));
	}

	fillDown(): void {
		this.#do(commands.fillDown(this.#rangeRows(), this.#rangeFields(), this.open.units));
	}

	insertRow(): void {
		if (!this.mayEdit) return;
		const { row } = this.selection.active;
		this.open.do(commands.newRow({}, this.open.units, this.rows[row]?.id ?? null).edit);
		this.selection.go({ row, column: 0 });
	}

	deleteRows(): void {
		const rows = this.#rangeRows();
		if (rows.length) this.#do({ kind: 'delete', rows: rows.map(({ id }) => id) });
	}

	moveRows(by: 1 | -1): void {
		const edit = commands.moveRows(this.open.sheet, this.#rangeRows(), by);
		if (!edit) return;
		const { top, bottom, left, right } = this.selection.range;
		this.#do(edit);
		this.selection.go({ row: top + by, column: left });
		this.selection.go({ row: bottom + by, column: right }, true);
	}

	arrange(): void {
		this.#do(commands.arrangeFromFan(this.open.sheet));
	}

	/** The range as text for the clipboard. */
	copy(): string {
		const fields = this.#rangeFields();
		return writeBlock(this.#rangeRows().map((row) => fields.map((field) => textToCopy(row, field, this.open.units))));
	}

	/** Pastes text of the clipboard at the active cell; one cell fills the whole range. */
	paste(text: string): void {
		if (!this.mayEdit) return;
		const { top, left } = this.selection.range;
		const block = readBlock(text, MOST_ROWS - top);
		if (!block.ok) {
			this.notice = block.message;
			return;
		}
		const fields = this.columns.slice(left).flatMap(({ key }) => (isRowField(key) ? [key] : []));
		const [[single = ''] = []] = block.cells;
		const fills = block.cells.length === 1 && block.cells[0]?.length === 1 && this.selection.isRange;
		const cells = fills ? this.#rangeRows().map(() => this.#rangeFields().map(() => single)) : block.cells;
		const edit = commands.pasteBlock(this.open.sheet, { row: top, fields }, cells, this.open.units);
		this.#do(edit);
		this.notice = doubtsOf(edit, this.open.units);
	}

	/** Goes to the row with a tag. */
	goToTag(tag: string): void {
		const row = this.rows.findIndex((one) => valueOf(one, 'tag') === tag);
		if (row >= 0) this.selection.go({ row, column: this.selection.active.column });
	}

	/** Goes to a cell by row id and column. */
	goToCell(id: string | null, field: string): void {
		const row = this.rows.findIndex((one) => one.id === id);
		const column = this.columns.findIndex(({ key }) => key === field);
		if (row >= 0) this.selection.go({ row, column: Math.max(0, column) });
	}

	#rowOf({ id }: Editing): SheetRow | undefined {
		return id === null ? undefined : this.rows.find((row) => row.id === id);
	}

	#placeOf({ row, id }: Editing): number {
		if (id === null) return this.rows.length;
		return this.rows[row]?.id === id ? row : this.rows.findIndex((one) => one.id === id);
	}

	#editOf(now: Editing): Edit | null {
		const { id, field, text } = now;
		const row = this.#rowOf(now);
		if (id !== null && !row) return null;
		if (row) return commands.writeCell(this.open.sheet, row, field, text, this.open.units);
		return text.trim() ? commands.newRow({ [field]: text }, this.open.units, null).edit : null;
	}

	#do(edit: Edit | null): void {
		this.notice = '';
		if (edit && this.mayEdit) this.open.do(edit);
	}

	#rangeRows(): SheetRow[] {
		const { top, bottom } = this.selection.range;
		return this.rows.slice(top, bottom + 1);
	}

	#rangeFields(): RowField[] {
		const { left, right } = this.selection.range;
		return this.columns.slice(left, right + 1).flatMap(({ key }) => (isRowField(key) ? [key] : []));
	}
}

function groupBy<T>(items: readonly T[], key: (item: T) => string): Map<string, T[]> {
	const groups = new Map<string, T[]>();
	for (const item of items) {
		const group = groups.get(key(item));
		if (group) group.push(item);
		else groups.set(key(item), [item]);
	}
	return groups;
}
