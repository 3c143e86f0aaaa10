import { createHash, randomBytes } from 'node:crypto';
import { and, eq, gt, isNull } from 'drizzle-orm';
import { database } from '../db';
import { mailToken, verificationToken } from '../db/schema';

type Purpose = (typeof mailToken.$inferSelect)['purpose'];

const HOUR_ms = 3_600_000;
/** How long a letter works. */
const LIFE_ms: Readonly<Record<Purpose, number>> = { 'verify-address': 24 * HOUR_ms, 'reset-password': HOUR_ms };

const digest = (token: string): string => createHash('sha256').update(token).digest('hex');

const live = (token: string, purpose: Purpose) =>
	and(
		eq(mailToken.tokenHash, digest(token)),
		eq(mailToken.purpose, purpose),
		isNull(mailToken.usedAt),
		gt(mailToken.expiresAt, new Date())
	);

/** A new token for a letter; earlier ones for the same purpose no longer work. Only its hash is stored. */
export async function newMailToken(userId: string, purpose: Purpose): Promise<string> {
	const token = randomBytes(32).toString('base64url');
	await database().transaction(async (tx) => {
		await tx.delete(mailToken).where(and(eq(mailToken.userId, userId), eq(mailToken.purpose, purpose)));
		const expiresAt = new Date(Date.now() + LIFE_ms[purpose]);
		await tx.insert(mailToken).values({ tokenHash: digest(token), userId, purpose, expiresAt });
	});
	return token;
}

/** Whether a token would still work; uses nothing up. */
export async function isLiveMailToken(token: string, purpose: Purpose): Promise<boolean> {
	const rows = await database().select({ userId: mailToken.userId }).from(mailToken).where(live(token, purpose));
	return rows.length > 0;
}

/** Ends what letters to a person still open: tokens, and links to sign in, from before their password was changed. */
export async function endLetters(userId: string, email: string): Promise<void> {
	await database().transaction(async (tx) => {
		await tx.delete(mailToken).where(eq(mailToken.userId, userId));
		await tx.delete(verificationToken).where(eq(verificationToken.identifier, email));
	});
}

/** Uses a token up and tells whose it was; null when it is unknown, used or too old. */
export async function useMailToken(token: string, purpose: Purpose): Promise<string | null> {
	const [row] = await database()
		.update(mailToken)
		.set({ usedAt: new Date() })
		.where(live(token, purpose))
		.returning({ userId: mailToken.userId });
	return row?.userId ?? null;
}
