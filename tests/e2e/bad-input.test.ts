import { beforeAll, describe, expect, it } from 'vitest';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { append, firm, logOf, rowsOf, sent, treeDesign } from '../server/support/designs';
import { RunSheet } from './support/run-sheet';
import { useStage } from './support/stage';

const stage = useStage();
const EMAIL = 'engineer@example.test';
let ours: FirmScope;
beforeAll(async () => {
	ours = await firm(EMAIL);
});

/** A trunk S1 with the outlets S2, S3 and S4, open in the browser. */
async function openTree(name: string): Promise<{ sheet: RunSheet; designId: string }> {
	const { designId } = await treeDesign(ours, name);
	const last = { tag: 'S4', joins: 'S1', serves: 'Store', flow: '60', size: 'Ø160', length: '3', outlet: '15' };
	await append(ours, designId, [sent(rowsOf([last]).edit)]);
	const page = await stage.pageOf(EMAIL);
	const sheet = new RunSheet(page);
	await sheet.open(designId);
	return { sheet, designId };
}

/** 60 L/s through Ø160. */
const VELOCITY_OF_S4 = '2.98';
const at = (sheet: RunSheet, row: number, key: string) => sheet.grid.locator(`[data-row="${row}"][data-key="${key}"]`);

type Typed = readonly [row: number, key: string, text: string];

describe('what cannot be counted', () => {
	it.each<[what: string, typed: Typed[], message: RegExp]>([
		['a size with two signs between its figures', [[1, 'size', '24xx12']], /24xx12/],
		['a size of one side and nothing', [[1, 'size', '600x']], /600x/],
		['a length below zero', [[1, 'length', '-4']], /-4|negative|below zero/],
		['a length that is no number', [[1, 'length', 'NaN']], /NaN/],
		['a flow of zero', [[1, 'flow', '0']], /without a flow|zero/],
		['a row that joins itself', [[1, 'joins', 'S2']], /S2 joins itself/],
		['a row that joins one which is not there', [[1, 'joins', 'S9']], /No row has the tag S9/],
		[
			'a ring of two rows',
			[
				[1, 'joins', 'S3'],
				[2, 'joins', 'S2']
			],
			/leads back to itself: S3 joins S2 joins S3/
		],
		['two rows with one tag', [[2, 'tag', 'S2']], /2 rows have the tag S2/],
		['a part with neither coefficient nor pressure', [[1, 'parts', 'gadget']], /gadget/],
		['a pressure that no outlet loses', [[1, 'outlet', 'much']], /much/],
		['air that runs both ways in one run', [[1, 'side', 'exhaust']], /toward the fan and away from it/]
	])('%s stays as typed, is boxed and told, and the other rows keep their figures', async (what, typed, message) => {
		const { sheet, designId } = await openTree(what);
		const { page } = sheet;
		for (const [row, key, text] of typed) {
			await at(sheet, row, key).click();
			await page.keyboard.type(text);
			await page.keyboard.press('Enter');
		}
		await sheet.saved();
		const [row, key, text] = typed.at(-1) ?? [0, '', ''];
		const cell = at(sheet, row, key);
		const account = page.getByRole('region', { name: 'Account of the selected row' });
		for (const visit of ['typed', 'loaded anew']) {
			if (visit === 'loaded anew') await sheet.open(designId);
			expect((await cell.innerText()).trim(), visit).toContain(text);
			expect(await cell.getAttribute('class'), visit).toMatch(/\bboxed\b/);
			expect(await cell.getAttribute('title'), visit).toMatch(message);
			await cell.click();
			expect(await account.innerText(), visit).toMatch(message);
			expect(await account.innerText(), visit).toContain('Expected:');
			expect(await sheet.text('S4', 'velocity'), visit).toBe(VELOCITY_OF_S4);
			expect(await page.getByText(/still to be mended/).innerText(), visit).toMatch(/^without \d rows?/);
		}
		expect(stage.faults).toEqual([]);
	});

	it('a flow where rows join cannot be typed, and one that is pasted there is told', async () => {
		const { sheet } = await openTree('flow in the middle');
		await sheet.select('S1', 'flow');
		await sheet.page.keyboard.type('900');
		expect(await sheet.page.getByRole('textbox').count()).toBe(0);
		await sheet.paste('900');
		await sheet.saved();
		expect(await sheet.cell('S1', 'flow').getAttribute('title')).toMatch(/its flow is their sum/);
		await sheet.page.keyboard.press('Delete');
		await sheet.saved();
		expect(await sheet.text('S1', 'flow')).toBe('360');
	});

	it('is told while it is typed, and leaves by the Escape key as if it had not been', async () => {
		const { sheet, designId } = await openTree('left');
		const { page } = sheet;
		await sheet.select('S2', 'size');
		await page.keyboard.type('24xx12');
		await page.getByText('Not understood').waitFor();
		expect(await page.getByRole('textbox').getAttribute('aria-invalid')).toBe('true');
		await page.keyboard.press('Escape');
		expect(await sheet.text('S2', 'size')).toBe('Ø200');
		expect(await logOf(ours, designId)).toHaveLength(3);
	});

	it('is undone and done again by the keyboard', async () => {
		const { sheet } = await openTree('undone');
		const duty = await sheet.duty.innerText();
		await sheet.write('S2', 'size', '24xx12');
		await sheet.saved();
		expect(await sheet.duty.innerText()).not.toBe(duty);
		await sheet.page.keyboard.press('Control+z');
		await sheet.saved();
		await expect.poll(() => sheet.duty.innerText()).toBe(duty);
		await sheet.page.keyboard.press('Control+y');
		await sheet.saved();
		expect(await sheet.text('S2', 'size')).toBe('24xx12');
	});
});

describe('a paste that no sheet could hold', () => {
	it.each([
		['100,000 rows', 'X\tS1\tsupply\n'.repeat(100_000), /100000 rows/],
		['a million rows', 'X\n'.repeat(1_000_000), /1000000 rows/],
		['a cell of 5,000 characters', `X\t${'y'.repeat(5_000)}`, /5000 characters/]
	])('of %s is refused with a notice, and nothing is lost', async (what, text, notice) => {
		const { sheet, designId } = await openTree(what);
		const { page } = sheet;
		await sheet.select('S2', 'tag');
		await sheet.paste(text);
		const alert = page.getByRole('alert');
		await alert.waitFor();
		expect(await alert.innerText()).toMatch(notice);
		expect(await alert.innerText()).toContain('Nothing was pasted');
		expect(await sheet.grid.getByRole('rowheader').allInnerTexts()).toEqual(['S1', 'S2', 'S3', 'S4']);
		expect(await logOf(ours, designId)).toHaveLength(3);
		await sheet.write('S2', 'length', '6.5');
		await sheet.saved();
		expect(await logOf(ours, designId)).toHaveLength(4);
	});

	it('of a document of another form makes a row that is told, and takes nothing from the others', async () => {
		const { sheet, designId } = await openTree('another form');
		await sheet.page.keyboard.press('Control+End');
		await sheet.page.keyboard.press('ArrowDown');
		await sheet.page.keyboard.press('Home');
		await sheet.paste('{"format":"evendraft/design@1","rows":[{"tag":"S1","length":-1}]}');
		// The clipboard answers when it does: the new row stands where the writing line was.
		await sheet.page.locator('[data-row="4"][data-key="tag"][title]').waitFor();
		await sheet.saved();
		expect(await sheet.text('S4', 'velocity')).toBe(VELOCITY_OF_S4);
		expect(await at(sheet, 4, 'tag').getAttribute('title')).toMatch(/characters/);
		expect(await logOf(ours, designId)).toHaveLength(4);
	});
});
