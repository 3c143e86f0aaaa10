// Published checks of changes of size.
import {
	coneFriction,
	conicalContractionIdelchik,
	conicalExpansionIdelchik,
	suddenContractionIdelchik,
	suddenExpansion
} from '../fitting/area-change-idelchik';
import { conicalContractionRennels2012, conicalExpansionRennels2012 } from '../fitting/area-change-rennels';
import { conicalExpansionTableIdelchik } from '../fitting/area-change-tables';
import { coefficientOnLeg } from '../fitting/reference-change';
import type { Evaluators, Given } from './given';

const angle = (given: Given) => given.number('included_angle');
function areaRatioOf(given: Given): number {
	const ratio = given.number('D1') / given.number('D2');
	return ratio < 1 ? ratio * ratio : 1 / (ratio * ratio);
}

export const areaChangeChecks: Evaluators = {
	'fitting.sudden-expansion': (given) => suddenExpansion(given.number('A1_over_A2')),
	'fitting.sudden-contraction': (given) => suddenContractionIdelchik(given.number('A_small_over_A_large')),
	'fitting.conical-expansion.idelchik': (given) =>
		conicalExpansionIdelchik(angle(given), 1 / given.number('A2_over_A1')),
	// The author holds the friction of the cone at that of 20°.
	'fitting.conical-expansion.idelchik-table': (given) => {
		const a = given.number('A1_over_A2');
		const friction = coneFriction(Math.min(angle(given), 20), a, given.number('fd'));
		return conicalExpansionTableIdelchik(angle(given), a) + friction;
	},
	'fitting.conical-expansion.rennels': (given) =>
		conicalExpansionRennels2012(angle(given), areaRatioOf(given), given.number('fd')),
	'fitting.conical-contraction.idelchik': (given) =>
		conicalContractionIdelchik(angle(given), given.number('A2_over_A1_small_over_large')),
	'fitting.conical-contraction.rennels': (given) =>
		conicalContractionRennels2012(angle(given), areaRatioOf(given), given.number('fd')),
	'fitting.reference-change': (given) =>
		coefficientOnLeg(given.number('C_on_branch_pv'), given.number('V_branch'), given.number('V_common'))
};
