/**
 * Applies the migrations in drizzle/ and makes the application's role.
 * Environment: DATABASE_ADMIN_URL (owner of the tables), DATABASE_APP_PASSWORD.
 */
import { drizzle } from 'drizzle-orm/postgres-js';
import { migrate } from 'drizzle-orm/postgres-js/migrator';
import postgres from 'postgres';

const { DATABASE_ADMIN_URL: url, DATABASE_APP_PASSWORD: password } = process.env;

/** One run at a time on a server, whoever starts it. */
const LOCK = 4_202_611;

async function run(): Promise<void> {
	if (!url) throw new Error('DATABASE_ADMIN_URL is not set');
	if (!password) throw new Error('DATABASE_APP_PASSWORD is not set');
	const sql = postgres(url, { max: 1, onnotice: () => {} });
	try {
		await sql`select pg_advisory_lock(${LOCK})`;
		const [role] = await sql`select 1 from pg_roles where rolname = 'evendraft_app'`;
		const attributes = `login password '${password.replaceAll("'", "''")}' nosuperuser nocreatedb nocreaterole nobypassrls`;
		await sql.unsafe(`${role ? 'alter' : 'create'} role evendraft_app ${attributes}`);
		await migrate(drizzle(sql), { migrationsFolder: 'drizzle' });
	} finally {
		await sql.end({ timeout: 5 });
	}
}

run().catch((cause: unknown) => {
	process.stderr.write(`migrate: ${cause instanceof Error ? cause.message : String(cause)}\n`);
	process.exit(1);
});
