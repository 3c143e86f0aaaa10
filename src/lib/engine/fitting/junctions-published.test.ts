import { describe, expect, it } from 'vitest';
import converging from '../../../../fixtures/published/junctions-converging.json';
import diverging from '../../../../fixtures/published/junctions-diverging.json';
import { describePublished } from '../../../../fixtures/published/published-checks';
import { straightConvergingIdelchik } from './junction-idelchik';
import { convergingChecks, divergingChecks } from '../published/junctions';

describePublished('junctions of uniting streams against published values', converging, convergingChecks);

describePublished('junctions of dividing streams against published values', diverging, divergingChecks);

describe('the factors printed for oblique junctions', () => {
	// Idelchik, diagrams 7-1 to 7-4 (1960): 1.74, 1.41 and 1.0 stand for 2 cos(angle)
	it.each([
		[30, 1.74],
		[45, 1.41],
		[60, 1]
	])('at %d° are 2 cos: %d', (degrees, printed) => {
		// C = 1 - (1 - q)^2 - F q^2/a: the factor read back from the straight leg
		const factor = (0.5 / 0.25) * (0.75 - straightConvergingIdelchik(0.5, 0.5, degrees));
		expect(Math.abs(factor - printed)).toBeLessThan(0.01);
	});
});

describe('the published checks', () => {
	it('all lie outside the smoothed bands, whose printed values they would not meet', () => {
		const inside = [...converging.checks, ...diverging.checks].filter(({ topic, inputs }) => {
			if (!/idelchik|crane|bullhead/.test(topic)) return false;
			const values: Record<string, unknown> = inputs;
			const q = Number(values.Qb_over_Qc ?? values.Q1_over_Qc ?? NaN);
			const a = Number(values.Ab_over_Ac ?? values.A1_over_Ac ?? Number(values.Db_over_Dc) ** 2);
			const within = (x: number, limit: number) => x > limit && x < limit + 0.04;
			return within(a, 0.35) || within(a, 0.4) || within(q, 0.4) || within(q, 0.5) || within(q, 0.6);
		});
		expect(inside.map(({ id }) => id)).toEqual([]);
	});
});
