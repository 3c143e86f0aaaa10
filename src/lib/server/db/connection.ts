import { drizzle, type PostgresJsDatabase } from 'drizzle-orm/postgres-js';
import postgres from 'postgres';
import * as schema from './schema';

export type Database = PostgresJsDatabase<typeof schema>;
export type Tx = Parameters<Parameters<Database['transaction']>[0]>[0];

/** What waits longer gives its connection back, so that one design cannot hold up all others [ms]. */
const PATIENCE = { lock_timeout: 15_000, statement_timeout: 60_000, idle_in_transaction_session_timeout: 120_000 };

let client: postgres.Sql | null = null;
let opened: Database | null = null;

/** The pool of connections, opened at first use: the build imports this module without a database. */
export function database(): Database {
	if (!opened) {
		const url = process.env.DATABASE_URL;
		if (!url) throw new Error('DATABASE_URL is not set');
		client = postgres(url, {
			max: Number(process.env.DATABASE_POOL ?? 10),
			onnotice: () => {},
			connection: PATIENCE
		});
		opened = drizzle(client, { schema });
	}
	return opened;
}

/** Ends the pool; for programs and tests that finish. */
export async function closeDatabase(): Promise<void> {
	await client?.end({ timeout: 5 });
	client = null;
	opened = null;
}
