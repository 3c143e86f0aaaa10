import { beforeAll, describe, expect, it } from 'vitest';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { firm, treeDesign } from '../server/support/designs';
import { RunSheet } from './support/run-sheet';
import { useStage } from './support/stage';

const stage = useStage();
const EMAIL = 'engineer@example.test';
let ours: FirmScope;
beforeAll(async () => {
	ours = await firm(EMAIL);
});

describe('the basis of design', () => {
	it('keeps the methods, the leakage class and the standard density that were chosen', async () => {
		const { designId } = await treeDesign(ours, 'AHU-B1');
		const page = await stage.pageOf(EMAIL);
		await page.goto(`/designs/${designId}/basis`);
		const method = page.getByRole('combobox', { name: 'Method of Round elbow, smooth radius' });
		const line = page.getByRole('row').filter({ has: method });
		// The title block says Saved, too.
		const form = page.locator('form[action="?/save"]');
		const told = (text: string) => form.getByRole('status').filter({ hasText: text }).waitFor();
		const before = await line.innerText();
		await method.selectOption('rennels');
		expect(await line.innerText()).not.toBe(before);
		await page.getByLabel('Leakage class of the ductwork').selectOption('C');
		await page.getByLabel('Test pressure of the ductwork').fill('400');
		await page.getByLabel('Flows of outlets are').selectOption('standard');
		await page.getByLabel('Density of standard air').fill('1.2');
		await page.getByRole('button', { name: 'Save the basis' }).click();
		await told('Saved');

		await page.reload();
		expect(await method.inputValue()).toBe('rennels');
		expect(await page.getByLabel('Leakage class of the ductwork').inputValue()).toBe('C');
		expect(await page.getByLabel('Density of standard air').inputValue()).toBe('1.2');
		await page.getByRole('button', { name: 'Save the basis' }).click();
		await told('Nothing was changed');

		await method.selectOption('');
		await page.getByRole('button', { name: 'Save the basis' }).click();
		await told('Saved');
		expect(await method.inputValue()).toBe('');
		expect(stage.faults).toEqual([]);
	});
});

describe('the columns of a row that are off', () => {
	it('come when they are asked for, and take temperature, lining and leakage class', async () => {
		const { designId } = await treeDesign(ours, 'AHU-B2');
		const sheet = new RunSheet(await stage.pageOf(EMAIL));
		await sheet.open(designId);
		const { page } = sheet;
		expect(await sheet.grid.locator('[data-key="lining"]').count()).toBe(0);
		await page.getByText('Columns').click();
		for (const head of ['Lining', 'Leakage', 'Temp.']) await page.getByRole('checkbox', { name: head }).check();
		await page.keyboard.press('Escape');
		for (const [key, typed] of [
			['lining', '25 metal'],
			['leakage', 'cl 6'],
			['temperature', '14']
		] as const) {
			await sheet.cell('S1', key).click();
			await page.keyboard.type(typed);
			await page.keyboard.press('Enter');
		}
		await sheet.saved();
		expect(await sheet.text('S1', 'lining')).toBe('25 metal');
		expect(await sheet.text('S1', 'leakage')).toBe('CL 6');
		expect(await sheet.text('S1', 'temperature')).toBe('14');
		expect(stage.faults).toEqual([]);
	});
});
