import { DrizzleAdapter } from '@auth/drizzle-adapter';
import type { Adapter } from '@auth/sveltekit/adapters';
import { lt } from 'drizzle-orm';
import { database } from '../db';
import { account, user, verificationToken } from '../db/schema';

/** Auth.js on our tables. It never makes a person: people are made by signing up. */
export function adapter(): Adapter {
	const db = database();
	const tables = { usersTable: user, accountsTable: account, verificationTokensTable: verificationToken };
	const drizzled = DrizzleAdapter(db, tables);
	return {
		...drizzled,
		createUser: () => Promise.reject(new Error('people are made by signing up')),
		async createVerificationToken(token) {
			await db.delete(verificationToken).where(lt(verificationToken.expires, new Date()));
			await db.insert(verificationToken).values(token);
			return token;
		}
	};
}
