import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { openDesign } from '../../src/lib/server/designs/find-design';
import { listVersions } from '../../src/lib/server/versions/versions';
import type { EditsReply } from '../../src/lib/sheet/server-reply';
import { POST } from '../../src/routes/api/v1/designs/[designId]/edits/+server';
import { actions as basis } from '../../src/routes/(app)/designs/[designId]/basis/+page.server';
import { load as openSheet } from '../../src/routes/(app)/designs/[designId]/+layout.server';
import { actions as versions } from '../../src/routes/(app)/designs/[designId]/versions/+page.server';
import {
	actions as oneVersion,
	load as openVersion
} from '../../src/routes/(app)/designs/[designId]/versions/[number]/+page.server';
import { browser, ORIGIN, type Answer, type Browser } from './support/browser';
import { freshDatabase, type TestDatabase } from './support/database';
import { colleague, firm, logOf, rowsOf, sent, treeDesign, write } from './support/designs';
import { signedIn } from './support/people';

let made: TestDatabase;
let ours: FirmScope;
let engineer: Browser;
let viewer: Browser;
let stranger: Browser;
beforeAll(async () => {
	Object.assign(process.env, { AUTH_URL: ORIGIN, AUTH_SECRET: 'a secret for tests alone, 32 or more' });
	made = await freshDatabase();
	ours = await firm('ours@example.test');
	await Promise.all([
		firm('theirs@example.test'),
		colleague(ours, 'viewer@example.test', 'viewer'),
		colleague(ours, 'engineer@example.test', 'engineer')
	]);
	[engineer, viewer, stranger] = (await Promise.all(
		['engineer', 'viewer', 'theirs'].map((name) => signedIn(`${name}@example.test`))
	)) as [Browser, Browser, Browser];
});
afterAll(() => made?.drop());

const route = '/api/v1/designs/[designId]/edits';
const post = (visitor: Browser, designId: string, content: string, headers: Record<string, string> = {}) =>
	visitor.ask({
		routeId: route,
		path: `/api/v1/designs/${designId}/edits`,
		params: { designId },
		content,
		headers: { 'content-type': 'application/json', ...headers },
		run: POST
	});
const postEdits = (visitor: Browser, designId: string, edits: unknown, base: unknown = 0) =>
	post(visitor, designId, JSON.stringify({ base, edits }));
const json = (answer: Answer) => (answer.body as Response).json() as Promise<unknown>;

describe('the route for edits', () => {
	it('answers with the entries that the client lacks and the figures of the server', async () => {
		const { designId, ids } = await treeDesign(ours);
		const edit = sent(write(ids[0] ?? '', 'size', '500x250'));
		const answer = await postEdits(engineer, designId, [edit], 1);
		const reply = (await json(answer)) as EditsReply;
		expect(reply.entries.map(({ seq }) => seq)).toEqual([2, 3]);
		expect(reply).toMatchObject({ seq: 3, refused: [], problems: 0, figures: { rows: 3 } });
		expect(reply.figures?.fan.flow).toBeCloseTo(0.3, 12);
	});

	it('takes an id in capitals as the same one', async () => {
		const { designId } = await treeDesign(ours);
		const edit = sent(rowsOf([{ tag: 'S4' }]).edit);
		for (const id of [edit.id, edit.id.toUpperCase()])
			expect(await json(await postEdits(engineer, designId, [{ ...edit, id }]))).toMatchObject({ seq: 3 });
		expect(await logOf(ours, designId)).toHaveLength(3);
	});

	const id = randomUUID();
	const set = { kind: 'set', row: null, field: 'title', typed: 'x', units: 'SI' };
	it.each([
		['what is not JSON', 400, '{"base":0,'],
		['nothing', 400, ''],
		['NaN', 400, '{"base":NaN,"edits":[]}'],
		['null', 422, 'null'],
		['a list', 422, '[]'],
		['a document of another form', 422, '{"format":"evendraft/design@1","rows":[]}'],
		['a base that is negative', 422, JSON.stringify({ base: -1, edits: [] })],
		['a base that is no whole number', 422, JSON.stringify({ base: 0.5, edits: [] })],
		['a base beyond what can be counted', 422, '{"base":1e300,"edits":[]}'],
		['an edit with no id', 422, JSON.stringify({ base: 0, edits: [{ edit: set }] })],
		['an id that is none', 422, JSON.stringify({ base: 0, edits: [{ id: '1', edit: set }] })],
		[
			'an edit of an unknown kind',
			422,
			JSON.stringify({ base: 0, edits: [{ id, edit: { ...set, kind: 'replace' } }] })
		],
		['a figure where a text belongs', 422, JSON.stringify({ base: 0, edits: [{ id, edit: { ...set, typed: 3 } }] })],
		[
			'a text that is too long',
			422,
			JSON.stringify({ base: 0, edits: [{ id, edit: { ...set, typed: 'x'.repeat(2001) } }] })
		],
		['units that are none', 422, JSON.stringify({ base: 0, edits: [{ id, edit: { ...set, units: 'CGS' } }] })],
		[
			'more edits than one message holds',
			422,
			JSON.stringify({ base: 0, edits: Array.from({ length: 1001 }, () => ({ id, edit: set })) })
		],
		[
			'one edit in a thousand at fault',
			422,
			JSON.stringify({
				base: 0,
				edits: [
					{ id, edit: set },
					{ id: 'x', edit: set }
				]
			})
		]
	])('refuses %s with a problem and stores nothing', async (_what, status, content) => {
		const { designId } = await treeDesign(ours);
		const answer = await post(engineer, designId, content);
		expect(answer.status).toBe(status);
		expect(answer.headers.get('content-type')).toBe('application/problem+json');
		expect(await json(answer)).toMatchObject({
			status,
			title: expect.any(String),
			type: expect.stringMatching(/^urn:/)
		});
		expect(await logOf(ours, designId)).toHaveLength(2);
	});

	it('refuses a body over the limit of the server as too large', async () => {
		const { designId } = await treeDesign(ours);
		const tooLarge = Object.assign(new Error('Payload Too Large'), { status: 413 });
		const request = { json: () => Promise.reject(tooLarge) };
		const answer = await engineer.ask({
			routeId: route,
			path: `/api/v1/designs/${designId}/edits`,
			params: { designId },
			method: 'POST',
			run: (event: Record<string, unknown>) => POST({ ...event, request } as never)
		});
		expect(answer.status).toBe(413);
		expect(await json(answer)).toMatchObject({ code: 'too-large' });
	});

	it('keeps text with NUL, half of a surrogate pair, quotes and SQL as text', async () => {
		const { designId, ids } = await treeDesign(ours);
		const texts = ['a\0b', 'half \ud83d only', "'; drop table edit; --", '🏛 “Bücherei” 図書館', '\\u0000', '${1}'];
		const edits = texts.map((typed, at) => sent(write(ids[at % 3] ?? '', at < 3 ? 'serves' : 'tag', typed)));
		const answer = await postEdits(engineer, designId, edits, 2);
		expect(answer.status).toBe(200);
		expect(await json(answer)).toMatchObject({ seq: 8, refused: [] });
		const log = (await logOf(ours, designId))
			.slice(2)
			.map(({ entry }) => (entry as { cell: { typed: string } }).cell.typed);
		expect(log).toEqual(['ab', 'half \ufffd only', ...texts.slice(2)]);
		expect((await openDesign(ours, designId))?.sheet.rows[0]?.cells.tag?.typed).toBe(texts[3]);
	});

	it('lets a viewer look and not write', async () => {
		const { designId, ids } = await treeDesign(ours);
		const refused = await postEdits(viewer, designId, [sent(write(ids[0] ?? '', 'length', '99'))]);
		expect(refused.status).toBe(404);
		expect(await json(await postEdits(viewer, designId, [], 1))).toMatchObject({ seq: 2 });
		expect(await logOf(ours, designId)).toHaveLength(2);
	});

	it("is absent for another firm's person and for what is no id, and closed for a stranger", async () => {
		const { designId, ids } = await treeDesign(ours);
		const edits = [sent(write(ids[0] ?? '', 'length', '99'))];
		for (const [visitor, of] of [
			[stranger, designId],
			[engineer, randomUUID()],
			[engineer, 'no-id'],
			[engineer, `${designId}'`]
		] as const) {
			const answer = await postEdits(visitor, of, edits);
			expect(answer.status).toBe(404);
			expect(answer.headers.get('content-type')).toBe('application/problem+json');
		}
		expect((await postEdits(browser(), designId, edits)).status).toBe(401);
		expect(
			(await post(engineer, designId, JSON.stringify({ base: 0, edits }), { origin: 'https://elsewhere.example' }))
				.status
		).toBe(403);
		expect(await logOf(ours, designId)).toHaveLength(2);
	});
});

describe('the pages of a design', () => {
	const page = (designId: string, below: string, more: object = {}) => ({
		routeId: `/(app)/designs/[designId]/${below}`,
		path: `/designs/${designId}/${below}`,
		params: { designId, ...more }
	});
	const open = (visitor: Browser, designId: string) =>
		visitor.ask({
			...page(designId, 'sheet'),
			run: (event: object) => openSheet({ ...event, depends: () => {} } as never)
		});
	const number = (text: string) => ({
		routeId: '/(app)/designs/[designId]/versions/[number]',
		params: { number: text }
	});
	const saving = { note: 'first', status: 'work-in-progress' };

	it('open for a member, read only for a viewer, and are absent for another firm', async () => {
		const { designId } = await treeDesign(ours);
		expect((await open(engineer, designId)).body).toMatchObject({ mayEdit: true, seq: 2 });
		expect((await open(viewer, designId)).body).toMatchObject({ mayEdit: false, seq: 2 });
		for (const [visitor, of] of [
			[stranger, designId],
			[engineer, randomUUID()],
			[engineer, 'no-id']
		] as const)
			expect((await open(visitor, of)).status).toBe(404);
	});

	it('save, open and restore a version for an editor only', async () => {
		const { designId } = await treeDesign(ours);
		const save = (visitor: Browser, form: Record<string, string> = saving) =>
			visitor.ask({ ...page(designId, 'versions'), form, run: versions.save });
		const restore = (visitor: Browser, text = '1') =>
			visitor.ask({
				...page(designId, `versions/${text}`),
				...number(text),
				params: { designId, number: text },
				form: {},
				run: oneVersion.restore
			});
		const look = (visitor: Browser, text = '1') =>
			visitor.ask({
				...page(designId, `versions/${text}`),
				...number(text),
				params: { designId, number: text },
				run: openVersion
			});
		for (const visitor of [viewer, stranger]) expect((await save(visitor)).status).toBe(404);
		expect((await save(engineer, { ...saving, note: ' ' })).body).toMatchObject({ status: 400 });
		expect((await save(engineer, { ...saving, note: 'a\0b' })).body).toMatchObject({ status: 400 });
		expect(await listVersions(ours, designId)).toEqual([]);
		expect((await save(engineer)).body).toMatchObject({ form: { message: 'Saved as P01' } });
		for (const visitor of [engineer, viewer])
			expect((await look(visitor)).body).toMatchObject({ version: { revision: 'P01' } });
		for (const [visitor, text] of [
			[stranger, '1'],
			[engineer, '2'],
			[engineer, '0'],
			[engineer, '-1'],
			[engineer, '1e3'],
			[engineer, '99999999999']
		] as const)
			expect((await look(visitor, text)).status, text).toBe(404);
		for (const visitor of [viewer, stranger]) expect((await restore(visitor)).status).toBe(404);
		expect((await restore(engineer, '2')).status).toBe(404);
		expect(await logOf(ours, designId)).toHaveLength(2);
		expect(await restore(engineer)).toMatchObject({
			status: 303,
			location: `/designs/${designId}/sheet?restored=P01&before=2`
		});
		expect(await logOf(ours, designId)).toHaveLength(3);
	});

	it('say what is missing when a sheet that does not stand whole is saved', async () => {
		const { designId, ids } = await treeDesign(ours);
		await postEdits(engineer, designId, [sent(write(ids[1] ?? '', 'size', '24xx12'))]);
		const answer = await engineer.ask({ ...page(designId, 'versions'), form: saving, run: versions.save });
		expect(answer.body).toMatchObject({ status: 409, data: { form: { message: expect.stringContaining('24xx12') } } });
	});

	it('change the basis of design for an editor only, as one entry of the log', async () => {
		const { designId } = await treeDesign(ours);
		const form = { name: 'AHU-1', serves: 'Supply air', typedIn: 'SI', temperature: '27', elevation: '120 m' };
		const change = (visitor: Browser) =>
			visitor.ask({ ...page(designId, 'basis'), form: { ...form, title: 'AHU-1' }, run: basis.save });
		for (const visitor of [viewer, stranger]) expect((await change(visitor)).status).toBe(404);
		expect(await logOf(ours, designId)).toHaveLength(2);
		expect((await change(engineer)).body).toMatchObject({ form: { message: 'Saved' } });
		const { sheet, seq } = (await openDesign(ours, designId)) ?? {};
		expect(seq).toBe(3);
		expect([sheet?.settings.temperature?.value, sheet?.settings.elevation?.value]).toEqual([27, 120]);
	});
});
