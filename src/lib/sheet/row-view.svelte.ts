import type { Flag, SolvedRow, UnitSystem } from '$lib/engine';
import type { Column } from './columns';
import { rowFigures, type RowFigures } from './row-figures';
import type { RowField, SheetRow } from './sheet';
import type { SheetProblem } from './sheet-problem';
import type { TreeLine } from './tree-lines';

/** All that one row of the screen is made of. */
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

const sameTexts = (a: readonly { message: string }[], b: readonly { message: string }[]) =>
	a.length === b.length && a.every(({ message }, at) => message === b[at]?.message);

/**
 * What one row of the screen shows. Each thing in it is a signal of its own, told only where it differs from before: an
 * edit then redraws the texts that it changes, and the others are not even asked.
 */
export class RowView {
	row = $state.raw<SheetRow>() as SheetRow;
	line = $state.raw<TreeLine>() as TreeLine;
	onIndex = $state.raw(false);
	problems = $state.raw<readonly SheetProblem[]>([]);
	flags = $state.raw<readonly Flag[]>([]);
	units = $state.raw<UnitSystem>('SI');
	columns = $state.raw<readonly Column[]>([]);
	template = $state.raw('');
	activeColumn = $state.raw(-1);
	firstRanged = $state.raw(Infinity);
	lastRanged = $state.raw(-1);
	edited = $state.raw<RowField | null>(null);

	hasAnswer = $state.raw(false);
	toBeConfirmed = $state.raw(false);
	side = $state.raw('');
	flow = $state.raw('');
	velocity = $state.raw('');
	rate = $state.raw('');
	duct = $state.raw('');
	fittings = $state.raw('');
	equipment = $state.raw('');
	total = $state.raw('');
	spare = $state.raw('');
	/** Of the full bar, from 0 to 1. */
	spareShare = $state.raw(0);

	#shown: RowShown | null = null;

	constructor(shown: RowShown) {
		this.show(shown);
	}

	/** Takes what the row shows now. */
	show(now: RowShown): void {
		const before = this.#shown;
		this.#shown = now;
		this.row = now.row;
		this.line = now.line;
		this.onIndex = now.onIndex;
		this.units = now.units;
		this.columns = now.columns;
		this.template = now.template;
		this.activeColumn = now.activeColumn;
		this.firstRanged = now.firstRanged;
		this.lastRanged = now.lastRanged;
		this.edited = now.edited;
		if (!before || !sameTexts(now.problems, before.problems)) this.problems = now.problems;
		if (!before || !sameTexts(now.flags, before.flags)) this.flags = now.flags;
		if (!before || now.solved !== before.solved || now.units !== before.units) this.#figure(now);
		const { solved, mostSpare } = now;
		this.spareShare = solved && mostSpare > 0 ? Math.max(0, Math.min(1, solved.spare / mostSpare)) : 0;
	}

	#figure({ solved, units }: RowShown): void {
		const figures: RowFigures = rowFigures(solved, units);
		this.hasAnswer = solved !== undefined;
		this.toBeConfirmed = solved?.items.some((item) => item.toBeConfirmed) ?? false;
		this.side = figures.side;
		this.flow = figures.flow;
		this.velocity = figures.velocity;
		this.rate = figures.rate;
		this.duct = figures.duct;
		this.fittings = figures.fittings;
		this.equipment = figures.equipment;
		this.total = figures.total;
		this.spare = figures.spare;
	}
}
