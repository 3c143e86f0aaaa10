import { and, desc, eq, sql } from 'drizzle-orm';
import type { DesignDocument, Solution } from '$lib/engine';
import type { Sheet } from '$lib/sheet/sheet';
import type { FirmScope } from '../auth/scope';
import { inFirm } from '../db';
import { design, edit, user, version } from '../db/schema';
import type { DesignHeading } from '../designs/find-design';

/** As a person signs, or the address where no name was given. */
const nameOf = sql<string>`coalesce(nullif(trim(${user.name}), ''), ${user.email})`;

/**
 * The last edit at which the working sheet stood as a version: the one that it was saved after, or the newest of the
 * log where that put the version back. Needs the newest edit of the design joined.
 */
export const standsAt = sql<number>`case
	when ${edit.entry}->>'kind' = 'replace' and ${edit.entry}->>'from' in (${version.revision}, 'edit ' || ${version.seq})
	then ${edit.seq} else ${version.seq} end`.mapWith(Number);

/** Joins the newest edit of a version's design. */
export const newestEdit = and(
	eq(edit.firmId, design.firmId),
	eq(edit.designId, design.designId),
	eq(edit.seq, design.headSeq)
);
export const ofVersion = and(eq(design.firmId, version.firmId), eq(design.designId, version.designId));

/** The saved versions of a design, newest first, without their contents. */
export function listVersions(scope: FirmScope, designId: string) {
	return inFirm(scope, (tx) =>
		tx
			.select({
				number: version.number,
				revision: version.revision,
				note: version.note,
				status: version.status,
				seq: version.seq,
				standsAt,
				sha256: version.sha256,
				engineVersion: version.engineVersion,
				savedAt: version.savedAt,
				by: nameOf
			})
			.from(version)
			.innerJoin(user, eq(user.id, version.userId))
			.innerJoin(design, ofVersion)
			.leftJoin(edit, newestEdit)
			.where(and(eq(version.firmId, scope.firmId), eq(version.designId, designId)))
			.orderBy(desc(version.number))
	);
}

export type VersionLine = Awaited<ReturnType<typeof listVersions>>[number];

/** One saved version with the figures that were stored; nothing is computed anew. Null when absent. */
export function openVersion(scope: FirmScope, designId: string, number: number) {
	return inFirm(scope, async (tx) => {
		const [row] = await tx
			.select({ saved: version, by: nameOf })
			.from(version)
			.innerJoin(user, eq(user.id, version.userId))
			.where(and(eq(version.firmId, scope.firmId), eq(version.designId, designId), eq(version.number, number)));
		if (!row) return null;
		const { firmId: _firm, userId: _user, ...saved } = row.saved;
		return {
			...saved,
			by: row.by,
			sheet: saved.sheet as Sheet,
			document: saved.document as DesignDocument,
			solution: saved.solution as Solution,
			heading: saved.heading as DesignHeading
		};
	});
}

export type SavedVersion = NonNullable<Awaited<ReturnType<typeof openVersion>>>;
