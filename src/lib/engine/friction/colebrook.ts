import { log, roughLog } from '../arithmetic';
import { requireInRange, type Range } from '../errors';

/** Relative roughness for which the equation can be solved at all [-]; it was drawn up for values up to 0.05. */
export const SOLVABLE_ROUGHNESS: Range = { min: 0, max: 1 };
/** Relative roughness of the published range [-]. */
export const COLEBROOK_ROUGHNESS: Range = { min: 0, max: 0.05 };
/** Reynolds numbers for which the equation can be solved [-]. */
const SOLVABLE_REYNOLDS: Range = { min: 1_000, max: Number.MAX_VALUE };

/** 2/ln 10 */
const K = 0.8685889638065036;
/** Times K of the formula: b = 2.51 K/Re */
const VISCOUS = 2.51 * K;

/**
 * Root of y + ln(a + b y) = 0 by two steps: Newton's with a logarithm good to 0.004, then one of fifth order.
 *
 *   r = y0 + ln(a + b y0), q = b/(a + b y0 + b), s = -q r
 *   y = y0 - (1 - q) r [1 + q s/2 + q (q/2 - 1/3) s^2 + q (5 q^2/8 - 5 q/6 + 1/4) s^3]
 *
 * The bracket is the series of the root in powers of the residual (Lagrange), with what is left of order s^4; after the
 * first step |s| is below 0.0007 from Re 4000 on and below 0.0022 from Re 1000 on.
 */
function rootOf(a: number, b: number): number {
	let y = -roughLog(a + b * 8);
	let inner = a + b * y;
	y -= ((y + roughLog(inner)) * inner) / (inner + b);
	inner = a + b * y;
	const r = y + log(inner);
	const inverse = 1 / (inner + b);
	const q = b * inverse;
	const s = -q * r;
	const series = 1 + s * q * (1 / 2 + s * (q * (1 / 2) - 1 / 3 + s * (q * (q * (5 / 8) - 5 / 6) + 1 / 4)));
	return y - r * inner * inverse * series;
}

export interface ColebrookRoot {
	/** 1/sqrt f */
	readonly x: number;
	/** d ln f/d ln Re at the root */
	readonly slope: number;
}

function requireSolvable(Re: number, roughness: number): void {
	requireInRange('colebrookRoot', 'Re', Re, SOLVABLE_REYNOLDS);
	requireInRange('colebrookRoot', 'roughness', roughness, SOLVABLE_ROUGHNESS);
}

/**
 * Root of the Colebrook–White equation and the slope of the friction factor there.
 *
 *   y + ln(a + b y) = 0, a = eps/3.7 D, b = 2.51 K/Re, K = 2/ln 10; x = K y
 *   d ln f/d ln Re = -2 p/(1 + p), p = b/(a + b y)
 *
 * @param Re Reynolds number [-], from 1000
 * @param roughness relative roughness eps/D [-], 0 to 1
 * @returns x = 1/sqrt f [-] and the slope of ln f against ln Re [-]
 * @throws {OutOfRangeError} when Re or roughness leaves its range
 * @source Colebrook, Turbulent flow in pipes (1939); the form after Clamond, Efficient resolution of the Colebrook
 * equation, Industrial & Engineering Chemistry Research 48 (2009)
 * @check fixtures/published/friction.json
 */
export function colebrookRoot(Re: number, roughness: number): ColebrookRoot {
	requireSolvable(Re, roughness);
	const a = roughness / 3.7;
	const b = VISCOUS / Re;
	const y = rootOf(a, b);
	return { x: K * y, slope: (-2 * b) / (a + b * y + b) };
}

/**
 * Darcy friction factor of turbulent flow, exact to the last bit or two.
 *
 *   1/sqrt f = -2 log10(eps/(3.7 D) + 2.51/(Re sqrt f))
 *
 * @param Re Reynolds number [-], above 4000
 * @param roughness relative roughness eps/D [-], 0 to 0.05
 * @returns f Darcy friction factor [-]
 * @throws {OutOfRangeError} when the equation has no root to be found
 * @source Colebrook, Turbulent flow in pipes, Journal of the Institution of Civil Engineers 11 (1939)
 * @check fixtures/published/friction.json
 */
export function frictionColebrook1939(Re: number, roughness: number): number {
	requireSolvable(Re, roughness);
	const x = K * rootOf(roughness / 3.7, VISCOUS / Re);
	return 1 / (x * x);
}
