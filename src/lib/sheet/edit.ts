/** What a person does to a sheet. Checked on both sides; the server reads the typed texts itself. */
import { z } from 'zod';
import { MOST_ROWS } from './sheet';
import { MOST_TYPED, storableText } from './storable-text';

const rowId = z.uuid();
const units = z.enum(['SI', 'IP']);
const typed = z.string().max(MOST_TYPED).transform(storableText);
const cell = z.object({ typed, units });
const field = z.string().max(40);

const set = z.object({ kind: z.literal('set'), row: rowId.nullable(), field, typed, units });
const insert = z.object({
	kind: z.literal('insert'),
	rows: z
		.array(z.object({ id: rowId, cells: z.record(field, cell) }))
		.min(1)
		.max(MOST_ROWS),
	before: rowId.nullable()
});
const remove = z.object({ kind: z.literal('delete'), rows: z.array(rowId).min(1).max(MOST_ROWS) });
const move = z.object({
	kind: z.literal('move'),
	rows: z.array(rowId).min(1).max(MOST_ROWS),
	before: rowId.nullable()
});
const single = z.discriminatedUnion('kind', [set, insert, remove, move]);
const batch = z.object({ kind: z.literal('batch'), edits: z.array(single).min(1).max(100_000) });
/** Insertions, deletions and moves of one message: each goes through the whole sheet, unlike a cell that is written. */
const MOST_OF_ROWS = MOST_ROWS;

/**
 * `set` writes one cell (row null: a setting; typed '' clears it). `insert`, `delete` and `move` act on whole rows,
 * before a named row or at the end. A `batch` is one step for undo.
 */
export const editSchema = z.discriminatedUnion('kind', [set, insert, remove, move, batch]);
export type SingleEdit = z.infer<typeof single>;
export type Edit = z.infer<typeof editSchema>;
export type TypedCell = z.infer<typeof cell>;

/** An edit with the id that its client gave it: sent again, it is applied once. In small letters, as the database has it. */
export const sentEditSchema = z.object({ id: z.uuid().toLowerCase(), edit: editSchema });
export type SentEdit = z.infer<typeof sentEditSchema>;

const ofRows = (edit: Edit): number =>
	edit.kind === 'batch' ? edit.edits.filter(({ kind }) => kind !== 'set').length : Number(edit.kind !== 'set');

/** Body of the route that takes edits. `base` is the last entry that the client has. */
export const editsBodySchema = z.object({
	base: z.int().min(0),
	edits: z
		.array(sentEditSchema)
		.max(1_000)
		.refine(
			(edits) => edits.reduce((sum, { edit }) => sum + ofRows(edit), 0) <= MOST_OF_ROWS,
			`A message inserts, deletes or moves rows at most ${MOST_OF_ROWS} times.`
		)
});
