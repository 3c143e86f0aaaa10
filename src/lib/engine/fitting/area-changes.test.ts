import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import published from '../../../../fixtures/published/area-changes.json';
import { describePublished, type Given } from '../../../../fixtures/published/published-checks';
import {
	conicalContractionIdelchik,
	conicalExpansionIdelchik,
	suddenContractionIdelchik,
	suddenExpansion
} from './area-change-idelchik';
import { conicalContractionRennels2012, conicalExpansionRennels2012 } from './area-change-rennels';
import { coefficientOfLeg, coefficientOnLeg } from './reference-change';

const angle = (given: Given) => given.number('included_angle');

function areaRatioOf(given: Given): number {
	const ratio = given.number('D1') / given.number('D2');
	return ratio < 1 ? ratio * ratio : 1 / (ratio * ratio);
}

describePublished('area changes against published values', published, {
	'fitting.sudden-expansion': (given) => suddenExpansion(given.number('A1_over_A2')),
	'fitting.sudden-contraction': (given) => suddenContractionIdelchik(given.number('A_small_over_A_large')),
	'fitting.conical-expansion.idelchik': (given) =>
		conicalExpansionIdelchik(angle(given), 1 / given.number('A2_over_A1')),
	'fitting.conical-expansion.rennels': (given) =>
		conicalExpansionRennels2012(angle(given), areaRatioOf(given), given.number('fd')),
	'fitting.conical-contraction.idelchik': (given) =>
		conicalContractionIdelchik(angle(given), given.number('A2_over_A1_small_over_large')),
	'fitting.conical-contraction.rennels': (given) =>
		conicalContractionRennels2012(angle(given), areaRatioOf(given), given.number('fd')),
	'fitting.reference-change': (given) =>
		coefficientOnLeg(given.number('C_on_branch_pv'), given.number('V_branch'), given.number('V_common'))
});

const ratio = fc.double({ min: 0.05, max: 0.95, noNaN: true });

describe('area changes', () => {
	it('lose nothing when the areas are equal', () => {
		expect(suddenExpansion(1)).toBe(0);
		expect(suddenContractionIdelchik(1)).toBe(0);
		expect(conicalExpansionIdelchik(30, 1)).toBe(0);
		expect(conicalContractionIdelchik(30, 1)).toBe(0);
	});

	it('lose less the nearer the areas', () => {
		fc.assert(
			fc.property(ratio, (a) => {
				expect(suddenExpansion(a + 0.05)).toBeLessThan(suddenExpansion(a));
				expect(suddenContractionIdelchik(a + 0.05)).toBeLessThan(suddenContractionIdelchik(a));
				expect(conicalExpansionIdelchik(30, a + 0.05)).toBeLessThan(conicalExpansionIdelchik(30, a));
			})
		);
	});

	it('are sudden from 90° on, without a jump on the way', () => {
		fc.assert(
			fc.property(ratio, fc.double({ min: 3, max: 179, noNaN: true }), (a, d) => {
				const step = conicalExpansionIdelchik(d + 0.01, a) - conicalExpansionIdelchik(d, a);
				expect(Math.abs(step)).toBeLessThan(1e-3);
				expect(conicalExpansionIdelchik(90 + d / 2, a)).toBe(suddenExpansion(a));
			})
		);
	});

	it('have a contraction that never gains', () => {
		fc.assert(
			fc.property(ratio, fc.double({ min: 3, max: 180, noNaN: true }), (a, d) => {
				expect(conicalContractionIdelchik(d, a)).toBeGreaterThan(0);
			})
		);
	});

	it('lose the same pressure on either leg', () => {
		fc.assert(
			fc.property(ratio, (a) => {
				const onLarger = coefficientOfLeg(0.3, a, 'larger');
				// V in the larger leg is a times that in the smaller: C pv is one and the same.
				expect(onLarger * a * a).toBeCloseTo(coefficientOfLeg(0.3, a, 'smaller'), 12);
				expect(coefficientOnLeg(0.3, 1, a)).toBeCloseTo(onLarger, 8);
			})
		);
	});
});
