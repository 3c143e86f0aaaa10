import type { Size } from '../shape';
import { Decimal } from './decimal';
import { shortDigits } from './digits';
import { withLabel } from './measure';
import { lacksInchSign, withoutFractions } from './mixed-fractions';
import { plainText, quoted, refusal } from './plain-text';
import type { Reading, UnitSystem } from './reading';
import { withoutNotes } from './size-notes';
import { readSum, type Sum } from './sum';
import { fromSI, toSI, UNITS, type Unit } from './units';

/** Believed sides of a duct [m]; common practice: beyond them the unit slipped. */
export const SIDE = { min: 0.01, max: 20 } as const;

const GRAMMAR = { units: [UNITS.millimetre, UNITS.centimetre, UNITS.metre, UNITS.inch, UNITS.foot], feetInches: true };
const BARE = { SI: UNITS.millimetre, IP: UNITS.inch } as const;

const OVAL = /(?<![a-z])(?:flat ?oval|oval|ov|fo)(?![a-z])/;
const ROUND_BEFORE = /^(?:ø|dn|dia(?:m(?:eter)?)?\.?|round|rd|d) ?[=:]? ?(?=[\d.,])/;
const ROUND_AFTER = / ?(?:ø|dia(?:m(?:eter)?)?\.?|round|rd|r|d)$/;
const BETWEEN = / ?(?:x|\*|\/|by) ?/;

type Found = { readonly ok: true; readonly side: Sum } | { readonly ok: false; readonly message: string };
interface Sides {
	readonly shape: Size['shape'];
	readonly sums: readonly Sum[];
	readonly why: string | null;
	readonly unit: Unit;
	readonly bare: boolean;
}

/**
 * Size of a duct from trade shorthand: one figure is round, two are width and height in the order typed.
 * Figures without a unit are mm in SI and inches in IP; a unit at one side holds for both. Never throws.
 */
export function readSize(text: string, units: UnitSystem): Reading<Size> {
	const expected =
		units === 'SI'
			? 'a size, such as 600x350, ø200, oval 510x255 or 12"'
			: 'a size, such as 24x12, 12"ø, 20x10 FO or 315 mm';
	const refuse = (why: string): Reading<Size> => ({ ok: false, message: refusal(text, why), expected });
	const plain = plainText(text);
	if (plain === '') return { ok: false, message: 'Nothing is typed.', expected };
	if (plain.length > 100) return refuse('too long for a size');
	const { size: bareText, notes } = withoutNotes(withoutFractions(plain, units));
	const sides = sidesOf(bareText, units);
	if (typeof sides === 'string')
		return refuse(lacksInchSign(plain, units) ? 'a fraction of an inch needs its sign, such as 17 1/2"' : sides);
	const metres: number[] = [];
	for (const sum of sides.sums) {
		const si = toSI(sum.value, sum.unit ?? sides.unit);
		const fault = faultOf(si, sum, sides, units);
		if (fault !== null) return refuse(fault);
		metres.push(si.toNumber());
	}
	const [width = 0, height = 0] = metres;
	const other = otherOf(withoutNotes(plain).size, sides, metres, units);
	return {
		ok: true,
		value: sides.shape === 'round' ? { shape: 'round', diameter: width } : { shape: sides.shape, width, height },
		words: [...wordsOf(sides, metres, units), ...notes].join(', '),
		why: whyOf(text, bareText, sides, metres, units, notes),
		other
	};
}

function sidesOf(text: string, units: UnitSystem): Sides | string {
	if (text.startsWith('=')) return roundOf(sideOf(text, units), null, BARE[units]);
	const oval = OVAL.test(text);
	const plain = inOrder(text.replace(OVAL, '').trim());
	const square = / ?(?:sq|square)\b\.?$/;
	if (!oval && square.test(plain)) return squareOf(plain.replace(square, ''), units);
	const pair = oval ? plain : plain.replace(/^rect(?:angular)?\.? ?/, '');
	const whole = sideOf(pair, units);
	const parts = pair.split(BETWEEN);
	if (parts.length === 2 && !whole.ok && parts.every((part) => /\d/.test(part))) {
		return pairOf(oval ? 'oval' : 'rectangular', pair, parts, units);
	}
	if (parts.length > 2 && parts.every((part) => /\d/.test(part))) return 'a size has one figure or two';
	if (parts.includes('')) return 'a figure of the size is missing';
	if (oval) return 'an oval has two figures, width and height';
	const marked = roundText(plain);
	const unit = /^dn/.test(plain) ? UNITS.millimetre : BARE[units];
	return roundOf(sideOf(marked, units), marked === plain ? 'one figure' : null, unit);
}

function squareOf(side: string, units: UnitSystem): Sides | string {
	return pairOf('rectangular', side, [side, side], units);
}

/** Sides that are named stand in the order width, height: `12"H x 24"W` is `24" x 12"`. */
function inOrder(text: string): string {
	const named =
		/^([^a-z]*\d[^a-z]*(?:mm|cm|m|in)?) ?([wh]) ?(?:x|\*|\/|by) ?([^a-z]*\d[^a-z]*(?:mm|cm|m|in)?) ?([wh])$/.exec(text);
	const [, first, side, second, last] = named ?? [];
	if (side === undefined || side === last) return text;
	return side === 'w' ? `${first} x ${second}` : `${second} x ${first}`;
}

/** A round size without its mark. */
function roundText(plain: string): string {
	const before = plain.replace(ROUND_BEFORE, '');
	return before !== plain ? before.replace(/ ?ø$/, '') : plain.replace(ROUND_AFTER, '');
}

function roundOf(found: Found, why: string | null, unit: Unit): Sides | string {
	if (!found.ok) return found.message;
	return { shape: 'round', sums: [found.side], why, unit: found.side.unit ?? unit, bare: found.side.unit === null };
}

function pairOf(
	shape: 'rectangular' | 'oval',
	pair: string,
	parts: readonly string[],
	units: UnitSystem
): Sides | string {
	const sums: Sum[] = [];
	for (const part of parts) {
		const found = sideOf(part, units);
		if (!found.ok) return found.message;
		sums.push(found.side);
	}
	const typed = sums.find((sum) => sum.unit !== null)?.unit ?? null;
	const why = pair.includes('/') ? 'slash' : null;
	return { shape, sums, why, unit: typed ?? BARE[units], bare: typed === null };
}

function sideOf(text: string, units: UnitSystem): Found {
	const result = readSum(text, GRAMMAR, units);
	return result.ok ? { ok: true, side: result.sum } : { ok: false, message: result.message };
}

function faultOf(si: Decimal, sum: Sum, sides: Sides, units: UnitSystem): string | null {
	const typed = sum.value.e > 12 ? 'this' : withLabel(sum.value, sum.unit ?? sides.unit, 6, units);
	if (si.isZero()) return 'a duct cannot have a size of zero';
	if (si.isNegative()) return 'a size cannot be negative';
	if (si.lt(SIDE.min)) return `${typed} is too small for a duct (least 10 mm)`;
	return si.gt(SIDE.max) ? `${typed} is too great for a duct (most 20 m)` : null;
}

function wordsOf(sides: Sides, metres: readonly number[], units: UnitSystem): string[] {
	const inside = sides.sums.map((sum, i) => sideWords(sum, sum.unit ?? sides.unit, metres[i] ?? 0, units));
	if (sides.shape === 'round') {
		return [`Ø${mark(metres[0] ?? 0, units)} round`, `${inside[0]} inside`];
	}
	const name = sides.shape === 'oval' ? 'flat oval' : 'rectangular';
	return [name, `${inside[0]} wide × ${inside[1]} high`];
}

function mark(metres: number, units: UnitSystem): string {
	return shortDigits(fromSI(metres, BARE[units]).toDecimalPlaces(units === 'SI' ? 0 : 1), 12, units);
}

function sideWords(sum: Sum, unit: Unit, metres: number, units: UnitSystem): string {
	const typed = withLabel(sum.value, unit, 12, units);
	return unit === BARE[units] ? typed : `${typed} (${withLabel(fromSI(metres, BARE[units]), BARE[units], 5, units)})`;
}

/** Figures that are hardly a duct in the project's own unit. */
function looksForeign(metres: readonly number[], units: UnitSystem): boolean {
	return units === 'SI' ? metres.every((m) => m < 0.05) : metres.some((m) => m > 3.81);
}

function whyOf(
	text: string,
	bareText: string,
	sides: Sides,
	metres: readonly number[],
	units: UnitSystem,
	notes: readonly string[]
): string | null {
	const reasons: string[] = [];
	if (sides.why === 'one figure') reasons.push(`read from ${quoted(text)} as round because it is one figure`);
	if (sides.why === 'slash') reasons.push('the slash is read as “by”');
	if (sides.bare && bareText.startsWith('dn')) reasons.push('DN is always in millimetres');
	else if (sides.bare && (sides.why === 'one figure' || looksForeign(metres, units))) {
		reasons.push(`in ${units === 'SI' ? 'millimetres' : 'inches'} because the design is in ${units}`);
	}
	const doubt = sides.sums.find((sum) => sum.doubt)?.doubt;
	if (doubt) reasons.push(doubt.why);
	if (notes.some((note) => note.startsWith('lined'))) reasons.push('read as the clear inside size, within the lining');
	if (notes.includes('flexible')) reasons.push('the length of flexible duct has its own column');
	return reasons.length > 0 ? reasons.join('; ') : null;
}

function otherOf(bareText: string, sides: Sides, metres: readonly number[], units: UnitSystem): string | null {
	const plain = sides.sums.map((sum) => sum.value.toSignificantDigits(6).toFixed());
	if (sides.bare && !bareText.startsWith('dn') && looksForeign(metres, units)) {
		const label = units === 'SI' ? '"' : ' mm';
		const shown = plain.map((figure) => `${figure}${label}`).join(' x ');
		return sides.shape === 'oval' ? `oval ${shown}` : sides.shape === 'round' ? `ø${shown}` : shown;
	}
	return sides.why === 'one figure' && !bareText.startsWith('=') ? `${bareText} x ${bareText}` : null;
}
