import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { inFirm } from '../../src/lib/server/db';
import { design, snapshot } from '../../src/lib/server/db/schema';
import { appendEdits } from '../../src/lib/server/designs/append-edits';
import { changeDesign } from '../../src/lib/server/designs/change-design';
import { openDesign } from '../../src/lib/server/designs/find-design';
import { applyMany } from '../../src/lib/sheet/apply';
import { MOST_PARTS } from '../../src/lib/sheet/count-parts';
import type { Edit } from '../../src/lib/sheet/edit';
import type { Entry } from '../../src/lib/sheet/entry';
import { EMPTY_SHEET, MOST_ROWS, type Sheet } from '../../src/lib/sheet/sheet';
import { ORIGIN } from './support/browser';
import { freshDatabase, type TestDatabase } from './support/database';
import { append, colleague, emptyDesign, firm, logOf, rowsOf, sent, treeDesign, write } from './support/designs';

let made: TestDatabase;
let ours: FirmScope;
let second: FirmScope;
let theirs: FirmScope;
beforeAll(async () => {
	Object.assign(process.env, { AUTH_URL: ORIGIN, AUTH_SECRET: 'a secret for tests alone, 32 or more' });
	made = await freshDatabase();
	[ours, theirs] = await Promise.all([firm('ours@example.test'), firm('theirs@example.test')]);
	second = await colleague(ours, 'second@example.test', 'engineer');
});
afterAll(() => made?.drop());

const seqs = async (designId: string) => (await logOf(ours, designId)).map(({ seq }) => seq);
const upTo = (last: number) => Array.from({ length: last }, (_, at) => at + 1);
const opened = async (scope: FirmScope, designId: string) => {
	const found = await openDesign(scope, designId);
	if (!found) throw new Error('the design was absent');
	return found;
};
const typedOf = async (designId: string, field: 'serves' | 'length') =>
	(await opened(ours, designId)).sheet.rows.map(({ cells }) => cells[field]?.typed);

describe('an edit that is sent again', () => {
	it('counts once in one message and in the next', async () => {
		const { designId, ids } = await treeDesign(ours);
		const { edit } = rowsOf([{ tag: 'S4' }]);
		const once = sent(edit);
		const first = await append(ours, designId, [once, once], 2);
		expect(first).toMatchObject({ seq: 3, refused: [] });
		expect(first.entries.map(({ id }) => id)).toEqual([once.id]);
		const again = await append(ours, designId, [once, sent(write(ids[0] ?? '', 'serves', 'J1'))], 2);
		expect(again.seq).toBe(4);
		expect(again.entries.map(({ seq }) => seq)).toEqual([3, 4]);
		expect(await seqs(designId)).toEqual([1, 2, 3, 4]);
		expect((await opened(ours, designId)).sheet.rows).toHaveLength(4);
	});

	it('counts once when many copies come at the same time', async () => {
		const { designId } = await treeDesign(ours);
		const edits = upTo(5).map((at) => sent(rowsOf([{ tag: `N${at}` }]).edit));
		const replies = await Promise.all(upTo(12).map(() => append(ours, designId, edits)));
		for (const reply of replies) expect(reply).toMatchObject({ seq: 7, refused: [] });
		expect(await seqs(designId)).toEqual(upTo(7));
		expect((await opened(ours, designId)).sheet.rows).toHaveLength(8);
	});

	it('may have an id that another design has', async () => {
		const [one, other] = [await treeDesign(ours), await treeDesign(ours, 'AHU-2')];
		const id = randomUUID();
		for (const { designId, ids } of [one, other])
			expect(await append(ours, designId, [sent(write(ids[0] ?? '', 'length', '9'), id)])).toMatchObject({ seq: 3 });
	});
});

describe('edits of several people', () => {
	it('stand in the order in which the server took them, for everybody', async () => {
		const { designId, ids } = await treeDesign(ours);
		const [row = ''] = ids;
		await append(second, designId, [sent(write(row, 'length', '11'))], 2);
		const mine = await append(ours, designId, [sent(write(row, 'length', '12'))], 2);
		expect(mine.entries.map(({ seq, entry }) => [seq, entry])).toEqual([
			[3, expect.objectContaining({ cell: expect.objectContaining({ typed: '11' }) })],
			[4, expect.objectContaining({ cell: expect.objectContaining({ typed: '12' }) })]
		]);
		for (const scope of [ours, second])
			expect((await opened(scope, designId)).sheet.rows[0]?.cells.length?.typed).toBe('12');
		expect((await logOf(ours, designId)).slice(2).map(({ userId }) => userId)).toEqual([second.userId, ours.userId]);
	});

	it('of which one deletes the row that the other writes, do what can still be done', async () => {
		const { designId, ids } = await treeDesign(ours);
		const [, row = ''] = ids;
		await append(second, designId, [sent({ kind: 'delete', rows: [row] })], 2);
		const mine = await append(
			ours,
			designId,
			[sent(write(row, 'length', '12')), sent(write(ids[2] ?? '', 'length', '13'))],
			2
		);
		expect(mine).toMatchObject({ seq: 5, refused: [] });
		expect(await typedOf(designId, 'length')).toEqual(['8', '13']);
	});

	it('that come at the same time all stay, in numbers without a gap', async () => {
		const { designId, ids } = await treeDesign(ours);
		const texts = upTo(40).map((at) => `room ${at}`);
		const replies = await Promise.all(
			texts.map((text, at) =>
				append(at % 2 ? ours : second, designId, [
					sent(rowsOf([{ tag: `N${at}`, serves: text }]).edit),
					sent(write(ids[0] ?? '', 'serves', text))
				])
			)
		);
		expect(await seqs(designId)).toEqual(upTo(82));
		expect(replies.map(({ seq }) => seq).sort((a, b) => a - b)).toEqual(upTo(40).map((at) => 2 + 2 * at));
		const [first, , , ...added] = await typedOf(designId, 'serves');
		expect([...added].sort()).toEqual([...texts].sort());
		// Whoever came last in the log has the cell, and the two edits of one message stay together.
		expect(first).toBe(added.at(-1));
	});

	it('ask for what they lack without sending anything', async () => {
		const { designId } = await treeDesign(ours);
		const asked = await append(second, designId, [], 1);
		expect(asked.entries.map(({ seq }) => seq)).toEqual([2]);
		expect(asked.seq).toBe(2);
		expect(await seqs(designId)).toEqual([1, 2]);
	});
});

describe('the snapshots of a design', () => {
	const snapshotsOf = (designId: string) =>
		inFirm(ours, async (tx) => (await tx.select().from(snapshot)).filter((row) => row.designId === designId));

	it('come with every hundredth entry and equal a replay of the log from its beginning', async () => {
		const { designId, ids } = await treeDesign(ours);
		const { edit, ids: added } = rowsOf([{ tag: 'S9', joins: 'S1', size: '12"x8"', length: '3.5', flow: '60' }]);
		const steps: Edit[] = [edit, { kind: 'move', rows: added, before: ids[0] ?? null }];
		for (let at = 0; steps.length < 210; at++)
			steps.push(at % 9 ? write(ids[at % 3] ?? '', 'length', String(at)) : write(null, 'title', `Title ${at}`));
		steps.push({ kind: 'delete', rows: [ids[1] ?? ''] });
		for (let at = 0; at < steps.length; at += 23)
			await append(
				ours,
				designId,
				steps.slice(at, at + 23).map((step) => sent(step))
			);
		const kept = await snapshotsOf(designId);
		expect(kept.map(({ seq }) => Math.floor(seq / 100)).sort()).toEqual([1, 2]);
		const log = await logOf(ours, designId);
		const replay = (last: number) =>
			applyMany(
				EMPTY_SHEET,
				log.filter(({ seq }) => seq <= last).map(({ entry }) => entry as Entry)
			);
		for (const { seq, sheet } of kept) expect(sheet as Sheet).toEqual(replay(seq));
		expect((await opened(ours, designId)).sheet).toEqual(replay(213));
		expect(log.map(({ seq }) => seq)).toEqual(upTo(213));
	});
});

describe('the register', () => {
	it('has the figures of the last solution of each design', async () => {
		const { designId, ids } = await treeDesign(ours);
		const { solved } = await append(ours, designId, [sent(write(ids[1] ?? '', 'flow', '140'))]);
		const [row] = await inFirm(ours, async (tx) =>
			(await tx.select().from(design)).filter((one) => one.designId === designId)
		);
		expect(solved.solution?.fan.flow).toBeCloseTo(0.32, 12);
		expect(row?.figures).toMatchObject({
			rows: 3,
			side: 'supply',
			flow: solved.solution?.fan.flow,
			totalPressure: solved.solution?.fan.totalPressure,
			index: solved.solution?.index.supply,
			problems: 0,
			uncounted: 0
		});
	});
});

describe('what no sheet can hold', () => {
	it(`is refused beyond ${MOST_ROWS} rows, told by its id, and what came beside it stays`, async () => {
		const { designId, ids } = await treeDesign(ours);
		const many = sent(rowsOf(Array.from({ length: MOST_ROWS - 2 }, (_, at) => ({ tag: `X${at}` }))).edit);
		const small = sent(write(ids[0] ?? '', 'length', '9'));
		const reply = await append(ours, designId, [many, small], 2);
		expect(reply.refused).toEqual([{ id: many.id, reason: expect.stringContaining(`${MOST_ROWS} rows`) }]);
		expect(reply.entries.map(({ id }) => id)).toEqual([small.id]);
		expect((await opened(ours, designId)).sheet.rows).toHaveLength(3);
	});

	it(`is refused beyond ${MOST_PARTS} parts of all rows together`, async () => {
		const { designId } = await treeDesign(ours);
		const parts = Array<string>(100).fill('elbow').join(', ');
		const rows = (count: number) =>
			sent(rowsOf(Array.from({ length: count }, (_, at) => ({ tag: `P${at}`, parts }))).edit);
		const [tooMany, enough] = [rows(MOST_PARTS / 100), rows(20)];
		const reply = await append(ours, designId, [tooMany, enough], 2);
		expect(reply.refused).toEqual([{ id: tooMany.id, reason: expect.stringContaining(`${MOST_PARTS} parts`) }]);
		expect(reply.entries.map(({ id }) => id)).toEqual([enough.id]);
	});

	it('a column or a setting that does not exist is refused, also one that every object has', async () => {
		const { designId, ids } = await treeDesign(ours);
		const wrong = ['colour', '__proto__', 'constructor', 'units'].map((field) => sent(write(ids[0] ?? '', field, 'x')));
		const settings = ['tag', 'toString'].map((field) => sent(write(null, field, 'x')));
		const reply = await append(ours, designId, [...wrong, ...settings], 2);
		expect(reply.refused.map(({ id }) => id)).toEqual([...wrong, ...settings].map(({ id }) => id));
		expect(reply).toMatchObject({ seq: 2, entries: [] });
	});

	it('an archived design takes no edit, and takes them again when it is brought back', async () => {
		const { designId, ids } = await treeDesign(ours);
		const edit = sent(write(ids[0] ?? '', 'length', '9'));
		expect(await changeDesign(ours, designId, { archived: true })).toBe('done');
		expect(await appendEdits(ours, designId, 0, [edit])).toBeNull();
		expect(await appendEdits(ours, designId, 0, [])).toMatchObject({ seq: 2 });
		await changeDesign(ours, designId, { archived: false });
		expect(await append(ours, designId, [edit])).toMatchObject({ seq: 3 });
	});
});

describe('a design of another firm', () => {
	it('looks absent to whoever opens it, writes in it or changes it', async () => {
		const { designId, ids } = await treeDesign(ours);
		const edit = sent(write(ids[0] ?? '', 'length', '99'));
		expect(await openDesign(theirs, designId)).toBeNull();
		expect(await appendEdits(theirs, designId, 0, [edit])).toBeNull();
		expect(await appendEdits(theirs, designId, 0, [])).toBeNull();
		for (const change of [{ archived: true }, { name: 'Taken' }, { service: '' }])
			expect(await changeDesign(theirs, designId, change)).toBe('absent');
		const { sheet, heading } = await opened(ours, designId);
		expect(sheet.rows[0]?.cells.length?.typed).toBe('8');
		expect(heading).toMatchObject({ name: 'AHU-1', archivedAt: null });
		expect(await openDesign(theirs, await emptyDesign(theirs))).not.toBeNull();
	});
});
