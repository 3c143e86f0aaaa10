import { describe, expect, it } from 'vitest';
import {
	branchConvergingGardel1957,
	branchDivergingGardel1957,
	straightConvergingGardel1957,
	straightDivergingGardel1957
} from './junction-rivals';
import { bullheadConvergingIdelchik, bullheadDivergingIdelchik, crossBranch, crossStraight } from './junction-several';
import { weightedLoss, type Branching } from './junction-stream';

const DIRECTIONS = ['diverging', 'converging'] as const;
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

describe('both streams of a junction together', () => {
	const forms = {
		'straight leg as wide as the common one': () => 1,
		'areas adding up': (a: number) => 1 - a,
		'areas between': (a: number) => 1 - a / 2
	};
	for (const direction of DIRECTIONS)
		for (const [form, straight] of Object.entries(forms))
			it(`make no energy by Idelchik: ${direction}, ${form}, 30 to 90°`, () => {
				for (const angle of [30, 45, 60, 75, 90])
					expect(leastLoss(direction, angle, straight).loss, `${angle}°`).toBeGreaterThanOrEqual(-1e-12);
			});

	it('make no energy at 15 and 20° either, but for the one case that its note tells', () => {
		for (const angle of [15, 20]) {
			for (const straight of Object.values(forms))
				expect(leastLoss('converging', angle, straight).loss).toBeGreaterThanOrEqual(-1e-12);
			expect(leastLoss('diverging', angle, forms['areas adding up']).loss).toBeGreaterThanOrEqual(-1e-12);
			expect(leastLoss('diverging', angle, forms['areas between']).loss).toBeGreaterThanOrEqual(-1e-12);
		}
	});

	it('make no energy in bullhead tees and crosses', () => {
		for (const a of areas)
			for (const q of flows) {
				const legs = (leg: (q: number) => number) => q * leg(q) + (1 - q) * leg(1 - q);
				expect(legs((one) => bullheadConvergingIdelchik(one, a))).toBeGreaterThanOrEqual(0);
				expect(legs((one) => bullheadDivergingIdelchik(one, a, 0.3))).toBeGreaterThanOrEqual(0);
				for (const direction of DIRECTIONS)
					for (const s of [1, Math.max(1 - 2 * a, 0.1)]) {
						const junction = { direction, a, s, angle: 90, heightRatio: Math.sqrt(a) };
						const branches = q * crossBranch({ ...junction, q: q / 2 });
						expect(branches + (1 - q) * crossStraight({ ...junction, q })).toBeGreaterThanOrEqual(0);
					}
			}
	});

	it('make no energy by Gardel', () => {
		for (const q of flows)
			for (const [branch, straight] of [
				[branchConvergingGardel1957, straightConvergingGardel1957],
				[branchDivergingGardel1957, straightDivergingGardel1957]
			] as const)
				expect(q * branch(q) + (1 - q) * straight(q)).toBeGreaterThanOrEqual(0);
	});
});
