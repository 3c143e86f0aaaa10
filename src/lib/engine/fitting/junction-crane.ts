// Crane's form of the same equations, with factors printed for four angles; pipes, straight leg as wide as the common leg.
// q = Qb/Qc, a = (Db/Dc)^2 = Ab/Ac. The jumps of the printed factors are smoothed as in junction-factors.
import { cos, radians } from '../arithmetic';
import { interpolate } from './interpolate';
import { dividingFactor, passageFactor, unitingFactor } from './junction-factors';
import { mixed } from './junction-smooth';

const ANGLES = [30, 45, 60, 90];
/** Printed for 2 cos(angle); straight lines between. */
const F = [1.74, 1.41, 1, 0];

/**
 * Branch of uniting streams.
 *
 *   K = C [1 + (q/a)^2 - 2 (1 - q)^2 - (F/a) q^2], C as unitingFactor, F = 1.74, 1.41, 1, 0 at 30, 45, 60, 90°
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @param angle between branch and straight leg [°], 30 to 90
 * @returns K on the velocity pressure of the common leg [-]
 * @source Crane, Technical Paper 410 (2009), as the fluids package has it
 * @check fixtures/published/junctions-converging.json
 */
export function branchConvergingCrane2009(q: number, a: number, angle: number): number {
	const bracket = 1 + (q * q) / (a * a) - 2 * (1 - q) * (1 - q) - (interpolate(ANGLES, F, angle) / a) * q * q;
	return unitingFactor(q, a) * bracket;
}

/**
 * Straight leg of uniting streams.
 *
 *   up to 60°: K = 1 - (1 - q)^2 - (F/a) q^2, F = 1.74, 1.41, 1 at 30, 45, 60°; at 90°: K = 1.55 q - q^2
 *   straight lines between 60 and 90° (ours; the fluids package changes over at 75°)
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @param angle between branch and straight leg [°], 30 to 90
 * @returns K on the velocity pressure of the common leg [-]
 * @source Crane, Technical Paper 410 (2009), as the fluids package has it
 * @check fixtures/published/junctions-converging.json
 */
export function straightConvergingCrane2009(q: number, a: number, angle: number): number {
	const oblique = 1 - (1 - q) * (1 - q) - (interpolate(ANGLES, F, Math.min(angle, 60)) / a) * q * q;
	return mixed(oblique, q * (1.55 - q), Math.min(Math.max((angle - 60) / 30, 0), 1));
}

/**
 * Branch of a dividing stream. Not for 90° with Db/Dc above 2/3, where the printed factors are in doubt.
 *
 *   up to 75°: K = G (1 + x^2 - 2 x cos(angle)), x = q/a, G as dividingFactor; at 90°: K = 1 + x^2
 *   straight lines between 75 and 90° (ours)
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1; to 4/9 above 75°
 * @param angle between branch and straight leg [°], 30 to 90
 * @returns K on the velocity pressure of the common leg [-]
 * @source Crane, Technical Paper 410 (2009), as the fluids package describes it
 * @check fixtures/published/junctions-diverging.json
 */
export function branchDivergingCrane2009(q: number, a: number, angle: number): number {
	const x = q / a;
	const oblique = dividingFactor(q, a) * (1 + x * x - 2 * x * cos(radians(Math.min(angle, 75))));
	return mixed(oblique, 1 + x * x, Math.min(Math.max((angle - 75) / 15, 0), 1));
}

/**
 * Straight leg of a dividing stream.
 *
 *   K = M q^2, M as passageFactor
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @returns K on the velocity pressure of the common leg [-]
 * @source Crane, Technical Paper 410 (2009), as the fluids package has it
 * @check fixtures/published/junctions-diverging.json
 */
export function straightDivergingCrane2009(q: number, a: number): number {
	return passageFactor(q, a) * q * q;
}
