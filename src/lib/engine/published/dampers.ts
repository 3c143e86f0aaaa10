// Published checks of dampers.
import { openBladeDamper } from '../fitting/damper-open';
import { butterflyDamper } from '../fitting/damper-tables';
import type { Evaluators } from './given';

export const damperChecks: Evaluators = {
	'fitting.damper-butterfly': (given) =>
		butterflyDamper(given.number('closed_angle'), given.text('shape') === 'round' ? 'round' : 'rectangular'),
	'fitting.damper-multiblade-open': (given) => {
		const Au = given.number('duct_m2');
		const V = given.number('Q_m3s') / Au;
		const blades = given.text('blades') === 'parallel' ? 'parallel' : 'opposed';
		const { freeRatio, loss } = openBladeDamper(blades, given.number('damper_m2'), Au, V);
		return { free_ratio: freeRatio, V_m_s: V, dp_Pa: loss };
	}
};
