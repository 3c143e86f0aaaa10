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
	const parameterOf = (name: string): FittingParameter => {
		const found = entry.parameters.find((one) => one.name === name);
		if (!found) throw new Error(`${entry.key} has no parameter ${name}`);
		return found;
	};
	return {
		number(name) {
			const parameter = parameterOf(name);
			const value = Object.hasOwn(given, name) ? given[name] : undefined;
			if (typeof value !== 'number' || !Number.isFinite(value)) return Number(parameter.default);
			return heldWithin(value, parameter, parameter.label.toLowerCase(), note);
		},
		choice(name) {
			const parameter = parameterOf(name);
			const value = Object.hasOwn(given, name) ? given[name] : undefined;
			return String(parameter.options?.find((one) => one === value) ?? parameter.default);
		}
	};
}
