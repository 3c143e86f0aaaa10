// Natural logarithm by a table: x = m 2^k, c the multiple of 1/128 next to m, log x = k ln 2 + ln c + log(1 + r),
// r = (m - c)/c, |r| <= 2^-8. After Tang, Table-driven implementation of the logarithm function in IEEE floating-point
// arithmetic, ACM Transactions on Mathematical Software 16 (1990); the series is Abramowitz & Stegun 4.1.24.
import { POWERS_OF_TWO } from './float-parts';
import { LN2_HIGH, LN2_LOW, logParts } from './logarithm';
import { LOW } from './two-part';

const LN2 = 0.6931471805599453;
const SMALLEST_NORMAL = 2.2250738585072014e-308;
/** So near to 1 the terms above cancel. */
const NEAR_ONE = 0.0625;

const cell = new Float64Array(1);
const words = new Uint32Array(cell.buffer);
/** Where the sign and the exponent lie: last on all machines of today, first where the bytes run the other way. */
const HIGH = new Uint8Array(new Uint32Array([1]).buffer)[0] === 1 ? 1 : 0;
/** Half the step of the table, as bits of the high word. */
const HALF_STEP = 0x1000;

const INVERSE = new Float64Array(128);
/** ln c in two parts; the first is a multiple of 2^-42, so that adding k ln 2 to it is exact. */
const LN_HIGH = new Float64Array(128);
const LN_LOW = new Float64Array(128);
/** Where 2^(1023 - e) lies among the powers of two, less -e. */
const PLACE = 1074 + 1023;

const ROUNDING = 1536; // 1.5 times 2^10, whose last bit is 2^-42
for (let j = 0; j < 128; j += 1) {
	const c = 1 + j / 128;
	const hi = logParts(c);
	const lo = LOW[0] as number;
	INVERSE[j] = 1 / c;
	LN_HIGH[j] = hi + ROUNDING - ROUNDING;
	LN_LOW[j] = hi - (LN_HIGH[j] as number) + lo;
}

/** The logarithm of a normal x that is not near 1. */
function byTable(x: number): number {
	cell[0] = x;
	const high = (words[HIGH] as number) + HALF_STEP;
	const e = high >>> 20;
	const j = (high >>> 13) & 127;
	const k = e - 1023;
	const r = (x * (POWERS_OF_TWO[PLACE - e] as number) - (1 + j * 0.0078125)) * (INVERSE[j] as number);
	const w = k * LN2_HIGH + (LN_HIGH[j] as number);
	const sum = w + r;
	const low = w - sum + r + (k * LN2_LOW + (LN_LOW[j] as number));
	const z = r * r;
	return sum + (low + z * (-1 / 2 + r * (1 / 3) + z * (-1 / 4 + r * (1 / 5) + z * (-1 / 6 + r * (1 / 7)))));
}

/**
 * Natural logarithm, within 0.55 units in the last place.
 *
 * @param x argument [-], positive; 0 gives -Infinity, negative NaN
 * @returns ln x [-]
 * @source Tang, Table-driven implementation of the logarithm function (1990); Abramowitz & Stegun (1964), 4.1.24
 * @check none: compared with 40 decimal digits in table-logarithm.test.ts, and pinned bits
 */
export function log(x: number): number {
	const beside = x - 1;
	if (x >= SMALLEST_NORMAL && x < Infinity && (beside > NEAR_ONE || beside < -NEAR_ONE)) return byTable(x);
	if (x > 0) return x === Infinity ? x : logParts(x);
	return x === 0 ? -Infinity : NaN;
}

/**
 * Rough natural logarithm for first guesses, within 0.004.
 *
 * @param x argument [-], positive, finite and not subnormal
 * @returns about ln x [-]
 * @source The table of ln c alone
 * @check none: compared with the exact logarithm in table-logarithm.test.ts
 */
export function roughLog(x: number): number {
	cell[0] = x;
	const high = (words[HIGH] as number) + HALF_STEP;
	return ((high >>> 20) - 1023) * LN2 + (LN_HIGH[(high >>> 13) & 127] as number);
}
