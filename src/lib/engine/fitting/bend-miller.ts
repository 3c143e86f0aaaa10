import { log10 } from '../arithmetic';
import type { Range } from '../errors';
import { interpolate, interpolateTable } from './interpolate';

/** Radii, angles [°] and Reynolds numbers of the chart as it is carried here. */
export const MILLER_RADIUS: Range = { min: 0.75, max: 4 };
export const MILLER_ANGLE: Range = { min: 20, max: 180 };
export const MILLER_REYNOLDS: Range = { min: 1e4, max: 1e7 };

const RADII = [0.75, 0.85, 1, 1.25, 1.5, 2, 3, 4];
const ANGLES = [0, 20, 30, 45, 60, 75, 90, 120, 150, 180];
// The points at 0° are ours: a bend of no angle is a straight duct. At r/D 1.25 and 1.5 the last figure is that of 150°,
// where the fitted curves dip a little.
const CHART = [
	[0, 0.038, 0.067, 0.135, 0.227, 0.299, 0.387, 0.548, 0.644, 0.665],
	[0, 0.036, 0.062, 0.115, 0.183, 0.26, 0.294, 0.36, 0.404, 0.428],
	[0, 0.034, 0.058, 0.1, 0.148, 0.203, 0.248, 0.268, 0.274, 0.287],
	[0, 0.036, 0.059, 0.09, 0.129, 0.166, 0.206, 0.23, 0.237, 0.237],
	[0, 0.039, 0.061, 0.088, 0.12, 0.15, 0.184, 0.205, 0.209, 0.209],
	[0, 0.045, 0.064, 0.089, 0.112, 0.135, 0.16, 0.179, 0.183, 0.197],
	[0, 0.051, 0.07, 0.093, 0.115, 0.132, 0.155, 0.188, 0.209, 0.219],
	[0, 0.056, 0.077, 0.099, 0.123, 0.141, 0.166, 0.215, 0.244, 0.271]
];
const FACTOR_RADII = [1, 1.25, 1.5, 1.75, 2];
const RE = [1e4, 2e4, 5e4, 1e5, 2e5, 5e5, 1e6, 2e6, 5e6, 1e7].map(log10);
const FACTORS = [
	[2.177, 1.856, 1.49, 1.244, 1.013, 1, 1, 1, 1, 1],
	[2.182, 1.884, 1.558, 1.347, 1.152, 1, 1, 1, 1, 1],
	[2.184, 1.901, 1.598, 1.405, 1.23, 1.002, 1, 1, 1, 1],
	[2.182, 1.917, 1.627, 1.442, 1.275, 1.067, 1, 1, 1, 1],
	[2.178, 1.938, 1.66, 1.477, 1.316, 1.13, 1.008, 0.899, 0.771, 0.684]
];

// For 20 diameters of straight duct after the bend; from 30 on the factor is 1.
const OUTLET_CHART = [0.1, 0.15, 0.2, 0.25];
const OUTLET = [0.854, 0.914, 0.964, 1];

/**
 * Smooth round bend with 20 diameters of straight duct after it, wall friction along the arc included.
 *
 *   K = Kb CRe Cf Co; Kb from the chart at Re 1e6, CRe for another Reynolds number, Cf rough over smooth friction
 *   factor, Co for the duct after the bend
 *
 * @param radiusRatio r/D [-], 0.75 to 4
 * @param angle of the bend [°], 20 to 180
 * @param Re Reynolds number [-], 1e4 to 1e7
 * @param f Darcy friction factor of the rough wall [-]
 * @param fSmooth that of a smooth wall at the same Reynolds number [-]
 * @returns K on the velocity pressure in the bend [-]
 * @source Miller, Internal Flow Systems, 2nd ed. (1990), charts of section 9.2, at second hand: points of the curves
 * that the open package fluids fitted to them, printed to three decimals
 * @check fixtures/published/elbows.json
 */
export function bendMiller(radiusRatio: number, angle: number, Re: number, f: number, fSmooth: number): number {
	const chart = interpolate(
		RADII,
		CHART.map((row) => interpolate(ANGLES, row, angle)),
		radiusRatio
	);
	const outlet = interpolate(OUTLET_CHART, OUTLET, chart);
	return chart * interpolateTable(FACTOR_RADII, RE, FACTORS, radiusRatio, log10(Re)) * (f / fSmooth) * outlet;
}
