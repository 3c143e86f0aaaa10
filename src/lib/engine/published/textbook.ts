// Published checks by worked examples of textbooks and by whole designs.
import { PI } from '../arithmetic';
import { validateDocument, type Solution } from '../document';
import { solveDesign } from '../network';
import { sectionOf } from '../shape';
import { darcyWeisbach, frictionFactor, reynoldsNumber } from '../friction';
import type { Evaluators, Given } from './given';

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

/** Diameter of a smooth duct that loses a head. */
function diameterForHead(given: Given): number {
	const [Q, L, nu] = [given.number('Q_m3s'), given.number('L_m'), given.number('nu')];
	const head = (D: number) => {
		const V = Q / sectionOf({ shape: 'round', diameter: D }).area;
		return darcyWeisbach(f((V * D) / nu, 0), L, D, 1, V) / G;
	};
	return rootOf((D) => given.number('hL_m_air') - head(D), 0.05, 2);
}

/** Loss of a square duct, with the friction factor on both diameters. */
function squareDuct(given: Given) {
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

/** Flow of a rectangular conduit under a head. */
function conduit(given: Given): number {
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

function duct(tag: string, joins: string | null, side: string, diameter = 0.3) {
	return { tag, joins, side, size: { shape: 'round', diameter }, length: 1, roughness: 0.00009, fittings: [] };
}

/** The rows of a design as the engine solves it. */
function solvedRows(parts: Readonly<Record<string, unknown>>): Solution['rows'] {
	const read = validateDocument({ format: 'evendraft/design@1', title: 'Check', ...parts });
	if (!read.ok) throw new Error(JSON.stringify(read.problems));
	const solved = solveDesign(read.document);
	if (!solved.ok) throw new Error(JSON.stringify(solved.problems));
	return solved.solution.rows;
}

export const textbookChecks: Evaluators = {
	textbook: (given) => {
		if (given.has('hL_m_air')) return diameterForHead(given);
		return given.has('square_in') ? squareDuct(given) : conduit(given);
	},
	// A riser of the engine's own: warm air upward in colder surroundings.
	'network.stack': (given) => {
		const rows = solvedRows({
			air: { density: given.number('rho_duct') },
			surroundings: { density: given.number('rho_amb') },
			rows: [{ ...duct('S', null, 'supply'), rise: given.number('dz_m'), outlet: { name: 'Room', flow: 0.1 } }]
		});
		return rows.S?.thermalGravity ?? NaN;
	},
	// The total pressure of each stream before the tee, by the loss that the engine gives it there.
	'network.junction-accounting': (given) => {
		const diameter = Math.sqrt((4 * given.number('A')) / PI);
		const leg = (tag: string, straight: boolean, flow: number) => ({
			...duct(tag, 'M', 'exhaust', diameter),
			junction: { kind: 'tee', leg: straight ? 'straight' : 'branch', method: 'idelchik' },
			outlet: { name: tag, flow }
		});
		const rows = solvedRows({
			air: { density: given.number('rho') },
			rows: [
				duct('M', null, 'exhaust', diameter),
				leg('B', false, given.number('Qb')),
				leg('S', true, given.number('Qs'))
			]
		});
		const common = given.number('pt_common_Pa');
		return {
			pv_common_Pa: rows.M?.velocityPressure ?? NaN,
			pt_branch_Pa: common + (rows.B?.junctionLoss ?? NaN),
			pt_straight_Pa: common + (rows.S?.junctionLoss ?? NaN)
		};
	}
};
