/** Designs for tests, made and filled through the same use cases as by the pages. */
import { randomUUID } from 'node:crypto';
import { provenScope, type FirmScope } from '../../../src/lib/server/auth/scope';
import { inFirm } from '../../../src/lib/server/db';
import { edit as editTable, membership, user, type Role } from '../../../src/lib/server/db/schema';
import { passwordHash } from '../../../src/lib/server/auth/password';
import { appendEdits, type Appended } from '../../../src/lib/server/designs/append-edits';
import { createDesign } from '../../../src/lib/server/designs/create-design';
import { createProject } from '../../../src/lib/server/projects/projects';
import type { Edit, SentEdit } from '../../../src/lib/sheet/edit';
import { PASSWORD, owner } from './people';

type Typed = Readonly<Record<string, string>>;

/** A firm and its owner's scope. */
export async function firm(email: string): Promise<FirmScope & { email: string }> {
	const { firmId, userId } = await owner(email);
	return { ...provenScope(firmId, userId, 'owner'), email };
}

/** One more person of a firm, in a role. */
export async function colleague(scope: FirmScope, email: string, role: Role): Promise<FirmScope> {
	const userId = randomUUID();
	const made = { id: userId, email, name: 'Colleague', passwordHash: await passwordHash(PASSWORD) };
	await inFirm(scope, async (tx) => {
		await tx.insert(user).values({ ...made, emailVerified: new Date() });
		await tx.insert(membership).values({ firmId: scope.firmId, userId, role });
	});
	return provenScope(scope.firmId, userId, role);
}

/** A project and an empty design in it; only the first entry, with its title and units, is in the log. */
export async function emptyDesign(scope: FirmScope, name = 'AHU-1'): Promise<string> {
	const fields = { name: 'Library', client: '', place: '', elevation_m: 0, units: 'SI' as const };
	const project = await createProject(scope, { ...fields, number: randomUUID().slice(0, 8) });
	if (project === 'taken') throw new Error('the number of the project was taken');
	const made = await createDesign(scope, { projectId: project.projectId, name, service: 'Supply air' });
	if (typeof made === 'string') throw new Error(`the design was not made: ${made}`);
	return made.designId;
}

export const sent = (edit: Edit, id: string = randomUUID()): SentEdit => ({ id, edit });

/** An edit that adds rows, and the ids of the rows. */
export function rowsOf(rows: readonly Typed[]): { edit: Edit; ids: string[] } {
	const added = rows.map((row) => ({
		id: randomUUID(),
		cells: Object.fromEntries(Object.entries(row).map(([field, typed]) => [field, { typed, units: 'SI' as const }]))
	}));
	return { edit: { kind: 'insert', rows: added, before: null }, ids: added.map(({ id }) => id) };
}

export const write = (row: string | null, field: string, typed: string): Edit => ({
	...{ kind: 'set', row, field, typed, units: 'SI' }
});

/** A trunk and two outlets: a whole sheet. */
export const TREE: readonly Typed[] = [
	{ tag: 'S1', serves: 'AHU to J1', size: '400x250', length: '8', parts: '2x elbow r1.0 C0.23, silencer 25 Pa' },
	{
		tag: 'S2',
		joins: 'S1',
		serves: 'Office',
		flow: '120',
		size: 'Ø200',
		length: '6',
		parts: 'tee branch C0.8',
		outlet: '20'
	},
	{
		tag: 'S3',
		joins: 'S1',
		serves: 'Library',
		flow: '180',
		size: 'Ø250',
		length: '12',
		parts: 'tee straight way C0.15',
		outlet: '22'
	}
];

/** A design that holds the rows of TREE, and the ids of its rows. */
export async function treeDesign(scope: FirmScope, name?: string): Promise<{ designId: string; ids: string[] }> {
	const designId = await emptyDesign(scope, name);
	const { edit, ids } = rowsOf(TREE);
	const done = await append(scope, designId, [sent(edit)]);
	if (done.solved.problems.length || !done.solved.solution) throw new Error('the rows were not understood');
	return { designId, ids };
}

/** Appends, and fails where the design is absent. */
export async function append(scope: FirmScope, designId: string, edits: SentEdit[], base = 0): Promise<Appended> {
	const done = await appendEdits(scope, designId, base, edits);
	if (!done) throw new Error('the design was absent');
	return done;
}

/** The whole edit log as the database has it. */
export function logOf(scope: FirmScope, designId: string) {
	return inFirm(scope, async (tx) => {
		const rows = await tx.select().from(editTable);
		return rows.filter((row) => row.designId === designId).sort((a, b) => a.seq - b.seq);
	});
}
