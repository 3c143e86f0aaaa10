import { asc, desc, eq, sql } from 'drizzle-orm';
import { provenScope, type FirmScope } from '../auth/scope';
import { asPerson } from '../db';
import { firm, membership } from '../db/schema';

export interface CurrentFirm {
	readonly scope: FirmScope;
	readonly firm: { readonly firmId: string; readonly name: string };
}

/**
 * The firm in which a person works: the one their session chose, if they still belong to it, else their first.
 * Null when they belong to none. This is the membership check, read from the database at each request.
 */
export async function findMembership(userId: string, chosenFirmId: string | null): Promise<CurrentFirm | null> {
	const chosenFirst = sql`${membership.firmId} is not distinct from ${chosenFirmId}::uuid`;
	const [row] = await asPerson(userId, (tx) =>
		tx
			.select({ firmId: firm.firmId, name: firm.name, role: membership.role })
			.from(membership)
			.innerJoin(firm, eq(firm.firmId, membership.firmId))
			.where(eq(membership.userId, userId))
			.orderBy(desc(chosenFirst), asc(membership.createdAt))
			.limit(1)
	);
	if (!row) return null;
	return { scope: provenScope(row.firmId, userId, row.role), firm: { firmId: row.firmId, name: row.name } };
}
