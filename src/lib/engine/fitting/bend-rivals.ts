// Other methods for round bends, for comparison; the catalogue uses those of Idelchik and of SMACNA.
import { PI, pow, radians, sin } from '../arithmetic';
import { requireInRange, type Range } from '../errors';

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

const ITO_CURVED: Range = { min: 91, max: Number.MAX_VALUE };

/**
 * Smooth round bend of 90° with smooth walls, wall friction along the arc included.
 *
 *   K = 0.00241 k 90 Re^-0.17 (2r/D)^0.84 for Re (D/2r)^2 above 91; k = 0.95 + 17.2 (2r/D)^-1.96, or 1 when 2r/D >= 19.7
 *
 * @param radiusRatio r/D [-], from 0.5
 * @param Re Reynolds number [-]
 * @returns K on the velocity pressure in the bend [-]
 * @throws {OutOfRangeError} when Re (D/2r)^2 leaves its range
 * @source Ito, Pressure losses in smooth pipe bends (1960), from memory; agrees with its checks
 * @check fixtures/published/elbows.json
 */
export function bendIto1960(radiusRatio: number, Re: number): number {
	const R = 2 * radiusRatio;
	requireInRange('bendIto1960', 'Re (D/2r)^2', Re / (R * R), ITO_CURVED);
	const k = R < 19.7 ? 0.95 + 17.2 * pow(R, -1.96) : 1;
	return 0.00241 * k * 90 * pow(Re, -0.17) * pow(R, 0.84);
}
