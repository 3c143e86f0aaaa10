import type { Problem, ProblemCode } from './types';

export type Step = string | number;

/** A problem at a place of the document; `row` and `id` are filled in by `locate` once the rows can be read. */
export function fault(code: ProblemCode, path: readonly Step[], message: string, expected: string): Problem {
	return { code, path: pathText(path), row: null, id: null, field: fieldOf(path), message, expected };
}

const PLAIN_KEY = /^[A-Za-z_$][\w$]*$/;

/** JSON path: `rows[3].size.width`; `$` is the whole document; a key with odd characters stands in quotes. */
export function pathText(path: readonly Step[]): string {
	let text = '';
	for (const step of path) {
		if (typeof step === 'number') text += `[${step}]`;
		else if (!PLAIN_KEY.test(step)) text += `[${JSON.stringify(step)}]`;
		else text += text === '' ? step : `.${step}`;
	}
	return text === '' ? '$' : text;
}

function fieldOf(path: readonly Step[]): string | null {
	const field = path[0] === 'rows' ? path[2] : undefined;
	return field === undefined ? null : String(field);
}

const ROW = /^rows\[(\d+)\]/;

/** The same problems with tag and id of the row they lie in, in the order of the rows. */
export function locate(problems: readonly Problem[], document: unknown): Problem[] {
	const rows = rowsOf(document);
	const place = (problem: Problem) => Number(ROW.exec(problem.path)?.[1] ?? -1);
	const placed = problems.map((problem) => {
		const at = place(problem);
		const row = at < 0 ? null : rows[at];
		return { at, problem: { ...problem, row: textAt(row, 'tag'), id: textAt(row, 'id') } };
	});
	return placed.sort((a, b) => a.at - b.at).map((one) => one.problem);
}

/** The rows as far as they can be read. */
export function rowsOf(document: unknown): readonly unknown[] {
	const rows = isRecord(document) ? document.rows : null;
	return Array.isArray(rows) ? rows : [];
}

export function isRecord(value: unknown): value is Readonly<Record<string, unknown>> {
	return typeof value === 'object' && value !== null && !Array.isArray(value);
}

export function textAt(value: unknown, key: string): string | null {
	const text = isRecord(value) ? value[key] : null;
	return typeof text === 'string' ? text : null;
}

/** A value as it may stand in a message: short, on one line. */
export function shown(value: unknown): string {
	if (Array.isArray(value)) return 'a list';
	if (isRecord(value)) return 'an object';
	const text = JSON.stringify(value) ?? 'nothing';
	return text.length > 40 ? `${text.slice(0, 39)}…` : text;
}
