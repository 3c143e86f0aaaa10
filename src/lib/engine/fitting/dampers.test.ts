import { describe, expect, it } from 'vitest';
import published from '../../../../fixtures/published/dampers.json';
import { describePublished } from '../../../../fixtures/published/published-checks';
import { coefficientOf } from './coefficient-of';
import { REFERENCE_VELOCITY, openBladeDamper, openDamperCoefficient } from './damper-open';
import { bladeDamper, butterflyDamper, gateDamper } from './damper-tables';
import { damperChecks } from '../published/dampers';

describePublished('dampers against published values', published, damperChecks);

describe('dampers', () => {
	it('lose more the more they close', () => {
		for (let d = 0; d < 60; d += 1)
			for (const section of ['round', 'rectangular'] as const)
				expect(butterflyDamper(d + 1, section)).toBeGreaterThan(butterflyDamper(d, section));
		for (let d = 0; d < 80; d += 1)
			for (const blades of ['parallel', 'opposed'] as const)
				expect(bladeDamper(d + 1, blades)).toBeGreaterThan(bladeDamper(d, blades));
	});

	it('fully open lose alike on either side of a free-area ratio of 0.5', () => {
		const loss = (freeRatio: number) => {
			const Ad = 0.5;
			const free = openBladeDamper('parallel', Ad, Ad, 5.08).freeRatio;
			return openBladeDamper('parallel', Ad, (free * Ad) / freeRatio, 5.08).loss;
		};
		expect(loss(0.4999) / loss(0.5001)).toBeCloseTo(1, 2);
	});

	it('lose more with opposed blades once they close', () => {
		for (let d = 10; d <= 80; d += 5) expect(bladeDamper(d, 'opposed')).toBeGreaterThan(bladeDamper(d, 'parallel'));
	});

	it('take the geometric mean half-way between two points of the table', () => {
		expect(butterflyDamper(35, 'round')).toBeCloseTo(Math.sqrt(4.5 * 11), 10);
	});

	// The published loss of the open damper over its velocity pressure, standard air of 0.075 lb/ft3
	it('fully open have the coefficient that gives the published loss', () => {
		const V = 9.45 / 1.69;
		const damper = openBladeDamper('parallel', 1.5, 1.69, REFERENCE_VELOCITY);
		expect(openDamperCoefficient(damper) * 0.5 * 1.2014 * V * V).toBeCloseTo(11.89, 1);
	});

	it('of gates lose more the more they close, and nothing when they are drawn', () => {
		for (const section of ['round', 'rectangular'] as const) {
			for (let o = 0.2; o < 0.99; o += 0.01) expect(gateDamper(o + 0.01, section)).toBeLessThan(gateDamper(o, section));
			expect(gateDamper(1, section)).toBe(0);
		}
	});

	it('against fire lose within the ranges as remembered, more with the curtain in the airstream', () => {
		const row = { size: { shape: 'rectangular', width: 0.5, height: 0.5 }, velocity: 6, reynolds: 2e5 } as const;
		const C = (curtain: string) =>
			coefficientOf('damper-fire-curtain', { curtain }, { ...row, relativeRoughness: 0, frictionFactor: 0.016 })
				.coefficient;
		expect(C('out')).toBeGreaterThanOrEqual(0.12);
		expect(C('out')).toBeLessThanOrEqual(0.2);
		expect(C('in')).toBeGreaterThanOrEqual(0.2);
		expect(C('in')).toBeLessThanOrEqual(0.8);
	});
});
