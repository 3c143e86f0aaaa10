import { solveDesign, type DesignDocument, type Solution } from '$lib/engine';
import { documentOf, type SheetProblem } from './design-document';
import type { Sheet } from './sheet';

/** What a sheet comes to. */
export interface SolvedSheet {
	readonly document: DesignDocument | null;
	/** Null while nothing can be computed. */
	readonly solution: Solution | null;
	readonly problems: readonly SheetProblem[];
	readonly uncounted: readonly string[];
}

/** Document, solution and problems of a sheet. The figures leave out the rows in `uncounted`. */
export function solveSheet(sheet: Sheet): SolvedSheet {
	const { document, problems, uncounted } = documentOf(sheet);
	const left = [...uncounted];
	if (!document) return { document, solution: null, problems, uncounted: left };
	const result = solveDesign(document);
	if (result.ok) return { document, solution: result.solution, problems, uncounted: left };
	const found = result.problems.map(({ id, field, message, expected }) => ({
		row: id,
		field:
			(id === null ? SETTING_OF : FIELD_OF)[field ?? ''] ?? (id === null ? ('temperature' as const) : ('tag' as const)),
		message,
		expected
	}));
	return { document, solution: null, problems: [...problems, ...found], uncounted: left };
}

/** The cell where a key of the document was typed. */
const FIELD_OF: Readonly<Record<string, SheetProblem['field']>> = {
	tag: 'tag',
	joins: 'joins',
	side: 'side',
	size: 'size',
	length: 'length',
	rise: 'rise',
	material: 'material',
	flexible: 'flex',
	junction: 'parts',
	fittings: 'parts',
	equipment: 'parts',
	outlet: 'outlet'
};
const SETTING_OF: Readonly<Record<string, SheetProblem['field']>> = {
	air: 'temperature',
	surroundings: 'surroundings'
};

/** Whether the figures stand for the whole sheet. */
export const isComplete = (solved: SolvedSheet): boolean =>
	solved.solution !== null && solved.problems.length === 0 && solved.uncounted.length === 0;
