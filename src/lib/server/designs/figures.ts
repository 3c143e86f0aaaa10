import type { Side } from '$lib/engine';
import { mainIndex } from '$lib/sheet/main-index';
import type { SolvedSheet } from '$lib/sheet/solve-sheet';

/** What the register shows of a design without opening it. */
export interface DesignFigures {
	readonly rows: number;
	readonly side: Side | null;
	/** [m3/s] */
	readonly flow: number | null;
	/** Fan total pressure [Pa]. */
	readonly totalPressure: number | null;
	/** Tag and served room of the index outlet. */
	readonly index: string | null;
	/** Cells to mend. */
	readonly problems: number;
	/** Rows that the figures leave out. */
	readonly uncounted: number;
	/** Checks that are cautions or faults. */
	readonly checks: number;
}

/** The figures of a solved sheet for the register. */
export function figuresOf({ document, solution, problems, uncounted }: SolvedSheet): DesignFigures {
	return {
		rows: (document?.rows.length ?? 0) + uncounted.length,
		side: mainSide(document?.rows.map(({ side }) => side) ?? []),
		flow: solution?.fan.flow ?? null,
		totalPressure: solution?.fan.totalPressure ?? null,
		index: mainIndex(solution),
		problems: problems.length,
		uncounted: uncounted.length,
		checks: solution?.flags.filter(({ severity }) => severity !== 'note').length ?? 0
	};
}

/** The side with the most rows: what the system is for. */
function mainSide(sides: readonly Side[]): Side | null {
	const counts = new Map<Side, number>();
	for (const side of sides) counts.set(side, (counts.get(side) ?? 0) + 1);
	return [...counts].sort((a, b) => b[1] - a[1])[0]?.[0] ?? null;
}
