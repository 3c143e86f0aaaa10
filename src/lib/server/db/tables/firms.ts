import { sql } from 'drizzle-orm';
import {
	doublePrecision,
	index,
	pgPolicy,
	pgTable,
	primaryKey,
	text,
	timestamp,
	uniqueIndex,
	uuid
} from 'drizzle-orm/pg-core';
import { application, currentUser, ofCurrentFirm } from '../roles';
import { user } from './sign-in';

const moment = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });

/** Roles of a firm, from most to fewest rights. */
export const ROLES = ['owner', 'administrator', 'engineer', 'checker', 'field', 'viewer'] as const;
export type Role = (typeof ROLES)[number];

export const firm = pgTable(
	'firm',
	{
		firmId: uuid('firm_id').primaryKey(),
		name: text('name').notNull(),
		createdAt: moment('created_at').notNull().defaultNow()
	},
	() => [
		ofCurrentFirm(),
		// A person reads the firms that they belong to before one of them is chosen.
		pgPolicy('of_its_members', {
			for: 'select',
			to: application,
			using: sql`exists (select 1 from membership m where m.firm_id = firm.firm_id and m.user_id = ${currentUser})`
		})
	]
);

export const membership = pgTable(
	'membership',
	{
		firmId: uuid('firm_id')
			.notNull()
			.references(() => firm.firmId),
		userId: uuid('user_id')
			.notNull()
			.references(() => user.id),
		role: text('role', { enum: ROLES }).notNull(),
		createdAt: moment('created_at').notNull().defaultNow()
	},
	(t) => [
		primaryKey({ columns: [t.firmId, t.userId] }),
		index('membership_user').on(t.userId),
		ofCurrentFirm(),
		pgPolicy('of_the_person', { for: 'select', to: application, using: sql`user_id = ${currentUser}` })
	]
);

export const project = pgTable(
	'project',
	{
		firmId: uuid('firm_id')
			.notNull()
			.references(() => firm.firmId),
		projectId: uuid('project_id').notNull().defaultRandom(),
		number: text('number').notNull(),
		name: text('name').notNull(),
		client: text('client').notNull().default(''),
		place: text('place').notNull().default(''),
		/** Above sea level [m]; new designs begin with it. */
		elevation_m: doublePrecision('elevation_m').notNull().default(0),
		units: text('units', { enum: ['SI', 'IP'] })
			.notNull()
			.default('SI'),
		createdAt: moment('created_at').notNull().defaultNow(),
		archivedAt: moment('archived_at')
	},
	(t) => [
		primaryKey({ columns: [t.firmId, t.projectId] }),
		uniqueIndex('project_number').on(t.firmId, t.number),
		ofCurrentFirm()
	]
);
