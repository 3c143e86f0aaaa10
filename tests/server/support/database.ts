/**
 * One database for each test file, cloned from a migrated template in the server of TEST_DATABASE_ADMIN_URL. The
 * template is made once for each set of migrations; test files that start together wait for it by an advisory lock.
 */
import { createHash, randomBytes } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { drizzle } from 'drizzle-orm/postgres-js';
import { migrate } from 'drizzle-orm/postgres-js/migrator';
import postgres from 'postgres';
import { closeDatabase } from '../../../src/lib/server/db';

const MIGRATIONS = 'drizzle';
const APPLICATION = 'evendraft_app';
const LOCK = 4_202_612;

export interface TestDatabase {
	/** Address for the owner of the tables, who may look behind row-level security only as far as it lets owners. */
	readonly ownerUrl: string;
	/** Ends the application's connections and drops the database. */
	readonly drop: () => Promise<void>;
}

function required(name: string): string {
	const value = process.env[name];
	if (!value) throw new Error(`${name} is not set: run the server tests by npm run test:server`);
	return value;
}

function addressOf(adminUrl: string, name: string, login?: { user: string; password: string }): string {
	const url = new URL(adminUrl);
	url.pathname = `/${name}`;
	if (login) [url.username, url.password] = [login.user, encodeURIComponent(login.password)];
	return url.href;
}

/** Named by the migrations' text, so that a new migration gets a new template. */
function templateName(): string {
	const files = readdirSync(MIGRATIONS).filter((name) => name.endsWith('.sql'));
	const hash = createHash('sha256');
	for (const file of files.sort()) hash.update(readFileSync(`${MIGRATIONS}/${file}`));
	return `evendraft_template_${hash.digest('hex').slice(0, 16)}`;
}

async function makeTemplate(admin: postgres.Sql, adminUrl: string, name: string): Promise<void> {
	const [found] = await admin`select 1 from pg_database where datname = ${name}`;
	if (found) return;
	// Under another name until it is whole: a run that was killed leaves no half of a template.
	const raw = `${name}_raw`;
	await admin.unsafe(`drop database if exists ${raw} with (force)`);
	await admin.unsafe(`create database ${raw}`);
	const owner = postgres(addressOf(adminUrl, raw), { max: 1, onnotice: () => {} });
	try {
		await migrate(drizzle(owner), { migrationsFolder: MIGRATIONS });
	} finally {
		await owner.end({ timeout: 5 });
	}
	await admin.unsafe(`alter database ${raw} rename to ${name}`);
}

async function makeRole(admin: postgres.Sql, password: string): Promise<void> {
	const [found] = await admin`select 1 from pg_roles where rolname = ${APPLICATION}`;
	if (found) return;
	await admin.unsafe(
		`create role ${APPLICATION} login password '${password.replaceAll("'", "''")}'
		 nosuperuser nocreatedb nocreaterole nobypassrls`
	);
}

/** Makes this file's database and points DATABASE_URL at it, as the application's role. */
export async function freshDatabase(): Promise<TestDatabase> {
	const adminUrl = required('TEST_DATABASE_ADMIN_URL');
	const password = required('TEST_DATABASE_APP_PASSWORD');
	const name = `evendraft_test_${randomBytes(6).toString('hex')}`;
	const admin = postgres(adminUrl, { max: 1, onnotice: () => {} });
	try {
		await admin`select pg_advisory_lock(${LOCK})`;
		await makeRole(admin, password);
		const template = templateName();
		await makeTemplate(admin, adminUrl, template);
		await admin.unsafe(`create database ${name} template ${template}`);
	} finally {
		await admin.end({ timeout: 5 });
	}
	process.env.DATABASE_URL = addressOf(adminUrl, name, { user: APPLICATION, password });
	return { ownerUrl: addressOf(adminUrl, name), drop: () => drop(adminUrl, name) };
}

async function drop(adminUrl: string, name: string): Promise<void> {
	await closeDatabase();
	const admin = postgres(adminUrl, { max: 1, onnotice: () => {} });
	await admin.unsafe(`drop database ${name} with (force)`);
	await admin.end({ timeout: 5 });
}
