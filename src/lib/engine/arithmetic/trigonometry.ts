// Sine, cosine, tangent: x = n pi/2 + r with pi/2 in three parts (Cody & Waite, Software Manual for the Elementary
// Functions, 1980), then the series of Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.3.65 and 4.3.66.
import { requireInRange, type Range } from '../errors';
import { LOW } from './two-part';

const TWO_OVER_PI = 0.6366197723675814;
// The first two parts have 33 bits: their products with n below 2^20 are exact.
const HALF_PI_1 = 1.5707963267341256;
const HALF_PI_2 = 6.077100506303966e-11;
const HALF_PI_3 = 2.0222662487959506e-21;

/** Angles for which the reduction is exact enough [rad]. */
export const REDUCIBLE: Range = { min: -1_000_000, max: 1_000_000 };

/** The angle that `reduce` has left, from -pi/4 to pi/4; its low part is in LOW. */
const REST = new Float64Array(1);

/** The quarter of the circle, 0 to 3, that x is next to. */
function reduce(name: string, x: number): number {
	requireInRange(name, 'x', x, REDUCIBLE);
	if (Math.abs(x) <= 0.7853981633974483) {
		REST[0] = x;
		LOW[0] = 0;
		return 0;
	}
	const n = Math.floor(x * TWO_OVER_PI + 0.5);
	const t = x - n * HALF_PI_1;
	const w = n * HALF_PI_2;
	const y = t - w;
	const rest = t - y - w - n * HALF_PI_3;
	const hi = y + rest;
	REST[0] = hi;
	LOW[0] = y - hi + rest;
	return n - 4 * Math.floor(n / 4);
}

/** sin(r + lo), |r| <= pi/4 */
function sineSeries(r: number, lo: number): number {
	const z = r * r;
	let sum = 1;
	for (let n = 17; n >= 5; n -= 2) sum = 1 - (sum * z) / (n * (n - 1));
	return r + (lo * (1 - z / 2) - (r * z * sum) / 6);
}

/** cos(r + lo), |r| <= pi/4 */
function cosineSeries(r: number, lo: number): number {
	const z = r * r;
	let sum = 1;
	for (let n = 18; n >= 6; n -= 2) sum = 1 - (sum * z) / (n * (n - 1));
	const half = z / 2;
	const w = 1 - half;
	return w + (1 - w - half + ((z * z * sum) / 24 - r * lo));
}

/**
 * Sine, to about one unit in the last place.
 *
 * @param x angle [rad], -1e6 to 1e6
 * @returns sin x [-]
 * @throws {OutOfRangeError} when x leaves the range
 * @source Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.3.65
 * @check none: compared with the platform's own function and pinned bits in arithmetic.test.ts
 */
export function sin(x: number): number {
	const quarter = reduce('sin', x);
	const r = REST[0] as number;
	const low = LOW[0] as number;
	const size = quarter % 2 === 0 ? sineSeries(r, low) : cosineSeries(r, low);
	return quarter < 2 ? size : -size;
}

/**
 * Cosine, to about one unit in the last place.
 *
 * @param x angle [rad], -1e6 to 1e6
 * @returns cos x [-]
 * @throws {OutOfRangeError} when x leaves the range
 * @source Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.3.66
 * @check none: compared with the platform's own function and pinned bits in arithmetic.test.ts
 */
export function cos(x: number): number {
	const quarter = reduce('cos', x);
	const r = REST[0] as number;
	const low = LOW[0] as number;
	const size = quarter % 2 === 0 ? cosineSeries(r, low) : sineSeries(r, low);
	return quarter === 0 || quarter === 3 ? size : -size;
}

/**
 * Tangent, to about two units in the last place.
 *
 * @param x angle [rad], -1e6 to 1e6
 * @returns tan x [-]
 * @throws {OutOfRangeError} when x leaves the range
 * @source Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.3.3
 * @check none: compared with the platform's own function and pinned bits in arithmetic.test.ts
 */
export function tan(x: number): number {
	const quarter = reduce('tan', x);
	const r = REST[0] as number;
	const low = LOW[0] as number;
	const s = sineSeries(r, low);
	const c = cosineSeries(r, low);
	return quarter % 2 === 0 ? s / c : -c / s;
}
