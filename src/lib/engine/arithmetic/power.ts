// Powers: x^y = e^(y ln x), with ln x and the product in two parts so that large exponents lose nothing.
import { expOfParts } from './exponential';
import { logParts } from './logarithm';
import { exactProduct, exactSum, LOW } from './two-part';

const isWhole = (y: number): boolean => Math.floor(y) === y;
const isOdd = (y: number): boolean => isWhole(y) && Math.abs(y) < 9007199254740992 && y - 2 * Math.floor(y / 2) === 1;

/** The size of a zero or infinite x to the y. */
function powerOfLimit(size: number, y: number): number {
	return (size === 0) === y > 0 ? 0 : Infinity;
}

/** x^y for x positive and finite. */
function powerOfPositive(x: number, y: number): number {
	if (x === 1) return 1;
	const ln = logParts(x);
	const lnLow = LOW[0] as number;
	const size = y * ln;
	if (Math.abs(size) > 800) return size > 0 ? Infinity : 0;
	const product = exactProduct(y, ln);
	const exponent = exactSum(product, (LOW[0] as number) + y * lnLow);
	return expOfParts(exponent, LOW[0] as number);
}

/**
 * Power with any exponent, to about one unit in the last place.
 *
 * @param x base [-]; a negative one wants a whole exponent, else NaN
 * @param y exponent [-]
 * @returns x^y [-]; 1 when y is 0
 * @source Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.2.7
 * @check none: compared with the platform's own function and pinned bits in arithmetic.test.ts
 */
export function pow(x: number, y: number): number {
	if (y === 0) return 1;
	if (x !== x || y !== y) return NaN;
	const size = Math.abs(x);
	if (Math.abs(y) === Infinity) return size === 1 ? NaN : size > 1 === y > 0 ? Infinity : 0;
	if (x < 0 && size !== Infinity && !isWhole(y)) return NaN;
	const power = size === 0 || size === Infinity ? powerOfLimit(size, y) : powerOfPositive(size, y);
	return (x < 0 || Object.is(x, -0)) && isOdd(y) ? -power : power;
}
