import type { JunctionDefinition } from './definition';
import { BASSETT, CRANE, GARDEL, GENERAL, idelchikStream, rivalStreams, streamBy } from './junction-methods';
import { numberParameter } from './parameters';
import { idelchik } from './sources';
import type { CatalogueEntry } from './types';

/** Said of every junction that has a method by formula. */
export const SPREAD =
	'Published methods for one and the same junction differ by 0.2 to 0.3 in the coefficient. A negative coefficient is real: ' +
	'the other stream pays for it.';

const FORMS =
	'flow ratio 0 to 1, branch 0.1 to 1 of the common area; straight leg as wide as the common one, or areas adding up; ' +
	'between, a straight line. Steps of the printed factors are smoothed over 0.04 above Ab/Ac 0.35 and 0.4, Qb/Qc 0.4, 0.5, 0.6';

const common = {
	family: 'junctions-diverging',
	place: 'junction',
	reference: 'common leg',
	shapes: ['round', 'rectangular', 'oval'],
	standardMethod: 'idelchik',
	known: 'published formula',
	caution: SPREAD
} as const satisfies Partial<CatalogueEntry>;

const square = () => 90;
const oblique = (values: { number(name: string): number }) => values.number('angle');

const tee: JunctionDefinition = {
	entry: {
		...common,
		key: 'tee',
		name: 'Tee, 90°',
		parameters: [],
		rivals: [CRANE, BASSETT, GARDEL, GENERAL],
		range: `${FORMS}. Dividing, a branch as high as the common leg: from memory`,
		method: 'Idelchik, both streams',
		source: idelchik('7-1 to 7-4, 7-20, 7-21'),
		uncertainty: 0.4,
		picture: 'tee'
	},
	coefficient: streamBy(idelchikStream, square),
	rivals: {
		crane: streamBy(rivalStreams.crane, square),
		bassett: streamBy(rivalStreams.bassett, square),
		gardel: streamBy(rivalStreams.gardel, square),
		'idelchik-equation': streamBy(rivalStreams['idelchik-equation'], square)
	}
};

const wye: JunctionDefinition = {
	entry: {
		...common,
		key: 'wye',
		name: 'Wye branch',
		parameters: [numberParameter('angle', 'Angle of the branch', '°', 45, { min: 15, max: 75 })],
		rivals: [CRANE, BASSETT, GENERAL],
		plot: { along: 'angle' },
		range: `15 to 75°; ${FORMS}. Uniting, straight leg: a straight line from 60 to 90°`,
		method: 'Idelchik, both streams',
		source: idelchik('7-1 to 7-4, 7-15 to 7-20'),
		uncertainty: 0.4,
		picture: 'wye'
	},
	coefficient: streamBy(idelchikStream, oblique),
	rivals: {
		crane: streamBy(rivalStreams.crane, oblique),
		bassett: streamBy(rivalStreams.bassett, oblique),
		'idelchik-equation': streamBy(rivalStreams['idelchik-equation'], oblique)
	}
};

const shoe: JunctionDefinition = {
	entry: {
		...common,
		key: 'shoe-take-off',
		name: 'Shoe take-off',
		parameters: [numberParameter('angle', 'Angle of the entry', '°', 45, { min: 45, max: 60 })],
		plot: { along: 'angle' },
		range: `45 to 60°; ${FORMS}`,
		method: 'Idelchik for a sharp wye of the angle of the entry, as a stand-in',
		source: idelchik('7-1 to 7-4, 7-15 to 7-20'),
		uncertainty: 0.5,
		picture: 'shoe',
		caution: `No public table of shoe take-offs was found: a sharp wye stands in. ${SPREAD}`
	},
	coefficient: streamBy(idelchikStream, oblique)
};

export const tees: readonly JunctionDefinition[] = [tee, wye, shoe];
