import type { Range } from '../errors';
import { shortFigure } from '../short-figure';
import type { Note, ParameterValues } from './definition';
import type { CatalogueEntry, FittingParameter, FittingParameters } from './types';

export function numberParameter(
	name: string,
	label: string,
	unit: string,
	standard: number,
	limits: Range
): FittingParameter {
	return { name, label, unit, default: standard, min: limits.min, max: limits.max };
}

export function choiceParameter(
	name: string,
	label: string,
	standard: number | string,
	options: readonly (number | string)[]
): FittingParameter {
	const numbers = options.filter((one) => typeof one === 'number');
	const min = Math.min(...numbers, Infinity);
	const max = Math.max(...numbers, -Infinity);
	const bounded = numbers.length > 0;
	return { name, label, unit: '', default: standard, min: bounded ? min : 0, max: bounded ? max : 0, options };
}

function outside(value: number, range: Range, what: string): string {
	return `${what} ${shortFigure(value, range)} is outside ${range.min} to ${range.max}`;
}

/** value within range, with a note when it was outside. */
export function heldWithin(value: number, range: Range, what: string, note: Note): number {
	if (value >= range.min && value <= range.max) return value;
	const held = value < range.min ? range.min : range.max;
	note(`${outside(value, range, what)}, and is taken at the nearer end`);
	return held;
}

/** A note when value is outside range, where the formula is used all the same. */
export function noteOutside(value: number, range: Range, what: string, note: Note): void {
	if (!(value >= range.min && value <= range.max)) note(outside(value, range, what));
}

/** Parameters of a document read for one entry: defaults for what is missing, limits for what is beyond them. */
export function readParameters(entry: CatalogueEntry, given: FittingParameters, note: Note): ParameterValues {
	return new GivenValues(entry, given, note);
}

/** One object, not a closure for each way to read: a network reads the parameters of many thousand fittings. */
class GivenValues implements ParameterValues {
	constructor(
		private readonly entry: CatalogueEntry,
		private readonly given: FittingParameters,
		private readonly note: Note
	) {}

	number(name: string): number {
		const parameter = this.parameterOf(name);
		const value = this.valueOf(name);
		if (typeof value !== 'number' || !Number.isFinite(value)) return Number(parameter.default);
		return heldWithin(value, parameter, parameter.label.toLowerCase(), this.note);
	}

	choice(name: string): string {
		const parameter = this.parameterOf(name);
		const value = this.valueOf(name);
		return String(parameter.options?.find((one) => one === value) ?? parameter.default);
	}

	private parameterOf(name: string): FittingParameter {
		for (const one of this.entry.parameters) if (one.name === name) return one;
		throw new Error(`${this.entry.key} has no parameter ${name}`);
	}

	private valueOf(name: string): unknown {
		return Object.hasOwn(this.given, name) ? this.given[name] : undefined;
	}
}
