import { describePublished } from '../../../../fixtures/published/published-checks';
import published from '../../../../fixtures/published/textbook.json';
import { sectionOf } from '../shape';
import { darcyWeisbach, frictionFactor, reynoldsNumber } from '.';

const G = 9.81;
const FOOT = 0.3048;

/** The root of a rising function between two bounds. */
function rootOf(rising: (x: number) => number, from: number, to: number): number {
	let [low, high] = [from, to];
	for (let i = 0; i < 100; i += 1) {
		const middle = (low + high) / 2;
		if (rising(middle) < 0) low = middle;
		else high = middle;
	}
	return (low + high) / 2;
}

const f = (reynolds: number, relativeRoughness: number) => frictionFactor({ reynolds, relativeRoughness });

describePublished('friction against worked examples of textbooks', published, {
	textbook: (given) => {
		if (given.has('hL_m_air')) {
			const [Q, L, nu] = [given.number('Q_m3s'), given.number('L_m'), given.number('nu')];
			const head = (D: number) => {
				const V = Q / sectionOf({ shape: 'round', diameter: D }).area;
				return darcyWeisbach(f((V * D) / nu, 0), L, D, 1, V) / G;
			};
			return rootOf((D) => given.number('hL_m_air') - head(D), 0.05, 2);
		}
		if (given.has('square_in')) {
			const side = given.number('square_in') / 12;
			const V = given.number('Q_ft3s') / (side * side);
			const Re = (V * side) / given.number('nu_ft2s');
			const onDh = f(Re, given.number('eps_ft') / side);
			const effective = 64 / 56.91;
			const onDeff = f(Re * effective, given.number('eps_ft') / (side * effective));
			const dp = (factor: number) => darcyWeisbach(factor, given.number('L_ft'), side, given.number('rho_slug'), V);
			return {
				V_ft_s: V,
				f_on_Dh: onDh,
				dp_lbf_ft2_on_Dh: dp(onDh),
				f_on_Deff: onDeff,
				dp_lbf_ft2_f_on_Deff: dp(onDeff)
			};
		}
		const size = {
			shape: 'rectangular',
			width: given.number('W_ft') * FOOT,
			height: given.number('H_ft') * FOOT
		} as const;
		const { area, hydraulicDiameter } = sectionOf(size);
		const rho = (62.364 * 0.45359237) / (FOOT * FOOT * FOOT);
		const local = given.number('K_entry') + given.number('K_exit');
		const head = (V: number) => {
			const Re = reynoldsNumber(rho, V, hydraulicDiameter, 0.0011);
			const friction = f(Re, (given.number('eps_ft') * FOOT) / hydraulicDiameter);
			const dp = darcyWeisbach(friction, given.number('L_ft') * FOOT, hydraulicDiameter, rho, V);
			return (dp / rho + (local * V * V) / 2) / G;
		};
		const V = rootOf((v) => head(v) - given.number('head_ft') * FOOT, 0.1, 100);
		return (V * area) / (FOOT * FOOT * FOOT);
	}
});
