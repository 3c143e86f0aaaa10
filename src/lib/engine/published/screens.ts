// Published checks of screens, plates and obstructions.
import {
	obstructionIdelchik,
	thickPlateIdelchik,
	thinPlateIdelchik,
	wireScreenBlevins,
	wireScreenIdelchik
} from '../fitting/screen-formulas';
import type { Evaluators } from './given';

export const screenChecks: Evaluators = {
	'fitting.screen-wire': (given) => wireScreenIdelchik(given.number('free_area_ratio')),
	'fitting.screen-wire.blevins': (given) => wireScreenBlevins(given.number('free_area_ratio'), given.number('Re')),
	'fitting.orifice-perforated-plate': (given) =>
		thickPlateIdelchik(given.number('free_area_ratio'), given.number('l_over_d'), given.number('lambda')),
	'fitting.perforated-plate-thin': (given) => thinPlateIdelchik(given.number('free_area_ratio')),
	'fitting.obstruction': (given) =>
		obstructionIdelchik(given.number('Sm_over_A'), given.number('Cx'), given.number('tau'))
};
