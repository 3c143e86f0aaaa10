import type { Entry } from './entry';
import type { FromWorker, ToWorker } from './preview';
import type { Sheet } from './sheet';
import { solveSheet, type SolvedSheet } from './solve-sheet';

/** Longest that the engine may hold up the hands [ms]: half a frame, so that edit and figures are painted together. */
const BUDGET = 8;
/** Runs of which the quickest counts: a single one may have been held up by something else. */
const RUNS = 5;

interface Answers {
	/** The sheet as it stands at a turn came to this. */
	readonly onsolved: (turn: number, solved: SolvedSheet, took: number) => void;
	/** What is being tried out would come to this. */
	readonly onwhatif: (turn: number, solved: SolvedSheet) => void;
}

/**
 * Computes the figures that the screen shows before the server's. A sheet that the engine solves within half a frame is
 * solved here and now, and its figures are painted with the edit itself: waiting for the worker would cost a frame. A
 * longer one, and whatever is only tried out, goes to the worker.
 */
export class PreviewFigures {
	#answers: Answers;
	#worker: Worker | null = null;
	#took: number[] = [];

	constructor(answers: Answers) {
		this.#answers = answers;
	}

	/** In the browser only: starts the worker, and makes the engine's code warm here while nothing else is to be done. */
	start(sheet: () => Sheet): void {
		this.#worker = new Worker(new URL('./preview.worker.ts', import.meta.url), { type: 'module' });
		this.#worker.onmessage = ({ data }: MessageEvent<FromWorker>) => {
			if (data.kind === 'what-if') this.#answers.onwhatif(data.turn, data.solved);
			else this.#answers.onsolved(data.turn, data.solved, data.took);
		};
		this.#warm(sheet, 2 * RUNS);
	}

	stop(): void {
		this.#worker?.terminate();
		this.#worker = null;
	}

	/** Solves the sheet as it stands; `change` is what the worker does not know of it yet. */
	solve(turn: number, sheet: Sheet, change: Entry | 'all'): void {
		const here = !this.#worker || this.#isQuick;
		if (change === 'all') this.#tell({ kind: 'sheet', turn, sheet, solve: !here });
		else this.#tell({ kind: 'entry', turn, entry: change, solve: !here });
		if (!here) return;
		const solved = this.#measured(sheet);
		this.#answers.onsolved(turn, solved, this.#took.at(-1) ?? 0);
	}

	/** Computes what an entry would come to. */
	tryOut(turn: number, entry: Entry): void {
		this.#tell({ kind: 'what-if', turn, entry });
	}

	get #isQuick(): boolean {
		return Math.min(...this.#took) <= BUDGET;
	}

	#measured(sheet: Sheet): SolvedSheet {
		const begun = performance.now();
		const solved = solveSheet(sheet);
		this.#took = [...this.#took.slice(1 - RUNS), performance.now() - begun];
		return solved;
	}

	/** New code runs slowly for its first rounds, and would lose the budget for good. */
	#warm(sheet: () => Sheet, rounds: number): void {
		if (rounds === 0 || !this.#worker) return;
		const idle = globalThis.requestIdleCallback ?? ((then: () => void) => setTimeout(then, 50));
		idle(() => {
			this.#measured(sheet());
			this.#warm(sheet, this.#isQuick ? 0 : rounds - 1);
		});
	}

	#tell(message: ToWorker): void {
		this.#worker?.postMessage(message);
	}
}
