import { NUMBER, SIGNED_NUMBER } from './number-pattern';

/** Figures and choices that only some parts have, each read where a word of such a part is there. */
interface Worded {
	readonly name: string;
	readonly of: RegExp;
	readonly pattern: RegExp;
	readonly value: (typed: string) => number | string;
}

const figure = (typed: string) => Number(typed.replace(',', '.'));
const percent = (typed: string) => Number((figure(typed) / 100).toPrecision(12));
const word = (typed: string) => typed;
const PERCENT = '(?<![\\d.,-])(\\d{1,3}(?:[.,]\\d+)?) ?%';

const WORDED: readonly Worded[] = [
	{ name: 'vanes', of: /vane/, pattern: /(?<![\d.,])(\d{2,3}\/\d{2,3})(?: ?mm)?/, value: word },
	{ name: 'bend', of: /elbow|bend|\bell/, pattern: /\b(easy|hard)(?: way)?\b/, value: word },
	{ name: 'spacing', of: /offset/, pattern: new RegExp(`\\bspacing ?=? ?${SIGNED_NUMBER}`), value: figure },
	{ name: 'second', of: /offset/, pattern: /\b(back|onward|across)\b/, value: word },
	{
		name: 'distanceRatio',
		of: /\bcap/,
		pattern: new RegExp(`\\b(?:distance|h ?/ ?d) ?=? ?${SIGNED_NUMBER}`),
		value: figure
	},
	{
		...{ name: 'curtain', of: /\bfd\b|fire/, value: word },
		pattern: /\bcurtain (in|out)\b(?: of)?(?: the)?(?: (?:air ?)?stream)?/
	},
	{ name: 'opening', of: /gate|slide/, pattern: new RegExp(`${PERCENT}(?: open)?`), value: percent },
	{ name: 'opening', of: /gate|slide/, pattern: /\bopen(?:ing)? ?=? ?(\d*[.,]\d+)/, value: figure },
	{ name: 'form', of: /obstruction/, pattern: /\b(flat bar|bar|cylinder|pipe)\b/, value: formOf },
	{ name: 'blockage', of: /obstruction/, pattern: new RegExp(`${PERCENT}(?: block(?:ed|age))?`), value: percent },
	{ name: 'blockage', of: /obstruction/, pattern: /\bblockage ?=? ?(\d*[.,]\d+)/, value: figure },
	{
		...{ name: 'freeArea', of: /screen|mesh|plate/, value: percent },
		pattern: new RegExp(`${PERCENT}(?: (?:free|open))?(?: area)?`)
	},
	{
		name: 'straight',
		of: /effect/,
		pattern: new RegExp(`\\bstraight ?=? ?(${NUMBER} ?(?:m|ft|'))(?![a-z])`),
		value: metres
	},
	{ name: 'edges', of: /bullhead/, pattern: /\b(sharp|rounded)\b(?: edges?)?/, value: word }
];

function formOf(typed: string): string {
	return typed.endsWith('bar') ? 'flat bar' : 'cylinder';
}

function metres(typed: string): number {
	const value = figure(typed.replace(/[^\d.,]/g, ''));
	return typed.endsWith('m') ? value : Number((value * 0.3048).toPrecision(12));
}

/**
 * Takes such figures out of a text.
 *
 * @param take removes what a pattern finds from the text, and gives its first group
 */
export function wordedFigures(
	typed: string,
	take: (pattern: RegExp) => string | null
): Record<string, number | string> {
	const found: Record<string, number | string> = {};
	for (const { name, of, pattern, value } of WORDED) {
		if (name in found || !of.test(typed)) continue;
		const text = take(pattern);
		if (text !== null) found[name] = value(text);
	}
	return found;
}
