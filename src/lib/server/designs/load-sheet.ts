import { and, asc, desc, eq, gt } from 'drizzle-orm';
import { applyMany } from '$lib/sheet/apply';
import type { Entry } from '$lib/sheet/entry';
import { EMPTY_SHEET, type Sheet } from '$lib/sheet/sheet';
import type { FirmScope } from '../auth/scope';
import type { Tx } from '../db';
import { edit, snapshot } from '../db/schema';

/** The sheet as the edit log has it: the latest snapshot and the entries after it. */
export async function loadSheet(tx: Tx, scope: FirmScope, designId: string): Promise<{ sheet: Sheet; seq: number }> {
	const [kept] = await tx
		.select({ seq: snapshot.seq, sheet: snapshot.sheet })
		.from(snapshot)
		.where(and(eq(snapshot.firmId, scope.firmId), eq(snapshot.designId, designId)))
		.orderBy(desc(snapshot.seq))
		.limit(1);
	const since = kept?.seq ?? 0;
	const entries = await tx
		.select({ seq: edit.seq, entry: edit.entry })
		.from(edit)
		.where(and(eq(edit.firmId, scope.firmId), eq(edit.designId, designId), gt(edit.seq, since)))
		.orderBy(asc(edit.seq));
	const sheet = applyMany(
		(kept?.sheet as Sheet | undefined) ?? EMPTY_SHEET,
		entries.map((row) => row.entry as Entry)
	);
	return { sheet, seq: entries.at(-1)?.seq ?? since };
}
