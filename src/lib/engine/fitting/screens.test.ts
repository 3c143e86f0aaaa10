import { describe, expect, it } from 'vitest';
import { describePublished } from '../../../../fixtures/published/published-checks';
import published from '../../../../fixtures/published/screens.json';
import { thickPlateIdelchik, thinPlateIdelchik, wireScreenIdelchik } from './screen-formulas';
import { screenChecks } from '../published/screens';

describePublished('screens and plates against published values', published, screenChecks);

describe('screens and plates', () => {
	it('lose less the more open they are', () => {
		for (let f = 0.1; f < 0.95; f += 0.05) {
			expect(wireScreenIdelchik(f + 0.05)).toBeLessThan(wireScreenIdelchik(f));
			expect(thinPlateIdelchik(f + 0.05)).toBeLessThan(thinPlateIdelchik(f));
			expect(thickPlateIdelchik(f + 0.05, 1, 0.02)).toBeLessThan(thickPlateIdelchik(f, 1, 0.02));
		}
	});

	// Idelchik, Handbook of Hydraulic Resistance, diagram 4-12: tau 1.35 at l/d 0, 0.24 at 1, 0 at 2.4 (from memory)
	it.each([
		[0, 1.35],
		[1, 0.24],
		[2.4, 0]
	])('have at l/d %d the thickness factor tau %d of Idelchik 4-12', (l, tau) => {
		const others = 0.5 * 0.5 ** 0.75 + 0.25;
		expect((thickPlateIdelchik(0.5, l, 0) * 0.25 - others) / 0.5 ** 1.375).toBeCloseTo(tau, 2);
	});

	it('lose nothing when all is open', () => {
		expect(wireScreenIdelchik(1)).toBe(0);
		expect(thinPlateIdelchik(1)).toBe(0);
		expect(thickPlateIdelchik(1, 0, 0.02)).toBe(0);
	});
});
