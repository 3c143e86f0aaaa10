import { and, eq, sql } from 'drizzle-orm';
import type { FirmScope } from '../auth/scope';
import { inFirm, type Tx } from '../db';
import { design, firm, project } from '../db/schema';
import { loadSheet } from './load-sheet';

const columns = {
	designId: design.designId,
	name: design.name,
	service: design.service,
	/** Of the design, or of its whole project. */
	archivedAt: sql<string | null>`coalesce(${design.archivedAt}, ${project.archivedAt})`,
	projectId: project.projectId,
	projectNumber: project.number,
	projectName: project.name,
	client: project.client,
	place: project.place,
	firm: firm.name
};

/** A design with the names that its title block shows. Null when absent or another firm's. */
export async function findDesign(tx: Tx, scope: FirmScope, designId: string) {
	const [row] = await tx
		.select(columns)
		.from(design)
		.innerJoin(project, and(eq(project.firmId, design.firmId), eq(project.projectId, design.projectId)))
		.innerJoin(firm, eq(firm.firmId, design.firmId))
		.where(and(eq(design.firmId, scope.firmId), eq(design.designId, designId)));
	return row ?? null;
}

export type DesignHeading = NonNullable<Awaited<ReturnType<typeof findDesign>>>;

/** A design and its working sheet, read at one moment. */
export function openDesign(scope: FirmScope, designId: string) {
	return inFirm(scope, async (tx) => {
		const heading = await findDesign(tx, scope, designId);
		return heading && { heading, ...(await loadSheet(tx, scope, designId)) };
	});
}
