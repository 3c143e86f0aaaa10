import { exp, log } from '../arithmetic';
import type { Range } from '../errors';
import { colebrookRoot } from './colebrook';

/** Laminar below, turbulent above; neither within [-]. */
export const TRANSITION: Range = { min: 2_000, max: 4_000 };
const LOG_MIN = 7.600902459542082; // ln 2000
const LOG_SPAN = 0.6931471805599453; // ln 2

/** y = start + t (one + t (two + t three)), t from 0 to 1 over the transition. */
interface Cubic {
	readonly start: number;
	readonly one: number;
	readonly two: number;
	readonly three: number;
}

/** The cubic that meets both laws with value and slope (Hermite). */
function cubicOf(roughness: number, laminar: number): Cubic {
	const { x, slope } = colebrookRoot(TRANSITION.max, roughness);
	const start = log(laminar) + LOG_MIN;
	const end = 2 * (LOG_MIN + LOG_SPAN) - 2 * log(x);
	const one = LOG_SPAN;
	const last = (2 + slope) * LOG_SPAN;
	const rise = end - start;
	return { start, one, two: 3 * rise - 2 * one - last, three: one + last - 2 * rise };
}

/**
 * Friction factor between laminar and turbulent flow, where nature settles on neither.
 *
 *   y = ln(f Re^2) is a cubic in u = ln Re that meets both laws with value and slope (Hermite). Its end slopes, 1 and
 *   about 1.8, stay below three times the mean slope, so that y rises all the way (Fritsch & Carlson 1980): the pressure
 *   loss rises with the flow.
 *
 * @param Re Reynolds number [-], 2000 to 4000
 * @param roughness relative roughness [-], 0 to 1
 * @param laminar f Re of laminar flow [-]
 * @returns f Darcy friction factor [-]
 * @source No standard; the blend is ours, after Fritsch & Carlson, Monotone piecewise cubic interpolation (1980)
 * @check none: no published value; laws tested in friction.test.ts
 */
export function blendedFriction(Re: number, roughness: number, laminar: number): number {
	const { start, one, two, three } = cubicOf(roughness, laminar);
	const u = log(Re);
	const t = (u - LOG_MIN) / LOG_SPAN;
	return exp(start + t * (one + t * (two + t * three)) - 2 * u);
}

/**
 * Slope of the blend, in logarithms.
 *
 *   d ln f/d ln Re = dy/du - 2
 *
 * @param Re Reynolds number [-], 2000 to 4000
 * @param roughness relative roughness [-], 0 to 1
 * @param laminar f Re of laminar flow [-]
 * @returns slope [-]
 * @source Derivative of blendedFriction
 * @check none: compared with finite differences in friction-slope.test.ts
 */
export function blendedSlope(Re: number, roughness: number, laminar: number): number {
	const { one, two, three } = cubicOf(roughness, laminar);
	const t = (log(Re) - LOG_MIN) / LOG_SPAN;
	return (one + t * (2 * two + 3 * t * three)) / LOG_SPAN - 2;
}
