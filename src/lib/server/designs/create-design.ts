import { randomUUID } from 'node:crypto';
import { and, eq, isNull } from 'drizzle-orm';
import type { SingleEdit } from '$lib/sheet/edit';
import { entryOf } from '$lib/sheet/entry';
import { applyEntry } from '$lib/sheet/apply';
import { EMPTY_SHEET } from '$lib/sheet/sheet';
import type { FirmScope } from '../auth/scope';
import { inFirm } from '../db';
import { isDuplicate } from '../db/is-duplicate';
import { design, project } from '../db/schema';
import { appendEntries } from './append-edits';

interface NewDesign {
	readonly projectId: string;
	readonly name: string;
	readonly service: string;
}

/** Makes a design that begins with its project's units and elevation. Returns its id, or why it was refused. */
export async function createDesign(
	scope: FirmScope,
	wanted: NewDesign
): Promise<{ designId: string } | 'absent' | 'taken'> {
	try {
		return await inFirm(scope, async (tx) => {
			const [of] = await tx
				.select({ units: project.units, elevation_m: project.elevation_m })
				.from(project)
				.where(
					and(eq(project.firmId, scope.firmId), eq(project.projectId, wanted.projectId), isNull(project.archivedAt))
				);
			if (!of) return 'absent';
			const designId = randomUUID();
			const edits: SingleEdit[] = [
				{ kind: 'set', row: null, field: 'units', typed: of.units, units: of.units },
				{ kind: 'set', row: null, field: 'elevation', typed: `${of.elevation_m} m`, units: of.units }
			];
			const entry = entryOf({ kind: 'batch', edits });
			if (!entry) throw new Error('the first entry of a design was not understood');
			await tx.insert(design).values({ firmId: scope.firmId, designId, ...wanted, headSeq: 1 });
			await appendEntries(tx, scope, designId, 0, [{ id: randomUUID(), entry }], applyEntry(EMPTY_SHEET, entry));
			return { designId };
		});
	} catch (cause) {
		if (isDuplicate(cause)) return 'taken';
		throw cause;
	}
}
