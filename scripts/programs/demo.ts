/**
 * Loads the demonstration firm once: its people, one project and two designs with their seeded faults, entered as
 * typed text like anybody's. Environment: DATABASE_URL. Prints the accounts, one JSON object a line.
 */
import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { passwordHash } from '../../src/lib/server/auth/password';
import { provenScope, type FirmScope } from '../../src/lib/server/auth/scope';
import { findUserByEmail } from '../../src/lib/server/auth/users';
import { closeDatabase, inFirm } from '../../src/lib/server/db';
import { membership, user, type Role } from '../../src/lib/server/db/schema';
import { appendEdits } from '../../src/lib/server/designs/append-edits';
import { createDesign } from '../../src/lib/server/designs/create-design';
import { foundFirm } from '../../src/lib/server/firms/found-firm';
import { createProject, type ProjectFields } from '../../src/lib/server/projects/projects';
import { saveVersion } from '../../src/lib/server/versions/save-version';
import type { SingleEdit } from '../../src/lib/sheet/edit';

interface Demo {
	firm: string;
	password: string;
	accounts: { email: string; name: string; role: Role }[];
	project: ProjectFields;
	designs: {
		name: string;
		service: string;
		settings: Record<string, string>;
		rows: Record<string, string>[];
		version: { note: string; status: 'work-in-progress' | 'issued-for-review' };
	}[];
}

const demo = JSON.parse(readFileSync('fixtures/demo/larkmoor.json', 'utf8')) as Demo;

async function load(): Promise<void> {
	const [owner, ...others] = demo.accounts;
	if (!owner) throw new Error('the demo names no owner');
	const hash = await passwordHash(demo.password);
	const founded = await foundFirm({
		...{ name: owner.name, email: owner.email, passwordHash: hash, firmName: demo.firm },
		emailVerified: new Date()
	});
	if (!founded) return;
	const scope = provenScope(founded.firmId, founded.userId, 'owner');
	const people = await Promise.all(others.map((one) => join(scope, one, hash)));
	const engineer = provenScope(scope.firmId, people[0] ?? scope.userId, 'engineer');
	const project = await createProject(scope, demo.project);
	if (project === 'taken') throw new Error('the demo project is there already');
	for (const design of demo.designs) await enter(engineer, project.projectId, design);
}

async function join(scope: FirmScope, person: Demo['accounts'][number], hash: string): Promise<string> {
	const userId = randomUUID();
	const { email, name, role } = person;
	await inFirm(scope, async (tx) => {
		await tx.insert(user).values({ id: userId, email, name, passwordHash: hash, emailVerified: new Date() });
		await tx.insert(membership).values({ firmId: scope.firmId, userId, role });
	});
	return userId;
}

async function enter(
	scope: FirmScope,
	projectId: string,
	{ name, service, settings, rows, version }: Demo['designs'][number]
) {
	const made = await createDesign(scope, { projectId, name, service });
	if (typeof made === 'string') throw new Error(`the demo design ${name} could not be made: ${made}`);
	const { units } = demo.project;
	const cell = (typed: string) => ({ typed, units });
	const cells = (row: Record<string, string>) =>
		Object.fromEntries(Object.entries(row).map(([field, typed]) => [field, cell(typed)]));
	const edits: SingleEdit[] = [
		...Object.entries(settings).map(([field, typed]) => ({ kind: 'set' as const, row: null, field, typed, units })),
		{ kind: 'insert', rows: rows.map((row) => ({ id: randomUUID(), cells: cells(row) })), before: null }
	];
	const done = await appendEdits(scope, made.designId, 1, [{ id: randomUUID(), edit: { kind: 'batch', edits } }]);
	const [fault] = done?.solved.problems ?? [];
	if (fault) throw new Error(`the demo design ${name} was not understood: ${fault.message}`);
	const saved = await saveVersion(scope, made.designId, version);
	if (!saved.ok) throw new Error(`the demo design ${name} could not be saved: ${saved.reason}`);
}

async function run(): Promise<void> {
	const first = demo.accounts[0];
	if (first && !(await findUserByEmail(first.email))) await load();
	for (const { email, role } of demo.accounts)
		process.stdout.write(`${JSON.stringify({ email, role, password: demo.password })}\n`);
}

run()
	.catch((cause: unknown) => {
		process.stderr.write(`demo: ${cause instanceof Error ? cause.message : String(cause)}\n`);
		process.exitCode = 1;
	})
	.finally(closeDatabase);
