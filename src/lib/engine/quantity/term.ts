import { Decimal } from './decimal';
import { figureAt, type Figure } from './figure';
import type { UnitSystem } from './reading';
import { UNITS, type Unit } from './units';

/** How the terms of one quantity may be written. */
export interface TermGrammar {
	readonly units: readonly Unit[];
	/** `1.2k` is 1200. */
	readonly thousands?: boolean;
	/** `12'-6"` and `6 1/2"`. */
	readonly feetInches?: boolean;
}

/** A figure with its unit, as found in a text. */
export interface Term {
	/** In `unit`, or bare. */
	readonly value: Decimal;
	readonly unit: Unit | null;
	/** Feet and inches together; the value is in inches. */
	readonly compound: boolean;
	readonly end: number;
	readonly bareInteger: boolean;
	readonly doubt: Figure['doubt'];
}

const FEET_INCHES =
	/(\d+) ?(?:'|ft\.?|feet|foot) ?-? ?(\d+(?:[.,]\d+)?)?(?:(?:[ -]|(?<!\d))(\d+)\/(\d+))? ?("|in(?:ch(?:es)?)?\.?)?(?! ?['\d.,/a-z"])/y;
const FRACTION = /(?:(\d+)[ -])?(\d+)\/(2|4|8|16|32|64)(?!\d)/y;

/** The term that starts at a place of a plain text, or null. */
export function termAt(text: string, start: number, grammar: TermGrammar, units: UnitSystem): Term | null {
	const special = grammar.feetInches ? (feetInchesAt(text, start) ?? fractionAt(text, start, grammar)) : null;
	if (special) return special;
	const figure = figureAt(text, start, units);
	if (!figure) return null;
	const own = unitAt(text, figure.end, grammar.units);
	if (own) return { ...figure, unit: own.unit, end: own.end, compound: false };
	const kilo = grammar.thousands ? /^ ?k/.exec(text.slice(figure.end)) : null;
	if (!kilo) return { ...figure, unit: null, compound: false };
	const end = figure.end + kilo[0].length;
	const after = unitAt(text, end, grammar.units);
	return {
		value: figure.value.times(1000),
		unit: after?.unit ?? null,
		end: after?.end ?? end,
		compound: false,
		bareInteger: false,
		doubt: figure.doubt
	};
}

function feetInchesAt(text: string, start: number): Term | null {
	FEET_INCHES.lastIndex = start;
	const found = FEET_INCHES.exec(text);
	if (!found) return null;
	const [all, feet = '', inches, over, under] = found;
	if (inches === undefined && over === undefined) return null; // a plain figure in feet
	const part = new Decimal(inches?.replace(',', '.') ?? 0).plus(fraction(over, under));
	if (!part.lt(12)) return null;
	const end = start + all.trimEnd().length;
	return {
		value: new Decimal(feet).times(12).plus(part),
		unit: UNITS.inch,
		compound: true,
		end,
		bareInteger: false,
		doubt: null
	};
}

function fractionAt(text: string, start: number, grammar: TermGrammar): Term | null {
	FRACTION.lastIndex = start;
	const found = FRACTION.exec(text);
	if (!found) return null;
	const [all, whole, over, under] = found;
	const part = fraction(over, under);
	if (!part.lt(1)) return null;
	const own = unitAt(text, start + all.length, grammar.units);
	// Without a unit `4/8` may be a size or a division.
	if (!own) return null;
	return {
		value: part.plus(whole ?? 0),
		unit: own.unit,
		compound: false,
		end: own.end,
		bareInteger: false,
		doubt: null
	};
}

function fraction(over: string | undefined, under: string | undefined): Decimal {
	if (over === undefined || under === undefined || /^0+$/.test(under)) return new Decimal(0);
	return new Decimal(over).div(under);
}

/** The unit with the longest name at this place; blanks and points in it do not count. */
export function unitAt(text: string, start: number, units: readonly Unit[]): { unit: Unit; end: number } | null {
	let best: { unit: Unit; end: number } | null = null;
	for (const unit of units) {
		for (const name of unit.names) {
			const end = nameEnd(text, start, name);
			if (end !== null && (best === null || end > best.end)) best = { unit, end };
		}
	}
	return best;
}

function nameEnd(text: string, start: number, name: string): number | null {
	let at = start;
	for (const sign of name) {
		while (text[at] === ' ' || text[at] === '.') at += 1;
		if (text[at] !== sign) return null;
		at += 1;
	}
	while (text[at] === '.') at += 1;
	return /[a-z0-9µ]/.test(name.at(-1) ?? '') && /[a-z0-9µ]/.test(text[at] ?? '') ? null : at;
}
