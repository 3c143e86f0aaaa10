// Flat oval elbows. No source for them is at hand: rectangular and round methods stand in, and each entry says which.
import type { Size } from '../shape';
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
import { TABLE_ANGLE, mitreReynoldsFactorSmacna, segmentRadii, segmentedElbowSmacna } from './elbow-tables';
import { MITRE_ANGLE, MITRE_ASPECT, mitreAspectFactorIdelchik, mitreIdelchik } from './mitre-idelchik';
import { choiceParameter, heldWithin, noteOutside, numberParameter } from './parameters';
import { SMACNA_ELBOWS, idelchik } from './sources';
import type { CatalogueEntry, FittingParameter } from './types';

const angle = (max: number): FittingParameter => numberParameter('angle', 'Angle', '°', 90, { min: 0, max });
const radiusRatio = numberParameter('radiusRatio', 'Radius to centre line over axis in the plane', '', 1, {
	min: 0.5,
	max: 10
});
const bend = choiceParameter('bend', 'Bend (easy: short axis in its plane)', 'easy', ['easy', 'hard']);

type Oval = Pick<CatalogueEntry, 'key' | 'name' | 'parameters' | 'range' | 'method' | 'source' | 'known'> &
	Pick<CatalogueEntry, 'uncertainty' | 'drawing' | 'plot' | 'caution'>;
const entryOf = (oval: Oval): CatalogueEntry => ({
	...oval,
	family: 'elbows-oval',
	shapes: ['oval'],
	reference: 'row',
	picture: 'elbow'
});

/** Axis parallel to the axis of the bend over that in its plane. */
function aspectOf(size: Size, way: string): number {
	if (size.shape === 'round') return 1;
	const long = Math.max(size.width, size.height) / Math.min(size.width, size.height);
	return way === 'hard' ? 1 / long : long;
}

const smooth: FittingDefinition = {
	entry: entryOf({
		key: 'oval-elbow-smooth',
		name: 'Flat oval elbow, smooth radius',
		parameters: [radiusRatio, angle(BEND_ANGLE.max), bend],
		plot: { along: 'radiusRatio' },
		range: 'r/W 0.5 to 3, H/W 0.25 to 8, Re from 10 000; wall friction along the arc belongs to the length of the row',
		method: 'The rectangular elbow of the same axes stands in: Idelchik, A1 B1 C1 with Reynolds factor; C1 from memory',
		source: idelchik('6-1'),
		known: 'from memory',
		uncertainty: 0.4,
		drawing: 'elbow-rectangular',
		caution: 'No source for flat ovals: the method for rectangles stands in.'
	}),
	coefficient(values, { size, reynolds }, note) {
		const R = values.number('radiusRatio');
		noteOutside(R, BEND_RADIUS, 'r/W', note);
		const aspect = heldWithin(aspectOf(size, values.choice('bend')), BEND_ASPECT, 'H/W', note);
		const Re = heldWithin(reynolds, BEND_REYNOLDS, 'Reynolds number', note);
		const square = bendIdelchik(values.number('angle'), R);
		return square * bendAspectFactorIdelchik(aspect) * bendReynoldsFactorIdelchik(R, Re);
	}
};

const segmented: FittingDefinition = {
	entry: entryOf({
		key: 'oval-elbow-segmented',
		name: 'Flat oval elbow of straight pieces',
		parameters: [choiceParameter('pieces', 'Pieces', 5, [3, 4, 5]), radiusRatio, angle(180)],
		plot: { along: 'radiusRatio' },
		range: 'r/D 0.75 to 2 (0.5 with three pieces), 20 to 180°; the axis in the plane of the bend stands for D',
		method: 'The round elbow of as many pieces stands in: table for 90° with angle factor',
		source: SMACNA_ELBOWS,
		known: 'published table, interpolated',
		uncertainty: 0.4,
		drawing: 'segmented',
		caution: 'No source for flat ovals: the table for round elbows stands in, alike for easy and hard bends.'
	}),
	coefficient(values, _context, note) {
		const pieces = Number(values.choice('pieces'));
		const R = heldWithin(values.number('radiusRatio'), segmentRadii(pieces), 'r/D', note);
		noteOutside(values.number('angle'), TABLE_ANGLE, 'angle', note);
		return segmentedElbowSmacna(pieces, R, values.number('angle'));
	}
};

const mitred: FittingDefinition = {
	entry: entryOf({
		key: 'oval-elbow-mitred',
		name: 'Flat oval elbow, mitred',
		parameters: [angle(120), bend],
		plot: { along: 'angle' },
		range: 'angle 20 to 90°, H/W 0.25 to 8, Re from 10 000',
		method:
			'The rectangular elbow of the same axes stands in; factors from memory, which agree with the SMACNA table; Idelchik, sine form, with the Reynolds factor of the SMACNA table',
		source: `${idelchik('6-7')}; ${SMACNA_ELBOWS}`,
		known: 'from memory',
		uncertainty: 0.3,
		drawing: 'mitre',
		caution: 'No source for flat ovals: the method for rectangles stands in.'
	}),
	coefficient(values, { size, reynolds }, note) {
		const d = values.number('angle');
		noteOutside(d, MITRE_ANGLE, 'angle', note);
		const aspect = heldWithin(aspectOf(size, values.choice('bend')), MITRE_ASPECT, 'H/W', note);
		const Re = heldWithin(reynolds, BEND_REYNOLDS, 'Reynolds number', note);
		return mitreIdelchik(d) * mitreAspectFactorIdelchik(aspect) * mitreReynoldsFactorSmacna(Re);
	}
};

export const elbowsOval: readonly FittingDefinition[] = [smooth, segmented, mitred];
