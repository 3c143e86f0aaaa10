import { and, asc, desc, eq, isNull, sql } from 'drizzle-orm';
import type { FirmScope } from '../auth/scope';
import { inFirm } from '../db';
import { isDuplicate } from '../db/is-duplicate';
import { design, edit, project, version } from '../db/schema';
import type { DesignFigures } from '../designs/figures';
import { newestEdit, ofVersion, standsAt } from '../versions/versions';

export interface ProjectFields {
	readonly number: string;
	readonly name: string;
	readonly client: string;
	readonly place: string;
	readonly elevation_m: number;
	readonly units: 'SI' | 'IP';
}

/** Makes a project; 'taken' when the firm has its number already. */
export async function createProject(scope: FirmScope, fields: ProjectFields): Promise<{ projectId: string } | 'taken'> {
	try {
		const [row] = await inFirm(scope, (tx) =>
			tx
				.insert(project)
				.values({ firmId: scope.firmId, ...fields })
				.returning({ projectId: project.projectId })
		);
		if (!row) throw new Error('the project was not returned');
		return row;
	} catch (cause) {
		if (isDuplicate(cause)) return 'taken';
		throw cause;
	}
}

/** Changes, archives or brings back a project. 'absent' also when it is another firm's. */
export async function changeProject(
	scope: FirmScope,
	projectId: string,
	{ archived, ...fields }: Partial<ProjectFields> & { archived?: boolean }
): Promise<'done' | 'absent' | 'taken'> {
	try {
		const [row] = await inFirm(scope, (tx) =>
			tx
				.update(project)
				.set({ ...fields, ...(archived !== undefined && { archivedAt: archived ? new Date() : null }) })
				.where(and(eq(project.firmId, scope.firmId), eq(project.projectId, projectId)))
				.returning({ projectId: project.projectId })
		);
		return row ? 'done' : 'absent';
	} catch (cause) {
		if (isDuplicate(cause)) return 'taken';
		throw cause;
	}
}

/** A project of the firm; null when absent or another's. */
export function findProject(scope: FirmScope, projectId: string) {
	return inFirm(scope, async (tx) => {
		const [row] = await tx
			.select()
			.from(project)
			.where(and(eq(project.firmId, scope.firmId), eq(project.projectId, projectId)));
		return row ?? null;
	});
}

/** The designs of a project, archived ones last. */
export function listDesigns(scope: FirmScope, projectId: string) {
	return inFirm(scope, async (tx) => {
		const rows = await tx
			.select()
			.from(design)
			.where(and(eq(design.firmId, scope.firmId), eq(design.projectId, projectId)))
			.orderBy(sql`${design.archivedAt} is not null`, asc(design.createdAt));
		return rows.map(({ designId, name, service, archivedAt, figures }) => ({
			...{ designId, name, service, archivedAt },
			figures: figures as DesignFigures | null
		}));
	});
}

/** Projects with their designs and the revisions of each: the register. */
export function listRegister(scope: FirmScope, show: 'current' | 'archived') {
	return inFirm(scope, async (tx) => {
		const projects = await tx
			.select()
			.from(project)
			.where(and(eq(project.firmId, scope.firmId), show === 'archived' ? undefined : isNull(project.archivedAt)))
			.orderBy(desc(project.createdAt));
		const designs = await tx
			.select()
			.from(design)
			.where(eq(design.firmId, scope.firmId))
			.orderBy(asc(design.createdAt));
		const revisions = await tx
			.select({
				designId: version.designId,
				revision: version.revision,
				status: version.status,
				savedAt: version.savedAt,
				standsAt
			})
			.from(version)
			.innerJoin(design, ofVersion)
			.leftJoin(edit, newestEdit)
			.where(eq(version.firmId, scope.firmId))
			.orderBy(asc(version.number));
		const kept = (archivedAt: Date | null) => (show === 'archived' ? archivedAt !== null : archivedAt === null);
		return projects
			.map((one) => ({
				...one,
				designs: designs
					.filter(
						(of) => of.projectId === one.projectId && (kept(of.archivedAt) || (show === 'archived' && one.archivedAt))
					)
					.map((of) => ({
						designId: of.designId,
						name: of.name,
						service: of.service,
						archivedAt: of.archivedAt,
						headSeq: of.headSeq,
						figures: of.figures as DesignFigures | null,
						revisions: revisions.filter(({ designId }) => designId === of.designId)
					}))
			}))
			.filter((one) => show === 'current' || one.archivedAt !== null || one.designs.length > 0);
	});
}

export type Register = Awaited<ReturnType<typeof listRegister>>;
