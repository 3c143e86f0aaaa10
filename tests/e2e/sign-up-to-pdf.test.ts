import { readFileSync } from 'node:fs';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { readPdf } from './support/pdf';
import { figureOf, RunSheet } from './support/run-sheet';
import { useStage } from './support/stage';

const stage = useStage();

const EMAIL = 'first.engineer@example.test';
const PASSWORD = 'ducts and dampers since noon';

async function signUp(page: Page): Promise<void> {
	await page.goto('/sign-up');
	await page.getByLabel('Name of the firm').fill('Alder & Co. Engineers');
	await page.getByLabel('Your name').fill('First Engineer');
	await page.getByLabel('E-mail').fill(EMAIL);
	await page.getByLabel('Password').fill(PASSWORD);
	await page.getByRole('button', { name: 'Start the firm' }).click();
	await page.waitForURL('**/sign-in/sent');
}

async function confirmByLetter(page: Page): Promise<void> {
	const letter = page.getByRole('link', { name: EMAIL });
	await expect.poll(async () => (await page.goto('/dev/inbox'), letter.count()), { timeout: 10_000 }).toBe(1);
	await letter.click();
	await page.getByRole('link', { name: /\/verify\?token=/ }).click();
	await page.getByRole('button', { name: 'Confirm the address' }).click();
	await page.getByText('The address is confirmed').waitFor();
}

async function signIn(page: Page): Promise<void> {
	await page.getByRole('link', { name: 'Sign in' }).click();
	await page.getByLabel('E-mail').fill(EMAIL);
	await page.getByLabel('Password').fill(PASSWORD);
	await page.getByRole('button', { name: 'Sign in' }).click();
	await page.waitForURL('**/register');
}

async function newSystem(page: Page): Promise<string> {
	await page.getByRole('link', { name: 'New project' }).click();
	await page.getByLabel('Project number').fill('ALD-01');
	await page.getByLabel('Name', { exact: true }).fill('Village hall');
	await page.getByRole('button', { name: 'Make the project' }).click();
	await page.getByLabel('Tag of the new system').fill('AHU-1');
	await page.getByLabel('What it serves').fill('Hall and stage');
	await page.getByRole('button', { name: 'Lay out a system' }).click();
	await page.waitForURL('**/sheet');
	return new URL(page.url()).pathname.split('/')[2] ?? '';
}

/** From the farthest room inward: each row names one that is typed later. */
const ROWS = [
	{
		tag: 'T4',
		joins: 'T2',
		serves: 'Stage',
		flow: '160',
		size: '8"',
		length: '6.5',
		flex: '1.2',
		parts: 'tee branch C0.8, elbow r1.0 C0.23, VCD C0.2',
		outlet: '22'
	},
	{
		tag: 'T3',
		joins: 'T2',
		serves: 'Hall',
		flow: '300 cfm',
		size: '200',
		length: '14\'6"',
		parts: 'tee straight way C0.15, VCD C0.2',
		outlet: '0.08"'
	},
	{ tag: 'T2', joins: 'T1', serves: 'J1 to J2', size: '300x250', length: '5', parts: 'split straight way C0.1' },
	{
		tag: 'T5',
		joins: 'T1',
		serves: 'Kitchen',
		flow: '90',
		size: 'Ø160',
		length: '3',
		parts: 'shoe C0.6, VCD C0.2',
		outlet: '18?'
	},
	{
		tag: 'T1',
		serves: 'AHU-1 to J1',
		size: '400x250',
		length: '8',
		parts: '2x elbow r1.0 C0.23, silencer 25 Pa, fire damper FD-01 8 Pa'
	}
];
const TAGS = ROWS.map(({ tag }) => tag);

describe('the path from sign-up to the PDF', () => {
	it('leads a person who was never here from an empty page to a report with the figures of the screen', async () => {
		const page = await stage.newPage();
		await signUp(page);
		await confirmByLetter(page);
		await signIn(page);
		const designId = await newSystem(page);

		const sheet = new RunSheet(page);
		await sheet.awake();
		for (const row of ROWS) await sheet.typeRow(row);
		await sheet.saved();
		const documentText = async () => (await page.request.get(`/api/v1/designs/${designId}/document.json`)).text();
		const figures = async () =>
			Object.fromEntries(
				await Promise.all(
					TAGS.map(async (tag) => [tag, [await sheet.text(tag, 'velocity'), await sheet.text(tag, 'total')]] as const)
				)
			);

		// 160 L/s and 90 L/s and 300 cfm, which are 141.58 L/s, through 0.4 m by 0.25 m.
		expect(await sheet.text('T1', 'flow')).toBe('392');
		expect(await sheet.text('T1', 'velocity')).toBe('3.92');
		expect(await sheet.text('T4', 'size')).toBe('Ø203');
		expect(await sheet.text('T3', 'length')).toBe('4.4');
		const read = JSON.parse(await documentText()) as {
			rows: { tag: string; length: number; size: { diameter?: number } }[];
		};
		expect(read.rows.map(({ tag }) => tag)).toEqual(TAGS);
		expect(read.rows[0]?.size.diameter).toBe(0.2032);
		expect(read.rows[1]?.length).toBe(4.4196);

		// Figures follow a size while it is typed, and again once it stands.
		const before = { duty: await sheet.duty.innerText(), total: await sheet.figure('T1', 'total') };
		await sheet.select('T1', 'size');
		await page.keyboard.type('500x250');
		const echo = page.getByRole('status').filter({ hasText: 'Velocity' });
		// 0.39158 m3/s through 0.5 m by 0.25 m.
		await echo.getByText('3.13', { exact: true }).waitFor();
		expect(await echo.innerText()).toContain('500');
		expect(await sheet.text('T1', 'velocity')).toBe('3.92');
		await page.keyboard.press('Enter');
		await expect.poll(() => sheet.text('T1', 'velocity')).toBe('3.13');
		await sheet.saved();
		expect(await sheet.figure('T1', 'total')).toBeLessThan(before.total);
		expect(await sheet.duty.innerText()).not.toBe(before.duty);

		// Units change what is shown, and not a byte of what is stored.
		const stored = await documentText();
		const inSi = await figures();
		const units = page.getByRole('group', { name: 'Units' });
		await units.getByRole('button', { name: 'IP' }).click();
		await sheet.saved();
		await expect.poll(() => sheet.text('T1', 'flow')).toBe('830');
		expect(await sheet.text('T4', 'size')).toBe('Ø8');
		expect(await documentText()).toBe(stored);
		await units.getByRole('button', { name: 'SI' }).click();
		await sheet.saved();
		expect(await figures()).toEqual(inSi);
		expect(await documentText()).toBe(stored);

		// Saved as P01, opened for reading.
		const shown = { duty: await sheet.duty.innerText(), index: (await sheet.index.innerText()).trim(), figures: inSi };
		await page.getByRole('link', { name: 'Versions', exact: false }).first().click();
		await page.getByLabel('What changed').fill('First layout for comment');
		await page.getByLabel('Issued for review').check();
		await page.getByRole('button', { name: 'Save as P01' }).click();
		await page.getByText('Saved as P01').waitFor();
		await page.getByRole('link', { name: 'P01', exact: true }).click();
		await page.getByText('the working sheet stands as this').waitFor();
		expect(await page.getByRole('button', { name: 'Restore into the sheet' }).count()).toBe(0);
		expect(await sheet.grid.getAttribute('aria-readonly')).toBe('true');
		await page.waitForLoadState('networkidle');
		await sheet.select('T1', 'size');
		await page.keyboard.type('900');
		await page.keyboard.press('Delete');
		expect(await page.getByRole('textbox').count()).toBe(0);
		expect(await sheet.text('T1', 'size')).toBe('500×250');
		expect(await figures()).toEqual(shown.figures);
		expect(await sheet.duty.innerText()).toBe(shown.duty);

		// The PDF says what the screen says.
		const [download] = await Promise.all([
			page.waitForEvent('download'),
			page.getByRole('link', { name: 'PDF' }).click()
		]);
		expect(download.suggestedFilename()).toBe('ALD-01 Village hall AHU-1 P01.pdf');
		const pages = await readPdf(readFileSync(await download.path()));
		const [cover] = pages;
		const all = pages.map(({ text }) => text).join(' ');
		const [duty = '', flow = ''] = [...shown.duty.matchAll(/\d[\d\u2009.]*/g)].map(([figure]) => figure);
		expect(cover?.text).toContain(`${duty} Pa`);
		expect(cover?.text).toContain(flow);
		expect(cover?.text).toContain('ISSUED FOR REVIEW');
		expect(cover?.text).toContain('NOT FOR CONSTRUCTION');
		expect(cover?.text).toContain('First layout for comment');
		for (const named of ['Alder & Co. Engineers', 'ALD-01', 'Village hall', 'AHU-1', 'P01'])
			expect(all).toContain(named);
		expect(cover?.text).toContain(shown.index);
		pages.forEach(({ text }, at) => {
			expect(text).toContain(`${at + 1} of ${pages.length}`);
			expect(text).toContain('Calculation aid. Results need review by a licensed professional; local codes govern.');
		});
		expect(all).toMatch(/Cautions/i);
		expect(all).toMatch(/to be confirmed/i);
		const schedule = pages.find(({ text }) => text.startsWith('Duct schedule'));
		for (const tag of TAGS) {
			const line = schedule?.lines.find(([first]) => first === tag);
			for (const figure of shown.figures[tag] ?? []) expect(line, tag).toContain(figure);
		}

		// P01 comes back into a sheet that has changed since.
		await page.goto(`/designs/${designId}/sheet`);
		await sheet.awake();
		await sheet.write('T1', 'size', '300');
		await sheet.select('T5', 'tag');
		await page.keyboard.press('Control+Delete');
		await sheet.saved();
		expect(await sheet.row('T5').count()).toBe(0);
		expect(await sheet.duty.innerText()).not.toBe(shown.duty);
		await page.goto(`/designs/${designId}/versions/1`);
		await page.getByRole('button', { name: 'Restore into the sheet' }).click();
		await page.getByRole('button', { name: 'Restore P01' }).click();
		await page.waitForURL('**/sheet?restored=P01*');
		await sheet.awake();
		expect(await figures()).toEqual(shown.figures);
		expect(await sheet.duty.innerText()).toBe(shown.duty);
		expect(await documentText()).toBe(stored);
		expect(figureOf(duty)).toBeGreaterThan(0);
		expect(stage.faults).toEqual([]);
	});
});
