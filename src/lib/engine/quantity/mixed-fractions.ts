import { Decimal } from './decimal';
import type { UnitSystem } from './reading';

/** `17 1/2`, `17-1/2`, and a lone `1/2`; halves to sixty-fourths, as a tape has them. */
const FRACTION = /(?<![\d.,/])(?:(\d+)(?: ?- ?| ))?(\d+)\/(2|4|8|16|32|64)(?![\d.,/])/g;
const INCHES = /"|\d ?in(?:ch(?:es)?)?\b/;
const INCHES_FOLLOW = /^ ?(?:"|in(?:ch(?:es)?)?\b)/;

/**
 * A plain text of a size with its fractions of an inch as decimals, exactly: `17-1/2 x 9-3/8 in` is `17.5 x 9.375 in`.
 * A fraction without a whole part is one only before an inch sign, since `24/12` is a size of two figures.
 */
export function withoutFractions(plain: string, units: UnitSystem): string {
	if (plain.startsWith('=') || !plain.includes('/')) return plain;
	const inInches = units === 'IP' || INCHES.test(plain);
	return plain.replace(FRACTION, (all, whole: string | undefined, over: string, under: string, at: number) => {
		const part = new Decimal(over).div(under);
		const isMixed = whole !== undefined && inInches && part.lt(1);
		const isAlone = whole === undefined && INCHES_FOLLOW.test(plain.slice(at + all.length));
		// Six decimals hold a sixty-fourth, and are never taken for thousands as three could be.
		return isMixed || isAlone ? part.plus(whole ?? 0).toFixed(6) : all;
	});
}

/** Whether a mixed fraction stands in a text that does not say it is in inches. */
export function lacksInchSign(plain: string, units: UnitSystem): boolean {
	return units === 'SI' && !plain.startsWith('=') && !INCHES.test(plain) && /\d(?: ?- ?| )\d+\/\d/.test(plain);
}
