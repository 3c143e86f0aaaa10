import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import published from '../../../../fixtures/published/elbows.json';
import { describePublished } from '../../../../fixtures/published/published-checks';
import { OutOfRangeError } from '../errors';
import { bendAspectFactorIdelchik, bendIdelchik, bendReynoldsFactorIdelchik } from './bend-idelchik';
import { bendIto1960 } from './bend-rivals';
import { elbowAngleFactorSmacna, rectangularElbowSmacna, roundElbowSmacna, segmentedElbowSmacna } from './elbow-tables';
import { mitreAspectFactorIdelchik, mitreIdelchik } from './mitre-idelchik';
import { rectangularMitreSmacna, roundMitreSmacna } from './mitre-tables';
import { elbowChecks } from '../published/elbows';

describePublished('elbows against published values', published, elbowChecks);

describe('the closed form of mitred elbows', () => {
	// SMACNA, HVAC Systems Duct Design, 4th ed. (2006), table A-7, printed to two figures
	it('gives every value of the SMACNA table A-7 to its rounding', () => {
		for (const d of [20, 30, 45, 60, 75, 90]) {
			expect(Math.abs(mitreIdelchik(d) - roundMitreSmacna(d))).toBeLessThanOrEqual(d === 90 ? 0.05 : 0.0075);
			for (const ratio of [0.25, 0.5, 0.75, 1, 1.5, 2, 4, 6, 8]) {
				const table = rectangularMitreSmacna(d, ratio);
				const form = mitreIdelchik(d) * mitreAspectFactorIdelchik(ratio);
				expect(Math.abs(form - table), `${d}°, H/W ${ratio}`).toBeLessThanOrEqual(table >= 1 ? 0.05 : 0.0125);
			}
		}
	});
});

describe('the angle factor of smooth bends', () => {
	// Two sources: Idelchik, diagram 6-1, and SMACNA, table A-7, printed to two decimals
	it('is that of the SMACNA table A-7 beyond 100°', () => {
		for (const d of [110, 130, 150, 180])
			expect(Math.abs(bendIdelchik(d, 1) / 0.21 - elbowAngleFactorSmacna(d)), `${d}°`).toBeLessThanOrEqual(0.006);
	});
});

describe('the method of Ito', () => {
	it('refuses what flows too slowly for a turbulent bend', () => {
		expect(() => bendIto1960(10, 30_000, 90)).toThrow(OutOfRangeError);
	});
});

describe('the closed form of rectangular bends', () => {
	it('lies within 15 % of the SMACNA table from r/W 0.5 to 2', () => {
		for (const R of [0.5, 1, 1.5, 2])
			for (const ratio of [0.25, 0.5, 1, 2, 4, 8]) {
				const form = bendIdelchik(90, R) * bendAspectFactorIdelchik(ratio);
				expect(Math.abs(form / rectangularElbowSmacna(R, ratio) - 1), `r/W ${R}, H/W ${ratio}`).toBeLessThan(0.15);
			}
	});
});

describe('elbows', () => {
	const radius = fc.double({ min: 0.5, max: 3, noNaN: true });
	const turn = fc.double({ min: 20, max: 89, noNaN: true });

	it('lose more the more they turn', () => {
		fc.assert(
			fc.property(radius, turn, (R, d) => {
				expect(bendIdelchik(d + 1, R)).toBeGreaterThan(bendIdelchik(d, R));
				expect(mitreIdelchik(d + 1)).toBeGreaterThan(mitreIdelchik(d));
				expect(roundElbowSmacna(R, d + 1)).toBeGreaterThan(roundElbowSmacna(R, d));
			})
		);
	});

	it('lose less with a larger radius', () => {
		fc.assert(
			fc.property(radius, (R) => {
				expect(bendIdelchik(90, R + 0.05)).toBeLessThan(bendIdelchik(90, R));
				expect(roundElbowSmacna(R + 0.05, 90)).toBeLessThanOrEqual(roundElbowSmacna(R, 90));
			})
		);
	});

	it('of more pieces lose less', () => {
		fc.assert(
			fc.property(fc.double({ min: 0.75, max: 2, noNaN: true }), (R) => {
				expect(segmentedElbowSmacna(4, R, 90)).toBeLessThan(segmentedElbowSmacna(3, R, 90));
				expect(segmentedElbowSmacna(5, R, 90)).toBeLessThan(segmentedElbowSmacna(4, R, 90));
			})
		);
	});

	it('have a Reynolds factor that is never below 1, never rises, and meets 1', () => {
		fc.assert(
			fc.property(radius, fc.double({ min: 1e4, max: 1e7, noNaN: true }), (R, Re) => {
				expect(bendReynoldsFactorIdelchik(R, Re)).toBeGreaterThanOrEqual(1);
				expect(bendReynoldsFactorIdelchik(R, Re * 1.1)).toBeLessThanOrEqual(bendReynoldsFactorIdelchik(R, Re));
				if (R >= 0.7 && Re > 3.9e5) expect(bendReynoldsFactorIdelchik(R, Re)).toBe(1);
				if (R >= 0.55 && Re > 1.8e6) expect(bendReynoldsFactorIdelchik(R, Re)).toBe(1);
			})
		);
	});
});
