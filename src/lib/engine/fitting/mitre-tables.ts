import { interpolate, interpolateTable } from './interpolate';

const ANGLES = [20, 30, 45, 60, 75, 90];
const ROUND = [0.08, 0.16, 0.34, 0.55, 0.81, 1.2];
const ASPECTS = [0.25, 0.5, 0.75, 1, 1.5, 2, 4, 6, 8];
const RECTANGULAR = [
	[0.08, 0.08, 0.08, 0.07, 0.07, 0.07, 0.06, 0.05, 0.05],
	[0.18, 0.17, 0.17, 0.16, 0.15, 0.15, 0.13, 0.12, 0.11],
	[0.38, 0.37, 0.36, 0.34, 0.33, 0.31, 0.27, 0.25, 0.24],
	[0.6, 0.59, 0.57, 0.55, 0.52, 0.49, 0.43, 0.39, 0.38],
	[0.89, 0.87, 0.84, 0.81, 0.77, 0.73, 0.63, 0.58, 0.57],
	[1.3, 1.3, 1.2, 1.2, 1.1, 1.1, 0.92, 0.85, 0.83]
];

/**
 * Round mitred elbow: the table that rivals mitreIdelchik.
 *
 * @param angle [°], 20 to 90
 * @returns C on the velocity pressure in the duct [-], Re from 1.4e5
 * @source SMACNA, HVAC Systems Duct Design, 4th ed. (2006), table A-7
 * @check fixtures/published/elbows.json
 */
export function roundMitreSmacna(angle: number): number {
	return interpolate(ANGLES, ROUND, angle);
}

/**
 * Rectangular mitred elbow without vanes: the table that rivals mitreIdelchik.
 *
 * @param angle [°], 20 to 90
 * @param aspect H/W, side parallel to the axis of the bend over side in its plane [-], 0.25 to 8
 * @returns C on the velocity pressure in the duct [-], Re from 1.4e5
 * @source SMACNA, HVAC Systems Duct Design, 4th ed. (2006), table A-7
 * @check fixtures/published/elbows.json
 */
export function rectangularMitreSmacna(angle: number, aspect: number): number {
	return interpolateTable(ANGLES, ASPECTS, RECTANGULAR, angle, aspect);
}
