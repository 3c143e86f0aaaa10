// Losses by the points of a maker, filters, and the effective duct length after a fan.
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { OutOfRangeError } from '../errors';
import { coefficientOf } from './coefficient-of';
import { lossFromPoints, powerLawFit, type LossPoint } from './equipment-loss';
import { filterLoss } from './filter-loss';
import { ratedLoss } from './rated-loss';
import { effectiveDuctLength } from './system-effect';

const figure = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const curve: readonly LossPoint[] = [
	[0.5, 20],
	[1, 70],
	[2, 250]
];
/** Rising points with a loss that does not fall. */
const anyCurve = fc.array(fc.tuple(figure(1.05, 3), figure(1, 8)), { minLength: 1, maxLength: 6 }).map((steps) => {
	let [flow, loss] = [0.1, 5];
	return steps.map(([a, b]) => [(flow *= a), (loss *= b)] as const);
});

describe('the loss by the points of a maker', () => {
	it('goes through every point, in whatever order they are given', () => {
		fc.assert(
			fc.property(anyCurve, (points) => {
				for (const [flow, loss] of points) {
					const found = lossFromPoints([...points].reverse(), flow);
					expect(Math.abs(found.loss / loss - 1)).toBeLessThan(1e-12);
					expect(found.note).toBeNull();
				}
			})
		);
	});

	it('is a power law wherever the points are one, and beyond them too', () => {
		fc.assert(
			fc.property(figure(0.5, 2.5), figure(0.01, 100), (n, Q) => {
				const points = [0.2, 0.7, 3].map((flow) => [flow, ratedLoss(40, 1, flow, n)] as const);
				const found = lossFromPoints(points, Q);
				expect(found.exponent).toBeCloseTo(n, 9);
				expect(found.loss / ratedLoss(40, 1, Q, n)).toBeCloseTo(1, 9);
			})
		);
	});

	it('never falls as the flow rises', () => {
		fc.assert(
			fc.property(anyCurve, figure(0, 50), figure(1, 3), (points, Q, more) => {
				const less = lossFromPoints(points, Q).loss;
				expect(lossFromPoints(points, Q * more).loss).toBeGreaterThanOrEqual(less * (1 - 1e-12));
			})
		);
	});

	it('says where the points do not reach', () => {
		expect(lossFromPoints(curve, 0.4).note).toContain('below');
		expect(lossFromPoints(curve, 2.1).note).toContain('beyond');
		expect(lossFromPoints([[1, 50]], 2)).toMatchObject({ loss: 200, exponent: 2 });
		expect(lossFromPoints([[1, 50]], 2).note).toContain('square');
		expect(lossFromPoints(curve, 0)).toMatchObject({ loss: 0 });
	});

	it.each([
		['no points', []],
		['a flow of nothing', [[0, 10]]],
		['a loss of nothing', [[1, 0]]],
		[
			'two points at one flow',
			[
				[1, 10],
				[1, 20]
			]
		],
		[
			'a loss that falls',
			[
				[1, 20],
				[2, 10]
			]
		],
		['a figure that is none', [[NaN, 10]]]
	] as [string, LossPoint[]][])('refuses %s', (_what, points) => {
		expect(() => lossFromPoints(points, 1)).toThrow(OutOfRangeError);
		expect(() => powerLawFit(points)).toThrow(OutOfRangeError);
	});

	it('refuses a flow that goes backward', () => {
		expect(() => lossFromPoints(curve, -1)).toThrow(OutOfRangeError);
	});
});

describe('the power law of a maker’s points', () => {
	it('comes back from points that follow one', () => {
		fc.assert(
			fc.property(figure(0.5, 2.5), figure(1, 500), (n, k) => {
				const law = powerLawFit([0.3, 0.5, 1.1, 2].map((Q) => [Q, ratedLoss(k, 1, Q, n)] as const));
				expect(law.exponent).toBeCloseTo(n, 9);
				expect(ratedLoss(law.loss, law.flow, 1, law.exponent) / k).toBeCloseTo(1, 9);
				expect(law.departure).toBeLessThan(1e-9);
			})
		);
	});

	// Four points 5 % above and below the square law, in turn at the ends and in the middle: the errors cancel
	it('takes the middle between errors that cancel, and tells them', () => {
		const points = [1, 2, 4, 8].map((Q, i) => [Q, Q * Q * (i === 0 || i === 3 ? 1.05 : 1 / 1.05)] as const);
		const law = powerLawFit(points);
		expect(law.exponent).toBeCloseTo(2, 12);
		expect(law.loss).toBeCloseTo(law.flow * law.flow, 10);
		expect(law.departure).toBeCloseTo(0.05, 10);
	});

	it('is the square law for one point', () => {
		expect(powerLawFit([[2, 50]])).toMatchObject({ exponent: 2, departure: 0 });
	});
});

describe('the loss of a filter', () => {
	const filter = { clean: 80, final: 200, atFlow: 1, exponent: 1.4 } as const;

	it('is clean, half-way or final at its flow, and goes with the flow', () => {
		expect(filterLoss({ ...filter, state: 'clean' }, 1)).toBe(80);
		expect(filterLoss({ ...filter, state: 'mean' }, 1)).toBe(140);
		expect(filterLoss({ ...filter, state: 'dirty' }, 1)).toBe(200);
		expect(filterLoss({ ...filter, state: 'mean' }, 2)).toBeCloseTo(140 * 2 ** 1.4, 10);
	});

	it('refuses a final loss below the clean one, and a rated flow of nothing', () => {
		expect(() => filterLoss({ ...filter, final: 70, state: 'clean' }, 1)).toThrow(OutOfRangeError);
		expect(() => filterLoss({ ...filter, atFlow: 0, state: 'clean' }, 1)).toThrow(OutOfRangeError);
		expect(() => filterLoss({ ...filter, state: 'clean' }, -1)).toThrow(OutOfRangeError);
	});
});

describe('the system effect of a fan', () => {
	const row = (velocity: number) => ({
		size: { shape: 'round', diameter: 0.5 } as const,
		...{ reynolds: 3e5, velocity, relativeRoughness: 0.0002, frictionFactor: 0.017 }
	});

	// AMCA 201, from memory: 2.5 diameters to 2500 fpm, one more for every 1000 fpm; 1 fpm = 0.00508 m/s
	it('asks for 2.5 diameters to 2500 fpm, for 3.5 at 3500 and for 5 at 5000', () => {
		expect(effectiveDuctLength(5)).toBe(2.5);
		expect(effectiveDuctLength(2500 * 0.00508)).toBeCloseTo(2.5, 12);
		expect(effectiveDuctLength(3500 * 0.00508)).toBeCloseTo(3.5, 12);
		expect(effectiveDuctLength(5000 * 0.00508)).toBeCloseTo(5, 12);
	});

	it('takes the K that is entered, and says what the straight duct tells of it', () => {
		const outlet = (parameters: Record<string, number>, V = 8) =>
			coefficientOf('fan-outlet-effect', parameters, row(V));
		expect(outlet({ coefficient: 0.8 })).toMatchObject({ coefficient: 0.8, rangeNote: null });
		expect(outlet({ coefficient: 0.8, straight: 1.3 }).rangeNote).toContain('no system effect is to be expected');
		expect(outlet({ straight: 1.3 }).rangeNote).toBeNull();
		expect(outlet({ straight: 1.3 }, 20).rangeNote).toContain('effective duct length is 2 m');
		expect(coefficientOf('fan-inlet-effect', { coefficient: 1.2 }, row(8))).toMatchObject({ coefficient: 1.2 });
	});
});
