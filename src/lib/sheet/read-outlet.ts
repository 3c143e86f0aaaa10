import { plainSigns, quoted, readPressure, refusal, type Reader, type Reading } from '$lib/engine';
import { findWord } from './parts/lexicon';
import type { OutletLoss } from './sheet';

const OPEN = /^(open|open end|o)$/i;
const BASIS = /\b(total|static|tp|sp)\b/gi;
/** Words that begin with a letter, before a figure or at the end. */
const WORDS = /^([a-z][^\d"]*?(?: [a-z]{1,4}-?\d{1,4}(?= |$))?)(?= -?[\d.,]| c ?[=:]? ?-?[\d.,]|$)/i;
const COEFFICIENT = /^c ?[=:]? ?(-?(?:\d+(?:[.,]\d+)?|[.,]\d+))$/i;
const MOST_COEFFICIENT = 1_000_000;
const LONGEST = 60; // characters of the words
const ALSO = '“open”, or a word before it, such as grille 25 Pa or louvre C 1.2';

/**
 * The loss of an outlet at its design flow: `16`, `16 Pa total`, `12 static`, `0.06"`, `open`, `grille 25 Pa`,
 * `louvre C 1.2`; a `?` at the end marks it as to be confirmed. A figure with no basis is a total pressure, as the head
 * of the column says; C is on the velocity pressure of the duct. What the words before it name stays with the outlet.
 */
export const readOutlet: Reader<OutletLoss> = (text, units) => {
	const plain = plainSigns(text);
	const toBeConfirmed = plain.endsWith('?');
	const rest = plain.replace(/\?\s*$/, '').trim();
	const mark = toBeConfirmed ? ', to be confirmed' : '';
	if (OPEN.test(rest)) {
		const value: OutletLoss = { loss: null, lossIs: 'total', toBeConfirmed };
		return { ok: true, value, words: `open end, one velocity pressure${mark}`, why: null, other: null };
	}
	const named = [...rest.matchAll(BASIS)].map(([word]) => word.toLowerCase()[0]);
	const isStatic = named.includes('s');
	const bare = rest.replace(BASIS, '').replace(/ +/g, ' ').trim();
	const typed = terminalIn(bare);
	const figure = bare.slice(typed.length).trim();
	const name = typed.charAt(0).toUpperCase() + typed.slice(1);
	if (name && !figure)
		return {
			ok: false,
			message: `${quoted(text)} lacks its loss: a pressure at the design flow, or a coefficient C.`,
			expected: `${typed} 25 Pa, or ${typed} C 1.2`
		};
	const described = { toBeConfirmed, ...(name && { description: name }) };
	const before = name && `${name}, `;
	const coefficient = COEFFICIENT.exec(figure)?.[1]?.replace(',', '.');
	if (coefficient !== undefined) return ofCoefficient(Number(coefficient), coefficient);
	const pressure = readPressure(figure, units);
	if (!pressure.ok) return { ...pressure, expected: `${pressure.expected}, ${ALSO}` };
	return {
		...pressure,
		value: { loss: pressure.value, lossIs: isStatic ? 'static' : 'total', ...described },
		words: `${before}${pressure.words}, ${isStatic ? 'static pressure and the velocity pressure of the duct' : 'total pressure'}${mark}`,
		other:
			pressure.other && `${name && `${typed} `}${pressure.other}${isStatic ? ' static' : ''}${toBeConfirmed ? '?' : ''}`
	};

	function ofCoefficient(value: number, shown: string): Reading<OutletLoss> {
		const refuse = (message: string): Reading<OutletLoss> => ({
			ok: false,
			message: refusal(text, message),
			expected: 'a coefficient from 0 up, such as louvre C 1.2'
		});
		if (isStatic) return refuse('a coefficient counts total pressure, not static');
		if (value < 0) return refuse('the coefficient of an outlet cannot be negative');
		if (value > MOST_COEFFICIENT) return refuse('the coefficient is too great');
		return {
			ok: true,
			value: { loss: null, lossIs: 'total', coefficient: value, ...described },
			words: `${before}C ${shown} on the velocity pressure of the duct${mark}`,
			why: null,
			other: null
		};
	}
};

/** The words at the beginning that name a terminal; '' where none of them is a known one. */
function terminalIn(bare: string): string {
	const words = (WORDS.exec(bare)?.[1] ?? '').trim();
	const isTerminal = words
		.toLowerCase()
		.split(/ +/)
		.some((word) => ['device', 'exit', 'entry'].includes(findWord(word)?.role ?? ''));
	return isTerminal && words.length <= LONGEST ? words : '';
}
