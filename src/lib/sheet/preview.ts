/** Messages between the sheet and the worker that computes its preview. */
import type { Entry } from './entry';
import type { Sheet } from './sheet';
import type { SolvedSheet } from './solve-sheet';

export type ToWorker =
	/** `solve`: false where the page itself solves it, and the worker only keeps its copy up to date. */
	| { readonly kind: 'sheet'; readonly turn: number; readonly sheet: Sheet; readonly solve: boolean }
	| { readonly kind: 'entry'; readonly turn: number; readonly entry: Entry; readonly solve: boolean }
	| { readonly kind: 'what-if'; readonly turn: number; readonly entry: Entry };

export interface FromWorker {
	readonly kind: 'solved' | 'what-if';
	readonly turn: number;
	readonly solved: SolvedSheet;
	/** Time that the engine took [ms]. */
	readonly took: number;
}
