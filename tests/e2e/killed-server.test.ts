import { setTimeout as delay } from 'node:timers/promises';
import type { Page } from 'playwright-core';
import { beforeAll, describe, expect, it } from 'vitest';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { openDesign } from '../../src/lib/server/designs/find-design';
import { firm, logOf, treeDesign } from '../server/support/designs';
import { RunSheet } from './support/run-sheet';
import { useStage } from './support/stage';

const stage = useStage();
const EMAIL = 'engineer@example.test';

let ours: FirmScope;
beforeAll(async () => {
	ours = await firm(EMAIL);
});

/** How often each text stands in the edit log. */
async function countsOf(designId: string): Promise<Map<string, number>> {
	const counts = new Map<string, number>();
	for (const { entry } of await logOf(ours, designId)) {
		const { cell } = entry as { cell?: { typed: string } };
		if (cell) counts.set(cell.typed, (counts.get(cell.typed) ?? 0) + 1);
	}
	return counts;
}

async function openSheet(designId: string): Promise<RunSheet> {
	const page = await stage.pageOf(EMAIL);
	page.on('dialog', (dialog) => void dialog.accept());
	const sheet = new RunSheet(page);
	await sheet.open(designId);
	return sheet;
}

/** Types texts into the column of rooms, one under the other and round again; tells after each what was shown as saved. */
async function typeRooms(sheet: RunSheet, texts: readonly string[], shown: Set<string>): Promise<void> {
	const { page } = sheet;
	await page.keyboard.press('Control+Home');
	for (let right = 0; right < 3; right++) await page.keyboard.press('ArrowRight');
	for (const [at, text] of texts.entries()) {
		if (at % 3 === 0) await page.keyboard.press('Control+ArrowUp');
		await page.keyboard.type(text);
		await page.keyboard.press('Enter');
		// Now and then a person stops until the sheet says where it stands.
		if (at % 5 === 4)
			await page.waitForFunction(() =>
				['saved', 'kept'].includes(document.querySelector('[data-testid="state"]')?.getAttribute('data-state') ?? '')
			);
		// The word is read after the key, so it speaks of this edit too.
		if ((await sheet.state.getAttribute('data-state')) === 'saved')
			for (const done of texts.slice(0, at + 1)) shown.add(done);
	}
}

const unsentOf = (page: Page, designId: string) =>
	page.evaluate(
		(key) => (JSON.parse(localStorage.getItem(key) ?? '[]') as unknown[]).length,
		`evendraft/unsent/${designId}`
	);

/** The rooms of the sheet as the database has them, and as the screen shows them. */
async function rooms(sheet: RunSheet, designId: string): Promise<{ stored: (string | undefined)[]; shown: string[] }> {
	const opened = await openDesign(ours, designId);
	const stored = opened?.sheet.rows.map(({ cells }) => cells.serves?.typed) ?? [];
	return { stored, shown: await Promise.all(['S1', 'S2', 'S3'].map((tag) => sheet.text(tag, 'serves'))) };
}

describe('a server that is killed while a person types', () => {
	it.each([1, 2, 3, 4])(
		'loses no edit that was shown as saved, and takes each kept one once (round %i)',
		async (round) => {
			const { designId } = await treeDesign(ours, `killed ${round}`);
			const sheet = await openSheet(designId);
			const texts = Array.from({ length: 24 }, (_, at) => `${round}.${at}`);
			const shown = new Set<string>();
			const wait = Math.random() * 1200;
			const killed = expect
				.poll(() => shown.size, { timeout: 10_000, interval: 5 })
				.toBeGreaterThan(0)
				.then(() => delay(wait))
				.then(() => stage.server.kill());
			await Promise.all([typeRooms(sheet, texts, shown), killed]);
			await sheet.write('S1', 'serves', 'after the kill');
			await sheet.page.waitForFunction(
				() => document.querySelector('[data-testid="state"]')?.getAttribute('data-state') === 'kept'
			);

			const afterKill = await countsOf(designId);
			for (const text of shown) expect(afterKill.get(text), `${text}, shown as saved, killed after ${wait} ms`).toBe(1);
			const unsent = await unsentOf(sheet.page, designId);
			expect(unsent).toBeGreaterThan(0);
			expect(await sheet.state.innerText()).toBe(`Kept on this device, ${unsent} to send`);

			await stage.server.start();
			// The first round waits for the sheet's own next try; the others are told that the network is back.
			if (round > 1) await sheet.page.evaluate(() => dispatchEvent(new Event('online')));
			await sheet.saved();
			const counts = await countsOf(designId);
			expect(texts.map((text) => counts.get(text))).toEqual(texts.map(() => 1));
			expect(await unsentOf(sheet.page, designId)).toBe(0);
			const { stored, shown: onScreen } = await rooms(sheet, designId);
			expect(stored).toEqual(['after the kill', ...texts.slice(-2)]);
			expect(counts.get('after the kill')).toBe(1);
			expect(onScreen).toEqual(stored);
		}
	);

	it('takes the kept edits once after the page was loaded anew, and again after a second kill', async () => {
		const { designId } = await treeDesign(ours, 'loaded anew');
		const sheet = await openSheet(designId);
		const { page } = sheet;
		const texts = ['first', 'second', 'third', 'fourth', 'fifth', 'sixth'];
		await stage.server.kill();
		await typeRooms(sheet, texts, new Set());
		await expect.poll(() => unsentOf(page, designId)).toBe(6);
		await expect(page.reload()).rejects.toThrow();

		await stage.server.start();
		await sheet.open(designId);
		await stage.server.kill();
		await stage.server.start();
		await sheet.open(designId);
		await sheet.saved();
		const counts = await countsOf(designId);
		expect(texts.map((text) => counts.get(text))).toEqual([1, 1, 1, 1, 1, 1]);
		const { stored, shown } = await rooms(sheet, designId);
		expect(stored).toEqual(['fourth', 'fifth', 'sixth']);
		expect(shown).toEqual(stored);
		expect(await unsentOf(page, designId)).toBe(0);
	});
});

describe('a reply that is lost', () => {
	it('after the server has taken the edit leads to one entry of the log', async () => {
		const { designId } = await treeDesign(ours, 'lost reply');
		const sheet = await openSheet(designId);
		let lost = 0;
		await sheet.page.route('**/edits', async (route) => {
			if (lost++ >= 2) return route.continue();
			// A connection kept from before the server was killed is closed: the first try on it is no reply that is lost.
			await route.fetch({ maxRetries: 3 });
			await route.abort();
		});
		await typeRooms(sheet, ['only once'], new Set());
		await sheet.saved();
		expect(lost).toBe(3);
		expect((await countsOf(designId)).get('only once')).toBe(1);
		expect((await logOf(ours, designId)).map(({ seq }) => seq)).toEqual([1, 2, 3]);
	});
});

describe('two people in one sheet', () => {
	it('see the order that the server gave, and keep what they typed in other cells', async () => {
		const { designId } = await treeDesign(ours, 'two people');
		const [mine, theirs] = [await openSheet(designId), await openSheet(designId)];
		await theirs.write('S2', 'length', '7.5');
		await theirs.saved();
		await mine.write('S3', 'length', '9.5');
		await mine.write('S1', 'serves', 'Plant room to hall');
		await mine.saved();
		for (const sheet of [mine]) {
			expect(await sheet.text('S2', 'length')).toBe('7.5');
			expect(await sheet.text('S3', 'length')).toBe('9.5');
		}
		await theirs.open(designId);
		expect(await theirs.text('S1', 'serves')).toBe('Plant room to hall');
		expect(await theirs.duty.innerText()).toBe(await mine.duty.innerText());
	});
});
