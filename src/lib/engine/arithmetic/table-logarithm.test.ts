import { Decimal } from 'decimal.js';
import { describe, expect, it } from 'vitest';
import { log, roughLog } from '.';

/** Units in the last place, as promised. */
const WORST = 0.55;
const Precise = Decimal.clone({ precision: 40, toExpNeg: -9e15, toExpPos: 9e15 });

/** A double as it is, and not as its shortest decimal. */
function exactly(x: number): Decimal {
	if (x < 0) return exactly(-x).negated();
	const e = Math.max(-1074, Math.floor(Math.log2(x)) - 53);
	const half = Math.trunc(e / 2);
	return new Precise(BigInt(x * 2 ** -half * 2 ** (half - e)).toString()).times(new Precise(2).pow(e));
}

/** The step between doubles next to a value. */
function unitOf(value: number): number {
	return 2 ** (Math.floor(Math.log2(Math.abs(value))) - 52);
}

/** Distance from the true logarithm in units in the last place, of the value itself. */
function error(x: number): number {
	const exact = exactly(x).ln();
	return Math.abs(
		exact
			.minus(exactly(log(x)))
			.div(unitOf(exact.toNumber()))
			.toNumber()
	);
}

/** The largest error of a sweep. */
function worst(count: number, at: (i: number) => number): number {
	let most = 0;
	for (let i = 0; i < count; i += 1) most = Math.max(most, error(at(i)));
	return most;
}

describe('the natural logarithm against 40 decimal digits', () => {
	// Steps that share no factor with powers of two or with the table.
	it('is within 0.55 units in the last place over all magnitudes', () => {
		expect(worst(1_500, (i) => 10 ** (-307.5 + 0.41057 * i))).toBeLessThan(WORST);
	});

	it('is within 0.55 units at both sides of every entry of the table', () => {
		for (const scale of [2 ** -20, 0.5, 1, 2 ** 9])
			expect(worst(256, (i) => scale * (1 + (i + 0.5) / 256 + ((i % 3) - 1) * 2 ** -40))).toBeLessThan(WORST);
	});

	it('is within 0.55 units about 1, where it crosses zero, and at the seams there', () => {
		expect(worst(400, (i) => 0.9003 + 0.00050013 * i)).toBeLessThan(WORST);
		for (const x of [1 - 2 ** -53, 1 + 2 ** -52, 0.9375, 0.9375 - 2 ** -53, 1.0625, 1.0625 + 2 ** -52])
			expect(error(x), `ln ${x}`).toBeLessThan(WORST);
	});

	it('reaches to the ends of the doubles', () => {
		for (const x of [5e-324, 1e-310, 2.2250738585072014e-308, Number.MAX_VALUE, 1.7e308])
			expect(error(x), `ln ${x}`).toBeLessThan(WORST);
	});

	it('rises over the seams of its parts', () => {
		for (const seam of [0.9375, 1.0625, 1.00390625 * 2, 1.99609375, 4, 2 ** -30])
			for (let i = -50; i < 50; i += 1)
				expect(log(seam * (1 + (i + 1) * 2 ** -52)), `${seam} ${i}`).toBeGreaterThanOrEqual(
					log(seam * (1 + i * 2 ** -52))
				);
	});
});

describe('the rough logarithm', () => {
	it('is within 0.004 of the exact one', () => {
		for (let i = 0; i < 20_000; i += 1) {
			const x = 10 ** (-307.5 + 0.0307 * i);
			expect(Math.abs(roughLog(x) - log(x)), `${x}`).toBeLessThan(0.004);
		}
	});
});
