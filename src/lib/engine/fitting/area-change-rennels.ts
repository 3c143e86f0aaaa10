// Area changes by Rennels & Hudson, beside those of Idelchik.
import { PI, pow, radians, sin, tan } from '../arithmetic';
import { coneFriction } from './area-change-idelchik';

const fourth = (x: number): number => x * x * x * x;

/** What stands before (1 - b^2)^2 above 20°, b = smaller/larger diameter. */
function expansionFactor(angle: number, b: number): number {
	const slender = b < 0.5;
	const edge = slender ? 3.28 * (0.0625 - fourth(b)) : 0;
	if (angle <= 60) {
		const main = 1.366 * Math.sqrt(sin((2 * PI * (angle - 15)) / 180)) - 0.17;
		return main - edge * Math.sqrt((angle - 20) / 40);
	}
	const wide = Math.sqrt((angle - 60) / 120);
	return 1.205 - edge - (slender ? 12.8 * fourth(b) * b * b : 0.2) * wide;
}

/**
 * Conical expansion, wall friction included up to 60°.
 *
 *   up to 20°: K = 8.30 tan(a/2)^1.75 (1 - b^2)^2 + f (1 - b^4)/(8 sin(a/2))
 *   20 to 60°: K = {1.366 sin[2 pi (a - 15)/180]^0.5 - 0.170 - e sqrt((a - 20)/40)}(1 - b^2)^2 + friction
 *   above:     K = {1.205 - e - g sqrt((a - 60)/120)}(1 - b^2)^2
 *   e = 3.28 (0.0625 - b^4) for b < 0.5, else 0; g = 12.8 b^6 for b < 0.5, else 0.20; b = smaller/larger diameter
 *
 * @param angle a, included angle [°], above 0 to 180
 * @param areaRatio b^2, smaller/larger area [-], 0 to 1
 * @param f Darcy friction factor [-]
 * @returns K on the velocity pressure in the smaller leg [-]
 * @source Rennels & Hudson, Pipe Flow (2012)
 * @check fixtures/published/area-changes.json
 */
export function conicalExpansionRennels2012(angle: number, areaRatio: number, f: number): number {
	const shock = (1 - areaRatio) * (1 - areaRatio);
	const factor = angle <= 20 ? 8.3 * pow(tan(radians(angle / 2)), 1.75) : expansionFactor(angle, Math.sqrt(areaRatio));
	return factor * shock + (angle <= 60 ? coneFriction(angle, areaRatio, f) : 0);
}

/**
 * Conical contraction, wall friction included.
 *
 *   K = 0.0696 sin(a/2) (1 - b^5) l^2 + (l - 1)^2 + f (1 - b^4)/(8 sin(a/2)),
 *   l = 1 + 0.622 (a/180)^0.8 (1 - 0.215 b^2 - 0.785 b^5), b = smaller/larger diameter
 *
 * @param angle a, included angle [°], above 0 to 180
 * @param areaRatio b^2, smaller/larger area [-], 0 to 1
 * @param f Darcy friction factor [-]
 * @returns K on the velocity pressure in the smaller leg [-]
 * @source Rennels & Hudson, Pipe Flow (2012)
 * @check fixtures/published/area-changes.json
 */
export function conicalContractionRennels2012(angle: number, areaRatio: number, f: number): number {
	const b = Math.sqrt(areaRatio);
	const b5 = areaRatio * areaRatio * b;
	const l = 1 + 0.622 * pow(angle / 180, 0.8) * (1 - 0.215 * areaRatio - 0.785 * b5);
	const local = 0.0696 * sin(radians(angle / 2)) * (1 - b5) * l * l + (l - 1) * (l - 1);
	return local + coneFriction(angle, areaRatio, f);
}

/**
 * Sudden contraction: a conical one of 180° without friction.
 *
 *   K = 0.0696 (1 - b^5) l^2 + (l - 1)^2, l = 1 + 0.622 (1 - 0.215 b^2 - 0.785 b^5), b = smaller/larger diameter
 *
 * @param areaRatio b^2, smaller/larger area [-], 0 to 1
 * @returns K on the velocity pressure in the smaller leg [-]
 * @source Rennels & Hudson, Pipe Flow (2012)
 * @check none: the spread to Idelchik's formula is recorded in a test
 */
export function suddenContractionRennels2012(areaRatio: number): number {
	return conicalContractionRennels2012(180, areaRatio, 0);
}
