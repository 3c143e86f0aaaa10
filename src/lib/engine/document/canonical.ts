/** Deepest nesting that canonicalText writes. */
const DEEPEST = 200;

/**
 * The one text of a plain value: JSON, keys in order of their code units, no white space, numbers as JSON.stringify
 * prints them. Equal data give equal text, whatever the order of keys. Keys with the value undefined are left out.
 *
 * @throws {TypeError} when the value holds what JSON cannot: NaN, Infinity, a function, a ring
 */
export function canonicalText(value: unknown): string {
	return textOf(value, 0);
}

function textOf(value: unknown, depth: number): string {
	if (depth > DEEPEST) throw new TypeError(`canonicalText: nested deeper than ${DEEPEST} levels`);
	if (value === null || typeof value === 'boolean') return String(value);
	if (typeof value === 'string') return JSON.stringify(value);
	if (typeof value === 'number') {
		if (!Number.isFinite(value)) throw new TypeError(`canonicalText: ${value} is not finite`);
		return JSON.stringify(value);
	}
	if (Array.isArray(value)) return `[${value.map((inner) => textOf(inner, depth + 1)).join(',')}]`;
	if (typeof value !== 'object') throw new TypeError(`canonicalText: a ${typeof value} has no JSON`);
	const entries = Object.entries(value).filter(([, inner]) => inner !== undefined);
	entries.sort(([a], [b]) => (a < b ? -1 : 1));
	return `{${entries.map(([key, inner]) => `${JSON.stringify(key)}:${textOf(inner, depth + 1)}`).join(',')}}`;
}
