/** A junction without its figures, and the leg of it that may follow after a comma. */
const JUNCTION = /\b(?:tee|wye|take-?off|shoe|split|junction)\b/i;
const FIGURES = /(?<![a-z])c ?[=:]? ?-?\d|\d ?(?:k?pa|in|")/i;
const LEG = /^(?:branch|straight|through|main)\b/i;
/** Counts and short letters without separators, as in `2E 1T 1D`. */
const SHORT = /^(?:\d+ ?(?!k?pa|in|mm)[a-z]{1,3} ?){2,}$/i;

/**
 * The parts of a cell. A semicolon, a line and a comma part them, but not a comma between two digits; what follows a
 * bare junction after a comma and names its leg belongs to it (`tee, branch C0.8`).
 *
 * @param plain with plain signs, in the case it was typed
 */
export function splitParts(plain: string): string[] {
	const pieces = plain
		.split(/;|,(?!\d)|(?<!\d),/)
		.map((piece) => piece.trim())
		.filter((piece) => piece !== '');
	const parts: string[] = [];
	for (const piece of pieces) {
		const before = parts.at(-1);
		if (before !== undefined && LEG.test(piece) && JUNCTION.test(before) && !FIGURES.test(before)) {
			parts[parts.length - 1] = `${before} ${piece}`;
		} else if (SHORT.test(piece)) parts.push(...(piece.match(/\d+ ?[a-z]{1,3}/gi) ?? []));
		else parts.push(piece);
	}
	return parts;
}
