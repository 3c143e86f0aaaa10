/** The run sheet as a person sees and uses it. */
import type { Locator, Page } from 'playwright-core';

/** The columns from left to right that are shown when nobody has asked for others. */
export const COLUMNS = ['tag', 'joins', 'side', 'serves', 'flow', 'size', 'length', 'flex', 'parts', 'outlet'] as const;
export type Typed = Partial<Record<(typeof COLUMNS)[number], string>>;

export const gridOf = (page: Page): Locator => page.getByRole('grid', { name: 'Run sheet' });

export class RunSheet {
	readonly page: Page;
	readonly grid: Locator;
	readonly state: Locator;
	readonly duty: Locator;
	readonly index: Locator;

	constructor(page: Page) {
		this.page = page;
		this.grid = gridOf(page);
		this.state = page.getByTestId('state');
		this.duty = page.getByTestId('duty');
		this.index = page.getByTestId('index');
	}

	/** Opens the sheet and waits until its keys work. */
	async open(designId: string): Promise<void> {
		await this.page.goto(`/designs/${designId}/sheet`);
		await this.awake();
	}

	/** The grid is busy until the scripts have taken the page over. A worker may still be that of the page before. */
	async awake(): Promise<void> {
		await this.page.locator('[role="grid"]:not([aria-busy])').waitFor();
		await this.grid.focus();
	}

	row(tag: string): Locator {
		return this.grid.getByRole('row').filter({ has: this.page.getByRole('rowheader', { name: tag, exact: true }) });
	}

	cell(tag: string, key: string): Locator {
		return this.row(tag).locator(`[data-key="${key}"]`);
	}

	/** The text of a cell, as shown. */
	async text(tag: string, key: string): Promise<string> {
		return (await this.cell(tag, key).innerText()).trim();
	}

	/** The figure of a computed cell. */
	async figure(tag: string, key: string): Promise<number> {
		return figureOf(await this.text(tag, key));
	}

	/** Types a row on the writing line by the keyboard alone. */
	async typeRow(cells: Typed): Promise<void> {
		const { keyboard } = this.page;
		await keyboard.press('Control+End');
		await keyboard.press('ArrowDown');
		await keyboard.press('Home');
		for (const [at, key] of COLUMNS.entries()) {
			const text = cells[key];
			if (text) await keyboard.type(text);
			await keyboard.press(at === COLUMNS.length - 1 ? 'Enter' : 'Tab');
		}
	}

	/** Selects a cell with the mouse. */
	async select(tag: string, key: string): Promise<void> {
		await this.cell(tag, key).click();
	}

	/** Writes a cell: selects it, types over it, goes on. */
	async write(tag: string, key: string, text: string): Promise<void> {
		await this.select(tag, key);
		await this.page.keyboard.type(text);
		await this.page.keyboard.press('Enter');
	}

	/** Pastes text at the selected cell by the clipboard. */
	async paste(text: string): Promise<void> {
		await this.page.evaluate((wanted) => navigator.clipboard.writeText(wanted), text);
		await this.grid.focus();
		await this.page.keyboard.press('Control+v');
	}

	/** Waits until every edit is with the server and the figures are no preview any more. */
	async saved(timeout = 12_000): Promise<void> {
		await this.page.waitForFunction(
			() =>
				document.querySelector('[data-testid="state"]')?.getAttribute('data-state') === 'saved' &&
				!document.querySelector('[role="grid"]')?.textContent?.includes('a preview, not yet'),
			null,
			{ timeout }
		);
	}
}

/** A figure as the screen prints it, in numbers. */
export function figureOf(text: string): number {
	const plain = text.replace(/[\u2009\u202f,\s]/g, '').replace('\u2212', '-');
	return plain === '' ? NaN : Number(plain);
}
