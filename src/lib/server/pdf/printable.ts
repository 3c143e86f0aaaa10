import type { ContentText } from 'pdfmake/interfaces';
import { face, NARROW, SANS, STRONG, type Family, type Weight } from './fonts';

export type TextStyle = Omit<ContentText, 'text'> & { readonly id?: string; readonly width?: number | '*' | 'auto' };
interface Run {
	readonly text: string;
	readonly font?: Family;
}

/** Characters that no face has, in the form in which they print. The no-break space is as narrow as a thin one here. */
const SUBSTITUTES: Readonly<Record<string, string>> = {
	'\u2007': '\u00a0',
	'\u2008': '\u00a0',
	'\u2009': '\u00a0',
	'\u200a': '\u00a0',
	'\u202f': '\u00a0',
	'′': "'",
	'″': '"',
	'⌀': 'Ø',
	'∅': 'Ø',
	'⁄': '/'
};
const UNKNOWN = '?';

/**
 * A text whose every character has a glyph in Sofia Sans: substituted where there is a plain form, a question mark
 * where there is none, nothing for marks that do not print. Never a box.
 */
export function printable(text: string): string {
	const normal = face(SANS, 'normal');
	const known = (one: string) => one === '\n' || normal.has(one.codePointAt(0) ?? 0);
	let printed = '';
	for (const character of text.replaceAll('\t', ' ').normalize('NFC')) {
		const plain = SUBSTITUTES[character] ?? character;
		if (/[\p{Cc}\p{Cf}]/u.test(character) && character !== '\n') continue;
		if ([...plain].every(known)) printed += plain;
		else if (/\p{M}/u.test(character)) continue;
		else {
			const compatible = [...character.normalize('NFKC')].map((one) => SUBSTITUTES[one] ?? one);
			printed += compatible.every(known) ? compatible.join('') : UNKNOWN;
		}
	}
	return printed;
}

/** A text in Sofia Sans. */
export function sans(text: string, style: TextStyle = {}): ContentText {
	return { ...style, text: printable(text) };
}

/** A text in the condensed face; characters that its Latin subset lacks are set in Sofia Sans, run by run. */
export function narrow(text: string, style: TextStyle = {}): ContentText {
	const runs = runsOf(printable(text));
	const [first] = runs;
	const plain = runs.length <= 1 && first?.font === undefined;
	return { ...style, font: NARROW, text: plain ? (first?.text ?? '') : [...runs] };
}

function runsOf(text: string): readonly Run[] {
	const condensed = face(NARROW, 'normal');
	const runs: Run[] = [];
	for (const character of text) {
		const own = character === '\n' || condensed.has(character.codePointAt(0) ?? 0);
		const last = runs.at(-1);
		if (last && (last.font === undefined) === own) runs[runs.length - 1] = { ...last, text: last.text + character };
		else runs.push(own ? { text: character } : { text: character, font: STRONG });
	}
	return runs;
}

/** A text cut to one line of a width [pt], with an ellipsis where something is left out. */
export function fitted(text: string, family: Family, weight: Weight, size: number, width: number): string {
	const one = printable(text).replaceAll('\n', ' ');
	const measured = face(family, weight);
	if (measured.widthOf(one, size) <= width) return one;
	const letters = [...one];
	while (letters.length > 0 && measured.widthOf(`${letters.join('')}…`, size) > width) letters.pop();
	return `${letters.join('').trimEnd()}…`;
}
