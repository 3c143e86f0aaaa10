import { pow } from '../arithmetic';

/**
 * Wire screen.
 *
 *   C = 1.3 (1 - f) + (1/f - 1)^2
 *
 * @param f free-area ratio [-], above 0 to 1; Reynolds number of the wire above 1000
 * @returns C on the approach velocity pressure [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, diagram 8-6, from memory
 * @check fixtures/published/screens.json
 */
export function wireScreenIdelchik(f: number): number {
	return 1.3 * (1 - f) + (1 / f - 1) * (1 / f - 1);
}

/**
 * Thin perforated plate or grid, sharp edges.
 *
 *   C = [0.707 (1 - f)^0.375 + 1 - f]^2/f^2
 *
 * @param f free-area ratio [-], above 0 to 1; thickness over hole diameter to 0.015
 * @returns C on the approach velocity pressure [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, diagram 8-1, from memory
 * @check fixtures/published/screens.json
 */
export function thinPlateIdelchik(f: number): number {
	const root = (0.707 * pow(1 - f, 0.375) + 1 - f) / f;
	return root * root;
}

/**
 * Thick perforated plate or grid.
 *
 *   C = [0.5 (1 - f)^0.75 + tau (1 - f)^1.375 + (1 - f)^2 + lambda l]/f^2,
 *   tau = (2.4 - l) 10^-(0.25 + 0.535 l^8/(0.05 + l^8)), l = thickness over hole diameter
 *
 * @param f free-area ratio [-], above 0 to 1
 * @param l thickness over hole diameter [-], 0 to 2.4
 * @param lambda Darcy friction factor in the holes [-]
 * @returns C on the approach velocity pressure [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagrams 4-15 and 8-3
 * @check fixtures/published/screens.json
 */
export function thickPlateIdelchik(f: number, l: number, lambda: number): number {
	const l2 = l * l;
	const l8 = l2 * l2 * l2 * l2;
	const tau = (2.4 - l) * pow(10, -(0.25 + (0.535 * l8) / (0.05 + l8)));
	const closed = 1 - f;
	return (0.5 * pow(closed, 0.75) + tau * pow(closed, 1.375) + closed * closed + lambda * l) / (f * f);
}

/**
 * Obstruction in a duct, a rod or a bar across it.
 *
 *   C = Cx s/(1 - tau s)^3
 *
 * @param s frontal area over duct area [-], 0 to 0.3
 * @param Cx drag coefficient [-], about 1.2 for a cylinder, 2 for a flat bar
 * @param tau blockage factor [-], 1 to 1.5
 * @returns C on the velocity pressure in the duct [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, chapter 10, from memory and with little confidence
 * @check fixtures/published/screens.json
 */
export function obstructionIdelchik(s: number, Cx: number, tau: number): number {
	const open = 1 - tau * s;
	return (Cx * s) / (open * open * open);
}
