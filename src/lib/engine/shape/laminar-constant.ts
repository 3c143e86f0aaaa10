/** f Re of laminar flow in a round pipe (Hagen and Poiseuille). */
export const LAMINAR_ROUND = 64;

/**
 * Friction of laminar flow in a rectangle.
 *
 *   f Re = 96 (1 - 1.3553 a + 1.9467 a^2 - 1.7012 a^3 + 0.9564 a^4 - 0.2537 a^5), a = short/long side
 *
 * @param width one side [m], positive
 * @param height the other side [m], positive
 * @returns f Re on the hydraulic diameter [-], 56.9 (square) to 96 (parallel plates)
 * @source Shah & London, Laminar Flow Forced Convection in Ducts (1978), polynomial of the exact series
 * @check fixtures/published/shape.json
 */
export function laminarRectangle(width: number, height: number): number {
	const a = Math.min(width, height) / Math.max(width, height);
	return 96 * (1 + a * (-1.3553 + a * (1.9467 + a * (-1.7012 + a * (0.9564 - 0.2537 * a)))));
}
