import type { SheetProblem } from './sheet-problem';

/**
 * The problems that the account of a row tells, in this order: that of the selected cell, those of the row's other
 * cells, and those of the settings, which concern every row.
 */
export function accountProblems(
	problems: readonly SheetProblem[],
	row: string | null,
	field: string | null
): readonly SheetProblem[] {
	const ofRow = row === null ? [] : problems.filter((one) => one.row === row);
	const ofCell = ofRow.filter((one) => one.field === field);
	const others = ofRow.filter((one) => one.field !== field);
	return [...ofCell, ...others, ...problems.filter((one) => one.row === null)];
}
