import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { colebrookRoot, frictionColebrook1939 } from '.';

const Precise = Decimal.clone({ precision: 40 });
const ROUGHNESSES = [0, 1e-9, 1e-6, 3.7e-5, 5e-4, 4e-3, 0.03, 0.05];

/** A short decimal, so that the number and its decimal are the same to 1e-17 of it. */
const exactly = (value: number) => new Precise(value.toPrecision(17));

/** x + 2 log10(eps/3.7 + 2.51 x/Re): rises with x, zero at the root. */
function excess(x: Decimal, Re: number, roughness: number): Decimal {
	const inner = exactly(roughness)
		.div('3.7')
		.plus(x.times('2.51').div(exactly(Re)));
	return x.plus(Precise.log10(inner).times(2));
}

/** Whether the true friction factor is within a part of f, by the signs of the equation at both ends. */
function isBracketed(f: number, Re: number, roughness: number, part: number): boolean {
	const root = (factor: number) => new Precise(1).div(exactly(f).times(new Precise(1).plus(factor)).sqrt());
	return excess(root(part), Re, roughness).lt(0) && excess(root(-part), Re, roughness).gt(0);
}

const ULP = 2 ** -52;

describe('Colebrook–White by brackets in 40 digits', () => {
	it.each(ROUGHNESSES)('is exact to three units of the last place at eps/D %d', (roughness) => {
		for (let Re = 4_000; Re < 1e9; Re *= 1.31)
			expect(isBracketed(frictionColebrook1939(Re, roughness), Re, roughness, 3 * ULP), `Re ${Re}`).toBe(true);
	});

	it('is exact wherever it can be solved', () => {
		const logOf = (min: number, max: number) => fc.double({ min: Math.log(min), max: Math.log(max), noNaN: true });
		fc.assert(
			fc.property(logOf(1_001, 1e300), logOf(1e-30, 1), (lnRe, lnRoughness) => {
				const [Re, roughness] = [Math.exp(lnRe), Math.min(1, Math.exp(lnRoughness))];
				expect(isBracketed(frictionColebrook1939(Re, roughness), Re, roughness, 5 * ULP)).toBe(true);
			}),
			{
				numRuns: 300,
				examples: [
					[Math.log(1_001), Math.log(1e-30)],
					[Math.log(1e308), 0]
				]
			}
		);
	});

	it('is exact below the transition too, where it only serves the blend', () => {
		for (const roughness of [0, 1e-4, 0.01, 0.3, 1])
			for (let Re = 1_000; Re < 4_000; Re *= 1.021)
				expect(isBracketed(frictionColebrook1939(Re, roughness), Re, roughness, 4 * ULP), `Re ${Re}`).toBe(true);
	});

	it('would miss a factor that is wrong by the fifteenth digit', () => {
		const f = frictionColebrook1939(1e5, 1e-4);
		expect(isBracketed(f * (1 + 1e-15), 1e5, 1e-4, 3 * ULP)).toBe(false);
		expect(isBracketed(f * (1 - 1e-15), 1e5, 1e-4, 3 * ULP)).toBe(false);
	});

	it('falls with the Reynolds number and rises with the roughness, step by step', () => {
		for (const roughness of [0, 1e-4, 0.03])
			for (let Re = 4_000; Re < 1e7; Re *= 1.001)
				expect(frictionColebrook1939(Re * 1.001, roughness)).toBeLessThanOrEqual(frictionColebrook1939(Re, roughness));
		for (let roughness = 1e-6; roughness < 0.05; roughness *= 1.001)
			expect(frictionColebrook1939(1e6, roughness * 1.001)).toBeGreaterThan(frictionColebrook1939(1e6, roughness));
	});

	it('is 1/x^2 of its root', () => {
		const { x } = colebrookRoot(12_345, 0.002);
		expect(frictionColebrook1939(12_345, 0.002)).toBe(1 / (x * x));
	});
});
