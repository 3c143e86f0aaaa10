/** Opens a generated design in Chromium, commits edits by the keyboard, and says how long each took. */
import { cpus } from 'node:os';
import { chromium } from 'playwright-core';
import { listen } from './listen.mjs';
import { editsOf, startTrace } from './main-thread.mjs';
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
		for (let at = 0; at < WARM_UP; at++) await commitLength(page, at);
		const endTrace = await startTrace(await page.context().newCDPSession(page));
		for (let at = WARM_UP; at < WARM_UP + EDITS; at++) await commitLength(page, at);
		const traced = committed(editsOf(await endTrace()));
		const seen = await page.evaluate(() => /** @type {Seen[]} */ (/** @type {any} */ (globalThis).edits));
		return summary(traced, seen.slice(WARM_UP), browser.version());
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

/** @typedef {{ isInFirstFrame: boolean, toPicture?: number }} Seen */
/** @typedef {ReturnType<typeof editsOf>[number]} Traced */

/** The last key before each pause is the one that commits. @param {Traced[]} keys */
function committed(keys) {
	const PAUSE_us = 40_000;
	const last = keys.filter(({ at }, index) => (keys[index + 1]?.at ?? Infinity) - at > PAUSE_us);
	if (last.length < EDITS) throw new Error(`${last.length} of ${EDITS} edits were found in the trace`);
	return last.slice(-EDITS);
}

/** @param {Traced[]} traced @param {Seen[]} seen @param {string} chromiumVersion */
function summary(traced, seen, chromiumVersion) {
	const spread = (/** @type {number[]} */ figures) => {
		const sorted = [...figures].sort((a, b) => a - b);
		const at = (/** @type {number} */ share) =>
			Number((sorted[Math.ceil(share * sorted.length) - 1] ?? NaN).toFixed(2));
		return { least: sorted[0] === undefined ? NaN : Number(sorted[0].toFixed(2)), median: at(0.5), p95: at(0.95) };
	};
	const of = (/** @type {(edit: Traced) => number} */ figure) => spread(traced.map(figure));
	return {
		...{ rows: ROWS, edits: traced.length, unit: 'ms', chromium: chromiumVersion, node: process.version },
		machine: `${cpus().length} × ${cpus()[0]?.model ?? 'unknown'}, software rendering`,
		/** The task of the key: the edit, the engine, and writing the figures into the page. */
		computing: of(({ computing }) => computing),
		/** The first frame after it on the page's own thread: style, layout and painted layers. */
		painting: of(({ painting }) => painting),
		computingAndPainting: of(({ computing, painting }) => computing + painting),
		/** By the clock, with whatever came in between. */
		keyToPaintedLayers: of(({ toPaintedLayers }) => toPaintedLayers),
		/** By the browser's own account, in steps of 8 ms, with raster and display. */
		keyToPicture: spread(seen.flatMap(({ toPicture }) => toPicture ?? [])),
		inFirstFrame: `${seen.filter(({ isInFirstFrame }) => isInFirstFrame).length} of ${seen.length}`
	};
}
