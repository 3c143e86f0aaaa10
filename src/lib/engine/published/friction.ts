// Published checks of friction.
import { sutherlandViscosity } from '../air';
import { sectionOf } from '../shape';
import {
	darcyWeisbach,
	flexibleCompressionFactor,
	frictionAltshulTsal1989,
	frictionChurchill1977,
	frictionFactor,
	frictionSwameeJain1976,
	reynoldsNumber
} from '../friction';
import type { Evaluators, Given } from './given';

const FOOT = 0.3048;
const POUND = 0.45359237;

/** Velocity [m/s], Reynolds number [-], friction factor [-] and loss [Pa] of a straight round duct. */
export function straightDuct(Q: number, diameter: number, roughness: number, L: number, rho: number, mu: number) {
	const V = Q / sectionOf({ shape: 'round', diameter }).area;
	const Re = reynoldsNumber(rho, V, diameter, mu);
	const f = frictionFactor({ reynolds: Re, relativeRoughness: roughness / diameter });
	return { V, Re, f, dp: darcyWeisbach(f, L, diameter, rho, V) };
}

const ofRoughness = (formula: (Re: number, roughness: number) => number) => (given: Given) =>
	formula(given.number('Re'), given.number('eps_over_D'));

export const frictionChecks: Evaluators = {
	'friction.colebrook': ofRoughness((reynolds, relativeRoughness) => frictionFactor({ reynolds, relativeRoughness })),
	// A pipe of 2000 is the first of the blend, which starts with the laminar value.
	'friction.laminar': (given) => frictionFactor({ reynolds: given.number('Re'), relativeRoughness: 0.0003 }),
	'friction.churchill': ofRoughness(frictionChurchill1977),
	'friction.swamee-jain': ofRoughness(frictionSwameeJain1976),
	'friction.altshul-tsal': ofRoughness(frictionAltshulTsal1989),
	'friction.duct': (given) => {
		const [Q, D, eps] = [given.number('Q_m3s'), given.number('D_m'), given.number('eps_m')];
		const duct = straightDuct(Q, D, eps, given.number('L_m'), given.number('rho'), given.number('mu'));
		return { V_m_s: duct.V, Re: duct.Re, f: duct.f, dp_Pa_per_m: duct.dp };
	},
	'friction.duct-ip': (given) => {
		const Q = (given.number('cfm') * FOOT * FOOT * FOOT) / 60;
		const rho = (0.075 * POUND) / (FOOT * FOOT * FOOT);
		const mu = sutherlandViscosity((70 - 32) / 1.8);
		const D = given.number('D_in') * 0.0254;
		const duct = straightDuct(Q, D, given.number('eps_ft') * FOOT, given.number('L_ft') * FOOT, rho, mu);
		return { V_fpm: (duct.V * 60) / FOOT, Re: duct.Re, f: duct.f, dp_inwg_per_100ft: duct.dp / 249.089 };
	},
	'friction.flex-compression': (given) =>
		flexibleCompressionFactor(given.number('compression_percent'), given.number('D_mm') / 1000)
};
