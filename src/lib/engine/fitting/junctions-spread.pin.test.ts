// Figures read off our own sweeps: how far published formulas differ, and where they make energy. A change of them is to
// be seen, not to be believed.
import { describe, expect, it } from 'vitest';
import {
	branchConvergingIdelchik,
	branchDivergingIdelchik,
	straightConvergingGeneralIdelchik,
	straightConvergingIdelchik,
	straightDivergingIdelchik
} from './junction-idelchik';
import {
	branchConvergingGardel1957,
	branchDivergingBassett2001,
	branchDivergingGardel1957,
	straightConvergingGardel1957,
	straightDivergingBassett2001,
	straightDivergingGardel1957
} from './junction-rivals';
import { weightedLoss, type Branching } from './junction-stream';

/** 0, 0.01 … 1 and 0.10, 0.11 … 1. */
const flows = Array.from({ length: 101 }, (_, i) => i / 100);
const areas = Array.from({ length: 91 }, (_, i) => (i + 10) / 100);

/** Least loss of both streams together over the range, and where. */
function leastLoss(direction: Branching['direction'], angle: number, straight: (a: number) => number) {
	const least = { loss: Infinity, q: NaN, a: NaN };
	for (const a of areas)
		for (const q of flows) {
			const s = straight(a);
			if (s < 0.1) continue;
			const loss = weightedLoss({ direction, q, a, s, angle, heightRatio: Math.sqrt(a) });
			if (loss < least.loss) Object.assign(least, { loss, q, a });
		}
	return least;
}

describe('both streams together, by formulas as published', () => {
	it('gain up to 0.022 at 15° and 0.010 at 20° where the stream divides, Qb/Qc 0.36, Ab/Ac 0.44', () => {
		const narrow = leastLoss('diverging', 15, () => 1);
		expect(narrow).toMatchObject({ q: 0.36, a: 0.44 });
		expect(narrow.loss).toBeLessThan(-0.02);
		expect(narrow.loss).toBeGreaterThan(-0.022);
		const twenty = leastLoss('diverging', 20, () => 1);
		expect(twenty.loss).toBeLessThan(0);
		expect(twenty.loss).toBeGreaterThan(-0.01);
	});

	it.each([
		[15, 0.041],
		[30, 0.023],
		[45, 0.0062],
		[60, 0],
		[90, 0]
	])('at %d° gain at most %d by Bassett, where branch and straight leg are nearly in line', (angle, gain) => {
		for (const a of areas)
			for (const q of flows) {
				const loss = q * branchDivergingBassett2001(q, a, angle) + (1 - q) * straightDivergingBassett2001(q);
				expect(loss, `q ${q}, a ${a}`).toBeGreaterThanOrEqual(-gain - 1e-12);
			}
	});
});

describe('the spread between methods', () => {
	const spread = (one: (q: number) => number, other: (q: number) => number, of = flows): number =>
		Math.max(...of.map((q) => Math.abs(one(q) - other(q))));

	// The limits in the titles are the greatest differences found, rounded up; the literature speaks of 0.2 to 0.3.
	const equalDividing = (q: number) => branchDivergingIdelchik(q, 1, 90, 1);
	const inner = flows.filter((q) => q >= 0.1 && q <= 0.9);

	it.each([
		{ leg: 'branch, uniting', one: branchConvergingIdelchik, other: branchConvergingGardel1957, limit: 0.22 },
		{ leg: 'straight, uniting', one: straightConvergingIdelchik, other: straightConvergingGardel1957, limit: 0.12 },
		{ leg: 'branch, dividing', one: equalDividing, other: branchDivergingGardel1957, limit: 0.32 },
		{ leg: 'straight, dividing', one: straightDivergingIdelchik, other: straightDivergingGardel1957, limit: 0.09 }
	])('Idelchik and Gardel, equal legs at 90°, Qb/Qc 0.1 to 0.9: $leg within $limit', ({ one, other, limit }) => {
		const found = spread((q) => one(q, 1, 90), other, inner);
		expect(found).toBeLessThanOrEqual(limit);
		expect(found).toBeGreaterThan(limit - 0.02);
	});

	it.each([
		{ angle: 45, a: 1, limit: 0.05 },
		{ angle: 60, a: 0.5, limit: 0.13 },
		{ angle: 60, a: 0.3, limit: 0.32 },
		{ angle: 90, a: 1, limit: 0.21 },
		{ angle: 90, a: 0.3, limit: 0.93 }
	])(
		'Idelchik and Bassett, branch, dividing, $angle°, Ab/Ac $a, Vb/Vc to 1.2: within $limit',
		({ angle, a, limit }) => {
			const found = spread(
				(q) => branchDivergingIdelchik(q, a, angle, Math.sqrt(a)),
				(q) => branchDivergingBassett2001(q, a, angle),
				inner.filter((q) => q <= 1.2 * a)
			);
			expect(found).toBeLessThanOrEqual(limit);
			expect(found).toBeGreaterThan(limit - 0.02);
		}
	);

	it('Idelchik and Bassett, straight leg, dividing: within 0.17', () => {
		const found = spread((q) => straightDivergingIdelchik(q, 1), straightDivergingBassett2001, inner);
		expect(found).toBeLessThanOrEqual(0.17);
	});

	it('the diagrams and the general equation of Idelchik, straight leg, uniting, Ab/Ac 1: within 0.21', () => {
		for (const angle of [30, 45, 60, 90])
			expect(
				spread(
					(q) => straightConvergingIdelchik(q, 1, angle),
					(q) => straightConvergingGeneralIdelchik(q, 1, angle),
					inner
				)
			).toBeLessThanOrEqual(0.21);
	});
});
