// Published checks of entries and exits.
import {
	angledEntryIdelchik,
	freeBellmouthIdelchik,
	projectingEntryIdelchik,
	roundedEntryIdelchik,
	roundedEntryRennels2012
} from '../fitting/entry-formulas';
import { plainExit } from '../fitting/exits';
import type { Evaluators } from './given';

export const entryChecks: Evaluators = {
	'fitting.entry-bellmouth-free': (given) => freeBellmouthIdelchik(given.number('r_over_D')),
	'fitting.entry-duct-through-wall': (given) =>
		projectingEntryIdelchik(given.number('t_over_D'), given.number('L_over_D')),
	'fitting.entry-rounded-flush': (given) => {
		const r = given.number('r_over_D');
		return { rennels: roundedEntryRennels2012(r), idelchik: roundedEntryIdelchik(r) };
	},
	'fitting.entry-angled': (given) => angledEntryIdelchik(given.number('angle_to_wall_deg'))
};

export const exitChecks: Evaluators = {
	// A uniform profile has a kinetic energy factor of 1.
	'fitting.exit': (given) => plainExit(given.text('profile') === 'uniform' ? 1 : NaN)
};
