import { and, eq } from 'drizzle-orm';
import type { FirmScope } from '../auth/scope';
import { inFirm } from '../db';
import { design } from '../db/schema';
import { isDuplicate } from '../db/is-duplicate';

type Change = Partial<{ name: string; service: string; archived: boolean }>;

/** Renames or archives a design. 'absent' also when it is another firm's. */
export async function changeDesign(
	scope: FirmScope,
	designId: string,
	change: Change
): Promise<'done' | 'absent' | 'taken'> {
	const { archived, ...names } = change;
	try {
		const [row] = await inFirm(scope, (tx) =>
			tx
				.update(design)
				.set({ ...names, ...(archived !== undefined && { archivedAt: archived ? new Date() : null }) })
				.where(and(eq(design.firmId, scope.firmId), eq(design.designId, designId)))
				.returning({ designId: design.designId })
		);
		return row ? 'done' : 'absent';
	} catch (cause) {
		if (isDuplicate(cause)) return 'taken';
		throw cause;
	}
}
