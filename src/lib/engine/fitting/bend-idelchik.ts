import { pow, radians, sin } from '../arithmetic';
import type { Range } from '../errors';
import { interpolate } from './interpolate';

/** Angles of a bend [°]. */
export const BEND_ANGLE: Range = { min: 0, max: 180 };
/** Centre-line radius over diameter or side for which the Reynolds factor is given [-]. */
export const BEND_RADIUS: Range = { min: 0.5, max: 3 };
/** Reynolds numbers of the factor [-]; it falls to 1 and stays there. */
export const BEND_REYNOLDS: Range = { min: 10_000, max: Infinity };

const ASPECT = [0.25, 0.5, 0.75, 1, 1.5, 2, 3, 4, 5, 6, 8];
const ASPECT_FACTOR = [1.3, 1.17, 1.09, 1, 0.9, 0.85, 0.85, 0.9, 0.95, 0.98, 1];
/** Aspect ratios H/W of the factor [-]. */
export const BEND_ASPECT: Range = { min: 0.25, max: 8 };

/** Between the two formulas of the angle, straight lines through 1 at 90°. */
const TURN = [70, 90, 100];
const TURN_FACTOR = [0.9 * sin(radians(70)), 1, 0.7 + 35 / 90];

function angleFactor(d: number): number {
	if (d <= 70) return 0.9 * sin(radians(d));
	if (d >= 100) return 0.7 + (0.35 * d) / 90;
	return interpolate(TURN, TURN_FACTOR, d);
}

/** Nearly all elbows of a design have one radius: its power is taken once. */
const last = new Float64Array([1, 1]);

function radiusFactor(R: number): number {
	if (last[0] !== R) {
		last[1] = R <= 1 ? pow(R, -2.5) : pow(R, -0.5);
		last[0] = R;
	}
	return last[1] as number;
}

/**
 * Bend of round or square section, smooth walls, local part (wall friction along the arc belongs to the duct's length).
 *
 *   C = A1 B1; A1 = 0.9 sin d (d <= 70°), 1 (90°), 0.7 + 0.35 d/90 (d >= 100°), straight lines between;
 *   B1 = 0.21 (R/D)^-2.5 (0.5 <= R/D <= 1), 0.21 (R/D)^-0.5 above
 *
 * @param d angle of the bend [°], 0 to 180
 * @param R centre-line radius over diameter, or over the side in the plane of the bend [-], from 0.5
 * @returns C on the velocity pressure in the bend [-], Re above 2e5
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 6-1
 * @check fixtures/published/elbows.json
 */
export function bendIdelchik(d: number, R: number): number {
	return angleFactor(d) * 0.21 * radiusFactor(R);
}

/**
 * Factor C1 for a rectangular bend.
 *
 * @param aspect H/W, side parallel to the axis of the bend over side in its plane [-], 0.25 to 8
 * @returns factor on C [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 6-1; table from memory
 * @check fixtures/published/elbows.json
 */
export function bendAspectFactorIdelchik(aspect: number): number {
	return interpolate(ASPECT, ASPECT_FACTOR, aspect);
}

/**
 * Factor for low Reynolds numbers. The source gives it below 2e5, where it does not yet meet 1; it is carried on until it
 * does (Re 3.8e5 for R/D above 0.7, 1.7e6 for 0.55 to 0.7), so that nothing jumps along Re. Never less than the source.
 * Along R/D it jumps as the source does: up to 1.42 times at 0.55, 0.83 to 1.09 times at 0.7.
 *
 *   1 + 4400/Re (0.5 <= R/D < 0.55), 5.45/Re^0.118 (0.55 to 0.70), 11.5/Re^0.19 (above); never below 1
 *
 * @param R centre-line radius over diameter [-], 0.5 to 3
 * @param Re Reynolds number [-], from 10 000
 * @returns factor on C [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., chapter 6
 * @check fixtures/published/elbows.json
 */
export function bendReynoldsFactorIdelchik(R: number, Re: number): number {
	if (R < 0.55) return 1 + 4_400 / Re;
	return Math.max(1, R < 0.7 ? 5.45 / pow(Re, 0.118) : 11.5 / pow(Re, 0.19));
}
