import { exp, log } from '../arithmetic';
import type { Range } from '../errors';
import { colebrookRoot } from './colebrook';

/** Laminar below, turbulent above; neither within [-]. */
export const TRANSITION: Range = { min: 2_000, max: 4_000 };
const LN2 = 0.6931471805599453; // of the width of the transition, in ln Re

/** y - y(2000) = t (one + t (two + t three)), t = log2(Re/2000), 0 to 1 over the transition. */
interface Cubic {
	readonly one: number;
	readonly two: number;
	readonly three: number;
}

/** The cubic that meets both laws with value and slope (Hermite). */
function cubicOf(roughness: number, laminar: number): Cubic {
	const { x, slope } = colebrookRoot(TRANSITION.max, roughness);
	// f Re^2 at 4000 over that at 2000
	const rise = log((TRANSITION.max * TRANSITION.max) / (TRANSITION.min * laminar * x * x));
	const one = LN2;
	const last = (2 + slope) * LN2;
	return { one, two: 3 * rise - 2 * one - last, three: one + last - 2 * rise };
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
	const { one, two, three } = cubicOf(roughness, laminar);
	const t = log(Re / TRANSITION.min) / LN2;
	return (exp(t * (one + t * (two + t * three))) * laminar * TRANSITION.min) / (Re * Re);
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
	const t = log(Re / TRANSITION.min) / LN2;
	return (one + t * (2 * two + 3 * t * three)) / LN2 - 2;
}
