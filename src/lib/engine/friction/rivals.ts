// Other friction formulas, for comparison; the product itself uses frictionFactor.
import { log, log10, pow } from '../arithmetic';

/**
 * Darcy friction factor in every regime.
 *
 *   f = 8 [(8/Re)^12 + (A + B)^-1.5]^(1/12), A = [2.457 ln(1/((7/Re)^0.9 + 0.27 eps/D))]^16, B = (37530/Re)^16
 *
 * @param Re Reynolds number [-], positive
 * @param roughness relative roughness [-], 0 to 0.05
 * @returns f Darcy friction factor [-]
 * @source Churchill, Friction-factor equation spans all fluid-flow regimes (1977)
 * @check fixtures/published/friction.json
 */
export function frictionChurchill1977(Re: number, roughness: number): number {
	const A = pow(2.457 * log(1 / (pow(7 / Re, 0.9) + 0.27 * roughness)), 16);
	const B = pow(37_530 / Re, 16);
	return 8 * pow(pow(8 / Re, 12) + pow(A + B, -1.5), 1 / 12);
}

/**
 * Darcy friction factor of turbulent flow, explicit.
 *
 *   f = 0.25/[log10(eps/3.7D + 5.74/Re^0.9)]^2
 *
 * @param Re Reynolds number [-], 5000 to 1e8
 * @param roughness relative roughness [-], 1e-6 to 0.05
 * @returns f Darcy friction factor [-], within 3 % of Colebrook
 * @source Swamee & Jain, Explicit equations for pipe-flow problems (1976)
 * @check fixtures/published/friction.json
 */
export function frictionSwameeJain1976(Re: number, roughness: number): number {
	const l = log10(roughness / 3.7 + 5.74 / pow(Re, 0.9));
	return 0.25 / (l * l);
}

/**
 * Darcy friction factor of turbulent flow, explicit.
 *
 *   f' = 0.11 (eps/D + 68/Re)^0.25; f = f' if f' >= 0.018, else 0.85 f' + 0.0028
 *
 * @param Re Reynolds number [-], above 4000
 * @param roughness relative roughness [-], 0 to 0.05
 * @returns f Darcy friction factor [-]
 * @source Altshul, as corrected by Tsal (1989)
 * @check fixtures/published/friction.json
 */
export function frictionAltshulTsal1989(Re: number, roughness: number): number {
	const f = 0.11 * pow(roughness + 68 / Re, 0.25);
	return f >= 0.018 ? f : 0.85 * f + 0.0028;
}
