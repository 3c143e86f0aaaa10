/** Opens a generated design in Chromium, commits edits by the keyboard, and says how long each took. */
import { cpus } from 'node:os';
import { chromium } from 'playwright-core';
import { listen } from './listen.mjs';
import { typedRows } from './rows.mjs';

const ROWS = 500;
const EDITS = 40;
/** Not counted: the first ones find cold code. */
const WARM_UP = 5;

/** @param {{ origin: string, email: string, password: string }} where */
export async function measureEdits({ origin, email, password }) {
	const browser = await chromium.launch({
		executablePath: process.env.CHROMIUM || '/usr/bin/chromium',
		args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking']
	});
	try {
		const page = await browser.newPage({ baseURL: origin, viewport: { width: 1440, height: 900 } });
		await page.addInitScript(listen);
		await page.goto('/sign-in');
		await page.getByLabel('E-mail').fill(email);
		await page.getByLabel('Password').fill(password);
		await page.getByRole('button', { name: 'Sign in' }).click();
		await page.waitForURL('**/register');
		await makeDesign(page);
		for (let at = 0; at < WARM_UP + EDITS; at++) await commitLength(page, at);
		const edits = await page.evaluate(
			() => /** @type {{ edits: Record<string, number>[] }} */ (/** @type {any} */ (globalThis)).edits
		);
		return summary(edits.slice(WARM_UP), browser.version());
	} finally {
		await browser.close();
	}
}

/** @param {import('playwright-core').Page} page */
async function makeDesign(page) {
	await page.goto('/projects/new');
	await page.getByLabel('Project number').fill('MEASURE');
	await page.getByLabel('Name', { exact: true }).fill('Measured building');
	await page.getByRole('button', { name: 'Make the project' }).click();
	await page.getByLabel('Tag of the new system').fill('AHU-1');
	await page.getByRole('button', { name: 'Lay out a system' }).click();
	await page.waitForURL('**/sheet');
	const status = await page.evaluate(async (rows) => {
		const cells = (/** @type {Record<string, string>} */ row) =>
			Object.fromEntries(Object.entries(row).map(([field, typed]) => [field, { typed, units: 'SI' }]));
		const added = rows.map((row) => ({ id: crypto.randomUUID(), cells: cells(row) }));
		const edit = { kind: 'insert', rows: added, before: null };
		const answer = await fetch(`/api/v1/designs/${location.pathname.split('/')[2]}/edits`, {
			...{ method: 'POST', headers: { 'content-type': 'application/json' } },
			body: JSON.stringify({ base: 1, edits: [{ id: crypto.randomUUID(), edit }] })
		});
		return answer.status;
	}, typedRows(ROWS));
	if (status !== 200) throw new Error(`the rows were answered with ${status}`);
	await page.reload();
	await page.waitForFunction(
		(rows) => document.querySelector('[role="grid"]')?.textContent?.includes(`${rows} of ${rows}`),
		ROWS
	);
	await page.waitForLoadState('networkidle');
}

/** Types a length into a row near the top of the tree, so that every figure beyond it changes. */
async function commitLength(/** @type {import('playwright-core').Page} */ page, /** @type {number} */ at) {
	await page.locator(`[data-row="${at % 12}"][data-key="length"]`).click();
	await page.keyboard.type(`${5 + (at % 7)}.${1 + at}`);
	await page.keyboard.press('Enter');
	await page.evaluate((count) => /** @type {any} */ (globalThis).settled(count), at + 1);
}

/** @param {Record<string, number>[]} edits @param {string} chromiumVersion */
function summary(edits, chromiumVersion) {
	const of = (/** @type {(edit: Record<string, number>) => number} */ figure) => {
		const sorted = edits.map(figure).sort((a, b) => a - b);
		const at = (/** @type {number} */ share) =>
			Number((sorted[Math.ceil(share * sorted.length) - 1] ?? NaN).toFixed(2));
		return { median: at(0.5), p95: at(0.95) };
	};
	const part = (/** @type {string} */ name) => of((edit) => edit[name] ?? NaN);
	return {
		...{ rows: ROWS, edits: edits.length, unit: 'ms', chromium: chromiumVersion, node: process.version },
		machine: `${cpus().length} × ${cpus()[0]?.model ?? 'unknown'}`,
		/** In the worker: the document, its validation and the solution. */
		engineInWorker: part('engine'),
		/** On the page's own thread, from the key to the end of its task. */
		workOfTheKey: part('keyWork'),
		/** On the page's own thread, from the worker's answer to the changed page. */
		workOfShowing: part('showWork'),
		/** Engine and both. */
		computing: of((edit) => (edit.engine ?? NaN) + (edit.keyWork ?? NaN) + (edit.showWork ?? NaN)),
		keyToAnswer: part('answered'),
		/** To the end of the first frame that has the new figures. */
		keyToPainted: part('painted'),
		/** To the frame after it. */
		keyToSecondFrame: part('secondFrame')
	};
}
