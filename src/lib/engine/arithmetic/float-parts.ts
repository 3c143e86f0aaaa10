// The parts of a double (IEEE 754): exponent and fraction, read through a view of fixed byte order.
const view = new DataView(new ArrayBuffer(8));

/** The least power of two: 2^-1074. */
const LEAST = 1074;

/** All powers of two that are doubles: 2^n at n + 1074. */
export const POWERS_OF_TWO = new Float64Array(LEAST + 1024);
POWERS_OF_TWO[LEAST] = 1;
for (let n = 1; n <= LEAST; n += 1) POWERS_OF_TWO[LEAST - n] = (POWERS_OF_TWO[LEAST - n + 1] as number) / 2;
for (let n = 1; n < 1024; n += 1) POWERS_OF_TWO[LEAST + n] = (POWERS_OF_TWO[LEAST + n - 1] as number) * 2;

/** The power of two 2^n as a double, n from -1074 to 1023. */
function powerOfTwo(n: number): number {
	return POWERS_OF_TWO[LEAST + n] as number;
}

/** x times 2^n, rounded once unless the result is subnormal. */
export function scale(x: number, n: number): number {
	if (n > 1023) return x * powerOfTwo(1023) * powerOfTwo(Math.min(n - 1023, 1023));
	if (n < -1022) return x * powerOfTwo(-969) * powerOfTwo(Math.max(n + 969, -1022));
	return x * powerOfTwo(n);
}

/** The exponent k of a positive finite x = m 2^k with m from sqrt(1/2) to sqrt(2). */
export function nearestExponent(x: number): number {
	// Subnormal numbers are first brought to full precision.
	if (x < 2.2250738585072014e-308) return nearestExponent(x * 18014398509481984) - 54;
	view.setFloat64(0, x);
	const high = view.getUint32(0);
	const k = Math.floor(high / 0x100000) - 1023;
	// The fraction of sqrt(2) starts with 0x6a09e.
	return high % 0x100000 > 0x6a09e ? k + 1 : k;
}
