// Published checks of air.
import {
	humidAirDensity,
	saturationPressure,
	standardPressure,
	standardTemperature,
	sutherlandViscosity,
	velocityPressure
} from '../air';
import type { Evaluators } from './given';

const GAS_CONSTANT = 287.05287; // J/(kg K), dry air of the standard atmosphere

export const airChecks: Evaluators = {
	'air.density': (given) => humidAirDensity(given.number('t_C'), given.number('rh'), given.number('p_Pa')),
	'air.saturation-pressure': (given) => saturationPressure(given.number('t_C')),
	'air.standard-atmosphere': (given) => {
		if (given.has('elevation_m')) return standardPressure(given.number('elevation_m'));
		const z = given.number('geometric_elevation_m');
		const t = standardTemperature(z);
		const p = standardPressure(z);
		const rho = p / (GAS_CONSTANT * (t + 273.15));
		return { T_K: t + 273.15, p_Pa: p, rho_kg_m3: rho, mu_Pa_s: sutherlandViscosity(t) };
	},
	'air.viscosity': (given) => sutherlandViscosity(given.number('t_C')),
	'air.velocity-pressure': (given) => {
		if (given.has('V_m_s')) return velocityPressure(given.number('rho_kg_m3'), given.number('V_m_s'));
		const V = (given.number('V_fpm') * 0.3048) / 60;
		const rho = (given.number('rho_lb_ft3') * 0.45359237) / (0.3048 * 0.3048 * 0.3048);
		return velocityPressure(rho, V) / 249.089;
	}
};
