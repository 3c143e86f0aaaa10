import axe from 'axe-core';
import type { Page } from 'playwright-core';
import { beforeAll, describe, expect, it } from 'vitest';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { saveVersion } from '../../src/lib/server/versions/save-version';
import { append, firm, sent, treeDesign, write } from '../server/support/designs';
import { demoDesigns, enterDemo } from './support/fixtures';
import { useStage } from './support/stage';

const stage = useStage();
const EMAIL = 'engineer@example.test';
let ours: FirmScope;
/** What stands for DESIGN, FAULTY and PROJECT in the paths below. */
const ids: Record<string, string> = {};

beforeAll(async () => {
	ours = await firm(EMAIL);
	const [demo] = demoDesigns();
	if (!demo) throw new Error('the demo has no design');
	ids.DESIGN = await enterDemo(ours, demo);
	await saveVersion(ours, ids.DESIGN, { note: 'For comment', status: 'issued-for-review' });
	const faulty = await treeDesign(ours, 'Faulty');
	ids.FAULTY = faulty.designId;
	await append(ours, faulty.designId, [sent(write(faulty.ids[1] ?? '', 'size', '24xx12'))]);
});

const WIDTHS = [1440, 1024, 390] as const;
const PAGES: readonly (readonly [name: string, path: string, signedIn: boolean])[] = [
	['front', '/', false],
	['methods', '/methods', false],
	['sign-in', '/sign-in', false],
	['sign-up', '/sign-up', false],
	['absent', '/nowhere', false],
	['register', '/register', true],
	['new project', '/projects/new', true],
	['run sheet', '/designs/DESIGN/sheet', true],
	['run sheet with a fault', '/designs/FAULTY/sheet', true],
	['ledger', '/designs/DESIGN/ledger', true],
	['ledger of a sheet with a fault', '/designs/FAULTY/ledger', true],
	['basis of design', '/designs/DESIGN/basis', true],
	['versions', '/designs/DESIGN/versions', true],
	['one version', '/designs/DESIGN/versions/1', true],
	['ledger of one version', '/designs/DESIGN/versions/1?show=ledger', true],
	['basis of one version', '/designs/DESIGN/versions/1?show=basis', true],
	['hand-over', '/designs/DESIGN/hand-over', true],
	['account', '/account', true]
];

/** What light and dark differ in, and what they do not. */
const COLOURS: axe.RunOptions = { runOnly: ['color-contrast', 'link-in-text-block'] };
const ALL_ELSE: axe.RunOptions = {
	rules: { 'color-contrast': { enabled: false }, 'link-in-text-block': { enabled: false } }
};

/** Serious and critical violations, each with the elements that it is about. */
async function violations(page: Page, options: axe.RunOptions = {}): Promise<string[]> {
	await page.evaluate(axe.source);
	const { violations } = await page.evaluate(
		(how) => (globalThis as unknown as { axe: typeof axe }).axe.run(how),
		options
	);
	return violations
		.filter(({ impact }) => impact === 'serious' || impact === 'critical')
		.map(
			({ id, nodes }) =>
				`${id}: ${nodes.map(({ html, failureSummary }) => `${html.slice(0, 160)} (${failureSummary})`).join('; ')}`
		);
}

describe('a page', () => {
	it.each(PAGES)('%s can be used by everybody, light and dark, and fits every width', async (_name, path, signedIn) => {
		const page = await (signedIn ? stage.pageOf(EMAIL) : stage.newPage());
		await page.goto(path.replace(/[A-Z]{6}/, (word) => ids[word] ?? word));
		await page.waitForLoadState('networkidle');
		await page.emulateMedia({ colorScheme: 'light', reducedMotion: 'reduce' });
		expect(await violations(page), 'light').toEqual([]);
		await page.emulateMedia({ colorScheme: 'dark', reducedMotion: 'reduce' });
		expect(await violations(page, COLOURS), 'dark').toEqual([]);
		for (const width of WIDTHS) {
			await page.setViewportSize({ width, height: 844 });
			const overflow = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
			expect(overflow, `at ${width}`).toBeLessThanOrEqual(0);
		}
		expect(await violations(page, ALL_ELSE), 'at 390').toEqual([]);
		expect(stage.faults).toEqual([]);
	});

	it('the run sheet can be used by everybody while a cell is edited', async () => {
		const page = await stage.pageOf(EMAIL);
		await page.goto(`/designs/${ids.DESIGN}/sheet`);
		await page.waitForLoadState('networkidle');
		await page.getByRole('grid').focus();
		await page.keyboard.press('ArrowDown');
		await page.keyboard.type('S99');
		await page.getByRole('status').filter({ hasText: 'S99' }).waitFor();
		await page.emulateMedia({ colorScheme: 'light', reducedMotion: 'reduce' });
		expect(await violations(page), 'light').toEqual([]);
		await page.emulateMedia({ colorScheme: 'dark', reducedMotion: 'reduce' });
		expect(await violations(page, COLOURS), 'dark').toEqual([]);
	});
});
