import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import published from '../../../../fixtures/published/area-changes.json';
import { describePublished } from '../../../../fixtures/published/published-checks';
import {
	conicalContractionIdelchik,
	conicalExpansionIdelchik,
	suddenContractionIdelchik,
	suddenExpansion
} from './area-change-idelchik';
import { conicalContractionRennels2012, conicalExpansionRennels2012 } from './area-change-rennels';
import { coefficientOfLeg, coefficientOnLeg } from './reference-change';
import { areaChangeChecks } from '../published/area-changes';

describePublished('area changes against published values', published, areaChangeChecks);

describe('cones by Rennels & Hudson against the worked values of the fluids package', () => {
	it.each([
		[0.1, 10, 0.02, 0.12301652230915454],
		[1 / 9, 50, 0.03, 0.8081340270019336],
		[4 / 9, 40, 0.03, 0.32533470783539786],
		[1 / 9, 120, 0.0185, 0.812308728765127],
		[4 / 9, 120, 0.0185, 0.3282650135070033]
	])('expansion of area ratio %d, %d°, f %d: %d', (a, d, f, K) => {
		expect(conicalExpansionRennels2012(d, a, f)).toBeCloseTo(K, 10);
	});

	// A cone from 0.1 m to 0.04 m over 0.04 m
	it('contraction from 0.1 m to 0.04 m over 0.04 m: 0.15779', () => {
		const d = (2 * Math.atan(0.75) * 180) / Math.PI;
		expect(conicalContractionRennels2012(d, 0.16, 0.0185)).toBeCloseTo(0.15779041548350314, 10);
	});
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
