// One stream of a tee or wye by Idelchik, between his two forms: straight leg as wide as the common one, and areas adding.
import {
	branchConvergingIdelchik,
	branchDivergingIdelchik,
	straightConvergingIdelchik,
	straightDivergingIdelchik
} from './junction-idelchik';
import {
	branchConvergingAddingIdelchik,
	branchDivergingAddingIdelchik,
	straightConvergingAddingIdelchik,
	straightDivergingAddingIdelchik
} from './junction-idelchik-adding';
import { mixed } from './junction-smooth';
import type { JunctionContext } from './types';

/** A junction of one branch: q, a, s are those of the branch and of the straight leg over the common leg. */
export interface Branching {
	readonly direction: JunctionContext['direction'];
	readonly q: number;
	readonly a: number;
	readonly s: number;
	/** [°] */
	readonly angle: number;
	/** Height or diameter of the branch over that of the common leg [-] */
	readonly heightRatio: number;
}

/**
 * How far the areas of a junction add up.
 *
 *   w = (1 - s)/a, held to 0 to 1: 0 where the straight leg is as wide as the common one, 1 where s + a = 1 (ours)
 *
 * @param a area of the branch over that of the common leg [-], above 0
 * @param s area of the straight leg over that of the common leg [-], above 0
 * @returns w [-]
 * @source The two forms of Idelchik's section 7; the straight line between them is ours
 * @check none: a blend of ours, held to its two ends by the test of the junctions
 */
export function addingShare(a: number, s: number): number {
	return Math.min(Math.max((1 - s) / a, 0), 1);
}

/**
 * Branch of a junction between the two forms.
 *
 *   C = (1 - w) C_common + w C_adding, w as addingShare
 *
 * @param junction direction, q, a, s, heightRatio [-], angle [°]
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., section 7; the line between the forms is ours
 * @check fixtures/published/junctions-diverging.json
 */
export function branchIdelchik({ direction, q, a, s, angle, heightRatio }: Branching): number {
	const w = addingShare(a, s);
	return direction === 'converging'
		? mixed(branchConvergingIdelchik(q, a, angle), branchConvergingAddingIdelchik(q, a, s, angle), w)
		: mixed(branchDivergingIdelchik(q, a, angle, heightRatio), branchDivergingAddingIdelchik(q, a, angle), w);
}

/**
 * Straight leg of a junction between the two forms.
 *
 *   C = (1 - w) C_common + w C_adding, w as addingShare
 *
 * @param junction direction, q, a, s, heightRatio [-], angle [°]
 * @returns C on the velocity pressure of the common leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., section 7; the line between the forms is ours
 * @check fixtures/published/junctions-diverging.json
 */
export function straightIdelchik({ direction, q, a, s, angle }: Branching): number {
	const w = addingShare(a, s);
	return direction === 'converging'
		? mixed(straightConvergingIdelchik(q, a, angle), straightConvergingAddingIdelchik(q, a, s, angle), w)
		: mixed(straightDivergingIdelchik(q, a), straightDivergingAddingIdelchik((1 - q) / s), w);
}

/**
 * Loss of both streams of a junction together, each weighted by its share of the flow.
 *
 *   C = q C_branch + (1 - q) C_straight
 *
 * @param junction direction, q, a, s, heightRatio [-], angle [°]
 * @returns C on the velocity pressure of the common leg [-]; below 0 the formulas make energy
 * @source Conservation of energy: the sum cannot be negative
 * @check none: a law, swept over the range by the test of the junctions
 */
export function weightedLoss(junction: Branching): number {
	return junction.q * branchIdelchik(junction) + (1 - junction.q) * straightIdelchik(junction);
}
