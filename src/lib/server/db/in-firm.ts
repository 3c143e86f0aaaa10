import { sql } from 'drizzle-orm';
import type { FirmScope } from '../auth/scope';
import { database, type Tx } from './connection';

/**
 * Runs one transaction in which the scope's firm is set for row-level security. Every query on a tenant table
 * goes through here; outside it the application's role sees no row.
 */
export function inFirm<T>(scope: FirmScope, work: (tx: Tx) => Promise<T>): Promise<T> {
	return database().transaction(async (tx) => {
		await tx.execute(
			sql`select set_config('app.firm_id', ${scope.firmId}, true), set_config('app.user_id', ${scope.userId}, true)`
		);
		return work(tx);
	});
}

/** Runs one transaction of a person before a firm is chosen: they see their own memberships and firms, no more. */
export function asPerson<T>(userId: string, work: (tx: Tx) => Promise<T>): Promise<T> {
	return database().transaction(async (tx) => {
		await tx.execute(sql`select set_config('app.user_id', ${userId}, true)`);
		return work(tx);
	});
}
