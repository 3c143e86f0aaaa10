import { pow } from '../arithmetic';
import { interpolate } from './interpolate';

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

const WIRE_RE = [20, 30, 40, 60, 80, 100, 200, 400];
const WIRE_FACTORS = [1.3, 1.1, 0.95, 0.83, 0.75, 0.7, 0.6, 0.52];

/**
 * Screen of round wire: the table that rivals the formula of Idelchik.
 *
 *   C = b (1 - f^2)/f^2, b by a table of the Reynolds number
 *
 * @param f free-area ratio [-], 0.05 to 0.8
 * @param Re Reynolds number of the space between the wires [-], from 20; from 400 on b stays
 * @returns C on the approach velocity pressure [-]
 * @source Blevins, Applied Fluid Dynamics Handbook (1984), table at second hand
 * @check fixtures/published/screens.json
 */
export function wireScreenBlevins(f: number, Re: number): number {
	return (interpolate(WIRE_RE, WIRE_FACTORS, Re) * (1 - f * f)) / (f * f);
}

const SQUARE_FREE = [
	0.05, 0.1, 0.15, 0.2, 0.25, 0.3, 0.35, 0.4, 0.45, 0.5, 0.55, 0.6, 0.65, 0.7, 0.75, 0.8, 0.85, 0.9, 1
];
const SQUARE = [1000, 250, 85, 52, 30, 17, 11, 7.7, 5.5, 3.8, 2.8, 2, 1.5, 1.1, 0.78, 0.53, 0.35, 0.08, 0];

/**
 * Perforated plate or screen of square bars: the table that rivals the formula of Idelchik.
 *
 * @param f free-area ratio [-], 0.05 to 1
 * @returns C on the approach velocity pressure [-]
 * @source Blevins, Applied Fluid Dynamics Handbook (1984), table at second hand
 * @check none: Idelchik's formula lies within 20 % from f 0.25 to 0.8, in a test
 */
export function thinPlateBlevins(f: number): number {
	return interpolate(SQUARE_FREE, SQUARE, f);
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
