import { describe, expect, it } from 'vitest';
import { describePublished } from '../../../../fixtures/published/published-checks';
import published from '../../../../fixtures/published/screens.json';
import { obstructionIdelchik, thickPlateIdelchik, thinPlateIdelchik, wireScreenIdelchik } from './screen-formulas';

describePublished('screens and plates against published values', published, {
	'fitting.screen-wire': (given) => wireScreenIdelchik(given.number('free_area_ratio')),
	'fitting.orifice-perforated-plate': (given) =>
		thickPlateIdelchik(given.number('free_area_ratio'), given.number('l_over_d'), given.number('lambda')),
	'fitting.perforated-plate-thin': (given) => thinPlateIdelchik(given.number('free_area_ratio')),
	'fitting.obstruction': (given) =>
		obstructionIdelchik(given.number('Sm_over_A'), given.number('Cx'), given.number('tau'))
});

describe('screens and plates', () => {
	it('lose less the more open they are', () => {
		for (let f = 0.1; f < 0.95; f += 0.05) {
			expect(wireScreenIdelchik(f + 0.05)).toBeLessThan(wireScreenIdelchik(f));
			expect(thinPlateIdelchik(f + 0.05)).toBeLessThan(thinPlateIdelchik(f));
			expect(thickPlateIdelchik(f + 0.05, 1, 0.02)).toBeLessThan(thickPlateIdelchik(f, 1, 0.02));
		}
	});

	it('lose nothing when all is open', () => {
		expect(wireScreenIdelchik(1)).toBe(0);
		expect(thinPlateIdelchik(1)).toBe(0);
		expect(thickPlateIdelchik(1, 0, 0.02)).toBe(0);
	});
});
