// Numbers kept as an unevaluated sum of two doubles, some 106 bits in all: hi + lo, lo at most half a unit in the last
// place of hi. Each function returns hi and leaves lo in LOW: a power is taken for every elbow, and pairs as objects
// would cost more than the sums.
// Dekker, A floating-point technique for extending the available precision, Numerische Mathematik 18 (1971).

/** The low part of what was computed last; to be taken before the next is. */
export const LOW = new Float64Array(1);

/** a + b without error. */
export function exactSum(a: number, b: number): number {
	const hi = a + b;
	const c = hi - a;
	LOW[0] = a - (hi - c) + (b - c);
	return hi;
}

const SPLIT = 134217729; // 2^27 + 1

/** a b without error, as long as neither overflows when split. */
export function exactProduct(a: number, b: number): number {
	const hi = a * b;
	const ca = SPLIT * a;
	const a1 = ca - (ca - a);
	const a2 = a - a1;
	const cb = SPLIT * b;
	const b1 = cb - (cb - b);
	const b2 = b - b1;
	LOW[0] = a1 * b1 - hi + a1 * b2 + a2 * b1 + a2 * b2;
	return hi;
}

/** The sum of two two-part numbers. */
export function addParts(a: number, aLow: number, b: number, bLow: number): number {
	const sum = exactSum(a, b);
	return exactSum(sum, (LOW[0] as number) + aLow + bLow);
}

/** The product of two two-part numbers. */
export function multiplyParts(a: number, aLow: number, b: number, bLow: number): number {
	const product = exactProduct(a, b);
	return exactSum(product, (LOW[0] as number) + a * bLow + aLow * b);
}
