import type { DesignDocument, Solution } from '$lib/engine';
import type { GridSource } from './run-grid.svelte';
import { unitsOf, type Sheet } from './sheet';

interface Saved {
	readonly sheet: Sheet;
	readonly document: DesignDocument;
	readonly solution: Solution;
}

/** A saved version as the grid reads it: the stored figures, computed once and for all. */
export function savedSheet({ sheet, document, solution }: Saved): GridSource {
	return {
		sheet,
		units: unitsOf(sheet),
		solved: { document, solution, problems: [], uncounted: [] },
		whatIf: null,
		isConfirmed: true,
		mayUndo: false,
		mayRedo: false,
		do: () => {},
		undo: () => {},
		redo: () => {},
		tryOut: () => {}
	};
}
