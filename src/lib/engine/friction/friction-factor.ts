import { requireInRange, type Range } from '../errors';
import { LAMINAR_ROUND } from '../shape';
import { TRANSITION, blendedFriction, blendedSlope } from './blend';
import { colebrookRoot, frictionColebrook1939 } from './colebrook';

export type Regime = 'laminar' | 'transition' | 'turbulent';

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

/**
 * Slope of the Darcy friction factor, exact in each regime and continuous between them.
 *
 *   Re < 2000: -laminar/Re^2; Re > 4000: -2 p f/((1 + p) Re), p = K b/(a + b x) at the root of Colebrook–White;
 *   between: (dy/du - 2) f/Re of the blend. The pressure loss of a duct then changes with its flow by
 *   d(dp)/dQ = (dp/Q) (2 + (Re/f) df/dRe).
 *
 * @param spec Reynolds number [-] (positive), relative roughness [-] (0 to 1), f Re of laminar flow [-] (64, round)
 * @returns df/dRe [-]
 * @throws {OutOfRangeError} when the Reynolds number is not positive or the roughness leaves its range
 * @source Derivative of frictionFactor
 * @check none: compared with finite differences in friction-slope.test.ts
 */
export function frictionFactorSlope({ reynolds, relativeRoughness, laminar = LAMINAR_ROUND }: FrictionSpec): number {
	requireInRange('frictionFactorSlope', 'reynolds', reynolds, FLOWING);
	switch (regime(reynolds)) {
		case 'laminar':
			return -laminar / reynolds / reynolds;
		case 'turbulent': {
			const { x, slope } = colebrookRoot(reynolds, relativeRoughness);
			return slope / (x * x) / reynolds;
		}
		case 'transition': {
			const slope = blendedSlope(reynolds, relativeRoughness, laminar);
			return (slope * blendedFriction(reynolds, relativeRoughness, laminar)) / reynolds;
		}
	}
}
