// Arc tangent: atan a = atan(k/8) + atan((a - k/8)/(1 + a k/8)), the last by its series with |t| <= 1/16.
// Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.4.34 and 4.4.42.
const HALF_PI = 1.5707963267948966;
const HALF_PI_LOW = 6.123233995736766e-17;

/** atan(k/8), k from 0 to 8, in two parts each; worked out with 80 decimal digits. */
const EIGHTHS: readonly (readonly [number, number])[] = [
	[0, 0],
	[0.12435499454676144, -3.1253241424539383e-18],
	[0.24497866312686414, 1.0698755618734451e-17],
	[0.35877067027057225, -2.4623815582638635e-17],
	[0.4636476090008061, 2.2698777452961687e-17],
	[0.5585993153435624, -5.4556305485916264e-18],
	[0.6435011087932844, 1.5834785051444286e-17],
	[0.7188299996216245, -2.1478388444456983e-17],
	[0.7853981633974483, 3.061616997868383e-17]
];

/** atan of a from 0 to 1 */
function atanOfUnit(a: number): number {
	const k = Math.floor(8 * a + 0.5);
	const c = k / 8;
	const t = (a - c) / (1 + a * c);
	const z = t * t;
	let sum = 1 / 17;
	for (let n = 15; n >= 3; n -= 2) sum = 1 / n - sum * z;
	const [high, low] = EIGHTHS[k] ?? [0, 0];
	return high + (t - (t * z * sum - low));
}

/**
 * Arc tangent, to about one unit in the last place.
 *
 * @param x argument [-]
 * @returns atan x [rad], -pi/2 to pi/2
 * @source Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.4.34 and 4.4.42
 * @check none: compared with the platform's own function and pinned bits in arithmetic.test.ts
 */
export function atan(x: number): number {
	const a = Math.abs(x);
	if (!(a > 0)) return x;
	const size = a <= 1 ? atanOfUnit(a) : HALF_PI - (atanOfUnit(1 / a) - HALF_PI_LOW);
	return x < 0 ? -size : size;
}

/**
 * Arc sine, to about two units in the last place.
 *
 * @param x argument [-], -1 to 1; outside NaN
 * @returns asin x [rad], -pi/2 to pi/2
 * @source Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 4.4.32
 * @check none: compared with the platform's own function and pinned bits in arithmetic.test.ts
 */
export function asin(x: number): number {
	if (!(Math.abs(x) <= 1)) return NaN;
	return atan(x / Math.sqrt((1 - x) * (1 + x)));
}
