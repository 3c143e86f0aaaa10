import { describe, expect, it } from 'vitest';
import converging from '../../../../fixtures/published/junctions-converging.json';
import diverging from '../../../../fixtures/published/junctions-diverging.json';
import { describePublished, type Given } from '../../../../fixtures/published/published-checks';
import {
	branchConvergingCrane2009,
	branchDivergingCrane2009,
	straightConvergingCrane2009,
	straightDivergingCrane2009
} from './junction-crane';
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
import { bullheadConvergingIdelchik, bullheadDivergingIdelchik } from './junction-several';
import { conicalTakeOffMain } from './junction-tables';
import { coefficientOnLeg } from './reference-change';

const angle = (given: Given) => given.number('angle');

function flowOf(given: Given): number {
	if (given.has('Qb_over_Qc')) return given.number('Qb_over_Qc');
	const branch = given.number('Q_branch_Lmin');
	return branch / (branch + given.number('Q_run_Lmin'));
}

function areaOf(given: Given): number {
	if (given.has('D_equal')) return 1;
	if (!given.has('Db_over_Dc')) return given.number('Ab_over_Ac');
	return given.number('Db_over_Dc') * given.number('Db_over_Dc');
}

describePublished('junctions of uniting streams against published values', converging, {
	'junction.converging.idelchik': (given) => ({
		branch_to_common: branchConvergingIdelchik(flowOf(given), areaOf(given), angle(given)),
		straight_to_common: straightConvergingIdelchik(flowOf(given), areaOf(given), angle(given))
	}),
	'junction.converging.crane': (given) => ({
		branch_to_common: branchConvergingCrane2009(flowOf(given), areaOf(given), angle(given)),
		straight_to_common: straightConvergingCrane2009(flowOf(given), areaOf(given), angle(given))
	}),
	'junction.converging.gardel': (given) => ({
		branch_to_common: branchConvergingGardel1957(flowOf(given)),
		straight_to_common: straightConvergingGardel1957(flowOf(given))
	}),
	'junction.converging.idelchik-general-variant': (given) =>
		straightConvergingGeneralIdelchik(flowOf(given), areaOf(given), angle(given)),
	'junction.bullhead-converging': (given) =>
		bullheadConvergingIdelchik(given.number('Q1_over_Qc'), given.number('A1_over_Ac'))
});

describePublished('junctions of dividing streams against published values', diverging, {
	'junction.diverging.idelchik': (given) => ({
		// Round legs: the height ratio is that of the diameters.
		common_to_branch: branchDivergingIdelchik(flowOf(given), areaOf(given), angle(given), Math.sqrt(areaOf(given))),
		common_to_straight: straightDivergingIdelchik(flowOf(given), areaOf(given))
	}),
	'junction.diverging.crane': (given) => ({
		common_to_branch: branchDivergingCrane2009(flowOf(given), areaOf(given), angle(given)),
		common_to_straight: straightDivergingCrane2009(flowOf(given), areaOf(given))
	}),
	'junction.diverging.bassett': (given) => ({
		common_to_branch: branchDivergingBassett2001(flowOf(given), areaOf(given), given.number('branch_deflection_deg')),
		common_to_straight: straightDivergingBassett2001(flowOf(given))
	}),
	'junction.diverging.gardel': (given) => ({
		common_to_branch: branchDivergingGardel1957(flowOf(given)),
		common_to_straight: straightDivergingGardel1957(flowOf(given))
	}),
	'junction.diverging.table': (given) => conicalTakeOffMain(given.number('Vs_over_Vc')),
	'junction.bullhead-diverging': (given) =>
		bullheadDivergingIdelchik(given.number('Q1_over_Qc'), given.number('A1_over_Ac'), given.number('k')),
	'fitting.reference-change': (given) =>
		coefficientOnLeg(given.number('C_on_branch_pv'), given.number('V_branch'), given.number('V_common'))
});

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
