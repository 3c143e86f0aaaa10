import type { Column } from './columns';

/** A place in the grid. The row after the last one is the blank line. */
export interface Place {
	readonly row: number;
	readonly column: number;
}

interface Bounds {
	readonly rows: () => number;
	readonly columns: () => readonly Column[];
}

const clamp = (value: number, most: number) => Math.max(0, Math.min(value, most));

/** The active cell and the range that reaches from it to its anchor. */
export class Selection {
	#bounds: Bounds;
	#active = $state.raw<Place>({ row: 0, column: 0 });
	#anchor = $state.raw<Place>({ row: 0, column: 0 });

	constructor(bounds: Bounds) {
		this.#bounds = bounds;
	}

	readonly active: Place = $derived.by(() => this.#clamped(this.#active));

	/** Top, left, bottom and right of the range, inclusive. */
	readonly range = $derived.by(() => {
		const [a, b] = [this.active, this.#clamped(this.#anchor)];
		return {
			top: Math.min(a.row, b.row),
			bottom: Math.max(a.row, b.row),
			left: Math.min(a.column, b.column),
			right: Math.max(a.column, b.column)
		};
	});

	get isRange(): boolean {
		const { top, bottom, left, right } = this.range;
		return top !== bottom || left !== right;
	}

	has(row: number, column: number): boolean {
		const { left, right } = this.range;
		return this.hasRow(row) && column >= left && column <= right;
	}

	hasRow(row: number): boolean {
		const { top, bottom } = this.range;
		return row >= top && row <= bottom;
	}

	/** The column where a run of Tab began, to which Enter goes back. */
	#runBegan: number | null = null;

	/** Goes to a place; with `extend` the anchor stays. */
	go(place: Place, extend = false): void {
		this.#runBegan = null;
		this.#active = this.#clamped(place);
		if (!extend) this.#anchor = this.#active;
	}

	move(down: number, right: number, extend = false): void {
		const { row, column } = this.active;
		this.go({ row: row + down, column: column + right }, extend);
	}

	/** Down or up as Enter does: after a run of Tab, in the column where it began. */
	line(by: 1 | -1): void {
		const { row, column } = this.active;
		this.go({ row: row + by, column: this.#runBegan ?? column });
	}

	/** To the next cell as Tab does: at the end of a row, on to the next one. */
	step(by: 1 | -1): void {
		const { row, column } = this.active;
		const began = this.#runBegan ?? column;
		this.#step(by);
		this.#runBegan = this.active.row === row ? began : null;
	}

	#step(by: 1 | -1): void {
		const { row, column } = this.active;
		const last = this.#bounds.columns().length - 1;
		if (by > 0 && column === last) this.go({ row: row + 1, column: 0 });
		else if (by < 0 && column === 0) {
			if (row > 0) this.go({ row: row - 1, column: last });
		} else this.go({ row, column: column + by });
	}

	#clamped({ row, column }: Place): Place {
		return { row: clamp(row, this.#bounds.rows()), column: clamp(column, this.#bounds.columns().length - 1) };
	}
}
