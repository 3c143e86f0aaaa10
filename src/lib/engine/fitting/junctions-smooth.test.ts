import { describe, expect, it } from 'vitest';
import { branchConvergingCrane2009, branchDivergingCrane2009 } from './junction-crane';
import { dividingFactor, passageFactor, unitingFactor } from './junction-factors';
import {
	branchConvergingIdelchik,
	branchDivergingIdelchik,
	straightConvergingGeneralIdelchik,
	straightConvergingIdelchik,
	straightDivergingIdelchik
} from './junction-idelchik';
import {
	branchConvergingAddingIdelchik,
	branchDivergingAddingIdelchik,
	straightConvergingAddingIdelchik,
	straightDivergingAddingIdelchik
} from './junction-idelchik-adding';
import {
	branchConvergingGardel1957,
	branchDivergingBassett2001,
	branchDivergingGardel1957,
	straightConvergingGardel1957,
	straightDivergingBassett2001,
	straightDivergingGardel1957
} from './junction-rivals';
import {
	bullheadConvergingIdelchik,
	bullheadDivergingIdelchik,
	crossBranch,
	crossStraight,
	plenumLeg
} from './junction-several';
import { stepAbove } from './junction-smooth';
import { type Branching } from './junction-stream';
import { conicalTakeOffMain, conicalTakeOffOblique, conicalTakeOffSquare } from './junction-tables';

const ANGLES = [15, 20, 30, 45, 60, 75, 90];

describe('the smoothed factors', () => {
	it('have the printed values up to a limit and from the end of its band on', () => {
		expect(unitingFactor(0.3, 0.35)).toBe(1);
		expect(unitingFactor(0.3, 0.391)).toBeCloseTo(0.63, 12);
		expect(unitingFactor(0.4, 0.5)).toBeCloseTo(0.54, 12);
		expect(unitingFactor(0.441, 0.5)).toBe(0.55);
		expect(dividingFactor(0.4, 0.35)).toBeCloseTo(0.82, 12);
		expect(dividingFactor(0.441, 0.3)).toBe(0.85);
		expect(dividingFactor(0.6, 0.4)).toBeCloseTo(0.64, 12);
		expect(dividingFactor(0.641, 0.4)).toBe(0.6);
		expect(passageFactor(0.3, 0.4)).toBe(0.4);
		expect(passageFactor(0.3, 0.441)).toBeCloseTo(-0.8, 12);
		expect(passageFactor(0.75, 0.5)).toBeCloseTo(0.15, 12);
	});

	it('step from 0 to 1 without a slope at either end', () => {
		expect([stepAbove(0.35, 0.35), stepAbove(0.37, 0.35), stepAbove(0.391, 0.35)]).toEqual([
			0,
			expect.closeTo(0.5, 12),
			1
		]);
		expect(stepAbove(0.3504, 0.35)).toBeLessThan(0.001);
		expect(stepAbove(0.3896, 0.35)).toBeGreaterThan(0.999);
	});
});

/** Every coefficient of a junction as a function of q alone. */
function curves(a: number, angle: number): Readonly<Record<string, (q: number) => number>> {
	const h = Math.sqrt(a);
	const s = Math.max(1 - a, 0.1);
	const cross = (q: number): Branching => ({ direction: 'diverging', q, a, s: 1, angle, heightRatio: h });
	return {
		branchConvergingIdelchik: (q) => branchConvergingIdelchik(q, a, angle),
		straightConvergingIdelchik: (q) => straightConvergingIdelchik(q, a, angle),
		straightConvergingGeneralIdelchik: (q) => straightConvergingGeneralIdelchik(q, a, angle),
		branchDivergingIdelchik: (q) => branchDivergingIdelchik(q, a, angle, h),
		straightDivergingIdelchik: (q) => straightDivergingIdelchik(q, a),
		branchConvergingAddingIdelchik: (q) => branchConvergingAddingIdelchik(q, a, s, angle),
		straightConvergingAddingIdelchik: (q) => straightConvergingAddingIdelchik(q, a, s, angle),
		branchDivergingAddingIdelchik: (q) => branchDivergingAddingIdelchik(q, a, angle),
		straightDivergingAddingIdelchik: (q) => straightDivergingAddingIdelchik((1 - q) / s),
		branchConvergingCrane2009: (q) => branchConvergingCrane2009(q, a, angle),
		branchDivergingCrane2009: (q) => branchDivergingCrane2009(q, a, angle),
		branchDivergingBassett2001: (q) => branchDivergingBassett2001(q, a, angle),
		straightDivergingBassett2001,
		branchConvergingGardel1957,
		straightConvergingGardel1957,
		branchDivergingGardel1957,
		straightDivergingGardel1957,
		bullheadConvergingIdelchik: (q) => bullheadConvergingIdelchik(q, a),
		bullheadDivergingIdelchik: (q) => bullheadDivergingIdelchik(q, a, 1.5),
		crossBranch: (q) => crossBranch(cross(q)),
		crossStraight: (q) => crossStraight(cross(q)),
		plenumDiverging: (q) => plenumLeg('diverging', q, a, 0.2),
		plenumConverging: (q) => plenumLeg('converging', q, a, 0.2),
		conicalTakeOffSquare: (q) => conicalTakeOffSquare(q / a),
		conicalTakeOffOblique: (q) => conicalTakeOffOblique(q / a),
		conicalTakeOffMain: (q) => conicalTakeOffMain(1 - q)
	};
}

describe('every coefficient of a junction', () => {
	it.each(Object.keys(curves(1, 90)))('%s has no jump and a bounded slope for any flow ratio', (name) => {
		for (const angle of ANGLES)
			for (const a of [0.1, 0.2, 0.35, 0.36, 0.37, 0.4, 0.41, 0.42, 0.5, 0.8, 1]) {
				const curve = curves(a, angle)[name] ?? (() => NaN);
				// The steepest terms are (q/a)^2 and ((1 - q)/s)^2, with slopes of 2/a^2 and 2/s^2.
				const s = Math.max(1 - a, 0.1);
				const bound = 12 / (a * a) + 4 / (s * s) + 20;
				for (let q = 0; q < 1; q += 1 / 256) {
					const step = curve(q + 1e-6) - curve(q);
					expect(Math.abs(step / 1e-6), `q ${q}, a ${a}, ${angle}°`).toBeLessThan(bound);
				}
				// At the printed limits themselves, where a jump would sit
				for (const limit of [0.4, 0.44, 0.5, 0.54, 0.6, 0.64])
					expect(Math.abs(curve(limit + 1e-9) - curve(limit - 1e-9))).toBeLessThan(bound * 3e-9);
			}
	});

	it('is finite for reversed and runaway flows', () => {
		for (const q of [-3, -1, -0.01, 0, 1, 1.01, 2, 50])
			for (const angle of ANGLES)
				for (const a of [0.01, 0.35, 0.4, 1, 3])
					for (const [name, curve] of Object.entries(curves(a, angle)))
						expect(curve(q), `${name} ${q}`).toSatisfy(Number.isFinite);
	});

	it('has no jump in the area ratio either', () => {
		for (const angle of ANGLES)
			for (const q of [0.1, 0.3, 0.5, 0.9])
				for (const limit of [0.35, 0.39, 0.4, 0.44, 4 / 9])
					for (const [name, curve] of Object.entries(curves(limit - 1e-9, angle)))
						expect(Math.abs(curve(q) - (curves(limit + 1e-9, angle)[name] ?? (() => NaN))(q)), name).toBeLessThan(1e-6);
	});

	it('has no jump in the angle', () => {
		for (const angle of [60, 75, 90])
			for (const [name, curve] of Object.entries(curves(0.6, angle - 1e-9)))
				expect(Math.abs(curve(0.3) - (curves(0.6, angle + 1e-9)[name] ?? (() => NaN))(0.3)), name).toBeLessThan(1e-8);
	});
});
