import { randomUUID } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import type { Entry } from '$lib/sheet/entry';
import type { Sheet } from '$lib/sheet/sheet';
import { solveSheet } from '$lib/sheet/solve-sheet';
import type { FirmScope } from '../auth/scope';
import { inFirm } from '../db';
import { design, version } from '../db/schema';
import { appendEntries } from '../designs/append-edits';
import { figuresOf } from '../designs/figures';

/** Puts a saved version's rows and settings back into the working sheet, as one more entry of the log. */
export function restoreVersion(scope: FirmScope, designId: string, number: number): Promise<'done' | 'absent'> {
	return inFirm(scope, async (tx) => {
		const [head] = await tx
			.select({ seq: design.headSeq, archivedAt: design.archivedAt })
			.from(design)
			.where(and(eq(design.firmId, scope.firmId), eq(design.designId, designId)))
			.for('update');
		const [saved] = await tx
			.select({ sheet: version.sheet, revision: version.revision })
			.from(version)
			.where(and(eq(version.firmId, scope.firmId), eq(version.designId, designId), eq(version.number, number)));
		if (!head || head.archivedAt || !saved) return 'absent';
		const sheet = saved.sheet as Sheet;
		const entry: Entry = { kind: 'replace', sheet, from: saved.revision };
		await appendEntries(tx, scope, designId, head.seq, [{ id: randomUUID(), entry }], sheet);
		await tx
			.update(design)
			.set({ headSeq: head.seq + 1, figures: figuresOf(solveSheet(sheet)) })
			.where(and(eq(design.firmId, scope.firmId), eq(design.designId, designId)));
		return 'done';
	});
}
