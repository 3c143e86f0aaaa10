import { PI, atan } from '../arithmetic';

/**
 * Included angle of the cone that has the areas and the length of a transition between two shapes.
 *
 *   d = 2 atan[(1/sqrt(a) - 1)/(l sqrt(pi))], a = smaller/larger area, l = length over the root of the smaller area
 *
 * @param a area ratio [-], above 0 to 1
 * @param l length over the root of the smaller area [-], above 0
 * @returns d included angle [°], 0 when the areas are equal
 * @source Geometry of two circles of the same areas; common practice
 * @check none: geometry, compared in a test with a cone drawn out
 */
export function equivalentAngle(a: number, l: number): number {
	return (2 * atan((1 / Math.sqrt(a) - 1) / (l * Math.sqrt(PI))) * 180) / PI;
}
