import { describe, expect, it } from 'vitest';
import { branchConvergingCrane2009, branchDivergingCrane2009, straightConvergingCrane2009 } from './junction-crane';
import { branchConvergingIdelchik, branchDivergingIdelchik, straightConvergingIdelchik } from './junction-idelchik';
import { conicalTakeOffOblique, conicalTakeOffSquare } from './junction-tables';

/** 0, 0.01 … 1 and 0.10, 0.11 … 1. */
const flows = Array.from({ length: 101 }, (_, i) => i / 100);
const areas = Array.from({ length: 91 }, (_, i) => (i + 10) / 100);

describe('methods beside one another', () => {
	const spread = (one: (q: number) => number, other: (q: number) => number, of = flows): number =>
		Math.max(...of.map((q) => Math.abs(one(q) - other(q))));

	it('Crane is Idelchik where the stream divides, to the last figures', () => {
		for (const angle of [30, 45, 60, 75])
			for (const a of areas)
				expect(
					spread(
						(q) => branchDivergingCrane2009(q, a, angle),
						(q) => branchDivergingIdelchik(q, a, angle, 1)
					)
				).toBeLessThan(1e-9);
		for (const a of areas.filter((one) => one <= 4 / 9))
			expect(
				spread(
					(q) => branchDivergingCrane2009(q, a, 90),
					(q) => branchDivergingIdelchik(q, a, 90, Math.sqrt(a))
				)
			).toBeLessThan(1e-9);
	});

	it('Crane is Idelchik where streams unite, but for the printed 1.74 and 1.41: 0.008 q^2/a at most', () => {
		for (const a of areas)
			for (const q of flows)
				for (const [angle, F] of [
					[30, 1.74],
					[45, 1.41],
					[60, 1],
					[90, 0]
				] as const) {
					const allowed = (Math.abs(F - 2 * Math.cos((angle * Math.PI) / 180)) * q * q) / a + 1e-9;
					for (const [one, other] of [
						[branchConvergingCrane2009, branchConvergingIdelchik],
						[straightConvergingCrane2009, straightConvergingIdelchik]
					] as const)
						expect(Math.abs(one(q, a, angle) - other(q, a, angle))).toBeLessThanOrEqual(allowed);
				}
	});

	it('a conical branch loses less than a sharp one once the stream turns into it', () => {
		for (const a of [0.2, 0.5, 1])
			for (const x of [0.4, 0.6, 0.8, 1, 1.2]) {
				const sharp = (angle: number) => branchDivergingIdelchik(x * a, a, angle, Math.sqrt(a));
				expect(conicalTakeOffSquare(x)).toBeLessThan(sharp(90));
				if (x > 0.6) expect(conicalTakeOffOblique(x)).toBeLessThan(sharp(45));
				expect(conicalTakeOffOblique(x)).toBeLessThan(conicalTakeOffSquare(x));
			}
	});
});
