import { Decimal } from './decimal';
import { shortDigits } from './digits';
import { plainText, refusal } from './plain-text';
import type { Reading, UnitSystem } from './reading';
import { readSum, type Sum } from './sum';
import type { TermGrammar } from './term';
import { fromSI, toSI, UNITS, type Unit } from './units';

/** How a figure without a unit is taken, where the size of the figure has a say. */
export interface BareRule {
	readonly unit: Unit;
	readonly why: string;
	/** Unit of the other plausible reading. */
	readonly other: Unit | null;
}

/** One kind of cell: what may be typed into it and what is believable there. */
export interface Measure extends TermGrammar {
	/** 'a flow'. */
	readonly noun: string;
	/** Unit of a figure without one. */
	readonly bare: Readonly<Record<UnitSystem, Unit>>;
	/** A second unit in the words, where the typed one is the usual one. */
	readonly aside?: Readonly<Record<UnitSystem, Unit | null>>;
	/** Least and greatest believed value, SI; common practice: beyond them the unit or the hand slipped. */
	readonly min: number;
	readonly max: number;
	readonly example: Readonly<Record<UnitSystem, string>>;
	readonly bareRule?: (sum: Sum, units: UnitSystem) => BareRule | null;
	/** A sign that says nothing of the unit: the degree of a temperature. */
	readonly idle?: RegExp;
	/** Said of a unit whatever the figure. */
	readonly caution?: (unit: Unit) => string | null;
}

const LONGEST = 200; // characters; no figure needs more
const LEAST = 1e-12; // of any SI value but zero

/** Reads one figure of this kind; the value is SI. Never throws. */
export function readMeasure(measure: Measure, text: string, units: UnitSystem): Reading<number> {
	const expected = `${measure.noun}, such as ${measure.example[units]}`;
	const refuse = (why: string): Reading<number> => ({ ok: false, message: refusal(text, why), expected });
	const plain = plainText(text);
	if (plain === '') return { ok: false, message: 'Nothing is typed.', expected };
	if (plain.length > LONGEST) return refuse('too long for a figure');
	const bare = plain.replace(/ ?\bper\b ?/, '/').replace(measure.idle ?? /$^/, '');
	const result = readSum(bare, measure, units);
	if (!result.ok) return refuse(foreignUnit(plain, measure, units) ?? result.message);

	const { sum } = result;
	const rule = sum.unit === null ? (measure.bareRule?.(sum, units) ?? null) : null;
	const unit = sum.unit ?? rule?.unit ?? measure.bare[units];
	const si = toSI(sum.value, unit);
	const fault = faultOf(measure, si, unit, units);
	if (fault !== null) return refuse(fault);
	const other = otherOf(measure, text, sum, rule, si, units);
	return {
		ok: true,
		value: plainZero(si.toNumber()),
		words: wordsOf(measure, sum, unit, si, units),
		why: whyOf(measure, sum, rule, other, unit),
		other
	};
}

const plainZero = (value: number) => (value === 0 ? 0 : value);

function faultOf(measure: Measure, si: Decimal, unit: Unit, units: UnitSystem): string | null {
	if (!si.isFinite()) return 'not a finite figure';
	if (!si.isZero() && si.abs().lt(LEAST)) return `too small for ${measure.noun}`;
	if (si.lt(measure.min)) {
		if (si.isNegative() && measure.min >= 0) return `${measure.noun} cannot be negative`;
		if (si.isZero()) return `${measure.noun} cannot be zero`;
		return `too small for ${measure.noun} (least ${limit(measure.min, unit, units)})`;
	}
	return si.gt(measure.max) ? `too great for ${measure.noun} (most ${limit(measure.max, unit, units)})` : null;
}

function limit(si: number, unit: Unit, units: UnitSystem): string {
	return withLabel(fromSI(si, unit), unit, 3, units);
}

/** A figure with its unit as printed. */
export function withLabel(value: Decimal, unit: Unit, significant: number, units: UnitSystem): string {
	const tight = unit.label === '°' || unit.label === '';
	return `${shortDigits(value, significant, units)}${tight ? '' : ' '}${unit.label}`;
}

function wordsOf(measure: Measure, sum: Sum, unit: Unit, si: Decimal, units: UnitSystem): string {
	const typed = sum.compound ? feetAndInches(sum.value, units) : withLabel(sum.value, unit, 12, units);
	const usual = measure.bare[units];
	const second = unit === usual ? measure.aside?.[units] : usual;
	return second ? `${typed} (${withLabel(fromSI(si, second), second, 4, units)})` : typed;
}

function feetAndInches(inches: Decimal, units: UnitSystem): string {
	const feet = inches.abs().div(12).trunc();
	const rest = shortDigits(inches.abs().minus(feet.times(12)), 8, units);
	return `${inches.lt(0) ? '−' : ''}${shortDigits(feet, 12, units)} ft ${rest} in`;
}

/** The other reading as a text, where it is believable and not the same. */
function otherOf(
	measure: Measure,
	text: string,
	sum: Sum,
	rule: BareRule | null,
	si: Decimal,
	units: UnitSystem
): string | null {
	if (sum.worked) return null;
	const typed = text.trim();
	const other = sum.doubt
		? typed.replace(/[.,]/, sum.doubt.other.includes('.') ? '.' : '')
		: rule?.other
			? `${typed} ${rule.other.label}`
			: null;
	if (other === null) return null;
	const reading = readMeasure(measure, other, units);
	return reading.ok && !si.eq(reading.value) ? other : null;
}

function whyOf(measure: Measure, sum: Sum, rule: BareRule | null, other: string | null, unit: Unit): string | null {
	const reasons = [
		sum.doubt && (other !== null || sum.worked || rule) ? sum.doubt.why : null,
		rule?.why ?? null,
		measure.caution?.(unit) ?? null
	].filter((reason) => reason !== null);
	return reasons.length > 0 ? reasons.join('; ') : null;
}

/** Names a unit that exists but belongs to another quantity. */
function foreignUnit(plain: string, measure: Measure, units: UnitSystem): string | null {
	const all = readSum(plain, { ...measure, units: Object.values(UNITS) }, units);
	if (!all.ok || all.sum.unit === null || measure.units.includes(all.sum.unit)) return null;
	if (measure.units.length === 0) return `${measure.noun} stands here without a unit`;
	return `${all.sum.unit.label} is not a unit of ${measure.noun}`;
}
