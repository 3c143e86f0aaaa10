import { and, asc, eq, gt, inArray } from 'drizzle-orm';
import { applyEntry } from '$lib/sheet/apply';
import type { SentEdit } from '$lib/sheet/edit';
import { entryOf, type Entry, type LoggedEntry } from '$lib/sheet/entry';
import { MOST_ROWS, type Sheet } from '$lib/sheet/sheet';
import { MOST_PARTS, partsOf } from '$lib/sheet/count-parts';
import { solveSheet, type SolvedSheet } from '$lib/sheet/solve-sheet';
import type { FirmScope } from '../auth/scope';
import { inFirm, type Tx } from '../db';
import { design, edit, snapshot } from '../db/schema';
import { figuresOf } from './figures';
import { findDesign } from './find-design';
import { loadSheet } from './load-sheet';

/** The log is folded into a snapshot each time it has grown by this many entries. */
const SNAPSHOT_EVERY = 100;
/** And after entries that change so much: whoever opens the sheet would do all of it again. */
const LARGE = 1_000;

export interface Refused {
	readonly id: string;
	readonly reason: string;
}

export interface Appended {
	/** Every entry after the client's base, others' included, in the order of the log. */
	readonly entries: readonly LoggedEntry[];
	readonly seq: number;
	readonly refused: readonly Refused[];
	readonly solved: SolvedSheet;
}

/**
 * Appends edits to the log of a design, each once whatever the number of times it is sent, and answers with what the
 * client lacks and with the server's own figures. Null when the design is absent, another firm's or archived.
 */
export function appendEdits(
	scope: FirmScope,
	designId: string,
	base: number,
	sent: readonly SentEdit[]
): Promise<Appended | null> {
	return inFirm(scope, async (tx) => {
		// The lock on the design's row is what orders the edits of several people and servers.
		const [head] = await tx
			.select({ seq: design.headSeq })
			.from(design)
			.where(and(eq(design.firmId, scope.firmId), eq(design.designId, designId)))
			.for('update');
		const heading = head && (await findDesign(tx, scope, designId));
		if (!head || !heading || (heading.archivedAt && sent.length)) return null;
		const loaded = await loadSheet(tx, scope, designId);
		const known = await knownEdits(tx, scope, designId, sent);
		const step = readEdits(loaded.sheet, sent, known);
		await appendEntries(tx, scope, designId, head.seq, step.accepted, step.sheet);
		const solved = solveSheet(step.sheet);
		const seq = head.seq + step.accepted.length;
		if (step.accepted.length)
			await tx
				.update(design)
				.set({ headSeq: seq, figures: figuresOf(solved) })
				.where(and(eq(design.firmId, scope.firmId), eq(design.designId, designId)));
		return { entries: await entriesAfter(tx, scope, designId, base), seq, refused: step.refused, solved };
	});
}

interface Step {
	sheet: Sheet;
	accepted: { id: string; entry: Entry }[];
	refused: Refused[];
}

function readEdits(sheet: Sheet, sent: readonly SentEdit[], known: ReadonlySet<string>): Step {
	const step: Step = { sheet, accepted: [], refused: [] };
	const seen = new Set(known);
	for (const { id, edit: wanted } of sent) {
		if (seen.has(id)) continue;
		seen.add(id);
		const entry = entryOf(wanted);
		const after = entry && applyEntry(step.sheet, entry);
		if (!entry || !after) step.refused.push({ id, reason: 'This edit names a column that does not exist.' });
		else if (after.rows.length > MOST_ROWS)
			step.refused.push({
				id,
				reason: `A sheet holds at most ${MOST_ROWS} rows; this would make ${after.rows.length}.`
			});
		else if (partsOf(after) > MOST_PARTS)
			step.refused.push({
				id,
				reason: `A sheet holds at most ${MOST_PARTS} parts; this would make ${partsOf(after)}.`
			});
		else {
			step.accepted.push({ id, entry });
			step.sheet = after;
		}
	}
	return step;
}

async function knownEdits(tx: Tx, scope: FirmScope, designId: string, sent: readonly SentEdit[]): Promise<Set<string>> {
	if (!sent.length) return new Set();
	const ids = sent.map(({ id }) => id);
	const rows = await tx
		.select({ id: edit.editId })
		.from(edit)
		.where(and(eq(edit.firmId, scope.firmId), eq(edit.designId, designId), inArray(edit.editId, ids)));
	return new Set(rows.map(({ id }) => id));
}

/** Writes entries after `seq`, and the snapshot when one is due. The caller holds the lock of the design. */
export async function appendEntries(
	tx: Tx,
	scope: FirmScope,
	designId: string,
	seq: number,
	accepted: readonly { id: string; entry: Entry }[],
	sheet: Sheet
): Promise<void> {
	if (!accepted.length) return;
	const { firmId, userId } = scope;
	await tx
		.insert(edit)
		.values(accepted.map(({ id, entry }, at) => ({ firmId, designId, seq: seq + 1 + at, editId: id, userId, entry })));
	const last = seq + accepted.length;
	const isLarge = accepted.reduce((sum, { entry }) => sum + sizeOf(entry), 0) >= LARGE;
	if (isLarge || Math.floor(last / SNAPSHOT_EVERY) > Math.floor(seq / SNAPSHOT_EVERY))
		await tx.insert(snapshot).values({ firmId, designId, seq: last, sheet });
}

function sizeOf(entry: Entry): number {
	if (entry.kind === 'batch') return entry.entries.length;
	return 'rows' in entry ? entry.rows.length : 1;
}

async function entriesAfter(tx: Tx, scope: FirmScope, designId: string, base: number): Promise<LoggedEntry[]> {
	const rows = await tx
		.select({ seq: edit.seq, id: edit.editId, entry: edit.entry })
		.from(edit)
		.where(and(eq(edit.firmId, scope.firmId), eq(edit.designId, designId), gt(edit.seq, base)))
		.orderBy(asc(edit.seq));
	return rows.map(({ seq, id, entry }) => ({ seq, id, entry: entry as Entry }));
}
