// The factors that Idelchik and Crane print in pieces, with the jumps smoothed; q = Qb/Qc, a = Ab/Ac.
import { mixed, stepAbove } from './junction-smooth';

/**
 * Factor of the branch of a junction where streams unite.
 *
 *   A = 1 for a <= 0.35; above, 0.9 (1 - q) for q <= 0.4 and 0.55 beyond
 *   Smoothed (ours): a 0.35 to 0.39, q 0.40 to 0.44
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @returns A [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., table 7-1; the same in Crane TP-410 (2009)
 * @check fixtures/published/junctions-converging.json
 */
export function unitingFactor(q: number, a: number): number {
	const wide = mixed(0.9 * (1 - q), 0.55, stepAbove(q, 0.4));
	return mixed(1, wide, stepAbove(a, 0.35));
}

/**
 * Factor of the branch of a junction where the stream divides, angles below 75°.
 *
 *   A' = 1.1 - 0.7 q for a <= 0.35, q <= 0.4, and 0.85 beyond; 1 - 0.6 q for a > 0.35, q <= 0.6, and 0.6 beyond
 *   Smoothed (ours): a 0.35 to 0.39, q 0.40 to 0.44 and 0.60 to 0.64
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @returns A' [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., table 7-4; the same in Crane TP-410 (2009)
 * @check fixtures/published/junctions-diverging.json
 */
export function dividingFactor(q: number, a: number): number {
	const narrow = mixed(1.1 - 0.7 * q, 0.85, stepAbove(q, 0.4));
	const wide = mixed(1 - 0.6 * q, 0.6, stepAbove(q, 0.6));
	return mixed(narrow, wide, stepAbove(a, 0.35));
}

/**
 * Factor of the straight leg where the stream divides.
 *
 *   tau = 0.4 for a <= 0.4; above, 2 (2q - 1) for q <= 0.5 and 0.3 (2q - 1) beyond
 *   Smoothed (ours): a 0.40 to 0.44; at q = 0.5 it bends but does not jump
 *
 * @param q flow of the branch over that of the common leg [-], 0 to 1
 * @param a area of the branch over that of the common leg [-], above 0 to 1
 * @returns tau [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 7-20; the same in Crane TP-410 (2009)
 * @check fixtures/published/junctions-diverging.json
 */
export function passageFactor(q: number, a: number): number {
	// Both printed branches are 0 at q = 0.5: the factor bends there, and jumps nowhere.
	const wide = (q <= 0.5 ? 2 : 0.3) * (2 * q - 1);
	return mixed(0.4, wide, stepAbove(a, 0.4));
}
