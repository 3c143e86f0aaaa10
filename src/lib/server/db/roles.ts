import { sql } from 'drizzle-orm';
import { pgPolicy, pgRole } from 'drizzle-orm/pg-core';

/** The role that the application connects as. It owns nothing; the migration command makes it. */
export const application = pgRole('evendraft_app').existing();

/** The firm of the running transaction; null outside one, so that no row is seen. */
export const currentFirm = sql`nullif(current_setting('app.firm_id', true), '')::uuid`;

/** The person of the running transaction, for the rows that lead to a firm. */
export const currentUser = sql`nullif(current_setting('app.user_id', true), '')::uuid`;

/** The policy of a tenant table: only rows of the current firm are read or written. */
export const ofCurrentFirm = () =>
	pgPolicy('of_current_firm', {
		as: 'permissive',
		for: 'all',
		to: application,
		using: sql`firm_id = ${currentFirm}`,
		withCheck: sql`firm_id = ${currentFirm}`
	});
