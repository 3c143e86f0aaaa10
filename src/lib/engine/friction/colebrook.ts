import { log, log10 } from '../arithmetic';
import { requireInRange, type Range } from '../errors';

/** Relative roughness for which the equation can be solved at all [-]; it was drawn up for values up to 0.05. */
export const SOLVABLE_ROUGHNESS: Range = { min: 0, max: 1 };
/** Relative roughness of the published range [-]. */
export const COLEBROOK_ROUGHNESS: Range = { min: 0, max: 0.05 };
/** Reynolds numbers for which the equation can be solved [-]. */
const SOLVABLE_REYNOLDS: Range = { min: 1_000, max: Number.MAX_VALUE };

/** 2/ln 10 */
const K = 0.8685889638065036;

export interface ColebrookRoot {
	/** 1/sqrt f */
	readonly x: number;
	/** Newton steps taken */
	readonly steps: number;
	/** d ln f/d ln Re at the root */
	readonly slope: number;
}

/**
 * Root of the Colebrook–White equation by Newton's method on x = 1/sqrt f.
 *
 *   F(x) = x + K ln(a + b x), F'(x) = 1 + K b/(a + b x), a = eps/3.7 D, b = 2.51/Re, K = 2/ln 10
 *   start: x0 = -2 log10(a + 5.74/Re^0.9), with Re^0.9 by its logarithm
 *
 * @param Re Reynolds number [-], from 1000
 * @param roughness relative roughness eps/D [-], 0 to 1
 * @returns x = 1/sqrt f [-], the steps taken and the slope of ln f against ln Re [-]
 * @throws {OutOfRangeError} when Re or roughness leaves its range
 * @source Colebrook, Turbulent flow in pipes (1939); start by Swamee & Jain (1976)
 * @check fixtures/published/friction.json
 */
export function colebrookRoot(Re: number, roughness: number): ColebrookRoot {
	requireInRange('colebrookRoot', 'Re', Re, SOLVABLE_REYNOLDS);
	requireInRange('colebrookRoot', 'roughness', roughness, SOLVABLE_ROUGHNESS);
	const a = roughness / 3.7;
	const b = 2.51 / Re;
	// One fixed-point turn from a rough guess starts close enough for two steps, three at most.
	let x = -2 * log10(a + b * (-2 * log10(a + 14 / Re)));
	let steps = 0;
	let change = Infinity;
	while (steps < 3 && Math.abs(change) > 1e-8 * x) {
		const inner = a + b * x;
		change = (x + K * log(inner)) / (1 + (K * b) / inner);
		x -= change;
		steps += 1;
	}
	const w = (K * b) / (a + b * x);
	return { x, steps, slope: (-2 * w) / (1 + w) };
}

/**
 * Darcy friction factor of turbulent flow.
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
	const { x } = colebrookRoot(Re, roughness);
	return 1 / (x * x);
}
