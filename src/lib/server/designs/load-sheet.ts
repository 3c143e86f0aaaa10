import { and, asc, desc, eq, gt, lte } from 'drizzle-orm';
import { applyMany } from '$lib/sheet/apply';
import type { Entry } from '$lib/sheet/entry';
import { EMPTY_SHEET, type Sheet } from '$lib/sheet/sheet';
import type { FirmScope } from '../auth/scope';
import type { Tx } from '../db';
import { edit, snapshot } from '../db/schema';

/** No design has so many edits. */
const LATEST = 2_147_483_647;

/**
 * The sheet as the edit log has it: the latest snapshot and the entries after it.
 *
 * @param upTo the last entry that counts; the latest if absent
 */
export async function loadSheet(
	tx: Tx,
	scope: FirmScope,
	designId: string,
	upTo = LATEST
): Promise<{ sheet: Sheet; seq: number }> {
	const [kept] = await tx
		.select({ seq: snapshot.seq, sheet: snapshot.sheet })
		.from(snapshot)
		.where(and(eq(snapshot.firmId, scope.firmId), eq(snapshot.designId, designId), lte(snapshot.seq, upTo)))
		.orderBy(desc(snapshot.seq))
		.limit(1);
	const since = kept?.seq ?? 0;
	const entries = await tx
		.select({ seq: edit.seq, entry: edit.entry })
		.from(edit)
		.where(and(eq(edit.firmId, scope.firmId), eq(edit.designId, designId), gt(edit.seq, since), lte(edit.seq, upTo)))
		.orderBy(asc(edit.seq));
	const sheet = applyMany(
		(kept?.sheet as Sheet | undefined) ?? EMPTY_SHEET,
		entries.map((row) => row.entry as Entry)
	);
	return { sheet, seq: entries.at(-1)?.seq ?? since };
}
