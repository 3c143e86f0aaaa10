import { formatFlow, formatPressure, formatRate, formatVelocity, type SolvedRow, type UnitSystem } from '$lib/engine';

/** Computed figures of a row, as the sheet prints them. */
export interface RowFigures {
	readonly side: string;
	readonly flow: string;
	readonly velocity: string;
	readonly rate: string;
	readonly duct: string;
	readonly fittings: string;
	readonly equipment: string;
	readonly total: string;
	readonly spare: string;
}

const NO_FIGURES: RowFigures = {
	...{ side: '', flow: '', velocity: '', rate: '', duct: '', fittings: '', equipment: '', total: '', spare: '' }
};

/** The texts of a solved row; blanks where it has no answer. */
export function rowFigures(solved: SolvedRow | undefined, units: UnitSystem): RowFigures {
	if (!solved) return NO_FIGURES;
	const ends = solved.equipmentLoss + solved.outletLoss;
	return {
		side: solved.side,
		flow: formatFlow(solved.flow, units),
		velocity: formatVelocity(solved.velocity, units),
		rate: formatRate(solved.frictionRate, units),
		duct: formatPressure(solved.frictionLoss + solved.flexibleLoss, units),
		fittings: formatPressure(solved.fittingLoss + solved.junctionLoss, units),
		equipment: ends === 0 ? '–' : formatPressure(ends, units),
		total: formatPressure(solved.loss, units),
		spare: formatPressure(solved.spare, units)
	};
}
