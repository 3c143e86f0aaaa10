import { exp, log } from '../arithmetic';
import { requireInRange, type Range } from '../errors';
import { LAMINAR_ROUND } from '../shape';
import { colebrookRoot, frictionColebrook1939 } from './colebrook';

export type Regime = 'laminar' | 'transition' | 'turbulent';

/** Laminar below, turbulent above; neither within [-]. */
export const TRANSITION: Range = { min: 2_000, max: 4_000 };
const LOG_MIN = 7.600902459542082; // ln 2000
const LOG_SPAN = 0.6931471805599453; // ln 2
const FLOWING: Range = { min: Number.MIN_VALUE, max: Number.MAX_VALUE };

export interface FrictionSpec {
	readonly reynolds: number;
	readonly relativeRoughness: number;
	/** f Re of laminar flow; 64 without it */
	readonly laminar?: number | undefined;
}

/** The regime of a Reynolds number [-]. */
export function regime(reynolds: number): Regime {
	if (reynolds < TRANSITION.min) return 'laminar';
	return reynolds > TRANSITION.max ? 'turbulent' : 'transition';
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
	const { x, slope } = colebrookRoot(TRANSITION.max, roughness);
	const u = log(Re);
	const t = (u - LOG_MIN) / LOG_SPAN;
	const y0 = log(laminar) + LOG_MIN;
	const y1 = 2 * (LOG_MIN + LOG_SPAN) - 2 * log(x);
	const m0 = LOG_SPAN;
	const m1 = (2 + slope) * LOG_SPAN;
	const rise = y1 - y0;
	const y = y0 + t * (m0 + t * (3 * rise - 2 * m0 - m1 + t * (m0 + m1 - 2 * rise)));
	return exp(y - 2 * u);
}

/**
 * Darcy friction factor at any Reynolds number.
 *
 *   Re < 2000: laminar/Re; Re > 4000: Colebrook–White; between: a rising blend
 *
 * @param spec Reynolds number [-] (positive), relative roughness [-] (0 to 1), f Re of laminar flow [-] (64, round)
 * @returns f Darcy friction factor [-]
 * @throws {OutOfRangeError} when the Reynolds number is not positive or the roughness leaves its range
 * @source Hagen & Poiseuille; Colebrook (1939)
 * @check fixtures/published/friction.json
 */
export function frictionFactor({ reynolds, relativeRoughness, laminar = LAMINAR_ROUND }: FrictionSpec): number {
	requireInRange('frictionFactor', 'reynolds', reynolds, FLOWING);
	switch (regime(reynolds)) {
		case 'laminar':
			return laminar / reynolds;
		case 'turbulent':
			return frictionColebrook1939(reynolds, relativeRoughness);
		case 'transition':
			return blendedFriction(reynolds, relativeRoughness, laminar);
	}
}
