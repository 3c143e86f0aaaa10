// Logarithms: x = m 2^k, then log m = 2 artanh(s) = 2 s + 2/3 s^3 + 2/5 s^5 + …, s = (m - 1)/(m + 1), |s| < 0.172.
// Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.1.27.
// The first two terms are kept in two parts, so that a power of the result loses nothing.
import { nearestExponent, scale } from './float-parts';
import { addParts, exactProduct, exactSum, LOW, multiplyParts } from './two-part';

/** ln 2; the first part has 33 bits, so that its product with an exponent is exact. */
export const LN2_HIGH = 0.6931471804855391;
export const LN2_LOW = 7.440617110012397e-11;
const INVERSE_LN10 = 0.4342944819032518;
const INVERSE_LN10_LOW = 1.098319650216765e-17;
const TWO_THIRDS = 0.6666666666666666;
const TWO_THIRDS_LOW = 3.700743415417188e-17;

/** 2/5 + 2/7 z + 2/9 z^2 + … up to s^25 */
function tail(z: number): number {
	let sum = 2 / 25;
	for (let n = 23; n >= 5; n -= 2) sum = sum * z + 2 / n;
	return sum;
}

/** The natural logarithm of a positive finite x in two parts, good to some 100 bits less the tail's rounding (about 2^-64). */
export function logParts(x: number): number {
	const k = nearestExponent(x);
	const f = scale(x, -k) - 1;
	if (f === 0) return exactSum(k * LN2_HIGH, k * LN2_LOW);
	const d = exactSum(f, 2);
	const dLow = LOW[0] as number;
	const s1 = f / d;
	const p = exactProduct(s1, d);
	const s = exactSum(s1, (f - p - (LOW[0] as number) - s1 * dLow) / d);
	const sLow = LOW[0] as number;
	const z = multiplyParts(s, sLow, s, sLow);
	const cube = multiplyParts(s, sLow, z, LOW[0] as number);
	const cubic = multiplyParts(cube, LOW[0] as number, TWO_THIRDS, TWO_THIRDS_LOW);
	const rest = s * z * z * tail(z);
	const terms = exactSum(cubic, (LOW[0] as number) + rest);
	const fraction = addParts(2 * s, 2 * sLow, terms, LOW[0] as number);
	if (k === 0) return fraction;
	const low = LOW[0] as number;
	const whole = exactSum(k * LN2_HIGH, k * LN2_LOW);
	return addParts(whole, LOW[0] as number, fraction, low);
}

/** What a logarithm of an x outside the positive finite numbers is; null for those within. */
function special(x: number): number | null {
	if (x > 0 && x < Infinity) return null;
	if (x === 0) return -Infinity;
	return x === Infinity ? Infinity : NaN;
}

/**
 * Logarithm to base 10, to about half a unit in the last place.
 *
 * @param x argument [-], positive; 0 gives -Infinity, negative NaN
 * @returns log10 x [-]
 * @source Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.1.27
 * @check none: compared with the platform's own function and pinned bits in arithmetic.test.ts
 */
export function log10(x: number): number {
	const limit = special(x);
	if (limit !== null) return limit;
	const ln = logParts(x);
	return multiplyParts(ln, LOW[0] as number, INVERSE_LN10, INVERSE_LN10_LOW);
}
