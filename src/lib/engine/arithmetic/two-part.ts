// Numbers kept as an unevaluated sum of two doubles, some 106 bits in all.
// Dekker, A floating-point technique for extending the available precision, Numerische Mathematik 18 (1971).

/** A number hi + lo, with lo at most half a unit in the last place of hi. */
export interface TwoPart {
	readonly hi: number;
	readonly lo: number;
}

/** a + b without error. */
export function exactSum(a: number, b: number): TwoPart {
	const hi = a + b;
	const c = hi - a;
	return { hi, lo: a - (hi - c) + (b - c) };
}

const SPLIT = 134217729; // 2^27 + 1

/** a b without error, as long as neither overflows when split. */
export function exactProduct(a: number, b: number): TwoPart {
	const hi = a * b;
	const ca = SPLIT * a;
	const a1 = ca - (ca - a);
	const a2 = a - a1;
	const cb = SPLIT * b;
	const b1 = cb - (cb - b);
	const b2 = b - b1;
	return { hi, lo: a1 * b1 - hi + a1 * b2 + a2 * b1 + a2 * b2 };
}

/** The sum of two two-part numbers. */
export function addParts(a: TwoPart, b: TwoPart): TwoPart {
	const s = exactSum(a.hi, b.hi);
	return exactSum(s.hi, s.lo + a.lo + b.lo);
}

/** The product of two two-part numbers. */
export function multiplyParts(a: TwoPart, b: TwoPart): TwoPart {
	const p = exactProduct(a.hi, b.hi);
	return exactSum(p.hi, p.lo + a.hi * b.lo + a.lo * b.hi);
}
