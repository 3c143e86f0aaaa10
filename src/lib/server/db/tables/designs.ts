import { sql } from 'drizzle-orm';
import {
	bigint,
	check,
	foreignKey,
	index,
	integer,
	jsonb,
	pgTable,
	primaryKey,
	text,
	timestamp,
	uniqueIndex,
	uuid
} from 'drizzle-orm/pg-core';
import { ofCurrentFirm } from '../roles';
import { project } from './firms';
import { user } from './sign-in';

const moment = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });
const firmId = () => uuid('firm_id').notNull();

/** One air system: the fan and all that joins it. */
export const design = pgTable(
	'design',
	{
		firmId: firmId(),
		designId: uuid('design_id').notNull().defaultRandom(),
		projectId: uuid('project_id').notNull(),
		/** Tag of the system, as AHU-1. */
		name: text('name').notNull(),
		service: text('service').notNull().default(''),
		/** The last entry of the edit log; also the lock that orders the edits. */
		headSeq: bigint('head_seq', { mode: 'number' }).notNull().default(0),
		/** Duty, flow and index outlet after the last edit, for the register; null while there is no answer. */
		figures: jsonb('figures'),
		createdAt: moment('created_at').notNull().defaultNow(),
		archivedAt: moment('archived_at')
	},
	(t) => [
		primaryKey({ columns: [t.firmId, t.designId] }),
		foreignKey({ columns: [t.firmId, t.projectId], foreignColumns: [project.firmId, project.projectId] }),
		uniqueIndex('design_name').on(t.firmId, t.projectId, t.name),
		ofCurrentFirm()
	]
);

/** The edit log. It only grows: the application may insert and select, nothing else. */
export const edit = pgTable(
	'edit',
	{
		firmId: firmId(),
		designId: uuid('design_id').notNull(),
		seq: bigint('seq', { mode: 'number' }).notNull(),
		/** Made by the client, so that a retry applies once. */
		editId: uuid('edit_id').notNull(),
		userId: uuid('user_id')
			.notNull()
			.references(() => user.id),
		/** What was done, with the cells as they were understood. */
		entry: jsonb('entry').notNull(),
		madeAt: moment('made_at').notNull().defaultNow()
	},
	(t) => [
		primaryKey({ columns: [t.firmId, t.designId, t.seq] }),
		uniqueIndex('edit_once').on(t.firmId, t.designId, t.editId),
		foreignKey({ columns: [t.firmId, t.designId], foreignColumns: [design.firmId, design.designId] }),
		ofCurrentFirm()
	]
);

/** The sheet as it stood after the entry `seq`, to open it without replaying the whole log. */
export const snapshot = pgTable(
	'snapshot',
	{
		firmId: firmId(),
		designId: uuid('design_id').notNull(),
		seq: bigint('seq', { mode: 'number' }).notNull(),
		sheet: jsonb('sheet').notNull(),
		madeAt: moment('made_at').notNull().defaultNow()
	},
	(t) => [
		primaryKey({ columns: [t.firmId, t.designId, t.seq] }),
		foreignKey({ columns: [t.firmId, t.designId], foreignColumns: [design.firmId, design.designId] }),
		ofCurrentFirm()
	]
);

export const STATUSES = ['work-in-progress', 'issued-for-review'] as const;

/** A saved version. It never changes: the application may insert and select, nothing else. */
export const version = pgTable(
	'version',
	{
		firmId: firmId(),
		designId: uuid('design_id').notNull(),
		number: integer('number').notNull(),
		/** Revision code, as P01. */
		revision: text('revision').notNull(),
		note: text('note').notNull(),
		status: text('status', { enum: STATUSES }).notNull(),
		/** The entry of the edit log that it was saved after. */
		seq: bigint('seq', { mode: 'number' }).notNull(),
		/** The sheet as typed, to restore it. */
		sheet: jsonb('sheet').notNull(),
		document: jsonb('document').notNull(),
		solution: jsonb('solution').notNull(),
		/** Firm, project and design as they were named then, for the title block. */
		heading: jsonb('heading').notNull(),
		engineVersion: text('engine_version').notNull(),
		/** SHA-256 of the canonical form of document, solution and engine version; hexadecimal. */
		sha256: text('sha256').notNull(),
		userId: uuid('user_id')
			.notNull()
			.references(() => user.id),
		savedAt: moment('saved_at').notNull().defaultNow()
	},
	(t) => [
		primaryKey({ columns: [t.firmId, t.designId, t.number] }),
		uniqueIndex('version_revision').on(t.firmId, t.designId, t.revision),
		index('version_hash').on(t.firmId, t.sha256),
		foreignKey({ columns: [t.firmId, t.designId], foreignColumns: [design.firmId, design.designId] }),
		check('version_sha256', sql`${t.sha256} ~ '^[0-9a-f]{64}$'`),
		ofCurrentFirm()
	]
);
