// Published checks of junctions.
import {
	branchConvergingCrane2009,
	branchDivergingCrane2009,
	straightConvergingCrane2009,
	straightDivergingCrane2009
} from '../fitting/junction-crane';
import {
	branchConvergingIdelchik,
	branchDivergingIdelchik,
	straightConvergingGeneralIdelchik,
	straightConvergingIdelchik,
	straightDivergingIdelchik
} from '../fitting/junction-idelchik';
import {
	branchConvergingGardel1957,
	branchDivergingBassett2001,
	branchDivergingGardel1957,
	straightConvergingGardel1957,
	straightDivergingBassett2001,
	straightDivergingGardel1957
} from '../fitting/junction-rivals';
import { bullheadConvergingIdelchik, bullheadDivergingIdelchik } from '../fitting/junction-several';
import { conicalTakeOffMain } from '../fitting/junction-tables';
import { coefficientOnLeg } from '../fitting/reference-change';
import type { Evaluators, Given } from './given';

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

export const convergingChecks: Evaluators = {
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
};

export const divergingChecks: Evaluators = {
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
};
