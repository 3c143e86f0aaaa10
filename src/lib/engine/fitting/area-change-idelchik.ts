import { exp, pow, radians, sin } from '../arithmetic';
import type { Range } from '../errors';

/** Included angles of a cone [°]; below, it is a duct. */
export const CONE_ANGLE: Range = { min: 3, max: 180 };
/** Included angle up to which the shock term of a widening cone is used alone [°]. */
const SHOCK_ANGLE = 60;
/** Included angle from which a widening cone is as bad as a sudden change [°]. */
const SUDDEN_ANGLE = 90;

/**
 * Sudden expansion.
 *
 *   C = (1 - a)^2, a = smaller/larger area
 *
 * @param a area ratio [-], 0 to 1
 * @returns C on the velocity pressure in the smaller leg [-]
 * @source Borda & Carnot; Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 4-1
 * @check fixtures/published/area-changes.json
 */
export function suddenExpansion(a: number): number {
	return (1 - a) * (1 - a);
}

/**
 * Sudden contraction.
 *
 *   C = 0.5 (1 - a)^0.75, a = smaller/larger area
 *
 * @param a area ratio [-], 0 to 1
 * @returns C on the velocity pressure in the smaller leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 4-9
 * @check fixtures/published/area-changes.json
 */
export function suddenContractionIdelchik(a: number): number {
	return 0.5 * pow(1 - a, 0.75);
}

/** Shock term of a widening cone, up to 60° included. */
function shock(angle: number, a: number): number {
	return 0.9455 * (1 - exp(-0.0541 * angle)) * pow(1 - a, 1.92);
}

/**
 * Conical expansion, local part.
 *
 *   C = phi (1 - a)^1.92, phi = 0.9455 (1 - e^(-0.0541 angle)), up to 60°; (1 - a)^2 from 90°; straight lines between
 *   (ours: real cones of 40 to 90° are as bad as a sudden expansion, or some 10 % worse)
 *
 * @param angle included angle [°], 3 to 180
 * @param a smaller/larger area [-], 0 to 1
 * @returns C on the velocity pressure in the smaller leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., eq. 5-7 and diagram 5-4, as fitted by others
 * @check fixtures/published/area-changes.json
 */
export function conicalExpansionIdelchik(angle: number, a: number): number {
	if (angle <= SHOCK_ANGLE) return shock(angle, a);
	if (angle >= SUDDEN_ANGLE) return suddenExpansion(a);
	const t = (angle - SHOCK_ANGLE) / (SUDDEN_ANGLE - SHOCK_ANGLE);
	return (1 - t) * shock(SHOCK_ANGLE, a) + t * suddenExpansion(a);
}

/**
 * Conical contraction, local part.
 *
 *   C = (-0.0125 a^4 + 0.0224 a^3 - 0.00723 a^2 + 0.00444 a - 0.00745)(r^3 - 2 pi r^2 - 10 r), r the angle in radians
 *
 * @param angle included angle [°], 3 to 180
 * @param a smaller/larger area [-], 0 to 1
 * @returns C on the velocity pressure in the smaller leg [-]; 0 when the areas are equal, where the polynomial would leave 0.001 at 20° and
 * 0.021 at 180°
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., diagram 5-23
 * @check fixtures/published/area-changes.json
 */
export function conicalContractionIdelchik(angle: number, a: number): number {
	if (a === 1) return 0;
	const r = radians(angle);
	const inArea = -0.00745 + a * (0.00444 + a * (-0.00723 + a * (0.0224 - 0.0125 * a)));
	return inArea * r * (r * (r - 2 * radians(180)) - 10);
}

/**
 * Wall friction along a cone.
 *
 *   C = f (1 - a^2)/(8 sin(angle/2))
 *
 * @param angle included angle [°], 3 to 180
 * @param a smaller/larger area [-], 0 to 1
 * @param f Darcy friction factor [-]
 * @returns C on the velocity pressure in the smaller leg [-]
 * @source Idelchik, Handbook of Hydraulic Resistance, 3rd ed., chapter 5; the same in Rennels & Hudson (2012)
 * @check fixtures/published/area-changes.json
 */
export function coneFriction(angle: number, a: number, f: number): number {
	return (f * (1 - a * a)) / (8 * sin(radians(angle / 2)));
}
