import { beforeAll, describe, expect, it } from 'vitest';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { saveVersion } from '../../src/lib/server/versions/save-version';
import { colleague, firm, logOf, sent, treeDesign, write } from '../server/support/designs';
import { signIn } from './support/person';
import { RunSheet } from './support/run-sheet';
import { useStage } from './support/stage';

const stage = useStage();
let ours: FirmScope;
let designId = '';
let rowId = '';

beforeAll(async () => {
	ours = await firm('owner@example.test');
	await Promise.all([colleague(ours, 'viewer@example.test', 'viewer'), firm('stranger@example.test')]);
	const made = await treeDesign(ours);
	designId = made.designId;
	rowId = made.ids[0] ?? '';
	await saveVersion(ours, designId, { note: 'first', status: 'work-in-progress' });
});

const pages = () =>
	['sheet', 'ledger', 'basis', 'versions', 'versions/1', 'hand-over'].map((name) => `/designs/${designId}/${name}`);
const files = () =>
	['report.pdf', 'schedule.csv', 'document.json', 'versions/1/report.pdf'].map(
		(name) => `/api/v1/designs/${designId}/${name}`
	);
const body = () => JSON.stringify({ base: 0, edits: [sent(write(rowId, 'length', '99'))] });
const untouched = async () => expect(await logOf(ours, designId)).toHaveLength(2);

describe('a stranger', () => {
	it('is led to sign-in from every page of a firm, and gets no file', async () => {
		const { request } = await stage.newPage();
		for (const path of [...pages(), '/register', '/projects/new', '/account']) {
			const answer = await request.get(path, { maxRedirects: 0 });
			expect([answer.status(), answer.headers()['location']], path).toEqual([
				303,
				`/sign-in?to=${encodeURIComponent(path)}`
			]);
		}
		for (const path of files()) expect((await request.get(path)).status(), path).toBe(401);
	});

	it('comes back after sign-in to where they wanted to go', async () => {
		const page = await stage.newPage();
		await page.goto(`/designs/${designId}/ledger`);
		expect(new URL(page.url()).pathname).toBe('/sign-in');
		await signIn(page, 'owner@example.test', `/designs/${designId}/ledger`);
		await page.getByRole('heading', { name: 'Ledger' }).waitFor();
	});
});

describe('a person of another firm', () => {
	it("finds nothing where a firm's design is, as at an address that leads nowhere", async () => {
		const page = await stage.pageOf('stranger@example.test');
		const nowhere = await page.goto('/designs/00000000-0000-4000-8000-000000000000/sheet');
		expect(nowhere?.status()).toBe(404);
		const shown = await page.locator('body').innerText();
		for (const path of [...pages(), '/designs/no-id/sheet', '/nowhere']) {
			expect((await page.goto(path))?.status(), path).toBe(404);
			expect(await page.locator('body').innerText(), path).toBe(shown);
		}
		for (const path of files()) expect((await page.request.get(path)).status(), path).toBe(404);
		const answer = await page.request.post(`/api/v1/designs/${designId}/edits`, { data: JSON.parse(body()) });
		expect(answer.status()).toBe(404);
		await untouched();
	});
});

describe('a viewer', () => {
	it('sees the sheet without its tools, types nothing, and is refused when they send an edit', async () => {
		const page = await stage.pageOf('viewer@example.test');
		const sheet = new RunSheet(page);
		await sheet.open(designId);
		await page.getByText('for reading only').waitFor();
		for (const name of ['Insert row', 'Delete rows', 'Fill down', 'Arrange from the fan', 'Undo', 'Redo'])
			expect(await page.getByRole('button', { name }).count(), name).toBe(0);
		expect(await page.getByRole('button', { name: 'IP' }).isDisabled()).toBe(true);
		await sheet.select('S1', 'size');
		await page.keyboard.type('900');
		for (const key of ['Delete', 'Insert', 'Control+Delete', 'Control+d', 'Alt+ArrowDown', 'Control+z'])
			await page.keyboard.press(key);
		await sheet.paste('S9\tS1');
		expect(await page.getByRole('textbox').count()).toBe(0);
		expect(await sheet.grid.getByRole('rowheader').allInnerTexts()).toEqual(['S1', 'S2', 'S3']);
		expect(await sheet.text('S1', 'size')).toBe('400×250');
		await page.goto(`/designs/${designId}/versions`);
		expect(await page.getByRole('button', { name: /Save as/ }).count()).toBe(0);
		await page.goto(`/designs/${designId}/versions/1`);
		expect(await page.getByRole('button', { name: /Restore/ }).count()).toBe(0);
		const status = await page.evaluate(
			async ([id, text]) =>
				(
					await fetch(`/api/v1/designs/${id}/edits`, {
						method: 'POST',
						headers: { 'content-type': 'application/json' },
						body: text
					})
				).status,
			[designId, body()] as const
		);
		expect(status).toBe(404);
		await untouched();
	});
});

describe('a request that another site sends in a person’s name', () => {
	it.each(['application/json', 'text/plain', 'application/x-www-form-urlencoded'])('is refused as %s', async (type) => {
		const page = await stage.pageOf('owner@example.test');
		for (const path of [`/api/v1/designs/${designId}/edits`, `/designs/${designId}/versions?/save`])
			for (const origin of ['https://elsewhere.example', 'null']) {
				const answer = await page.request.post(path, { data: body(), headers: { 'content-type': type, origin } });
				expect(answer.status(), `${path} from ${origin}`).toBe(403);
			}
		await untouched();
	});
});

describe('a body that is too large', () => {
	it('is told so, and the server goes on', async () => {
		const page = await stage.pageOf('owner@example.test');
		const answer = await page.request.post(`/api/v1/designs/${designId}/edits`, {
			data: Buffer.alloc(17 * 1024 * 1024, ' '),
			headers: { 'content-type': 'application/json' }
		});
		expect([answer.status(), answer.headers()['content-type']]).toEqual([413, 'application/problem+json']);
		expect((await page.request.get('/api/v1/health')).status()).toBe(200);
		await untouched();
	});
});

describe('the letters', () => {
	it('lead to the configured address whatever host the request names', async () => {
		const page = await stage.newPage();
		const { origin } = stage.server;
		for (const [path, form] of [
			[
				'/sign-up',
				{ name: 'New', firmName: 'New firm', email: 'steered@example.test', password: 'a sentence that is long' }
			],
			['/sign-in/link', { email: 'owner@example.test', to: '' }],
			['/forgotten', { email: 'owner@example.test', to: '' }]
		] as const)
			await page.request.post(path, {
				form,
				headers: {
					origin,
					'x-forwarded-host': 'elsewhere.example',
					'x-forwarded-proto': 'https',
					forwarded: 'host=elsewhere.example'
				}
			});
		const inbox = async () =>
			(await (await fetch(`${stage.inboxUrl}/messages`)).json()) as { text: string; html: string }[];
		await expect.poll(async () => (await inbox()).length, { timeout: 10_000 }).toBe(3);
		for (const { text, html } of await inbox()) {
			expect(text).toContain(`${origin}/`);
			expect(text + html).not.toContain('elsewhere');
		}
	});
});
