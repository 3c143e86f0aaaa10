import { eq } from 'drizzle-orm';
import { database } from '../db';
import { user } from '../db/schema';

export type User = typeof user.$inferSelect;
type Change = Partial<Pick<User, 'name' | 'emailVerified' | 'passwordHash'>>;

/** The person with this address, given in lower case; null when there is none. */
export async function findUserByEmail(email: string): Promise<User | null> {
	const [row] = await database().select().from(user).where(eq(user.email, email));
	return row ?? null;
}

/** The person with this id; null when there is none. */
export async function findUser(userId: string): Promise<User | null> {
	const [row] = await database().select().from(user).where(eq(user.id, userId));
	return row ?? null;
}

/** Changes a person's name, password or proof of address. */
export async function changeUser(userId: string, change: Change): Promise<void> {
	await database().update(user).set(change).where(eq(user.id, userId));
}
