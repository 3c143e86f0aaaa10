import { sentence, solveDesign, type DesignDocument, type Problem, type Solution } from '$lib/engine';
import { documentOf } from './design-document';
import type { Sheet } from './sheet';
import type { SheetProblem } from './sheet-problem';

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
	const found = result.problems.map((problem) => {
		const { message, expected } = problem;
		return { ...placeOf(problem, document), message: sentence(message), expected };
	});
	return { document, solution: null, problems: [...problems, ...found], uncounted: left };
}

/** What the engine found too late for the cells to say it; what concerns all rows stands at the first one's link. */
function placeOf({ id, path, field }: Problem, { rows }: DesignDocument): Pick<SheetProblem, 'row' | 'field'> {
	if (id !== null) return { row: id, field: FIELD_OF[field ?? ''] ?? 'tag' };
	if (path.startsWith('rows')) return { row: rows[0]?.id ?? null, field: 'joins' };
	const setting = SETTINGS.find((one) => path.startsWith(one)) ?? 'temperature';
	return { row: null, field: setting };
}

const SETTINGS = ['surroundings', 'leakage', 'standardDensity'] as const;

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
	outlet: 'outlet',
	lining: 'lining',
	leakage: 'leakage',
	temperature: 'temperature'
};

/** Whether the figures stand for the whole sheet. */
export const isComplete = (solved: SolvedSheet): boolean =>
	solved.solution !== null && solved.problems.length === 0 && solved.uncounted.length === 0;
