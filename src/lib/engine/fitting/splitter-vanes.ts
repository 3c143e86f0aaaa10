import { pow } from '../arithmetic';
import { interpolateTable } from './interpolate';

export interface SplitterVanes {
	/** CR [-] */
	readonly curveRatio: number;
	/** From the throat outward, in the unit of the throat radius */
	readonly radii: readonly number[];
}

/**
 * Radii of splitter vanes in a rectangular elbow.
 *
 *   CR = [R/(R + W)]^(1/(n + 1)), Ri = R/CR^i
 *
 * @param vanes n, number of vanes [-]
 * @param throatRadius R, radius of the inner wall [m], positive
 * @param width W, side in the plane of the bend [m]
 * @returns curve ratio [-] and radii [m]
 * @source Common practice; from memory, checked by algebra
 * @check fixtures/published/elbows.json
 */
export function splitterVanes(vanes: number, throatRadius: number, width: number): SplitterVanes {
	const curveRatio = pow(throatRadius / (throatRadius + width), 1 / (vanes + 1));
	const radii: number[] = [];
	let radius = throatRadius;
	for (let i = 0; i < vanes; i += 1) {
		radius /= curveRatio;
		radii.push(radius);
	}
	return { curveRatio, radii };
}

const CURVE_RATIOS = [0.218, 0.302, 0.408, 0.447, 0.577];
const ASPECTS = [0.25, 0.5, 1, 1.5, 2, 3, 4, 5, 6, 7, 8];
const ONE_VANE = [
	[0.52, 0.4, 0.43, 0.49, 0.55, 0.66, 0.75, 0.84, 0.93, 1.01, 1.09],
	[0.36, 0.27, 0.25, 0.28, 0.3, 0.35, 0.39, 0.42, 0.46, 0.49, 0.52],
	[0.22, 0.16, 0.14, 0.14, 0.15, 0.16, 0.17, 0.18, 0.19, 0.2, 0.21],
	[0.18, 0.13, 0.11, 0.11, 0.11, 0.12, 0.13, 0.14, 0.14, 0.15, 0.15],
	[0.09, 0.06, 0.05, 0.05, 0.04, 0.04, 0.04, 0.05, 0.05, 0.05, 0.05]
];

/**
 * Rectangular elbow, 90°, with one splitter vane.
 *
 * @param curveRatio CR [-], 0.218 to 0.577
 * @param aspect H/W, side parallel to the axis of the bend over side in its plane [-], 0.25 to 8
 * @returns C on the velocity pressure in the elbow [-]
 * @source SMACNA, HVAC Systems Duct Design, elbow with splitter vanes, from memory
 * @check none: no checked value is at hand
 */
export function oneSplitterSmacna(curveRatio: number, aspect: number): number {
	return interpolateTable(CURVE_RATIOS, ASPECTS, ONE_VANE, curveRatio, aspect);
}
