import type { DesignDocument, Solution } from '../document/types';
import { effectsOf } from './effects';
import { firstOrder } from './first-order';
import { monteCarlo } from './monte-carlo';
import type { SpreadOptions } from './spreads';
import type { MonteCarlo, Uncertainty } from './types';

/** Draws of a Monte Carlo where none are named. */
const SAMPLES = 2_000;

/**
 * What the stated spreads of methods and inputs come to at the fan and at each path, to the first order.
 *
 * @param document the design document, SI units
 * @param solution what `solveDesign` gave for it
 * @param spreads in place of the standing ones, fractions
 */
export function uncertaintyOf(document: DesignDocument, solution: Solution, spreads: SpreadOptions = {}): Uncertainty {
	return firstOrder(solution, effectsOf(document, solution, spreads));
}

/**
 * The same by drawing: seeded, so that the same seed gives the same figures anywhere.
 *
 * @param document the design document, SI units
 * @param solution what `solveDesign` gave for it
 * @param options seed, number of draws, and spreads in place of the standing ones
 */
export function monteCarloOf(
	document: DesignDocument,
	solution: Solution,
	options: { readonly seed: number; readonly samples?: number; readonly spreads?: SpreadOptions }
): MonteCarlo {
	const effects = effectsOf(document, solution, options.spreads ?? {});
	return monteCarlo(solution, effects, options.seed, options.samples ?? SAMPLES);
}
