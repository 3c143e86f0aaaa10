import { sql } from 'drizzle-orm';
import { database } from './connection';

/** Whether the database answers a question. */
export async function isReachable(): Promise<boolean> {
	try {
		await database().execute(sql`select 1`);
		return true;
	} catch {
		return false;
	}
}
