import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { branchDivergingIdelchik, straightConvergingIdelchik, straightDivergingIdelchik } from './junction-idelchik';
import {
	branchConvergingAddingIdelchik,
	branchDivergingAddingIdelchik,
	straightConvergingAddingIdelchik,
	straightDivergingAddingIdelchik
} from './junction-idelchik-adding';
import { addingShare, branchIdelchik, straightIdelchik, type Branching } from './junction-stream';

const DIRECTIONS = ['diverging', 'converging'] as const;
const ANGLES = [15, 20, 30, 45, 60, 75, 90];
/** 0, 0.01 … 1. */
const flows = Array.from({ length: 101 }, (_, i) => i / 100);

describe('the two forms of Idelchik', () => {
	const junction = fc.record({
		direction: fc.constantFrom(...DIRECTIONS),
		q: fc.double({ min: 0, max: 1, noNaN: true }),
		a: fc.double({ min: 0.1, max: 0.9, noNaN: true }),
		angle: fc.double({ min: 15, max: 90, noNaN: true })
	});

	it('are met at either end, and the way between is straight', () => {
		fc.assert(
			fc.property(junction, fc.double({ min: 0, max: 1, noNaN: true }), (one, w) => {
				const at = (s: number): Branching => ({ ...one, s, heightRatio: Math.sqrt(one.a) });
				expect(addingShare(one.a, 1)).toBe(0);
				expect(addingShare(one.a, 1 - one.a)).toBeCloseTo(1, 12);
				expect(addingShare(one.a, 1 - w * one.a)).toBeCloseTo(w, 12);
				const isJoining = one.direction === 'converging';
				const { q, a, angle } = one;
				expect(straightIdelchik(at(1))).toBe(
					isJoining ? straightConvergingIdelchik(q, a, angle) : straightDivergingIdelchik(q, a)
				);
				expect(branchIdelchik(at(1 - a))).toBeCloseTo(
					isJoining ? branchConvergingAddingIdelchik(q, a, 1 - a, angle) : branchDivergingAddingIdelchik(q, a, angle),
					8
				);
			})
		);
	});

	// Momentum along the run with three equal speeds, q = a and s = 1 - a: C = 2 a (1 - cos)
	it('agree with the momentum of three equal speeds, but for the printed additions up to 0.40', () => {
		for (const angle of [15, 30, 45, 60, 90])
			for (const a of [0.1, 0.2, 0.33, 0.5]) {
				const exact = 2 * a * (1 - Math.cos((angle * Math.PI) / 180));
				const branch = branchConvergingAddingIdelchik(a, a, 1 - a, angle) - exact;
				const straight = straightConvergingAddingIdelchik(a, a, 1 - a, angle) - exact;
				for (const K of [branch, straight]) {
					expect(K).toBeGreaterThanOrEqual(-1e-12);
					expect(K).toBeLessThanOrEqual(0.4 + 1e-12);
				}
				// Table 7-2: at 90° the straight leg has no addition, below 60° the branch none
				if (angle === 90) expect(straight).toBeCloseTo(0, 12);
				if (angle < 60) expect(branch).toBeCloseTo(0, 12);
			}
	});

	it('lose the velocity pressure of the common leg where nothing flows off', () => {
		for (const angle of ANGLES) {
			expect(branchDivergingAddingIdelchik(0, 0.5, angle)).toBe(1);
			expect(straightConvergingIdelchik(0, 0.5, angle)).toBeCloseTo(0, 15);
			expect(straightDivergingIdelchik(0, 0.5)).toBeCloseTo(0, 15);
		}
		expect(branchDivergingIdelchik(0, 0.5, 90, 1)).toBe(1);
	});

	// Idelchik, table 7-5: K = 1 at 90°, where the branch then loses 1 at any speed; sin^2 at least at the best speed
	it('lose the velocity pressure of the common leg in a branch at 90° where areas add up', () => {
		for (const q of flows) expect(branchDivergingAddingIdelchik(q, 0.5, 90)).toBeCloseTo(1, 12);
	});

	// The parabola is a least-square fit to the same diagram, 1.2258 - 3.3072 v + 2.2511 v^2, as the FluidDissipation
	// library has it; it does not meet 0 at v = 1
	it('have a fast straight leg between Borda and a parabola fitted to the diagram', () => {
		for (const v of [1.2, 1.4, 1.6, 1.8, 2]) {
			const C = straightDivergingAddingIdelchik(v);
			expect(C).toBeGreaterThan((1 - v) * (1 - v));
			expect(C).toBeLessThan(1.2258 - 3.3072 * v + 2.2511 * v * v);
		}
	});

	// Idelchik, table 7-2, as the FluidDissipation library carries it
	it.each([
		{ angle: 15, a: 0.33, straight: 0.14, branch: 0 },
		{ angle: 30, a: 0.33, straight: 0.17, branch: 0 },
		{ angle: 45, a: 0.33, straight: 0.14, branch: 0 },
		{ angle: 60, a: 0.33, straight: 0.1, branch: 0 },
		{ angle: 90, a: 0.33, straight: 0, branch: 0.2 },
		{ angle: 15, a: 0.5, straight: 0.4, branch: 0 },
		{ angle: 30, a: 0.5, straight: 0.35, branch: 0 },
		{ angle: 45, a: 0.5, straight: 0.3, branch: 0 },
		{ angle: 60, a: 0.5, straight: 0.25, branch: 0.1 },
		{ angle: 90, a: 0.5, straight: 0, branch: 0.25 },
		{ angle: 45, a: 0.1, straight: 0.05, branch: 0 },
		{ angle: 45, a: 0.2, straight: 0.14, branch: 0 },
		{ angle: 60, a: 0.2, straight: 0, branch: 0 },
		{ angle: 90, a: 0.2, straight: 0, branch: 0.1 }
	])('have the additions of the table where streams unite: $angle°, Ab/Ac $a', ({ angle, a, straight, branch }) => {
		// By hand at rest in the branch: C = 1 - 2/s + K, and 1 + 1/s^2 - 2/s + K in the straight leg
		const s = 1 - a;
		expect(branchConvergingAddingIdelchik(0, a, s, angle) - (1 - 2 / s)).toBeCloseTo(branch, 12);
		expect(straightConvergingAddingIdelchik(0, a, s, angle) - (1 + 1 / (s * s) - 2 / s)).toBeCloseTo(straight, 12);
	});

	// Idelchik, table 7-5, as the FluidDissipation library carries it: C = 1 + x^2 - 2 x cos - K x^2, at x = 1
	it.each([
		[15, 0.04],
		[30, 0.16],
		[45, 0.36],
		[60, 0.64],
		[90, 1]
	])('have the factor of the table where the stream divides: %d°, %d', (angle, K) => {
		const C = branchDivergingAddingIdelchik(0.4, 0.4, angle);
		expect(2 - 2 * Math.cos((angle * Math.PI) / 180) - C).toBeCloseTo(K, 12);
	});
});
