// Tables: straight lines between points, the end values held beyond them.

/** Place of x in a rising list: the lower index and the fraction to the next. */
function placeOf(xs: readonly number[], x: number): { readonly i: number; readonly t: number } {
	const last = xs.length - 1;
	if (!(x > (xs[0] ?? 0))) return { i: 0, t: 0 };
	if (x >= (xs[last] ?? 0)) return { i: last - 1, t: 1 };
	let i = 0;
	while (x > (xs[i + 1] ?? Infinity)) i += 1;
	const low = xs[i] ?? 0;
	return { i, t: (x - low) / ((xs[i + 1] ?? 0) - low) };
}

function between(a: number, b: number, t: number): number {
	return t === 0 ? a : t === 1 ? b : a + t * (b - a);
}

/** y at x, linear. */
export function interpolate(xs: readonly number[], ys: readonly number[], x: number): number {
	const { i, t } = placeOf(xs, x);
	return between(ys[i] ?? NaN, ys[i + 1] ?? NaN, t);
}

/** z at (row x, column y), bilinear; table[k] is the row of xs[k]. */
export function interpolateTable(
	xs: readonly number[],
	ys: readonly number[],
	table: readonly (readonly number[])[],
	x: number,
	y: number
): number {
	const { i, t } = placeOf(xs, x);
	return between(interpolate(ys, table[i] ?? [], y), interpolate(ys, table[i + 1] ?? [], y), t);
}
