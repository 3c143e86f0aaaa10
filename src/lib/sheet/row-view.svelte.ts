import type { Flag, SolvedRow, UnitSystem } from '$lib/engine';
import type { Column } from './columns';
import type { RowField, SheetRow } from './sheet';
import type { SheetProblem } from './sheet-problem';
import type { TreeLine } from './tree-lines';

/** All that one row of the screen shows. */
export interface RowShown {
	readonly row: SheetRow;
	readonly line: TreeLine;
	readonly solved: SolvedRow | undefined;
	readonly onIndex: boolean;
	readonly problems: readonly SheetProblem[];
	readonly flags: readonly Flag[];
	readonly units: UnitSystem;
	/** The greatest spare of the design: the full bar [Pa]. */
	readonly mostSpare: number;
	readonly columns: readonly Column[];
	readonly template: string;
	/** Column of the active cell; -1 in another row. */
	readonly activeColumn: number;
	readonly firstRanged: number;
	readonly lastRanged: number;
	readonly edited: RowField | null;
}

/** Figures that a row shows; worker and server send them as new objects each time. */
const FIGURES = [
	...['side', 'flow', 'velocity', 'frictionRate', 'frictionLoss', 'flexibleLoss', 'fittingLoss', 'junctionLoss'],
	...['equipmentLoss', 'outletLoss', 'loss', 'spare']
] as (keyof SolvedRow)[];

const sameFigures = (a: SolvedRow | undefined, b: SolvedRow | undefined) =>
	a === b || (a !== undefined && b !== undefined && FIGURES.every((key) => a[key] === b[key]));

const sameTexts = (a: readonly { message: string }[], b: readonly { message: string }[]) =>
	a.length === b.length && a.every(({ message }, at) => message === b[at]?.message);

/**
 * What one row of the screen shows, told to it only where it differs from before: an edit then redraws the rows that it
 * changes, and the others are not even asked.
 */
export class RowView {
	#shown = $state.raw<RowShown>() as RowShown;

	constructor(shown: RowShown) {
		this.#shown = shown;
	}

	get shown(): RowShown {
		return this.#shown;
	}

	/** Takes what the row shows now. */
	show(now: RowShown, before: RowShown): void {
		const solved = sameFigures(now.solved, before.solved) ? before.solved : now.solved;
		const problems = sameTexts(now.problems, before.problems) ? before.problems : now.problems;
		const flags = sameTexts(now.flags, before.flags) ? before.flags : now.flags;
		const next: RowShown = { ...now, solved, problems, flags };
		const keys = Object.keys(next) as (keyof RowShown)[];
		if (keys.some((key) => next[key] !== before[key])) this.#shown = next;
	}
}
