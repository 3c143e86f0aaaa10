import { sql } from 'drizzle-orm';
import { check, index, integer, pgTable, primaryKey, text, timestamp, uniqueIndex, uuid } from 'drizzle-orm/pg-core';

const moment = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });

/** A person. `email` is kept in lower case. The keys are those that the Auth.js adapter expects. */
export const user = pgTable(
	'user',
	{
		id: uuid('id').primaryKey().defaultRandom(),
		name: text('name'),
		email: text('email').notNull(),
		emailVerified: moment('email_verified'),
		image: text('image'),
		/** argon2id, in its own encoded form; null for those who only use links. */
		passwordHash: text('password_hash'),
		createdAt: moment('created_at').notNull().defaultNow()
	},
	(t) => [uniqueIndex('user_email').on(t.email), check('user_email_lower', sql`${t.email} = lower(${t.email})`)]
);

/** Identities at outside providers, as the Auth.js adapter keeps them. */
export const account = pgTable(
	'account',
	{
		userId: uuid('user_id')
			.notNull()
			.references(() => user.id, { onDelete: 'cascade' }),
		type: text('type').notNull(),
		provider: text('provider').notNull(),
		providerAccountId: text('provider_account_id').notNull(),
		refresh_token: text('refresh_token'),
		access_token: text('access_token'),
		expires_at: integer('expires_at'),
		token_type: text('token_type'),
		scope: text('scope'),
		id_token: text('id_token'),
		session_state: text('session_state')
	},
	(t) => [primaryKey({ columns: [t.provider, t.providerAccountId] })]
);

/** Tokens of sign-in links, hashed by Auth.js. */
export const verificationToken = pgTable(
	'verification_token',
	{
		identifier: text('identifier').notNull(),
		token: text('token').notNull(),
		expires: moment('expires').notNull()
	},
	(t) => [primaryKey({ columns: [t.identifier, t.token] })]
);

/** One signed-in browser. The session cookie carries its id; a revoked or expired one signs nobody in. */
export const signedInSession = pgTable(
	'signed_in_session',
	{
		id: uuid('id').primaryKey().defaultRandom(),
		userId: uuid('user_id')
			.notNull()
			.references(() => user.id, { onDelete: 'cascade' }),
		/** The firm that the person works in at present. */
		firmId: uuid('firm_id'),
		browser: text('browser').notNull().default(''),
		createdAt: moment('created_at').notNull().defaultNow(),
		lastSeenAt: moment('last_seen_at').notNull().defaultNow(),
		expiresAt: moment('expires_at').notNull(),
		revokedAt: moment('revoked_at')
	},
	(t) => [index('signed_in_session_user').on(t.userId)]
);

/** Single-use tokens of letters that verify an address or reset a password; only their SHA-256 is kept. */
export const mailToken = pgTable(
	'mail_token',
	{
		tokenHash: text('token_hash').primaryKey(),
		userId: uuid('user_id')
			.notNull()
			.references(() => user.id, { onDelete: 'cascade' }),
		purpose: text('purpose', { enum: ['verify-address', 'reset-password'] }).notNull(),
		expiresAt: moment('expires_at').notNull(),
		usedAt: moment('used_at')
	},
	(t) => [index('mail_token_user').on(t.userId)]
);
