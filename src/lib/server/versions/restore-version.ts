import { randomUUID } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import type { Entry } from '$lib/sheet/entry';
import type { Sheet } from '$lib/sheet/sheet';
import { solveSheet } from '$lib/sheet/solve-sheet';
import type { FirmScope } from '../auth/scope';
import { inFirm, type Tx } from '../db';
import { design, version } from '../db/schema';
import { appendEntries } from '../designs/append-edits';
import { figuresOf } from '../designs/figures';
import { findDesign } from '../designs/find-design';
import { loadSheet } from '../designs/load-sheet';

/** What was put into the sheet, and the last edit of what stood there before; null when the design or the version is absent. */
export type Restored = { readonly from: string; readonly before: number } | null;

/** Puts a saved version's rows and settings back into the working sheet, as one more entry of the log. */
export function restoreVersion(scope: FirmScope, designId: string, number: number): Promise<Restored> {
	return inFirm(scope, async (tx) => {
		const [saved] = await tx
			.select({ sheet: version.sheet, revision: version.revision })
			.from(version)
			.where(and(eq(version.firmId, scope.firmId), eq(version.designId, designId), eq(version.number, number)));
		return saved ? replaceSheet(tx, scope, designId, saved.sheet as Sheet, saved.revision) : null;
	});
}

/** Puts the sheet back as it stood after an edit of its log, as one more entry. */
export function putBack(scope: FirmScope, designId: string, seq: number): Promise<Restored> {
	return inFirm(scope, async (tx) => {
		const found = await loadSheet(tx, scope, designId, seq);
		return found.seq === seq ? replaceSheet(tx, scope, designId, found.sheet, `edit ${seq}`) : null;
	});
}

async function replaceSheet(tx: Tx, scope: FirmScope, designId: string, sheet: Sheet, from: string): Promise<Restored> {
	const [head] = await tx
		.select({ seq: design.headSeq })
		.from(design)
		.where(and(eq(design.firmId, scope.firmId), eq(design.designId, designId)))
		.for('update');
	const heading = head && (await findDesign(tx, scope, designId));
	if (!head || !heading || heading.archivedAt) return null;
	const entry: Entry = { kind: 'replace', sheet, from };
	await appendEntries(tx, scope, designId, head.seq, [{ id: randomUUID(), entry }], sheet);
	await tx
		.update(design)
		.set({ headSeq: head.seq + 1, figures: figuresOf(solveSheet(sheet)) })
		.where(and(eq(design.firmId, scope.firmId), eq(design.designId, designId)));
	return { from, before: head.seq };
}
