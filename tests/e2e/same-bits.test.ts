import fc from 'fast-check';
import { build } from 'vite';
import { beforeAll, describe, expect, it } from 'vitest';
import { canonicalText, solveDesign, validateDocument } from '../../src/lib/engine';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { openDesign } from '../../src/lib/server/designs/find-design';
import { solveSheet } from '../../src/lib/sheet/solve-sheet';
import { building } from '../bench/building';
import { anyDesignOfStreams, isWithinRange } from '../engine/any-design';
import { firm } from '../server/support/designs';
import { demoDesigns, enterDemo, networks } from './support/fixtures';
import { RunSheet } from './support/run-sheet';
import { useStage } from './support/stage';

const stage = useStage();
const EMAIL = 'engineer@example.test';
let ours: FirmScope;
/** The engine as one script for a page. */
let script = '';

beforeAll(async () => {
	ours = await firm(EMAIL);
	const result = await build({
		configFile: false,
		envFile: false,
		logLevel: 'silent',
		publicDir: false,
		build: {
			write: false,
			minify: false,
			lib: { entry: 'src/lib/engine/index.ts', formats: ['iife'], name: 'engine' }
		}
	});
	const [output] = (Array.isArray(result) ? result : [result]) as { output: { code: string }[] }[];
	script = output?.output[0]?.code ?? '';
});

/** Made-up designs with all that a row can have, always the same. */
const streams = fc
	.sample(anyDesignOfStreams, { seed: 110, numRuns: 200 })
	.filter((document) => document.rows.length > 8 && document.leakage !== undefined && isWithinRange(document))
	.slice(0, 12);

function solvedHere(document: unknown): string {
	const read = validateDocument(document);
	const solved = read.ok ? solveDesign(read.document) : read;
	if (!solved.ok) throw new Error(JSON.stringify(solved.problems[0]));
	return canonicalText(solved.solution);
}

describe('the engine in Chromium and in Node', () => {
	const documents = [
		...networks().map(({ name, document }) => [name, document] as const),
		['a building of 500 rows', building(500)] as const,
		...streams.map((document, at) => [`junctions, temperatures and leakage, ${at + 1}`, document] as const)
	];

	it.each(documents)('gives the same solution to the last bit for %s', async (_name, document) => {
		const page = await stage.newPage();
		await page.goto('about:blank');
		await page.addScriptTag({ content: script });
		const there = await page.evaluate((text) => {
			const { canonicalText, solveDesign, validateDocument } = (
				globalThis as unknown as { engine: typeof import('../../src/lib/engine') }
			).engine;
			const read = validateDocument(JSON.parse(text));
			const solved = read.ok ? solveDesign(read.document) : read;
			return solved.ok ? canonicalText(solved.solution) : JSON.stringify(solved.problems);
		}, JSON.stringify(document));
		expect(there).toBe(solvedHere(document));
	});
});

describe("the sheet's own worker, as it is served", () => {
	it.each(demoDesigns())('computes $name as the server does, to the last bit', async (demo) => {
		const designId = await enterDemo(ours, demo);
		const page = await stage.pageOf(EMAIL);
		// Listens beside the page to what its worker answers.
		await page.addInitScript(() => {
			const heard: unknown[] = [];
			Object.assign(globalThis, { heard });
			globalThis.Worker = class extends Worker {
				constructor(url: string | URL, options?: WorkerOptions) {
					super(url, options);
					this.addEventListener('message', ({ data }) => heard.push(data));
				}
			};
		});
		await new RunSheet(page).open(designId);
		await page.waitForFunction(() => (globalThis as unknown as { heard: unknown[] }).heard.length > 0);
		const heard = await page.evaluate(() =>
			(globalThis as unknown as { heard: { solved: { solution: unknown } }[] }).heard.at(-1)
		);
		const sheet = (await openDesign(ours, designId))?.sheet;
		const solution = sheet && solveSheet(sheet).solution;
		expect(solution).toBeTruthy();
		expect(canonicalText(heard?.solved.solution)).toBe(canonicalText(solution));
	});
});
