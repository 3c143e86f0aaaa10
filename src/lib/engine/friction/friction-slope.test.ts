import { describe, expect, it } from 'vitest';
import { OutOfRangeError } from '../errors';
import { frictionFactor, frictionFactorSlope } from '.';

const ROUGHNESSES = [0, 1e-6, 1e-4, 1e-3, 0.01, 0.05];
const LAMINARS = [56.918, 64, 96];

/** Central difference of fourth order: what is left is rounding, some 1e-10 of the slope. */
function difference(reynolds: number, relativeRoughness: number, laminar: number): number {
	const h = reynolds * 1e-3;
	const f = (steps: number) => frictionFactor({ reynolds: reynolds + steps * h, relativeRoughness, laminar });
	return (8 * (f(1) - f(-1)) - (f(2) - f(-2))) / (12 * h);
}

describe('the slope of the friction factor', () => {
	it.each([1, 30, 700, 1_990, 2_010, 2_500, 3_000, 3_700, 3_990, 4_010, 5_000, 3e4, 1e6, 1e8])(
		'is that of its own differences at Re %d',
		(reynolds) => {
			for (const laminar of LAMINARS)
				for (const relativeRoughness of ROUGHNESSES) {
					const slope = frictionFactorSlope({ reynolds, relativeRoughness, laminar });
					const numeric = difference(reynolds, relativeRoughness, laminar);
					// Fully rough flow has hardly a slope: there the rounding of f itself is what is compared with.
					const rounding = (1e-12 * frictionFactor({ reynolds, relativeRoughness, laminar })) / reynolds;
					const what = `eps/D ${relativeRoughness}, f Re ${laminar}: ${slope} for ${numeric}`;
					expect(Math.abs(slope - numeric), what).toBeLessThan(2e-8 * Math.abs(numeric) + rounding);
				}
		}
	);

	it.each([2_000, 4_000])('is continuous at Re %d', (edge) => {
		for (const laminar of LAMINARS)
			for (const relativeRoughness of ROUGHNESSES) {
				const slope = (reynolds: number) => frictionFactorSlope({ reynolds, relativeRoughness, laminar });
				expect(slope(edge * (1 + 1e-12)) / slope(edge * (1 - 1e-12))).toBeCloseTo(1, 9);
			}
	});

	it('never lets the pressure loss fall as the flow rises', () => {
		for (const laminar of LAMINARS)
			for (const relativeRoughness of ROUGHNESSES)
				for (let reynolds = 100; reynolds < 1e8; reynolds *= 1.02) {
					const spec = { reynolds, relativeRoughness, laminar };
					// d ln dp/d ln Q: 1 in laminar flow, toward 2 in fully rough flow
					const power = 2 + (reynolds * frictionFactorSlope(spec)) / frictionFactor(spec);
					expect(power, `Re ${reynolds}, eps/D ${relativeRoughness}`).toBeGreaterThan(1 - 1e-12);
					if (reynolds > 4_000) expect(power).toBeLessThanOrEqual(2);
				}
	});

	it('refuses what the factor refuses', () => {
		for (const reynolds of [0, -1, NaN, Infinity])
			expect(() => frictionFactorSlope({ reynolds, relativeRoughness: 0 })).toThrow(OutOfRangeError);
		expect(() => frictionFactorSlope({ reynolds: 1e5, relativeRoughness: 1.01 })).toThrow(OutOfRangeError);
	});
});
