import { pow } from '../arithmetic';
import type { Range } from '../errors';
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

const ASPECTS = [0.25, 0.5, 1, 1.5, 2, 3, 4, 5, 6, 7, 8];

interface SplitterTable {
	readonly curveRatios: readonly number[];
	readonly coefficients: readonly (readonly number[])[];
}
const ONE: SplitterTable = {
	curveRatios: [0.218, 0.302, 0.408, 0.447, 0.577],
	coefficients: [
		[0.52, 0.4, 0.43, 0.49, 0.55, 0.66, 0.75, 0.84, 0.93, 1.01, 1.09],
		[0.36, 0.27, 0.25, 0.28, 0.3, 0.35, 0.39, 0.42, 0.46, 0.49, 0.52],
		[0.22, 0.16, 0.14, 0.14, 0.15, 0.16, 0.17, 0.18, 0.19, 0.2, 0.21],
		[0.18, 0.13, 0.11, 0.11, 0.11, 0.12, 0.13, 0.14, 0.14, 0.15, 0.15],
		[0.09, 0.06, 0.05, 0.05, 0.04, 0.04, 0.04, 0.05, 0.05, 0.05, 0.05]
	]
};
const TWO: SplitterTable = {
	curveRatios: [0.362, 0.45, 0.507, 0.55, 0.585],
	coefficients: [
		[0.26, 0.2, 0.22, 0.25, 0.28, 0.33, 0.37, 0.41, 0.45, 0.48, 0.51],
		[0.17, 0.13, 0.11, 0.12, 0.13, 0.15, 0.16, 0.17, 0.19, 0.2, 0.21],
		[0.12, 0.09, 0.08, 0.08, 0.08, 0.09, 0.1, 0.1, 0.11, 0.11, 0.11],
		[0.09, 0.07, 0.06, 0.05, 0.06, 0.06, 0.06, 0.06, 0.07, 0.07, 0.07],
		[0.08, 0.05, 0.04, 0.04, 0.04, 0.04, 0.05, 0.05, 0.05, 0.05, 0.05]
	]
};
const THREE: SplitterTable = {
	curveRatios: [0.467, 0.549, 0.601],
	coefficients: [
		[0.11, 0.1, 0.12, 0.13, 0.14, 0.16, 0.18, 0.19, 0.21, 0.22, 0.23],
		[0.07, 0.05, 0.06, 0.06, 0.06, 0.07, 0.07, 0.08, 0.08, 0.08, 0.09],
		[0.05, 0.04, 0.04, 0.04, 0.04, 0.04, 0.05, 0.05, 0.05, 0.05, 0.05]
	]
};

/** Centre-line radius over side for which the table of a number of vanes was drawn up [-]. */
export const splitterRadii = (vanes: number): Range => ({
	min: 0.55,
	max: vanes === 1 ? 1 : vanes === 2 ? 0.75 : 0.65
});

/**
 * Rectangular elbow, 90°, with one, two or three splitter vanes.
 *
 * @param vanes number of vanes [-], 1, 2 or 3
 * @param curveRatio CR [-], 0.218 to 0.577, 0.362 to 0.585, 0.467 to 0.601
 * @param aspect H/W, side parallel to the axis of the bend over side in its plane [-], 0.25 to 8
 * @returns C on the velocity pressure in the elbow [-]
 * @source SMACNA, HVAC Systems Duct Design, elbow with splitter vanes, from memory
 * @check none: the bends between the vanes by Idelchik's formula are of the same order, in a test
 */
export function splitterSmacna(vanes: number, curveRatio: number, aspect: number): number {
	const { curveRatios, coefficients } = vanes >= 3 ? THREE : vanes === 2 ? TWO : ONE;
	return interpolateTable(curveRatios, ASPECTS, coefficients, curveRatio, aspect);
}
