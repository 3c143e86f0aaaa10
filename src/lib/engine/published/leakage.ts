// Published checks of leakage.
import { allowableLeakage, findLeakageClass, leakageFlow, type LeakageClass } from '../leakage';
import type { Evaluators } from './given';

const FOOT = 0.3048;
const CFM = (FOOT * FOOT * FOOT) / 60;
const INCH_OF_WATER = 249.089;
function classOf(key: string): LeakageClass {
	const found = findLeakageClass(key);
	if (found === null) throw new Error(`no class ${key}`);
	return found;
}

export const leakageChecks: Evaluators = {
	'leakage.en-class': (given) =>
		allowableLeakage(classOf(given.text('class')), given.number('area_m2'), given.number('p_Pa')) * 1000,
	'leakage.ip-class': (given) => {
		const surface = given.number('area_ft2') * FOOT * FOOT;
		return leakageFlow({ CL: given.number('CL') }, surface, given.number('p_inwg') * INCH_OF_WATER) / CFM;
	},
	'leakage.system': (given) => {
		const flow = given
			.rows('sections')
			.map(([surface, pressure, key]) => leakageFlow(classOf(String(key)), Number(surface), Number(pressure)))
			.reduce((sum, one) => sum + one, 0);
		const L_s = flow * 1000;
		return { L_s, percent: (100 * L_s) / given.number('design_flow_L_s') };
	}
};
