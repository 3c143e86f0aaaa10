import { Decimal } from './decimal';
import type { UnitSystem } from './reading';

/** A figure found in a text, with how its commas and points were taken. */
export interface Figure {
	readonly value: Decimal;
	/** As typed. */
	readonly text: string;
	/** Where it ends in the text. */
	readonly end: number;
	/** Whole, and typed without decimals. */
	readonly bareInteger: boolean;
	/** Set where the same characters are two figures in two countries. */
	readonly doubt: { readonly why: string; readonly other: string } | null;
}

/** `1e3` is a whole figure like 1000; one of more digits than anybody types is none. */
const LIKE_TYPED = 1e6;

const FIGURE = /(?:[1-9]\d{0,2}(?: \d{3})+(?![\d])(?:[.,]\d+)?|[.,]?\d[\d.,]*)(?:e[+-]?\d{1,3}(?![\d.,]))?/y;

/**
 * The figure that starts at a place of a text. Blanks, points and commas may group thousands; the last
 * sign of two kinds is the decimal one. A lone comma before three digits groups thousands; in SI that is in doubt.
 * Null when there is none, or when the grouping makes no figure (`1,20,0`, `5..6`).
 */
export function figureAt(text: string, start: number, units: UnitSystem): Figure | null {
	FIGURE.lastIndex = start;
	const typed = FIGURE.exec(text)?.[0];
	if (typed === undefined) return null;
	const [mantissa = '', exponent] = typed.split('e');
	const digits = decimalDigits(mantissa.replaceAll(' ', ''));
	if (digits === null) return null;
	const power = exponent === undefined ? '' : `e${exponent}`;
	const value = new Decimal(digits + power);
	if (!value.isFinite()) return null;
	return {
		value,
		text: typed,
		end: start + typed.length,
		bareInteger: !digits.includes('.') && value.isInteger() && (power === '' || value.lt(LIKE_TYPED)),
		doubt: units === 'SI' && power === '' ? doubtOf(mantissa) : null
	};
}

/** The digits with a plain decimal point; null when the signs do not make a figure. */
function decimalDigits(typed: string): string | null {
	const commas = typed.split(',').length - 1;
	const points = typed.split('.').length - 1;
	if (commas === 0 && points <= 1) return plainDigits(typed);
	if (commas > 0 && points > 0) {
		const decimal = typed.lastIndexOf(',') > typed.lastIndexOf('.') ? ',' : '.';
		const [whole = '', part = '', ...more] = typed.split(decimal);
		const joined = grouped(whole, decimal === ',' ? '.' : ',');
		return more.length > 0 || joined === null || !/^\d*$/.test(part) ? null : plainDigits(`${joined}.${part}`);
	}
	const sign = commas > 0 ? ',' : '.';
	if (commas + points > 1 || /^[1-9]\d{0,2},\d{3}$/.test(typed)) return grouped(typed, sign);
	return plainDigits(typed.replace(',', '.'));
}

function grouped(typed: string, sign: string): string | null {
	const groups = typed.split(sign);
	const sound = groups.every((group, i) => (i === 0 ? /^\d{1,3}$/ : /^\d{3}$/).test(group));
	return sound ? groups.join('') : null;
}

function plainDigits(typed: string): string | null {
	return /^(?:\d+\.?\d*|\.\d+)$/.test(typed) ? typed : null;
}

function doubtOf(typed: string): Figure['doubt'] {
	if (!/^[1-9]\d{0,2}[.,]\d{3}$/.test(typed)) return null;
	return typed.includes(',')
		? { why: `the comma in “${typed}” is read as thousands`, other: typed.replace(',', '.') }
		: { why: `the point in “${typed}” is read as the decimal point`, other: typed.replace('.', '') };
}
