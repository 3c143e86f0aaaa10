import type { UnitSystem } from '$lib/engine';
import { applyEntry, applyMany } from './apply';
import type { Edit, SentEdit } from './edit';
import { entryOf, type Entry } from './entry';
import { inverseOf } from './invert';
import { readKept, readSeen } from './kept-edits';
import { newId } from './new-id';
import { Outbox } from './outbox.svelte';
import { PreviewFigures } from './preview-figures';
import type { EditsReply, ServerFigures } from './server-reply';
import { unitsOf, type Sheet } from './sheet';
import { solveSheet, type SolvedSheet } from './solve-sheet';

interface Opened {
	readonly designId: string;
	readonly sheet: Sheet;
	readonly seq: number;
}

/** Steps kept for undo. */
const MOST_STEPS = 1_000;

/**
 * The sheet of one design, open in this browser: what is on the screen, its figures, the way of each edit to the
 * server, and the way back. The engine runs in a worker; the server's figures are the ones that count.
 */
export class OpenSheet {
	readonly designId: string;
	readonly outbox: Outbox;
	#confirmed: Sheet;
	#base: number;
	#sheet = $state.raw<Sheet>() as Sheet;
	#units = $state.raw<UnitSystem>('SI');
	#solved = $state.raw<SolvedSheet>() as SolvedSheet;
	#whatIf = $state.raw<SolvedSheet | null>(null);
	#server = $state.raw<ServerFigures | null>(null);
	#undo = $state.raw<readonly Edit[]>([]);
	#redo = $state.raw<readonly Edit[]>([]);
	#turn = $state(0);
	#solvedTurn = $state(0);
	#whatIfTurn = 0;
	#figures: PreviewFigures;
	/** Time that the engine took for the last figures [ms]. */
	took = $state(0);

	constructor(opened: Opened) {
		this.designId = opened.designId;
		this.#confirmed = opened.sheet;
		this.#show(opened.sheet);
		this.#base = opened.seq;
		this.#solved = solveSheet(opened.sheet);
		this.#figures = new PreviewFigures({
			onsolved: (turn, solved, took) => {
				// The worker may answer for an older state after a newer one was solved here.
				if (turn < this.#solvedTurn) return;
				this.#solvedTurn = turn;
				this.#solved = solved;
				this.took = took;
			},
			onwhatif: (turn, solved) => {
				if (turn === this.#whatIfTurn) this.#whatIf = solved;
			}
		});
		this.outbox = new Outbox({
			designId: opened.designId,
			base: () => this.#base,
			onreply: (reply, sent) => this.#take(reply, sent)
		});
	}

	get sheet() {
		return this.#sheet;
	}
	/** Told only where they change: most figures of the screen hang on them, and need not be asked with every edit. */
	get units(): UnitSystem {
		return this.#units;
	}
	get solved() {
		return this.#solved;
	}
	/** Figures of the text that is being typed, while it is. */
	get whatIf() {
		return this.#whatIf;
	}
	get mayUndo() {
		return this.#undo.length > 0;
	}
	get mayRedo() {
		return this.#redo.length > 0;
	}
	/** The last entry of the log that this browser has. */
	get seq() {
		return this.#base;
	}
	/** Whether the server has computed the same duty from the same edits. */
	get isConfirmed(): boolean {
		if (this.outbox.unsent.length || this.#turn !== this.#solvedTurn) return false;
		const mine = this.#solved.solution?.fan;
		const theirs = this.#server?.fan;
		return !this.#server || (mine?.totalPressure === theirs?.totalPressure && mine?.flow === theirs?.flow);
	}

	/** Starts the worker and sends what an earlier visit kept. In the browser only. Returns the end of it. */
	start(): () => void {
		this.#figures.start(() => this.#sheet);
		this.outbox.recall();
		const kept = readKept(this.designId);
		this.#show(
			applyMany(
				this.#sheet,
				kept.flatMap(({ edit }) => entryOf(edit) ?? [])
			)
		);
		this.#solve('all');
		if (kept.length) this.outbox.fill(kept);
		// The page before this one may have sent its last edits while this one was already on its way.
		else if (readSeen(this.designId) > this.#base) void this.outbox.ask();
		const online = () => void this.outbox.flush();
		addEventListener('online', online);
		return () => {
			removeEventListener('online', online);
			this.outbox.stop();
			this.#figures.stop();
		};
	}

	/** Does an edit: at once on the screen, then to the server. */
	do(edit: Edit): void {
		const inverse = inverseOf(this.#sheet, edit);
		if (!inverse) return;
		this.#undo = [...this.#undo, inverse].slice(-MOST_STEPS);
		this.#redo = [];
		this.#apply(edit);
	}

	undo(): void {
		const step = this.#stepBack(this.#undo);
		this.#undo = step.rest;
		if (!step.inverse) return;
		this.#redo = [...this.#redo, step.inverse];
		this.#apply(step.edit);
	}

	redo(): void {
		const step = this.#stepBack(this.#redo);
		this.#redo = step.rest;
		if (!step.inverse) return;
		this.#undo = [...this.#undo, step.inverse];
		this.#apply(step.edit);
	}

	/** The last step that still changes something; those whose rows others have deleted are passed over. */
	#stepBack(steps: readonly Edit[]) {
		for (let at = steps.length - 1; at >= 0; at--) {
			const edit = steps[at];
			const inverse = edit && inverseOf(this.#sheet, edit);
			if (inverse) return { edit, inverse, rest: steps.slice(0, at) };
		}
		return { inverse: null, rest: [] };
	}

	/** Computes what an edit would do, without doing it; null ends it. */
	tryOut(edit: Edit | null): void {
		const entry = edit && entryOf(edit);
		if (!entry) {
			this.#whatIfTurn++;
			this.#whatIf = null;
			return;
		}
		this.#figures.tryOut(++this.#whatIfTurn, entry);
	}

	#apply(edit: Edit): void {
		const entry = entryOf(edit);
		if (!entry) return;
		this.#show(applyEntry(this.#sheet, entry));
		this.tryOut(null);
		this.#solve(entry);
		this.outbox.put({ id: newId(), edit });
	}

	#show(sheet: Sheet): void {
		this.#sheet = sheet;
		this.#units = unitsOf(sheet);
	}

	#solve(change: Entry | 'all'): void {
		this.#figures.solve(++this.#turn, this.#sheet, change);
	}

	/** Brings in the server's order. Where others were faster, the screen is rebuilt from it and the unsent edits. */
	#take(reply: EditsReply, sent: readonly SentEdit[]): void {
		this.#confirmed = applyMany(
			this.#confirmed,
			reply.entries.map(({ entry }) => entry)
		);
		this.#base = reply.seq;
		this.#server = reply.figures;
		const asSent = !reply.refused.length && sameIds(reply.entries, sent);
		if (asSent) return;
		const gone = new Set(sent.map(({ id }) => id));
		const waiting = this.outbox.unsent.filter(({ id }) => !gone.has(id));
		const entries = waiting.flatMap(({ edit }) => (entryOf(edit) ?? []) as Entry | []);
		this.#show(applyMany(this.#confirmed, entries));
		this.#solve('all');
	}
}

const sameIds = (entries: readonly { id: string }[], sent: readonly { id: string }[]) =>
	entries.length === sent.length && entries.every(({ id }, at) => id === sent[at]?.id);
