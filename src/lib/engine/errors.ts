import { shortFigure } from './short-figure';

/** The interval in which a formula holds; both ends belong to it. */
export interface Range {
	readonly min: number;
	readonly max: number;
}

/** A formula was asked outside the range of its source. */
export class OutOfRangeError extends Error {
	override readonly name = 'OutOfRangeError';

	constructor(
		readonly formula: string,
		readonly symbol: string,
		readonly value: number,
		readonly range: Range
	) {
		super(`${formula}: ${symbol} = ${shortFigure(value, range)} is outside ${range.min} to ${range.max}`);
	}
}

/**
 * Stops a value outside the range, and NaN with it.
 *
 * @throws {OutOfRangeError} when value is not within range
 */
export function requireInRange(formula: string, symbol: string, value: number, range: Range): void {
	if (!(value >= range.min && value <= range.max)) throw new OutOfRangeError(formula, symbol, value, range);
}
