import { randomUUID } from 'node:crypto';
import postgres from 'postgres';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { asPerson, inFirm } from '../../src/lib/server/db';
import { design, edit, firm, membership, project, snapshot, version } from '../../src/lib/server/db/schema';
import { provenScope, type FirmScope } from '../../src/lib/server/auth/scope';
import { findMembership } from '../../src/lib/server/firms/find-membership';
import { foundFirm } from '../../src/lib/server/firms/found-firm';
import { freshDatabase, type TestDatabase } from './support/database';

/** Tables outside the firms, where no row belongs to one. */
const SIGN_IN = ['account', 'mail_token', 'signed_in_session', 'user', 'verification_token'];
const TENANT = { design, edit, firm, membership, project, snapshot, version };

let made: TestDatabase;
let app: postgres.Sql;
let owner: postgres.Sql;
let ours: FirmScope;
let theirs: FirmScope;

async function firmWithWork(email: string): Promise<FirmScope> {
	const founded = await foundFirm({ name: 'Some Person', email, passwordHash: 'none', firmName: `Firm of ${email}` });
	if (!founded) throw new Error('the address was taken');
	const { firmId, userId } = founded;
	const scope = provenScope(firmId, userId, 'owner');
	await inFirm(scope, async (tx) => {
		const [projectId, designId] = [randomUUID(), randomUUID()];
		await tx.insert(project).values({ firmId, projectId, number: '1', name: 'Library' });
		await tx.insert(design).values({ firmId, projectId, designId, name: 'AHU-1' });
		await tx.insert(edit).values({ firmId, designId, seq: 1, editId: randomUUID(), userId, entry: {} });
		await tx.insert(snapshot).values({ firmId, designId, seq: 1, sheet: {} });
		const saved = { number: 1, revision: 'P01', note: '', status: 'work-in-progress' as const, seq: 1, userId };
		const stored = { sheet: {}, document: {}, solution: {}, heading: {}, engineVersion: '0', sha256: 'a'.repeat(64) };
		await tx.insert(version).values({ firmId, designId, ...saved, ...stored });
	});
	return scope;
}

beforeAll(async () => {
	made = await freshDatabase();
	app = postgres(process.env.DATABASE_URL ?? '', { max: 1, onnotice: () => {} });
	owner = postgres(made.ownerUrl, { max: 1, onnotice: () => {} });
	ours = await firmWithWork('ours@example.test');
	theirs = await firmWithWork('theirs@example.test');
});
afterAll(async () => {
	await Promise.all([app?.end(), owner?.end()]);
	await made?.drop();
});

describe('tables', () => {
	it('are tenant tables under forced row-level security, or stand on the short list of sign-in', async () => {
		const rows = await owner`
			select relname, relrowsecurity, relforcerowsecurity,
				(select array_agg(polcmd::text || ':' || pg_get_expr(polqual, polrelid)) from pg_policy where polrelid = c.oid) as policies
			from pg_class c where relkind = 'r' and relnamespace = 'public'::regnamespace`;
		const guarded = rows.filter((row) => row.relrowsecurity && row.relforcerowsecurity);
		expect(guarded.map((row) => row.relname).sort()).toEqual(Object.keys(TENANT).sort());
		expect(
			rows
				.filter((row) => !guarded.includes(row))
				.map((row) => row.relname)
				.sort()
		).toEqual(SIGN_IN);
		for (const { relname, policies } of guarded)
			expect(
				policies.some((text: string) => text.startsWith('*:') && text.includes("current_setting('app.firm_id'")),
				relname
			).toBe(true);
	});

	it('lead with firm_id in every primary key and unique index of a tenant', async () => {
		const rows = await owner`
			select t.relname as table, x.relname as index, a.attname as first from pg_index i
			join pg_class t on t.oid = i.indrelid join pg_class x on x.oid = i.indexrelid
			join pg_attribute a on a.attrelid = t.oid and a.attnum = i.indkey[0]
			where i.indisunique and t.relname in ${owner(Object.keys(TENANT))}`;
		expect(rows.length).toBeGreaterThanOrEqual(Object.keys(TENANT).length);
		for (const row of rows) expect(row.first, row.index).toBe('firm_id');
	});
});

describe("the application's role", () => {
	it('owns nothing and can neither bypass the policies nor make roles or databases', async () => {
		const [role] = await owner`select * from pg_roles where rolname = 'evendraft_app'`;
		expect(role).toMatchObject({ rolsuper: false, rolbypassrls: false, rolcreatedb: false, rolcreaterole: false });
		expect(
			await owner`select 1 from pg_shdepend d join pg_roles r on r.oid = d.refobjid
			where r.rolname = 'evendraft_app' and d.deptype = 'o'`
		).toHaveLength(0);
		expect(
			await owner`select 1 from pg_auth_members m join pg_roles r on r.oid = m.member
			where r.rolname = 'evendraft_app'`
		).toHaveLength(0);
		const [privilege] = await owner`select has_schema_privilege('evendraft_app', 'public', 'create') as may`;
		expect(privilege?.may).toBe(false);
	});

	it.each(Object.keys(TENANT))('sees no row of %s without a firm, and none of another firm', async (table) => {
		expect(await app`select 1 from ${app(table)}`).toHaveLength(0);
		const seen = await app.begin(async (tx) => {
			await tx`select set_config('app.firm_id', ${ours.firmId}, true)`;
			return tx`select firm_id from ${tx(table)}`;
		});
		expect(seen.length).toBeGreaterThan(0);
		expect(new Set(seen.map((row) => row.firm_id))).toEqual(new Set([ours.firmId]));
		// The setting ended with the transaction.
		expect(await app`select 1 from ${app(table)}`).toHaveLength(0);
	});

	it('writes nothing without a firm, nor with the id of another firm', async () => {
		const row = { firm_id: theirs.firmId, number: '2', name: 'Forged' };
		await expect(app`insert into project ${app(row)}`).rejects.toMatchObject({ code: '42501' });
		const forged = inFirm(ours, (tx) =>
			tx.insert(project).values({ firmId: theirs.firmId, number: '2', name: 'Forged' })
		);
		await expect(forged).rejects.toMatchObject({ cause: { code: '42501' } });
		const moved = inFirm(ours, (tx) => tx.update(project).set({ firmId: theirs.firmId }));
		await expect(moved).rejects.toMatchObject({ cause: { code: '42501' } });
		const taken = await inFirm(ours, (tx) => tx.update(project).set({ name: 'Renamed' }).returning());
		expect(taken.map((project) => project.firmId)).toEqual([ours.firmId]);
	});

	it('may not change or remove an entry of the edit log or a version', async () => {
		for (const table of [edit, version]) {
			const changed = inFirm(ours, (tx) => tx.update(table).set({ seq: 2 }));
			await expect(changed).rejects.toMatchObject({ cause: { code: '42501' } });
			await expect(inFirm(ours, (tx) => tx.delete(table))).rejects.toMatchObject({ cause: { code: '42501' } });
		}
	});

	it("shows a person their own memberships and firms, and no other firm's", async () => {
		const seen = await asPerson(ours.userId, async (tx) => ({
			firms: await tx.select().from(firm),
			memberships: await tx.select().from(membership),
			projects: await tx.select().from(project)
		}));
		expect(seen.firms.map((row) => row.firmId)).toEqual([ours.firmId]);
		expect(seen.memberships.map((row) => row.userId)).toEqual([ours.userId]);
		expect(seen.projects).toEqual([]);
	});
});

describe('the owner of the tables', () => {
	it.each(['edit', 'version'])('may not change or remove rows of %s either', async (table) => {
		const inOurs = (work: (tx: postgres.TransactionSql) => Promise<unknown>) =>
			owner.begin(async (tx) => {
				await tx`select set_config('app.firm_id', ${ours.firmId}, true)`;
				return work(tx);
			});
		await expect(inOurs((tx) => tx`update ${tx(table)} set seq = 2`)).rejects.toMatchObject({ code: '23001' });
		await expect(inOurs((tx) => tx`delete from ${tx(table)}`)).rejects.toMatchObject({ code: '23001' });
		await expect(inOurs((tx) => tx`truncate ${tx(table)}`)).rejects.toMatchObject({ code: '23001' });
	});
});

describe('the membership check', () => {
	it('gives a scope of the first firm, and of the chosen one only to its members', async () => {
		expect((await findMembership(ours.userId, null))?.scope.firmId).toBe(ours.firmId);
		expect((await findMembership(ours.userId, theirs.firmId))?.scope.firmId).toBe(ours.firmId);
		await inFirm(theirs, (tx) => tx.insert(membership).values({ ...theirs, userId: ours.userId, role: 'viewer' }));
		expect((await findMembership(ours.userId, theirs.firmId))?.scope).toMatchObject({
			firmId: theirs.firmId,
			role: 'viewer'
		});
	});

	it('gives nothing to a person without a firm', async () => {
		const [row] = await app`insert into ${app('user')} (email) values ('alone@example.test') returning id`;
		expect(await findMembership(row?.id, ours.firmId)).toBeNull();
	});
});
