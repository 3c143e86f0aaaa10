import type { Shape, Size } from '../shape';
import {
	BEND_ANGLE,
	BEND_ASPECT,
	BEND_RADIUS,
	BEND_REYNOLDS,
	bendAspectFactorIdelchik,
	bendIdelchik,
	bendReynoldsFactorIdelchik
} from './bend-idelchik';
import type { FittingDefinition, Note } from './definition';
import { mitreReynoldsFactorSmacna } from './elbow-tables';
import { MITRE_ANGLE, MITRE_ASPECT, mitreAspectFactorIdelchik, mitreIdelchik } from './mitre-idelchik';
import { choiceParameter, heldWithin, noteOutside, numberParameter } from './parameters';
import { SMACNA_ELBOWS, idelchik } from './sources';
import { oneSplitterSmacna, splitterVanes } from './splitter-vanes';
import type { FittingParameter } from './types';

const shapes: readonly Shape[] = ['rectangular', 'oval'];
const plane = choiceParameter('plane', 'Side in the plane of the bend', 'width', ['width', 'height']);
const angle = (max: number): FittingParameter => numberParameter('angle', 'Angle', '°', 90, { min: 0, max });
const radiusRatio = (standard: number, max: number): FittingParameter =>
	numberParameter('radiusRatio', 'Radius to centre line over side in the plane', '', standard, { min: 0.5, max });

/** H/W: the side parallel to the axis of the bend over the side in its plane. */
function aspectOf(size: Size, inPlane: string, note: Note): number {
	if (size.shape === 'round') return 1;
	if (size.shape === 'oval') note('the method for rectangles stands in for a flat oval');
	return inPlane === 'width' ? size.height / size.width : size.width / size.height;
}

const smooth: FittingDefinition = {
	entry: {
		key: 'rectangular-elbow-smooth',
		name: 'Rectangular elbow, smooth radius',
		family: 'elbows-rectangular',
		shapes,
		parameters: [radiusRatio(1, 10), angle(BEND_ANGLE.max), plane],
		reference: 'row',
		range:
			'smooth walls; the factor for low Reynolds numbers is carried on above 2e5 until it meets 1; r/W 0.5 to 3, H/W 0.25 to 8, Re from 10 000; wall friction along the arc belongs to the length of the row',
		method: 'Idelchik, A1 B1 C1 with Reynolds factor; C1 from memory',
		source: idelchik('6-1'),
		known: 'from memory',
		uncertainty: 0.3,
		picture: 'elbow',
		caution: 'Published methods for this elbow differ by 30 to 50 %.'
	},
	coefficient(values, context, note) {
		const R = values.number('radiusRatio');
		noteOutside(R, BEND_RADIUS, 'r/W', note);
		const aspect = heldWithin(aspectOf(context.size, values.choice('plane'), note), BEND_ASPECT, 'H/W', note);
		const Re = heldWithin(context.reynolds, BEND_REYNOLDS, 'Reynolds number', note);
		const square = bendIdelchik(values.number('angle'), R);
		return square * bendAspectFactorIdelchik(aspect) * bendReynoldsFactorIdelchik(R, Re);
	}
};

const mitred: FittingDefinition = {
	entry: {
		key: 'rectangular-elbow-mitred',
		name: 'Rectangular elbow, mitred, without vanes',
		family: 'elbows-rectangular',
		shapes,
		parameters: [angle(120), plane],
		reference: 'row',
		range: 'angle 20 to 90°, H/W 0.25 to 8, Re from 10 000',
		method:
			'factors from memory, which agree with the SMACNA table; Idelchik, sine form, with the Reynolds factor of the SMACNA table',
		source: `${idelchik('6-7')}; ${SMACNA_ELBOWS}`,
		known: 'from memory',
		uncertainty: 0.2,
		picture: 'elbow',
		caution: null
	},
	coefficient(values, context, note) {
		const d = values.number('angle');
		noteOutside(d, MITRE_ANGLE, 'angle', note);
		const aspect = heldWithin(aspectOf(context.size, values.choice('plane'), note), MITRE_ASPECT, 'H/W', note);
		const Re = heldWithin(context.reynolds, BEND_REYNOLDS, 'Reynolds number', note);
		return mitreIdelchik(d) * mitreAspectFactorIdelchik(aspect) * mitreReynoldsFactorSmacna(Re);
	}
};

const vaned: FittingDefinition = {
	entry: {
		key: 'rectangular-elbow-vaned',
		name: 'Rectangular elbow, mitred, with turning vanes',
		family: 'elbows-rectangular',
		shapes,
		parameters: [],
		reference: 'row',
		range: '90°, single-thickness vanes; 0.12 to 0.18 by vane radius and spacing, other printings 0.11 to 0.33',
		method: 'One value for vanes of 114 mm radius, 57 mm apart',
		source: 'SMACNA, HVAC Systems Duct Design, elbow with turning vanes, from memory',
		known: 'from memory',
		uncertainty: 0.5,
		picture: 'elbow',
		caution: 'A value from memory: enter the coefficient of the vanes that are built in, if it is known.'
	},
	coefficient(_values, context, note) {
		aspectOf(context.size, 'width', note);
		return 0.15;
	}
};

const splitter: FittingDefinition = {
	entry: {
		key: 'rectangular-elbow-splitter',
		name: 'Rectangular elbow, smooth radius, one splitter vane',
		family: 'elbows-rectangular',
		shapes,
		parameters: [radiusRatio(0.75, 1), plane],
		reference: 'row',
		range: '90°, r/W 0.55 to 1, H/W 0.25 to 8, vane by the curve ratio',
		method: 'Table of curve ratio and aspect',
		source: 'SMACNA, HVAC Systems Duct Design, elbow with splitter vanes, from memory',
		known: 'from memory',
		uncertainty: 0.4,
		picture: 'elbow',
		caution: null
	},
	coefficient(values, context, note) {
		const R = heldWithin(values.number('radiusRatio'), { min: 0.55, max: 1 }, 'r/W', note);
		const aspect = heldWithin(aspectOf(context.size, values.choice('plane'), note), BEND_ASPECT, 'H/W', note);
		return oneSplitterSmacna(splitterVanes(1, R - 0.5, 1).curveRatio, aspect);
	}
};

export const elbowsRectangular: readonly FittingDefinition[] = [smooth, mitred, vaned, splitter];
