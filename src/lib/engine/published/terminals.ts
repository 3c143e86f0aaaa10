// Published checks of equipment and terminals.
import { lossAtDensity, meanFilterLoss, ratedLoss } from '../fitting/rated-loss';
import type { Evaluators } from './given';

export const terminalChecks: Evaluators = {
	'terminal.power-law': (given) =>
		ratedLoss(given.number('dp_rated'), given.number('Q_rated'), given.number('Q'), given.number('n')),
	'terminal.filter': (given) => meanFilterLoss(given.number('dp_clean'), given.number('dp_dirty')),
	'terminal.density': (given) => lossAtDensity(given.number('dp_catalogue_1.2'), 1.2, given.number('rho'))
};
