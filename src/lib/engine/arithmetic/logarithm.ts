// Logarithms: x = m 2^k, then log m = 2 artanh(s) = 2 s + 2/3 s^3 + 2/5 s^5 + …, s = (m - 1)/(m + 1), |s| < 0.172.
// Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.1.27.
// The first two terms are kept in two parts, so that a power of the result loses nothing.
import { nearestExponent, scale } from './float-parts';
import { addParts, exactProduct, exactSum, multiplyParts, type TwoPart } from './two-part';

/** ln 2; the first part has 33 bits, so that its product with an exponent is exact. */
export const LN2_HIGH = 0.6931471804855391;
export const LN2_LOW = 7.440617110012397e-11;
const INVERSE_LN10: TwoPart = { hi: 0.4342944819032518, lo: 1.098319650216765e-17 };
const TWO_THIRDS: TwoPart = { hi: 0.6666666666666666, lo: 3.700743415417188e-17 };

/** 2/5 + 2/7 z + 2/9 z^2 + … up to s^25 */
function tail(z: number): number {
	let sum = 2 / 25;
	for (let n = 23; n >= 5; n -= 2) sum = sum * z + 2 / n;
	return sum;
}

/** The natural logarithm of a positive finite x, good to some 100 bits less the tail's rounding (about 2^-64). */
export function logParts(x: number): TwoPart {
	const k = nearestExponent(x);
	const f = scale(x, -k) - 1;
	if (f === 0) return exactSum(k * LN2_HIGH, k * LN2_LOW);
	const d = exactSum(f, 2);
	const s1 = f / d.hi;
	const p = exactProduct(s1, d.hi);
	const s = exactSum(s1, (f - p.hi - p.lo - s1 * d.lo) / d.hi);
	const z = multiplyParts(s, s);
	const cubic = multiplyParts(multiplyParts(s, z), TWO_THIRDS);
	const rest = s.hi * z.hi * z.hi * tail(z.hi);
	const fraction = addParts({ hi: 2 * s.hi, lo: 2 * s.lo }, exactSum(cubic.hi, cubic.lo + rest));
	return k === 0 ? fraction : addParts(exactSum(k * LN2_HIGH, k * LN2_LOW), fraction);
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
	return special(x) ?? multiplyParts(logParts(x), INVERSE_LN10).hi;
}
