// Exponential: x = n ln 2 + r, |r| <= ln 2 / 2; e^r by its series to r^14.
// Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.2.1.
import { scale } from './float-parts';
import { LN2_HIGH, LN2_LOW } from './logarithm';

const INVERSE_LN2 = 1.4426950408889634;
const LARGEST = 709.782712893384;
const SMALLEST = -745.1332191019412;

/** 1/2! + r/3! + r^2/4! + … + r^12/14! */
function tail(r: number): number {
	const last = 1 / 3628800 + r * (1 / 39916800 + r * (1 / 479001600 + r * (1 / 6227020800 + r * (1 / 87178291200))));
	const middle = 1 / 720 + r * (1 / 5040 + r * (1 / 40320 + r * (1 / 362880 + r * last)));
	return 1 / 2 + r * (1 / 6 + r * (1 / 24 + r * (1 / 120 + r * middle)));
}

/** e^(hi + lo), |lo| far below |hi|. */
export function expOfParts(hi: number, lo: number): number {
	if (hi > LARGEST) return Infinity;
	if (hi < SMALLEST) return 0;
	const n = Math.floor(hi * INVERSE_LN2 + 0.5);
	const a = hi - n * LN2_HIGH;
	const b = lo - n * LN2_LOW;
	const r = a + b;
	const e = a - r + b;
	return scale(1 + (r + (r * r * tail(r) + e * (1 + r))), n);
}

/**
 * Exponential function, to about one unit in the last place.
 *
 * @param x argument [-]
 * @returns e^x [-]; Infinity above 709.78, 0 below -745.13
 * @source Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.2.1
 * @check none: compared with the platform's own function and pinned bits in arithmetic.test.ts
 */
export function exp(x: number): number {
	return x !== x ? NaN : expOfParts(x, 0);
}
