import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import reference from '../../../../fixtures/published/elementary-functions.json';
import { OutOfRangeError } from '../errors';
import { PI, asin, atan, cos, exp, log, log10, pow, radians, sin, tan } from '.';

const ours: Readonly<Record<string, (x: number) => number>> = { log, log10, exp, sin, cos, tan, asin, atan };
const platform: Readonly<Record<string, (x: number) => number>> = {
	log: Math.log,
	log10: Math.log10,
	exp: Math.exp,
	sin: Math.sin,
	cos: Math.cos,
	tan: Math.tan,
	asin: Math.asin,
	atan: Math.atan
};

/** Distance in units of relative error, 0 when both are the same, infinite ones included. */
function relativeError(value: number, expected: number): number {
	return value === expected ? 0 : Math.abs(value - expected) / Math.abs(expected);
}

const ULP = 2 ** -52;

describe(`elementary functions against ${reference.source}`, () => {
	it.each(reference.functions as [string, number, number][])('%s(%d) is %d', (name, x, expected) => {
		const units = name === 'tan' || name === 'asin' ? 2 : 1;
		expect(relativeError(ours[name]?.(x) ?? NaN, expected)).toBeLessThanOrEqual(units * ULP);
	});

	it.each(reference.powers as [number, number, number][])('%d to the %d is %d', (x, y, expected) => {
		expect(relativeError(pow(x, y), expected)).toBeLessThanOrEqual(ULP);
	});
});

describe('elementary functions against those of the platform', () => {
	// Steps that share no factor with powers of two or ten.
	const sweeps: readonly (readonly [string, (i: number) => number])[] = [
		['log', (i) => 10 ** (-307 + 0.0307 * i)],
		['log', (i) => 0.4 + 0.000083 * i],
		['log10', (i) => 10 ** (-307 + 0.0307 * i)],
		['log10', (i) => 0.4 + 0.000083 * i],
		['exp', (i) => -708 + 0.0707 * i],
		['exp', (i) => -1 + 0.0001003 * i],
		['sin', (i) => -1000 + 0.1003 * i],
		['cos', (i) => -1000 + 0.1003 * i],
		['tan', (i) => -1000 + 0.1003 * i],
		['asin', (i) => -1 + 0.0001 * i],
		['atan', (i) => 10 ** (-9 + 0.00091 * i)]
	];

	it.each(sweeps)('%s agrees to 1e-15 (sweep %#)', (name, at) => {
		for (let i = 0; i < 20_000; i += 1) {
			const x = at(i);
			expect(relativeError(ours[name]?.(x) ?? NaN, platform[name]?.(x) ?? NaN), `${name}(${x})`).toBeLessThan(1e-15);
		}
	});

	it('pow agrees to 2e-15 for any base and exponent', () => {
		const base = fc.double({ min: 1e-30, max: 1e30, noNaN: true });
		const exponent = fc.double({ min: -10, max: 10, noNaN: true });
		fc.assert(
			fc.property(base, exponent, (x, y) => {
				expect(relativeError(pow(x, y), x ** y)).toBeLessThan(2e-15);
			}),
			{ numRuns: 5_000 }
		);
	});
});

describe('laws', () => {
	const any = fc.double({ min: -300, max: 300, noNaN: true });

	it('log undoes exp', () => {
		fc.assert(
			fc.property(any, (x) => {
				expect(Math.abs(log(exp(x)) - x)).toBeLessThan(3e-16 + 2e-16 * Math.abs(x));
			})
		);
	});

	it('log10 of a power of ten is whole', () => {
		for (let n = -22; n <= 22; n += 1) expect(log10(Number(`1e${n}`))).toBe(n);
	});

	it('squares of sine and cosine make one', () => {
		fc.assert(
			fc.property(any, (x) => {
				expect(sin(x) * sin(x) + cos(x) * cos(x)).toBeCloseTo(1, 15);
			})
		);
	});

	it('sine and tangent are odd, cosine is even', () => {
		fc.assert(
			fc.property(any, (x) => {
				expect(sin(-x) + sin(x)).toBe(0);
				expect(tan(-x) + tan(x)).toBe(0);
				expect(cos(-x)).toBe(cos(x));
			})
		);
	});

	it('asin undoes sine, atan undoes tangent', () => {
		fc.assert(
			fc.property(fc.double({ min: -1.5, max: 1.5, noNaN: true }), (x) => {
				expect(asin(sin(x))).toBeCloseTo(x, 13);
				expect(atan(tan(x))).toBeCloseTo(x, 14);
			})
		);
	});

	it('exp rises', () => {
		fc.assert(
			fc.property(any, (x) => {
				expect(exp(x + 1e-9)).toBeGreaterThan(exp(x));
			})
		);
	});
});

describe('ends and edges', () => {
	const limits = [0, -0, 1, -1, 0.5, -0.5, 2, -2, 3, -3, 1e300, -1e300, Infinity, -Infinity, NaN];

	it('pow has the limits of the language', () => {
		for (const x of limits)
			for (const y of limits) {
				const [power, expected] = [pow(x, y), x ** y];
				if (Number.isFinite(expected) && expected !== 0)
					expect(relativeError(power, expected)).toBeLessThanOrEqual(ULP);
				else expect(power, `${x} to the ${y}`).toBe(expected);
			}
	});

	it.each([
		[log, 0, -Infinity],
		[log, -1, NaN],
		[log, Infinity, Infinity],
		[log, 1, 0],
		[log10, 0, -Infinity],
		[log10, NaN, NaN],
		[exp, 0, 1],
		[exp, 710, Infinity],
		[exp, -746, 0],
		[exp, NaN, NaN],
		[exp, -Infinity, 0],
		[atan, Infinity, PI / 2],
		[atan, -Infinity, -PI / 2],
		[atan, 0, 0],
		[asin, 1, PI / 2],
		[asin, 1.1, NaN],
		[sin, 0, 0],
		[cos, 0, 1]
	])('%o of %d is %d', (of, x, expected) => expect(of(x)).toBe(expected));

	it('exp goes down through the subnormal numbers', () => {
		expect(exp(-745)).toBe(5e-324);
		expect(relativeError(exp(-720), Math.exp(-720))).toBeLessThan(1e-10);
	});

	it.each([1_000_001, -1_000_001, NaN, Infinity])('sine refuses %d', (x) =>
		expect(() => sin(x)).toThrow(OutOfRangeError)
	);

	it('180 degrees are pi', () => expect(radians(180)).toBe(PI));
});
