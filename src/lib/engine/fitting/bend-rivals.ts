// Other authors' methods for round bends, beside those of Idelchik and of SMACNA.
import { PI, pow, radians, sin } from '../arithmetic';
import { requireInRange, type Range } from '../errors';
import { interpolate } from './interpolate';

/**
 * Smooth round bend, wall friction along the arc included.
 *
 *   K = f a r/D + (0.10 + 2.4 f) sin(a/2) + 6.6 f (sqrt(sin(a/2)) + sin(a/2))/(r/D)^(4 a/pi)
 *
 * @param angle a [°], 0 to 180
 * @param radiusRatio r/D [-], from 0.5
 * @param f Darcy friction factor [-]
 * @returns K on the velocity pressure in the bend [-]
 * @source Rennels & Hudson, Pipe Flow (2012)
 * @check fixtures/published/elbows.json
 */
export function bendRennels2012(angle: number, radiusRatio: number, f: number): number {
	const a = radians(angle);
	const s = sin(a / 2);
	const arc = f * a * radiusRatio;
	return arc + (0.1 + 2.4 * f) * s + (6.6 * f * (Math.sqrt(s) + s)) / pow(radiusRatio, (4 * a) / PI);
}

/**
 * Round mitred elbow.
 *
 *   K = 0.42 sin(a/2) + 2.56 sin^3(a/2)
 *
 * @param angle a [°], 0 to 150
 * @returns K on the velocity pressure in the duct [-]
 * @source Rennels & Hudson, Pipe Flow (2012)
 * @check fixtures/published/elbows.json
 */
export function mitreRennels2012(angle: number): number {
	const s = sin(radians(angle / 2));
	return 0.42 * s + 2.56 * s * s * s;
}

/** Re (D/2r)^2 from which the bend is turbulent by this method [-]. */
export const ITO_CURVED: Range = { min: 91, max: Number.MAX_VALUE };
const ITO_ANGLES = [45, 90, 180];

/**
 * Smooth round bend with smooth walls, wall friction along the arc included.
 *
 *   K = 0.00241 k a Re^-0.17 (2r/D)^0.84 for Re (D/2r)^2 above 91; with R = 2r/D
 *   k = 1 + 14.2 R^-1.47 (45°), 0.95 + 17.2 R^-1.96 or 1 when R >= 19.7 (90°), 1 + 116 R^-4.52 (180°); straight between
 *
 * @param radiusRatio r/D [-], from 0.5
 * @param Re Reynolds number [-]
 * @param angle a [°], 45 to 180; k of 45° is held below
 * @returns K on the velocity pressure in the bend [-]
 * @throws {OutOfRangeError} when Re (D/2r)^2 leaves its range
 * @source Ito, Pressure losses in smooth pipe bends (1960), from memory; agrees with its checks
 * @check fixtures/published/elbows.json
 */
export function bendIto1960(radiusRatio: number, Re: number, angle: number): number {
	const R = 2 * radiusRatio;
	requireInRange('bendIto1960', 'Re (D/2r)^2', Re / (R * R), ITO_CURVED);
	const square = R < 19.7 ? 0.95 + 17.2 * pow(R, -1.96) : 1;
	const k = interpolate(ITO_ANGLES, [1 + 14.2 * pow(R, -1.47), square, 1 + 116 * pow(R, -4.52)], angle);
	return 0.00241 * k * angle * pow(Re, -0.17) * pow(R, 0.84);
}

/**
 * Wall friction along the centre line of a bend, which some authors count with it.
 *
 *   K = f a r/D
 *
 * @param angle a [°]
 * @param radiusRatio r/D [-]
 * @param f Darcy friction factor [-]
 * @returns K on the velocity pressure in the bend [-]
 * @source Definition of the friction factor
 * @check none: it is the friction of a duct as long as the arc
 */
export function arcFriction(angle: number, radiusRatio: number, f: number): number {
	return f * radians(angle) * radiusRatio;
}
