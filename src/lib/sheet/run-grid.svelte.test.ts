import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { rowId, sheetOf, type TypedRow } from '../../../tests/sheet/any-sheet';
import { applyEntry } from './apply';
import { pressInEditor, pressOnGrid } from './keyboard';
import { OpenSheet } from './open-sheet.svelte';
import { RunGrid } from './run-grid.svelte';
import { savedSheet } from './saved-sheet';
import { MOST_ROWS, valueOf, type RowField } from './sheet';
import { MOST_TYPED } from './storable-text';

const ROWS: TypedRow[] = [
	{ tag: 'A', size: '400x300', length: '5' },
	{ tag: 'B', joins: 'A', size: 'Ø200', length: '4', flow: '100', outlet: '10' },
	{ tag: 'C', joins: 'A', size: 'Ø160', length: '3', flow: '60', outlet: '16' }
];

function gridOf(rows: readonly TypedRow[] = ROWS, mayEdit = true) {
	const open = new OpenSheet({ designId: 'design-1', sheet: sheetOf(rows), seq: 0 });
	return new RunGrid(open, mayEdit);
}

/** A key as it is said: `Ctrl+Shift+Z`. It goes where the browser would send it. */
function press(grid: RunGrid, ...keys: string[]): boolean {
	let used = false;
	for (const said of keys) {
		const parts = said.split('+');
		const key = parts.at(-1) ?? '';
		const has = (name: string) => parts.slice(0, -1).includes(name);
		const event = {
			...{
				key,
				ctrlKey: has('Ctrl'),
				metaKey: has('Meta'),
				altKey: has('Alt'),
				shiftKey: has('Shift'),
				isComposing: false
			}
		} as KeyboardEvent;
		used = grid.editing ? pressInEditor(grid, event) : pressOnGrid(grid, event);
	}
	return used;
}

const at = (grid: RunGrid) => [grid.selection.active.row, grid.columns[grid.selection.active.column]?.key];
const column = (grid: RunGrid, field: string) => grid.columns.findIndex(({ key }) => key === field);
const go = (grid: RunGrid, row: number, field: string, extend = false) =>
	grid.selection.go({ row, column: column(grid, field) }, extend);
const typed = (grid: RunGrid, field: RowField) => grid.rows.map((row) => row.cells[field]?.typed ?? '');
const write = (grid: RunGrid, text: string) => {
	press(grid, [...text][0] ?? '');
	grid.type(text);
};

beforeEach(() => {
	// No server: the edits wait.
	vi.stubGlobal('fetch', () => new Promise(() => {}));
	vi.stubGlobal('localStorage', undefined);
});
afterEach(() => vi.unstubAllGlobals());

describe('moving in the grid', () => {
	it('goes by arrows, and stops at the edges; the blank line belongs to it', () => {
		const grid = gridOf();
		press(grid, 'ArrowUp', 'ArrowLeft');
		expect(at(grid)).toEqual([0, 'tag']);
		press(grid, 'ArrowDown', 'ArrowRight');
		expect(at(grid)).toEqual([1, 'joins']);
		press(grid, 'ArrowDown', 'ArrowDown', 'ArrowDown', 'ArrowDown');
		expect(at(grid)).toEqual([3, 'joins']);
		expect(grid.activeRow).toBeUndefined();
	});

	it('goes by Enter to the column where a run of Tab began, and not after the hands went elsewhere', () => {
		const grid = gridOf();
		go(grid, 0, 'size');
		press(grid, '4', 'Tab', '6', 'Tab', '1', 'Enter');
		expect(at(grid)).toEqual([1, 'size']);
		press(grid, 'Tab', 'ArrowDown', 'Enter');
		expect(at(grid)).toEqual([3, 'length']);
	});

	it('says why a cell takes no text, until the hands go on', () => {
		const grid = gridOf();
		go(grid, 0, 'flow');
		press(grid, '5');
		expect(grid.editing).toBeNull();
		expect(grid.notice).toMatch(/^Rows join A: its flow is their sum\./);
		press(grid, 'ArrowDown');
		expect(grid.notice).toBe('');
		go(grid, 1, 'velocity');
		press(grid, '5');
		expect(grid.notice).toBe('This column is computed.');
		const reader = gridOf(ROWS, false);
		press(reader, 'x');
		expect(reader.notice).toBe('You may read this sheet, not write in it.');
	});

	it('goes on by Tab at the end of a row, and leaves the grid at its two ends', () => {
		const grid = gridOf();
		expect(press(grid, 'Shift+Tab')).toBe(false);
		press(grid, 'End');
		expect(at(grid)).toEqual([0, 'marks']);
		expect(press(grid, 'Tab')).toBe(true);
		expect(at(grid)).toEqual([1, 'tag']);
		expect(press(grid, 'Shift+Tab')).toBe(true);
		expect(at(grid)).toEqual([0, 'marks']);
		go(grid, 3, 'tag');
		expect(press(grid, 'Tab')).toBe(false);
	});

	it.each<[string, string, [number, string]]>([
		['Enter', 'size', [2, 'size']],
		['Shift+Enter', 'size', [0, 'size']],
		['Home', 'size', [1, 'tag']],
		['End', 'size', [1, 'marks']],
		['PageDown', 'size', [3, 'size']],
		['PageUp', 'size', [0, 'size']],
		['Ctrl+Home', 'size', [0, 'tag']],
		['Ctrl+End', 'size', [2, 'marks']],
		['Ctrl+ArrowDown', 'size', [2, 'size']],
		['Ctrl+ArrowUp', 'size', [0, 'size']],
		['Ctrl+ArrowLeft', 'size', [1, 'tag']],
		['Meta+ArrowRight', 'size', [1, 'marks']]
	])('%s from the second row’s %s leads there', (key, field, place) => {
		const grid = gridOf();
		go(grid, 1, field);
		expect(press(grid, key)).toBe(true);
		expect(at(grid)).toEqual(place);
		expect(grid.selection.isRange).toBe(false);
	});

	it('takes a range by Shift, from where it began', () => {
		const grid = gridOf();
		go(grid, 1, 'size');
		press(grid, 'Shift+ArrowDown', 'Shift+ArrowRight', 'Shift+ArrowRight');
		const [size, flex] = [column(grid, 'size'), column(grid, 'size') + 2];
		expect(grid.selection.range).toEqual({ top: 1, bottom: 2, left: size, right: flex });
		press(grid, 'Shift+ArrowUp', 'Shift+ArrowUp');
		expect(grid.selection.range).toEqual({ top: 0, bottom: 1, left: size, right: flex });
		press(grid, 'ArrowDown');
		expect(grid.selection.isRange).toBe(false);
		press(grid, 'Ctrl+a');
		expect(grid.selection.range).toEqual({ top: 0, bottom: 2, left: 0, right: grid.columns.length - 1 });
	});

	it.each(['Escape', 'F5', 'Dead', 'Control', 'Ctrl+s', 'Alt+ArrowLeft', 'Alt+x'])('leaves %s to others', (key) => {
		const grid = gridOf();
		expect(press(grid, key)).toBe(false);
		expect([at(grid), grid.editing]).toEqual([[0, 'tag'], null]);
	});
});

describe('typing in the grid', () => {
	it('types over a cell, and an arrow writes it and goes on', () => {
		const grid = gridOf();
		go(grid, 0, 'length');
		press(grid, '7');
		expect(grid.editing).toMatchObject({ row: 0, field: 'length', text: '7', mode: 'replace' });
		grid.type('7.5');
		expect(typed(grid, 'length')[0]).toBe('5');
		press(grid, 'ArrowRight');
		expect([typed(grid, 'length')[0], at(grid), grid.editing]).toEqual(['7.5', [0, 'flex'], null]);
	});

	it('amends by F2, where arrows stay in the text, and F2 again lets them leave', () => {
		const grid = gridOf();
		go(grid, 0, 'length');
		press(grid, 'F2');
		expect(grid.editing).toMatchObject({ text: '5', mode: 'amend' });
		expect(press(grid, 'ArrowLeft')).toBe(false);
		grid.type('51');
		press(grid, 'F2');
		expect(grid.editing).toMatchObject({ text: '51', mode: 'replace' });
		press(grid, 'F2');
		expect(grid.editing).toMatchObject({ text: '51', mode: 'amend' });
		press(grid, 'F2', 'ArrowDown');
		expect([typed(grid, 'length')[0], at(grid)]).toEqual(['51', [1, 'length']]);
	});

	it.each<[string, [number, string]]>([
		['Enter', [2, 'length']],
		['Shift+Enter', [0, 'length']],
		['Tab', [1, 'flex']],
		['Shift+Tab', [1, 'size']]
	])('%s writes the text and goes on', (key, place) => {
		const grid = gridOf();
		go(grid, 1, 'length');
		write(grid, '9');
		press(grid, key);
		expect([typed(grid, 'length')[1], at(grid), grid.editing]).toEqual(['9', place, null]);
	});

	it('Escape leaves the cell as it was', () => {
		const grid = gridOf();
		go(grid, 1, 'length');
		write(grid, '9');
		press(grid, 'Escape');
		expect([typed(grid, 'length')[1], at(grid), grid.editing, grid.open.mayUndo]).toEqual([
			'4',
			[1, 'length'],
			null,
			false
		]);
	});

	it('keeps what is not understood, and says why', () => {
		const grid = gridOf();
		go(grid, 1, 'size');
		write(grid, '24xx12');
		expect(grid.reading).toMatchObject({ ok: false, message: '“24xx12”: a figure of the size is missing.' });
		press(grid, 'Enter');
		expect(typed(grid, 'size')[1]).toBe('24xx12');
		const row = grid.rows[1];
		expect(row && grid.problems(row).map(({ field }) => field)).toEqual(['size']);
	});

	it('makes no edit of a text that stands there already', () => {
		const grid = gridOf();
		go(grid, 1, 'size');
		press(grid, 'F2', 'Enter');
		expect(grid.open.mayUndo).toBe(false);
	});

	it('adds a row by typing on the blank line, and goes on in it', () => {
		const grid = gridOf();
		go(grid, 3, 'tag');
		write(grid, 'D');
		press(grid, 'Tab');
		expect([typed(grid, 'tag'), at(grid)]).toEqual([
			['A', 'B', 'C', 'D'],
			[3, 'joins']
		]);
		write(grid, 'A');
		press(grid, 'Enter');
		expect([grid.rows.length, typed(grid, 'joins')[3]]).toEqual([4, 'A']);
		write(grid, ' ');
		press(grid, 'Enter');
		expect(grid.rows).toHaveLength(4);
	});

	it('takes no flow, outlet or room where rows join, but lets one that stands there be taken out', () => {
		const grid = gridOf();
		grid.showColumn('pressure', true);
		for (const field of ['flow', 'outlet', 'pressure']) {
			go(grid, 0, field);
			press(grid, '5');
			expect(grid.editing).toBeNull();
		}
		const middle = gridOf([{ ...ROWS[0], flow: '160' }, ...ROWS.slice(1)]);
		go(middle, 0, 'flow');
		press(middle, 'F2');
		expect(middle.editing).toMatchObject({ text: '160' });
	});

	it('opens no editor on computed columns', () => {
		const grid = gridOf();
		go(grid, 0, 'velocity');
		press(grid, '5');
		press(grid, 'F2');
		expect(grid.editing).toBeNull();
	});

	it('refuses a text that no cell can hold, and leaves the editor open with it', () => {
		const grid = gridOf();
		go(grid, 1, 'serves');
		write(grid, 'x'.repeat(MOST_TYPED + 1));
		press(grid, 'Enter');
		expect(grid.editing?.text).toHaveLength(MOST_TYPED + 1);
		expect(at(grid)).toEqual([1, 'serves']);
		expect(grid.notice).toBe('This text has 2001 characters; a cell holds at most 2000.');
		press(grid, 'Escape');
		expect([grid.editing, typed(grid, 'serves')[1]]).toEqual([null, '']);
	});

	it('writes into its row, though another person moves the rows meanwhile', () => {
		const open = new OpenSheet({ designId: 'design-1', sheet: sheetOf(ROWS), seq: 0 });
		let sheet = open.sheet;
		const edits: unknown[] = [];
		const grid = new RunGrid(
			{
				...savedSheet({ sheet, document: open.solved.document!, solution: open.solved.solution! }),
				get sheet() {
					return sheet;
				},
				do: (edit) => edits.push(edit)
			},
			true
		);
		go(grid, 1, 'length');
		write(grid, '9');
		sheet = applyEntry(sheet, { kind: 'insert', rows: [{ id: rowId(77), cells: {} }], before: rowId(0) });
		expect(grid.editing?.row).toBe(2);
		grid.accept();
		expect(edits).toEqual([{ kind: 'set', row: rowId(1), field: 'length', typed: '9', units: 'SI' }]);

		go(grid, 2, 'length');
		write(grid, '11');
		sheet = applyEntry(sheet, { kind: 'delete', rows: [rowId(1)] });
		grid.accept();
		expect(edits).toHaveLength(1);
		expect(grid.notice).toBe('The row was deleted meanwhile; “11” could not be written into it.');
	});
});

describe('commands of the keyboard', () => {
	it('Delete and Backspace clear the range', () => {
		for (const key of ['Delete', 'Backspace']) {
			const grid = gridOf();
			go(grid, 1, 'size');
			go(grid, 2, 'length', true);
			press(grid, key);
			expect([typed(grid, 'size'), typed(grid, 'length')]).toEqual([
				['400x300', '', ''],
				['5', '', '']
			]);
		}
	});

	it('Ctrl+D fills the first row of the range down', () => {
		const grid = gridOf();
		go(grid, 0, 'size');
		go(grid, 2, 'size', true);
		press(grid, 'Ctrl+d');
		expect(typed(grid, 'size')).toEqual(['400x300', '400x300', '400x300']);
	});

	it('Insert adds a row above, and Ctrl+Delete takes the rows of the range out', () => {
		const grid = gridOf();
		go(grid, 1, 'size');
		press(grid, 'Insert');
		expect([typed(grid, 'tag'), at(grid)]).toEqual([
			['A', '', 'B', 'C'],
			[1, 'tag']
		]);
		press(grid, 'Shift+ArrowDown', 'Ctrl+Delete');
		expect(typed(grid, 'tag')).toEqual(['A', 'C']);
		go(grid, 2, 'tag');
		press(grid, 'Ctrl+Delete');
		expect(typed(grid, 'tag')).toEqual(['A', 'C']);
	});

	it('Alt+arrows move the rows of the range, which stay taken', () => {
		const grid = gridOf();
		go(grid, 1, 'size');
		go(grid, 2, 'length', true);
		press(grid, 'Alt+ArrowUp');
		expect(typed(grid, 'tag')).toEqual(['B', 'C', 'A']);
		expect(grid.selection.range).toMatchObject({ top: 0, bottom: 1 });
		press(grid, 'Alt+ArrowUp');
		expect(typed(grid, 'tag')).toEqual(['B', 'C', 'A']);
		press(grid, 'Alt+ArrowDown');
		expect(typed(grid, 'tag')).toEqual(['A', 'B', 'C']);
		expect(grid.selection.range).toMatchObject({ top: 1, bottom: 2 });
	});

	it('Ctrl+Z undoes to the start, Ctrl+Y and Ctrl+Shift+Z redo to the end', () => {
		const grid = gridOf();
		const start = grid.open.sheet;
		go(grid, 0, 'tag');
		write(grid, 'M');
		press(grid, 'Enter', 'Delete', 'Insert', 'Ctrl+Delete', 'Alt+ArrowDown');
		go(grid, 0, 'length');
		write(grid, '8');
		press(grid, 'Enter');
		const end = grid.open.sheet;
		expect(typed(grid, 'joins')).toContain('M');
		let steps = 0;
		for (; grid.open.mayUndo; steps++) press(grid, 'Ctrl+z');
		expect(steps).toBe(6);
		expect(grid.open.sheet).toEqual(start);
		expect(grid.open.solved.solution?.rows).toHaveProperty('A');
		for (; grid.open.mayRedo; steps++) press(grid, steps % 2 ? 'Ctrl+y' : 'Ctrl+Shift+Z');
		expect(steps).toBe(12);
		expect(grid.open.sheet).toEqual(end);
		press(grid, 'Ctrl+z');
		write(grid, '5');
		press(grid, 'Enter');
		expect(grid.open.mayRedo).toBe(false);
	});

	it('do nothing to a sheet that is only shown', () => {
		const shown = gridOf();
		const { document, solution } = shown.open.solved;
		if (!document || !solution) throw new Error('no figures');
		const grid = new RunGrid(savedSheet({ sheet: shown.open.sheet, document, solution }), false);
		for (const row of [0, 1, 2]) {
			go(grid, row, 'length');
			press(grid, '5', 'F2', 'Delete', 'Insert', 'Ctrl+Delete', 'Alt+ArrowUp', 'Ctrl+d', 'Ctrl+z', 'Ctrl+y');
			grid.paste('1\t2\n');
		}
		expect([grid.editing, grid.open.sheet]).toEqual([null, shown.open.sheet]);
		press(grid, 'ArrowDown', 'ArrowDown', 'ArrowDown');
		expect(grid.selection.active.row).toBe(2);
	});
});

describe('copy and paste', () => {
	it('tells pasted figures that could be read otherwise, and says nothing of others', () => {
		const grid = gridOf();
		go(grid, 0, 'flow');
		grid.paste('150\n1.5');
		expect(grid.notice).toBe('');
		grid.paste('1,200\n1.350');
		expect(grid.notice).toMatch(/^2 figures of these could be read otherwise: “1,200” is read as 1\u2009200 L\/s/);
	});

	it('bring a block back as it was typed', () => {
		const grid = gridOf();
		press(grid, 'Ctrl+a');
		const text = grid.copy();
		const other = gridOf([]);
		other.paste(text);
		const cells = (of: RunGrid) => of.rows.map((row) => row.cells);
		expect(cells(other)).toEqual(cells(grid));
		press(other, 'Ctrl+z');
		expect(other.rows).toEqual([]);
	});

	it('fill the whole range with one cell', () => {
		const grid = gridOf();
		go(grid, 0, 'length');
		go(grid, 2, 'flex', true);
		grid.paste('2\n');
		expect([typed(grid, 'length'), typed(grid, 'flex')]).toEqual([Array(3).fill('2'), Array(3).fill('2')]);
	});

	it('add no rows from a computed column', () => {
		const grid = gridOf();
		go(grid, 3, 'velocity');
		grid.paste('1\t2\n3\t4\n');
		expect(grid.rows).toHaveLength(3);
	});

	it('refuse a million rows quickly, with nothing changed and the reason told', () => {
		const grid = gridOf();
		const before = grid.open.sheet;
		const begun = performance.now();
		grid.paste('S1\tA\n'.repeat(1_000_000));
		expect(performance.now() - begun).toBeLessThan(2_000);
		expect(grid.open.sheet).toBe(before);
		expect(grid.notice).toBe(
			'Nothing was pasted: the clipboard holds 1000000 rows, and the sheet has room for 5000 more.'
		);
		grid.paste('Z\n');
		expect(grid.notice).toBe('');
	});

	it('fill a sheet to its last row, and not beyond', () => {
		const grid = gridOf([]);
		grid.paste(Array.from({ length: MOST_ROWS }, (_, n) => `R${n}`).join('\n'));
		expect(grid.rows).toHaveLength(MOST_ROWS);
		go(grid, MOST_ROWS - 1, 'tag');
		grid.paste('X\nY');
		expect(grid.notice).toBe('Nothing was pasted: the clipboard holds 2 rows, and the sheet has room for 1 more.');
		expect(valueOf(grid.rows[MOST_ROWS - 1]!, 'tag')).toBe(`R${MOST_ROWS - 1}`);
	}, 20_000);
});

describe('what rows have to say', () => {
	it('follows the edits', () => {
		const grid = gridOf();
		expect(grid.onIndex).toEqual(new Set(['A', grid.open.solved.solution?.index.supply]));
		expect(grid.joined.has('A')).toBe(true);
		go(grid, 1, 'joins');
		press(grid, 'Delete');
		go(grid, 2, 'joins');
		press(grid, 'Delete');
		expect(grid.joined.has('A')).toBe(false);
		expect(grid.problemsOf.get(rowId(0))?.map(({ field }) => field)).toEqual(['flow']);
	});

	it('is found by tag and by cell', () => {
		const grid = gridOf();
		grid.goToTag('C');
		expect(at(grid)).toEqual([2, 'tag']);
		grid.goToCell(rowId(1), 'size');
		expect(at(grid)).toEqual([1, 'size']);
		grid.goToTag('nowhere');
		grid.goToCell(null, 'size');
		expect(at(grid)).toEqual([1, 'size']);
	});
});
