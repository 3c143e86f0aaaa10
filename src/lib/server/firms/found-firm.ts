import { randomUUID } from 'node:crypto';
import { provenScope } from '../auth/scope';
import { inFirm } from '../db';
import { firm, membership, user } from '../db/schema';

export interface Founder {
	readonly name: string;
	/** In lower case. */
	readonly email: string;
	readonly passwordHash: string;
	readonly firmName: string;
	/** For accounts that need no letter, as those of the demo. */
	readonly emailVerified?: Date;
}

/** SQLSTATE of a row that breaks a unique index. */
const UNIQUE_VIOLATION = '23505';

const addressTaken = (cause: unknown): boolean =>
	cause instanceof Error && (cause.cause as { code?: unknown } | undefined)?.code === UNIQUE_VIOLATION;

/** Makes a person, their firm and their ownership of it, together or not at all. Null when the address is known. */
export async function foundFirm(founder: Founder): Promise<{ userId: string; firmId: string } | null> {
	const { name, email, passwordHash, firmName, emailVerified } = founder;
	const [userId, firmId] = [randomUUID(), randomUUID()];
	try {
		await inFirm(provenScope(firmId, userId, 'owner'), async (tx) => {
			await tx.insert(user).values({ id: userId, name, email, passwordHash, emailVerified });
			await tx.insert(firm).values({ firmId, name: firmName });
			await tx.insert(membership).values({ firmId, userId, role: 'owner' });
		});
	} catch (cause) {
		if (addressTaken(cause)) return null;
		throw cause;
	}
	return { userId, firmId };
}
