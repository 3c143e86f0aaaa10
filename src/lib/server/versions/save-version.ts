import { and, desc, eq } from 'drizzle-orm';
import { ENGINE_VERSION } from '$lib/engine';
import { isComplete, solveSheet, type SolvedSheet } from '$lib/sheet/solve-sheet';
import type { FirmScope } from '../auth/scope';
import { inFirm } from '../db';
import { design, version } from '../db/schema';
import { findDesign } from '../designs/find-design';
import { loadSheet } from '../designs/load-sheet';
import { contentHash } from './content-hash';

interface Wanted {
	readonly note: string;
	readonly status: 'work-in-progress' | 'issued-for-review';
}

export type SaveResult =
	| { readonly ok: true; readonly number: number; readonly revision: string; readonly sha256: string }
	| { readonly ok: false; readonly reason: 'absent' }
	| { readonly ok: false; readonly reason: 'incomplete'; readonly solved: SolvedSheet };

/** Saves the working sheet as the next version; an archived design takes none. Refused while a row does not count: a version stands for the whole sheet. */
export function saveVersion(scope: FirmScope, designId: string, wanted: Wanted): Promise<SaveResult> {
	return inFirm(scope, async (tx) => {
		await tx
			.select({ seq: design.headSeq })
			.from(design)
			.where(and(eq(design.firmId, scope.firmId), eq(design.designId, designId)))
			.for('update');
		const heading = await findDesign(tx, scope, designId);
		if (!heading || heading.archivedAt) return { ok: false, reason: 'absent' };
		const { sheet, seq } = await loadSheet(tx, scope, designId);
		const solved = solveSheet(sheet);
		if (!isComplete(solved)) return { ok: false, reason: 'incomplete', solved };
		const [last] = await tx
			.select({ number: version.number })
			.from(version)
			.where(and(eq(version.firmId, scope.firmId), eq(version.designId, designId)))
			.orderBy(desc(version.number))
			.limit(1);
		const number = (last?.number ?? 0) + 1;
		const revision = `P${String(number).padStart(2, '0')}`;
		const { document, solution } = solved;
		const sha256 = contentHash({ document, solution, engineVersion: ENGINE_VERSION });
		const { firmId, userId } = scope;
		await tx.insert(version).values({
			...{ firmId, designId, number, revision, seq, userId, sha256, sheet, document, solution, heading },
			engineVersion: ENGINE_VERSION,
			...wanted
		});
		return { ok: true, number, revision, sha256 };
	});
}
