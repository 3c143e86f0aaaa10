import { PI, pow } from '../arithmetic';
import type { Size } from './size';

/**
 * Round duct of equal flow and equal loss for a rectangle.
 *
 *   De = 1.30 (a b)^0.625/(a + b)^0.25
 *
 * @param a one side [m], positive; aspect ratio up to 8
 * @param b the other side [m], positive
 * @returns De equivalent diameter [m]; its velocity is Q/(pi De^2/4), not that of the rectangle
 * @source Huebscher, Friction equivalents for round, square and rectangular ducts (1948)
 * @check fixtures/published/shape.json
 */
export function equivalentRectangleHuebscher1948(a: number, b: number): number {
	return (1.3 * pow(a * b, 0.625)) / pow(a + b, 0.25);
}

/**
 * Round duct of equal flow and equal loss for a flat oval.
 *
 *   De = 1.55 A^0.625/P^0.25
 *
 * @param a minor side [m], positive
 * @param b major side [m], not less than a; b/a from 2 to 4 is typical
 * @returns De equivalent diameter [m]
 * @source Heyt & Diaz, Pressure drop in flat-oval spiral air duct (1975)
 * @check fixtures/published/shape.json
 */
export function equivalentOvalHeytDiaz1975(a: number, b: number): number {
	const A = (PI * a * a) / 4 + a * (b - a);
	const P = PI * a + 2 * (b - a);
	return (1.55 * pow(A, 0.625)) / pow(P, 0.25);
}

/**
 * Round duct of equal flow and equal loss; a round one is its own equivalent.
 *
 * @param size inner sides or diameter [m], positive
 * @returns equivalent diameter [m]
 * @source Huebscher (1948) for a rectangle, Heyt & Diaz (1975) for a flat oval
 * @check fixtures/published/shape.json
 */
export function equivalentDiameter(size: Size): number {
	if (size.shape === 'round') return size.diameter;
	if (size.shape === 'rectangular') return equivalentRectangleHuebscher1948(size.width, size.height);
	return equivalentOvalHeytDiaz1975(Math.min(size.width, size.height), Math.max(size.width, size.height));
}
