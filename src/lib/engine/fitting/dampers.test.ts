import { describe, expect, it } from 'vitest';
import published from '../../../../fixtures/published/dampers.json';
import { describePublished } from '../../../../fixtures/published/published-checks';
import { openBladeDamper } from './damper-open';
import { bladeDamper, butterflyDamper } from './damper-tables';

describePublished('dampers against published values', published, {
	'fitting.damper-butterfly': (given) =>
		butterflyDamper(given.number('closed_angle'), given.text('shape') === 'round' ? 'round' : 'rectangular'),
	'fitting.damper-multiblade-open': (given) => {
		const Au = given.number('duct_m2');
		const V = given.number('Q_m3s') / Au;
		const blades = given.text('blades') === 'parallel' ? 'parallel' : 'opposed';
		const { freeRatio, loss } = openBladeDamper(blades, given.number('damper_m2'), Au, V);
		return { free_ratio: freeRatio, V_m_s: V, dp_Pa: loss };
	}
});

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
});
