// What other authors say of round elbows, less the wall friction along the arc, which belongs to the length of the row.
import { frictionFactor } from '../friction';
import { MILLER_ANGLE, MILLER_RADIUS, MILLER_REYNOLDS, bendMiller } from './bend-miller';
import { ITO_CURVED, arcFriction, bendIto1960, bendRennels2012, mitreRennels2012 } from './bend-rivals';
import type { FittingDefinition } from './definition';
import { STAMPED_RADIUS, TABLE_ANGLE, mitreReynoldsFactorSmacna, roundElbowSmacna } from './elbow-tables';
import { roundMitreSmacna } from './mitre-tables';
import { heldWithin, noteOutside } from './parameters';
import { MILLER, RENNELS, RENNELS_METHOD, SMACNA_ELBOWS } from './sources';
import type { Method } from './types';

type Coefficients = NonNullable<FittingDefinition['rivals']>;

const LESS_ARC = 'the wall friction of the arc is taken off and belongs to the length of the row';

export const smoothMethods: readonly Method[] = [
	{
		key: 'smacna',
		range: 'die-stamped, r/D 0.5 to 2.5, 20 to 180°; beyond, the nearer end',
		method: 'Table for 90° with angle factor',
		source: SMACNA_ELBOWS,
		known: 'published table, interpolated',
		uncertainty: 0.3
	},
	{
		key: 'rennels',
		range: `r/D from 0.5, angle to 180°; ${LESS_ARC}`,
		method: RENNELS_METHOD,
		source: RENNELS,
		known: 'published formula',
		uncertainty: 0.3
	},
	{
		key: 'miller',
		range: `r/D 0.75 to 4, 20 to 180°, Re 1e4 to 1e7, 20 diameters of straight duct after the bend; ${LESS_ARC}`,
		method: 'Chart with factors for Reynolds number and roughness',
		source: MILLER,
		known: 'published table, interpolated',
		uncertainty: 0.3
	},
	{
		key: 'ito',
		range: `smooth walls, 45 to 180°, Re (D/2r)^2 above 91; ${LESS_ARC}`,
		method: 'Ito, power form, from memory; agrees with its checks',
		source: 'Ito, Pressure losses in smooth pipe bends (1960)',
		known: 'from memory',
		uncertainty: 0.3
	}
];

const ITO_ANGLE = { min: 45, max: 180 };

export const smoothCoefficients: Coefficients = {
	smacna(values, _context, note) {
		const R = heldWithin(values.number('radiusRatio'), STAMPED_RADIUS, 'r/D', note);
		noteOutside(values.number('angle'), TABLE_ANGLE, 'angle', note);
		return roundElbowSmacna(R, values.number('angle'));
	},
	rennels(values, { frictionFactor: f }) {
		const R = values.number('radiusRatio');
		const d = values.number('angle');
		return Math.max(0, bendRennels2012(d, R, f) - arcFriction(d, R, f));
	},
	miller(values, { reynolds, relativeRoughness }, note) {
		const R = heldWithin(values.number('radiusRatio'), MILLER_RADIUS, 'r/D', note);
		const d = values.number('angle');
		noteOutside(d, MILLER_ANGLE, 'angle', note);
		const Re = heldWithin(reynolds, MILLER_REYNOLDS, 'Reynolds number', note);
		const f = frictionFactor({ reynolds: Re, relativeRoughness });
		const smooth = frictionFactor({ reynolds: Re, relativeRoughness: 0 });
		return Math.max(0, bendMiller(R, d, Re, f, smooth) - arcFriction(d, R, f));
	},
	ito(values, { reynolds }, note) {
		const R = values.number('radiusRatio');
		const d = values.number('angle');
		noteOutside(d, ITO_ANGLE, 'angle', note);
		const least = { min: ITO_CURVED.min * 4 * R * R, max: Infinity };
		// A hair above, so that the limit itself is not rounded below it.
		const Re = heldWithin(reynolds, least, 'Reynolds number', note) * (1 + 1e-12);
		const smooth = frictionFactor({ reynolds: Re, relativeRoughness: 0 });
		return Math.max(0, bendIto1960(R, Re, d) - arcFriction(d, R, smooth));
	}
};

export const mitreMethods: readonly Method[] = [
	{
		key: 'smacna',
		range: '20 to 90°, Re from 10 000',
		method: 'Table of the angle with Reynolds factor',
		source: SMACNA_ELBOWS,
		known: 'published table, interpolated',
		uncertainty: 0.2
	},
	{
		key: 'rennels',
		range: 'angle to 150°, turbulent flow',
		method: `${RENNELS_METHOD}, sine form`,
		source: RENNELS,
		known: 'published formula',
		uncertainty: 0.25
	}
];

const MITRE_TABLE_ANGLE = { min: 20, max: 90 };
const MITRE_REYNOLDS = { min: 1e4, max: Infinity };

export const mitreCoefficients: Coefficients = {
	smacna(values, context, note) {
		const d = heldWithin(values.number('angle'), MITRE_TABLE_ANGLE, 'angle', note);
		const Re = heldWithin(context.reynolds, MITRE_REYNOLDS, 'Reynolds number', note);
		return roundMitreSmacna(d) * mitreReynoldsFactorSmacna(Re);
	},
	rennels: (values) => mitreRennels2012(values.number('angle'))
};
