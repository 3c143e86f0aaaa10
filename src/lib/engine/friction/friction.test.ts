import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import published from '../../../../fixtures/published/friction.json';
import { describePublished } from '../../../../fixtures/published/published-checks';
import { velocityPressure } from '../air';
import { OutOfRangeError } from '../errors';
import {
	DEFAULT_MATERIAL,
	colebrookRoot,
	darcyWeisbach,
	findMaterial,
	frictionAltshulTsal1989,
	frictionChurchill1977,
	frictionFactor,
	frictionSwameeJain1976,
	materials,
	regime
} from '.';
import { frictionChecks, straightDuct } from '../published/friction';

const FOOT = 0.3048;

describePublished('friction against published values', published, frictionChecks);

const ROUGHNESSES = [0, 1e-7, 1e-6, 1e-5, 1e-4, 3e-4, 1e-3, 3e-3, 0.01, 0.03, 0.05];

function eachReynolds(from: number, to: number, factor: number, visit: (Re: number) => void): void {
	for (let Re = from; Re <= to; Re *= factor) visit(Re);
}

describe('Colebrook–White', () => {
	it('has the slope of its own differences', () => {
		for (const roughness of [0, 1e-3, 0.05])
			for (const Re of [4_000, 1e5, 1e7]) {
				const h = 1e-4;
				const logF = (R: number) => -2 * Math.log(colebrookRoot(R, roughness).x);
				const difference = (logF(Re * Math.exp(h)) - logF(Re * Math.exp(-h))) / (2 * h);
				expect(colebrookRoot(Re, roughness).slope).toBeCloseTo(difference, 7);
			}
	});

	it('lies within 3 % of explicit rivals above Re 5000', () => {
		for (const roughness of [1e-5, 1e-4, 1e-3, 0.01])
			eachReynolds(5_000, 1e8, 1.5, (Re) => {
				const f = frictionFactor({ reynolds: Re, relativeRoughness: roughness });
				expect(Math.abs(frictionSwameeJain1976(Re, roughness) / f - 1)).toBeLessThan(0.03);
				expect(Math.abs(frictionChurchill1977(Re, roughness) / f - 1)).toBeLessThan(0.035);
			});
	});

	it('lies within 4 % of Altshul and Tsal, whose two branches meet within 1 %', () => {
		for (const roughness of [1e-5, 1e-4, 1e-3])
			eachReynolds(2e4, 1e7, 1.5, (Re) => {
				const f = frictionFactor({ reynolds: Re, relativeRoughness: roughness });
				expect(Math.abs(frictionAltshulTsal1989(Re, roughness) / f - 1), `${Re} ${roughness}`).toBeLessThan(0.04);
			});
		// 0.11 (68/Re)^0.25 = 0.018
		const Re = 68 / (0.018 / 0.11) ** 4;
		expect(Math.abs(frictionAltshulTsal1989(Re * 1.0001, 0) / frictionAltshulTsal1989(Re, 0) - 1)).toBeLessThan(0.01);
	});

	it('can be solved for any roughness up to the diameter, and no further', () => {
		for (const roughness of [0.1, 0.3, 1])
			eachReynolds(4_000, 1e8, 3, (Re) => {
				const { x } = colebrookRoot(Re, roughness);
				expect(Math.abs(x + 2 * Math.log10(roughness / 3.7 + (2.51 * x) / Re))).toBeLessThan(1e-13);
			});
		expect(() => frictionFactor({ reynolds: 1e5, relativeRoughness: 1.01 })).toThrow(OutOfRangeError);
		expect(() => frictionFactor({ reynolds: 1e5, relativeRoughness: -0.01 })).toThrow(OutOfRangeError);
	});
});

describe('friction between laminar and turbulent flow', () => {
	const laminars = [56.918, 64, 96];

	it('lets the loss rise with the flow from 1900 to 4200', () => {
		for (const laminar of laminars)
			for (const relativeRoughness of ROUGHNESSES) {
				let before = 0;
				for (let reynolds = 1_900; reynolds <= 4_200; reynolds += 1) {
					const loss = frictionFactor({ reynolds, relativeRoughness, laminar }) * reynolds * reynolds;
					expect(loss, `Re ${reynolds}, eps/D ${relativeRoughness}, f Re ${laminar}`).toBeGreaterThan(before);
					before = loss;
				}
			}
	});

	it.each([2_000, 4_000])('is continuous at %d, in value and in slope', (edge) => {
		for (const laminar of laminars)
			for (const relativeRoughness of ROUGHNESSES) {
				const f = (reynolds: number) => frictionFactor({ reynolds, relativeRoughness, laminar });
				const h = edge * 1e-6;
				expect(f(edge + h) / f(edge - h)).toBeCloseTo(1, 5);
				const below = (f(edge - h) - f(edge - 2 * h)) / f(edge);
				const above = (f(edge + 2 * h) - f(edge + h)) / f(edge);
				expect(Math.abs(above - below)).toBeLessThan(1e-9);
			}
	});

	it('names the regime', () => {
		expect([1_999.9, 2_000, 4_000, 4_000.1].map(regime)).toEqual(['laminar', 'transition', 'transition', 'turbulent']);
	});

	it('refuses a Reynolds number that is not positive', () => {
		for (const reynolds of [0, -1, NaN, Infinity])
			expect(() => frictionFactor({ reynolds, relativeRoughness: 0 })).toThrow(OutOfRangeError);
	});
});

describe('a straight duct', () => {
	const positive = (min: number, max: number) => fc.double({ min, max, noNaN: true });

	it('loses more with more flow and with more roughness, less with a larger diameter', () => {
		fc.assert(
			fc.property(positive(0.001, 20), positive(0.08, 2), positive(0, 0.003), (Q, D, eps) => {
				const loss = (q: number, d: number, e: number) => straightDuct(q, d, e, 1, 1.2, 1.8e-5).dp;
				expect(loss(Q * 1.01, D, eps)).toBeGreaterThan(loss(Q, D, eps));
				expect(loss(Q, D * 1.01, eps)).toBeLessThan(loss(Q, D, eps));
				expect(loss(Q, D, eps + 1e-4)).toBeGreaterThanOrEqual(loss(Q, D, eps));
			})
		);
	});

	it('loses f velocity pressures over one hydraulic diameter', () => {
		expect(darcyWeisbach(0.02, 0.3, 0.3, 1.2, 5)).toBeCloseTo(0.02 * velocityPressure(1.2, 5), 14);
	});
});

describe('materials', () => {
	it('have keys of their own, a positive roughness and a source', () => {
		expect(new Set(materials.map((one) => one.key)).size).toBe(materials.length);
		for (const one of materials) {
			expect(one.roughness).toBeGreaterThan(0);
			expect(one.source.length).toBeGreaterThan(10);
		}
	});

	it('have a design value within the range, and the range of the table in feet', () => {
		for (const { key, low, roughness, high } of materials) {
			expect(low, key).toBeLessThanOrEqual(roughness);
			expect(roughness, key).toBeLessThanOrEqual(high);
		}
		const inFeet = (key: string) =>
			[findMaterial(key)?.low ?? NaN, findMaterial(key)?.high ?? NaN].map((m) => m / FOOT);
		const printed: readonly (readonly [string, number, number])[] = [
			['galvanized-steel', 0.00016, 0.00032],
			['galvanized-steel-spiral', 0.0002, 0.0004],
			['galvanized-steel-spiral-ribbed', 0.00029, 0.00038],
			['galvanized-steel-rectangular', 0.00027, 0.0005],
			['steel-corrugated', 0.0018, 0.003],
			['aluminium', 0.00012, 0.0002],
			['plastic', 0.00003, 0.00015],
			['flexible-extended', 0.0003, 0.003]
		];
		// Rounded to thousandths of a millimetre.
		for (const [key, low, high] of printed) {
			expect(Math.abs((inFeet(key)[0] ?? NaN) - low), key).toBeLessThan(5e-6);
			expect(Math.abs((inFeet(key)[1] ?? NaN) - high), key).toBeLessThan(5e-6);
		}
	});

	it('say of what is remembered that it is, and which are lined', () => {
		for (const { known, source } of materials) expect(source.includes('from memory')).toBe(known === 'from memory');
		expect(materials.filter(({ lined }) => lined).map(({ key }) => key)).toEqual(['liner-coated', 'liner-uncoated']);
	});

	it('start from galvanised steel of 0.09 mm', () => {
		expect(findMaterial(DEFAULT_MATERIAL)?.roughness).toBeCloseTo(0.00009, 12);
		expect(findMaterial('constructor')).toBeNull();
	});
});
