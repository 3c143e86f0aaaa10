import { locate } from './fault';
import { partProblems } from './parts';
import { plainCopy } from './plain';
import { schemaProblems } from './reading';
import { readTree } from './tree';
import type { DesignDocument, ValidateResult } from './types';

/**
 * Reads a design document: the document, copied, or all that is wrong with it at once.
 * Never throws, whatever the input. A document that validates holds finite numbers within `LIMITS` and rows that form
 * trees from the fan, with an outlet at the end of each branch.
 */
export function validateDocument(json: unknown): ValidateResult {
	const copy = plainCopy(json);
	const problems = [...copy.problems];
	if (copy.whole) {
		// Where the copy found no JSON it left null: told once.
		const told = new Set(copy.problems.map((problem) => problem.path));
		const ofSchema = schemaProblems(copy.value).filter((problem) => !told.has(problem.path));
		for (const problem of ofSchema) problems.push(problem);
		// A list of more rows than may be is not read further.
		if (!ofSchema.some((problem) => problem.code === 'too-many-rows')) {
			for (const problem of readTree(copy.value).problems) problems.push(problem);
			for (const problem of partProblems(copy.value)) problems.push(problem);
		}
	}
	if (problems.length > 0) return { ok: false, problems: locate(problems, copy.value) };
	return { ok: true, document: copy.value as DesignDocument };
}
