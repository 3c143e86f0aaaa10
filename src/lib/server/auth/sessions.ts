import { and, desc, eq, gt, isNull, lt, ne, or } from 'drizzle-orm';
import { database } from '../db';
import { signedInSession, user } from '../db/schema';

const DAY_s = 86_400;
/** How long a browser stays signed in [s]. */
export const SESSION_LIFE_s = 30 * DAY_s;
/** `last_seen_at` is written at most this often [ms]. */
const TOUCH_ms = 5 * 60_000;

const live = () => and(isNull(signedInSession.revokedAt), gt(signedInSession.expiresAt, new Date()));

/** Begins a session in a browser and gives its id. Sessions that ended long ago are removed on the way. */
export async function beginSession(userId: string, browser: string): Promise<string> {
	const now = Date.now();
	const longAgo = new Date(now - SESSION_LIFE_s * 1000);
	const over = or(lt(signedInSession.expiresAt, longAgo), lt(signedInSession.revokedAt, longAgo));
	await database()
		.delete(signedInSession)
		.where(and(eq(signedInSession.userId, userId), over));
	const expiresAt = new Date(now + SESSION_LIFE_s * 1000);
	const row = { userId, browser: browser.slice(0, 300), expiresAt };
	const [made] = await database().insert(signedInSession).values(row).returning({ id: signedInSession.id });
	if (!made) throw new Error('the session was not made');
	return made.id;
}

/** The person and chosen firm of a session; null when it is revoked, expired or unknown. */
export async function findSession(sessionId: string) {
	const [row] = await database()
		.select({
			userId: user.id,
			email: user.email,
			name: user.name,
			firmId: signedInSession.firmId,
			lastSeenAt: signedInSession.lastSeenAt
		})
		.from(signedInSession)
		.innerJoin(user, eq(user.id, signedInSession.userId))
		.where(and(eq(signedInSession.id, sessionId), live()));
	if (!row) return null;
	if (Date.now() - row.lastSeenAt.getTime() > TOUCH_ms)
		await database().update(signedInSession).set({ lastSeenAt: new Date() }).where(eq(signedInSession.id, sessionId));
	return row;
}

/** The browsers in which a person is signed in, the last used first. */
export async function listSessions(userId: string) {
	const { id, browser, createdAt, lastSeenAt } = signedInSession;
	return database()
		.select({ id, browser, createdAt, lastSeenAt })
		.from(signedInSession)
		.where(and(eq(signedInSession.userId, userId), live()))
		.orderBy(desc(lastSeenAt));
}

/** Signs one browser of a person out. False when it is not theirs or is signed out already. */
export async function revokeSession(userId: string, sessionId: string): Promise<boolean> {
	const rows = await database()
		.update(signedInSession)
		.set({ revokedAt: new Date() })
		.where(and(eq(signedInSession.id, sessionId), eq(signedInSession.userId, userId), live()))
		.returning({ id: signedInSession.id });
	return rows.length > 0;
}

/** Signs every browser of a person out, but for the one that is kept. */
export async function revokeSessions(userId: string, keptId: string | null): Promise<void> {
	const others = keptId === null ? undefined : ne(signedInSession.id, keptId);
	await database()
		.update(signedInSession)
		.set({ revokedAt: new Date() })
		.where(and(eq(signedInSession.userId, userId), others, live()));
}
