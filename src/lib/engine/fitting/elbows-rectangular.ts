import type { Shape } from '../shape';
import {
	BEND_ANGLE,
	BEND_ASPECT,
	BEND_RADIUS,
	BEND_REYNOLDS,
	bendAspectFactorIdelchik,
	bendIdelchik,
	bendReynoldsFactorIdelchik
} from './bend-idelchik';
import type { FittingDefinition } from './definition';
import { aspectInPlane, plane } from './elbow-aspect';
import {
	RECTANGULAR_RADIUS,
	TABLE_ANGLE,
	elbowAngleFactorSmacna,
	mitreReynoldsFactorSmacna,
	rectangularElbowSmacna
} from './elbow-tables';
import { elbowsRectangularVaned } from './elbows-rectangular-vaned';
import { MITRE_ANGLE, MITRE_ASPECT, mitreAspectFactorIdelchik, mitreIdelchik } from './mitre-idelchik';
import { heldWithin, noteOutside, numberParameter } from './parameters';
import { rectangularMitreSmacna } from './mitre-tables';
import { SMACNA_ELBOWS, SMACNA_MEMORY, idelchik } from './sources';
import type { FittingParameter } from './types';

const shapes: readonly Shape[] = ['rectangular', 'oval'];
const angle = (max: number): FittingParameter => numberParameter('angle', 'Angle', '°', 90, { min: 0, max });
const radiusRatio = (standard: number, max: number): FittingParameter =>
	numberParameter('radiusRatio', 'Radius to centre line over side in the plane', '', standard, { min: 0.5, max });

const smooth: FittingDefinition = {
	entry: {
		key: 'rectangular-elbow-smooth',
		name: 'Rectangular elbow, smooth radius',
		family: 'elbows-rectangular',
		shapes,
		parameters: [radiusRatio(1, 10), angle(BEND_ANGLE.max), plane],
		reference: 'row',
		standardMethod: 'idelchik',
		rivals: [
			{
				key: 'smacna',
				range: 'r/W 0.5 to 2, H/W 0.25 to 8, 20 to 180°, Re from 10 000; beyond, the nearer end',
				method: 'Table for 90° with angle factor of round elbows and Reynolds factor of Idelchik',
				source: SMACNA_MEMORY,
				known: 'from memory',
				uncertainty: 0.3
			}
		],
		plot: { along: 'radiusRatio' },
		range:
			'smooth walls; the factor for low Reynolds numbers is carried on above 2e5 until it meets 1, and jumps as the source does: up to 1.42 times at r/W 0.55, 0.83 to 1.09 times at 0.7; r/W 0.5 to 3, H/W 0.25 to 8, Re from 10 000; wall friction along the arc belongs to the length of the row',
		method: 'Idelchik, A1 B1 C1 with Reynolds factor; C1 from memory',
		source: idelchik('6-1'),
		known: 'from memory',
		uncertainty: 0.3,
		picture: 'elbow',
		drawing: 'elbow-rectangular',
		caution: 'Published methods for this elbow differ by 30 to 50 %.'
	},
	coefficient(values, context, note) {
		const R = values.number('radiusRatio');
		noteOutside(R, BEND_RADIUS, 'r/W', note);
		const aspect = heldWithin(aspectInPlane(context.size, values.choice('plane'), note), BEND_ASPECT, 'H/W', note);
		const Re = heldWithin(context.reynolds, BEND_REYNOLDS, 'Reynolds number', note);
		const square = bendIdelchik(values.number('angle'), R);
		return square * bendAspectFactorIdelchik(aspect) * bendReynoldsFactorIdelchik(R, Re);
	},
	rivals: {
		smacna(values, context, note) {
			const R = heldWithin(values.number('radiusRatio'), RECTANGULAR_RADIUS, 'r/W', note);
			const d = values.number('angle');
			noteOutside(d, TABLE_ANGLE, 'angle', note);
			const aspect = heldWithin(aspectInPlane(context.size, values.choice('plane'), note), BEND_ASPECT, 'H/W', note);
			const Re = heldWithin(context.reynolds, BEND_REYNOLDS, 'Reynolds number', note);
			return rectangularElbowSmacna(R, aspect) * elbowAngleFactorSmacna(d) * bendReynoldsFactorIdelchik(R, Re);
		}
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
		standardMethod: 'idelchik',
		rivals: [
			{
				key: 'smacna',
				range: '20 to 90°, H/W 0.25 to 8, Re from 10 000',
				method: 'Table of angle and aspect with Reynolds factor',
				source: SMACNA_ELBOWS,
				known: 'published table, interpolated',
				uncertainty: 0.2
			}
		],
		plot: { along: 'angle' },
		range: 'angle 20 to 90°, H/W 0.25 to 8, Re from 10 000',
		method:
			'factors from memory, which agree with the SMACNA table; Idelchik, sine form, with the Reynolds factor of the SMACNA table',
		source: `${idelchik('6-7')}; ${SMACNA_ELBOWS}`,
		known: 'from memory',
		uncertainty: 0.2,
		picture: 'elbow',
		drawing: 'mitre',
		caution: null
	},
	coefficient(values, context, note) {
		const d = values.number('angle');
		noteOutside(d, MITRE_ANGLE, 'angle', note);
		const aspect = heldWithin(aspectInPlane(context.size, values.choice('plane'), note), MITRE_ASPECT, 'H/W', note);
		const Re = heldWithin(context.reynolds, BEND_REYNOLDS, 'Reynolds number', note);
		return mitreIdelchik(d) * mitreAspectFactorIdelchik(aspect) * mitreReynoldsFactorSmacna(Re);
	},
	rivals: {
		smacna(values, context, note) {
			const d = heldWithin(values.number('angle'), MITRE_ANGLE, 'angle', note);
			const aspect = heldWithin(aspectInPlane(context.size, values.choice('plane'), note), MITRE_ASPECT, 'H/W', note);
			const Re = heldWithin(context.reynolds, BEND_REYNOLDS, 'Reynolds number', note);
			return rectangularMitreSmacna(d, aspect) * mitreReynoldsFactorSmacna(Re);
		}
	}
};

export const elbowsRectangular: readonly FittingDefinition[] = [smooth, mitred, ...elbowsRectangularVaned];
