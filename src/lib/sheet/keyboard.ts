/** The keyboard of the run sheet: which key does what, while a cell is selected and while it is edited. */
import type { RunGrid } from './run-grid.svelte';

/** Rows that Page Up and Page Down pass. */
const PAGE = 20;

const ARROWS: Readonly<Record<string, readonly [number, number]>> = {
	ArrowUp: [-1, 0],
	ArrowDown: [1, 0],
	ArrowLeft: [0, -1],
	ArrowRight: [0, 1]
};

/** A key pressed on the grid with no editor open. True when it was used. */
export function pressOnGrid(grid: RunGrid, event: KeyboardEvent): boolean {
	const command = event.ctrlKey || event.metaKey;
	if (command) return pressCommand(grid, event);
	if (event.altKey) return pressAlt(grid, event);
	const arrow = ARROWS[event.key];
	const { selection } = grid;
	if (arrow) selection.move(arrow[0], arrow[1], event.shiftKey);
	else
		switch (event.key) {
			case 'PageUp':
			case 'PageDown':
				selection.move(event.key === 'PageUp' ? -PAGE : PAGE, 0, event.shiftKey);
				break;
			case 'Home':
				selection.go({ row: selection.active.row, column: 0 }, event.shiftKey);
				break;
			case 'End':
				selection.go({ row: selection.active.row, column: Infinity }, event.shiftKey);
				break;
			case 'Tab':
				return stepOut(grid, event.shiftKey ? -1 : 1);
			case 'Enter':
				selection.line(event.shiftKey ? -1 : 1);
				break;
			case 'F2':
				grid.edit(null);
				break;
			case 'Delete':
			case 'Backspace':
				grid.clear();
				break;
			case 'Insert':
				grid.insertRow();
				break;
			default:
				if ([...event.key].length !== 1) return false;
				grid.edit(event.key);
		}
	return true;
}

/** Tab leaves the grid at its two ends, so that nobody is caught in it. */
function stepOut(grid: RunGrid, by: 1 | -1): boolean {
	const { row, column } = grid.selection.active;
	if (by < 0 && row === 0 && column === 0) return false;
	if (by > 0 && row >= grid.rows.length && column === 0) return false;
	grid.selection.step(by);
	return true;
}

function pressCommand(grid: RunGrid, event: KeyboardEvent): boolean {
	const { selection } = grid;
	const arrow = ARROWS[event.key];
	if (arrow) {
		const [down, right] = arrow;
		const row = down ? (down < 0 ? 0 : grid.rows.length - 1) : selection.active.row;
		selection.go({ row, column: right ? (right < 0 ? 0 : Infinity) : selection.active.column }, event.shiftKey);
		return true;
	}
	switch (event.key) {
		case 'Home':
			selection.go({ row: 0, column: 0 }, event.shiftKey);
			return true;
		case 'End':
			selection.go({ row: grid.rows.length - 1, column: Infinity }, event.shiftKey);
			return true;
		case 'Delete':
			grid.deleteRows();
			return true;
	}
	switch (event.key.toLowerCase()) {
		case 'a':
			selection.go({ row: 0, column: 0 });
			selection.go({ row: grid.rows.length - 1, column: Infinity }, true);
			return true;
		case 'd':
			grid.fillDown();
			return true;
		case 'z':
			if (event.shiftKey) grid.open.redo();
			else grid.open.undo();
			return true;
		case 'y':
			grid.open.redo();
			return true;
	}
	return false;
}

function pressAlt(grid: RunGrid, event: KeyboardEvent): boolean {
	if (event.key !== 'ArrowUp' && event.key !== 'ArrowDown') return false;
	grid.moveRows(event.key === 'ArrowUp' ? -1 : 1);
	return true;
}

/** A key pressed in the editor of a cell. True when it was used. */
export function pressInEditor(grid: RunGrid, event: KeyboardEvent): boolean {
	const { selection } = grid;
	const arrow = ARROWS[event.key];
	if (event.isComposing) return false;
	if (arrow && grid.editing?.mode === 'replace' && !event.ctrlKey && !event.metaKey && !event.altKey) {
		if (grid.accept()) selection.move(arrow[0], arrow[1], event.shiftKey);
		return true;
	}
	switch (event.key) {
		case 'Enter':
			if (grid.accept()) selection.line(event.shiftKey ? -1 : 1);
			return true;
		case 'Tab':
			if (grid.accept()) selection.step(event.shiftKey ? -1 : 1);
			return true;
		case 'Escape':
			grid.leave();
			return true;
		case 'F2':
			grid.switchMode();
			return true;
	}
	return false;
}
