import { BEND_ANGLE, BEND_RADIUS, BEND_REYNOLDS, bendIdelchik, bendReynoldsFactorIdelchik } from './bend-idelchik';
import type { FittingDefinition } from './definition';
import { TABLE_ANGLE, mitreReynoldsFactorSmacna, segmentRadii, segmentedElbowSmacna } from './elbow-tables';
import { mitreCoefficients, mitreMethods, smoothCoefficients, smoothMethods } from './elbows-round-rivals';
import { MITRE_ANGLE, mitreIdelchik } from './mitre-idelchik';
import { choiceParameter, heldWithin, noteOutside, numberParameter } from './parameters';
import { SMACNA_ELBOWS, idelchik } from './sources';
import type { FittingParameter } from './types';

const angle = (max: number): FittingParameter => numberParameter('angle', 'Angle', '°', 90, { min: 0, max });
const radiusRatio = (max: number): FittingParameter =>
	numberParameter('radiusRatio', 'Radius to centre line over diameter', '', 1.5, { min: 0.5, max });

const smooth: FittingDefinition = {
	entry: {
		key: 'round-elbow-smooth',
		name: 'Round elbow, smooth radius',
		family: 'elbows-round',
		shapes: ['round'],
		parameters: [radiusRatio(10), angle(BEND_ANGLE.max)],
		reference: 'row',
		standardMethod: 'idelchik',
		rivals: smoothMethods,
		plot: { along: 'radiusRatio' },
		range:
			'smooth walls; the factor for low Reynolds numbers is carried on above 2e5 until it meets 1, and jumps as the source does: up to 1.42 times at r/D 0.55, 0.83 to 1.09 times at 0.7; r/D 0.5 to 3, angle to 180°, Re from 10 000; wall friction along the arc belongs to the length of the row',
		method: 'Idelchik, A1 B1 with Reynolds factor',
		source: idelchik('6-1'),
		known: 'published formula',
		uncertainty: 0.3,
		picture: 'elbow',
		drawing: 'elbow',
		caution: 'Published methods for this elbow differ by 30 to 50 %.'
	},
	coefficient(values, context, note) {
		const R = values.number('radiusRatio');
		noteOutside(R, BEND_RADIUS, 'r/D', note);
		const Re = heldWithin(context.reynolds, BEND_REYNOLDS, 'Reynolds number', note);
		return bendIdelchik(values.number('angle'), R) * bendReynoldsFactorIdelchik(R, Re);
	},
	rivals: smoothCoefficients
};

const segmented: FittingDefinition = {
	entry: {
		key: 'round-elbow-segmented',
		name: 'Round elbow of straight pieces',
		family: 'elbows-round',
		shapes: ['round'],
		parameters: [choiceParameter('pieces', 'Pieces', 4, [3, 4, 5]), radiusRatio(10), angle(180)],
		reference: 'row',
		plot: { along: 'radiusRatio' },
		range: 'r/D 0.75 to 2 (0.5 with three pieces), 20 to 180°; other angles than 90° by the factor of smooth elbows',
		method: 'Table for 90° with angle factor',
		source: SMACNA_ELBOWS,
		known: 'published table, interpolated',
		uncertainty: 0.25,
		picture: 'elbow',
		drawing: 'segmented',
		caution: null
	},
	coefficient(values, _context, note) {
		const pieces = Number(values.choice('pieces'));
		const R = heldWithin(values.number('radiusRatio'), segmentRadii(pieces), 'r/D', note);
		const d = values.number('angle');
		noteOutside(d, TABLE_ANGLE, 'angle', note);
		return segmentedElbowSmacna(pieces, R, d);
	}
};

const mitred: FittingDefinition = {
	entry: {
		key: 'round-elbow-mitred',
		name: 'Round elbow, mitred',
		family: 'elbows-round',
		shapes: ['round'],
		parameters: [angle(120)],
		reference: 'row',
		standardMethod: 'idelchik',
		rivals: mitreMethods,
		plot: { along: 'angle' },
		range: 'angle 20 to 90°, Re from 10 000',
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
		const Re = heldWithin(context.reynolds, BEND_REYNOLDS, 'Reynolds number', note);
		return mitreIdelchik(d) * mitreReynoldsFactorSmacna(Re);
	},
	rivals: mitreCoefficients
};

export const elbowsRound: readonly FittingDefinition[] = [smooth, segmented, mitred];
