// Other authors' methods of a tee or wye, as a design may choose them; where one is silent, Idelchik's.
import type { Definition, Note } from './definition';
import {
	branchConvergingCrane2009,
	branchDivergingCrane2009,
	straightConvergingCrane2009,
	straightDivergingCrane2009
} from './junction-crane';
import { branchIdelchik, straightIdelchik, type Branching } from './junction-stream';
import { straightConvergingGeneralIdelchik } from './junction-idelchik';
import {
	branchConvergingGardel1957,
	branchDivergingBassett2001,
	branchDivergingGardel1957,
	straightConvergingGardel1957,
	straightDivergingBassett2001,
	straightDivergingGardel1957
} from './junction-rivals';
import { branchingOf, noteBranching, noteEqualRun, noteForms, noteGain } from './junction-view';
import { noteOutside } from './parameters';
import type { JunctionContext, Method } from './types';

type Formula = (junction: Branching, context: JunctionContext, note: Note) => number;

/** One stream by Idelchik. */
export const idelchikStream: Formula = (junction, context, note) => {
	noteForms(context, junction, note);
	return context.leg === 'branch' ? branchIdelchik(junction) : straightIdelchik(junction);
};

const craneStream: Formula = (junction, context, note) => {
	const { direction, q, a, angle } = junction;
	if (direction === 'diverging' && context.leg === 'branch' && angle > 75 && a > 4 / 9) {
		note('the factors printed for a wide branch at 90° are in doubt; Idelchik is used');
		return idelchikStream(junction, context, note);
	}
	noteEqualRun(junction, note);
	noteOutside(angle, { min: 30, max: 90 }, 'angle', note);
	if (context.size.shape !== 'round' || context.commonSize.shape !== 'round') note('the method is for round pipes');
	if (context.leg === 'straight')
		return direction === 'diverging' ? straightDivergingCrane2009(q, a) : straightConvergingCrane2009(q, a, angle);
	return direction === 'diverging' ? branchDivergingCrane2009(q, a, angle) : branchConvergingCrane2009(q, a, angle);
};

const bassettStream: Formula = (junction, context, note) => {
	if (junction.direction === 'converging') {
		note('the method is carried for a dividing stream only; Idelchik is used');
		return idelchikStream(junction, context, note);
	}
	noteEqualRun(junction, note);
	const { q, a, angle } = junction;
	const branch = branchDivergingBassett2001(q, a, angle);
	const straight = straightDivergingBassett2001(q);
	noteGain(q * branch + (1 - q) * straight, q, note);
	return context.leg === 'branch' ? branch : straight;
};

const gardelStream: Formula = ({ direction, q, a, s }, { leg }, note) => {
	if (Math.abs(1 - a) > 0.05 || Math.abs(1 - s) > 0.05) note('the method is for three legs of one size');
	if (leg === 'branch') return direction === 'diverging' ? branchDivergingGardel1957(q) : branchConvergingGardel1957(q);
	return direction === 'diverging' ? straightDivergingGardel1957(q) : straightConvergingGardel1957(q);
};

const generalStream: Formula = (junction, context, note) => {
	if (junction.direction === 'diverging' || context.leg === 'branch') return idelchikStream(junction, context, note);
	noteEqualRun(junction, note);
	return straightConvergingGeneralIdelchik(junction.q, junction.a, junction.angle);
};

/** A formula as a coefficient of the catalogue: the sheet's flows and areas read, what is outside noted. */
export function streamBy(formula: Formula, angleOf: Angle): Definition<JunctionContext>['coefficient'] {
	return (values, context, note) => {
		const junction = branchingOf(context, angleOf(values));
		noteBranching(context, junction, 1, note);
		return formula(junction, context, note);
	};
}

type Angle = (values: Parameters<Definition<JunctionContext>['coefficient']>[0]) => number;

const EQUAL_RUN = 'straight leg as wide as the common one';

export const CRANE: Method = {
	key: 'crane',
	range: `round pipes, ${EQUAL_RUN}, 30 to 90°; not a dividing stream at 90° with Db/Dc above 2/3`,
	method: 'Crane, printed factors',
	source: 'Crane, Technical Paper 410 (2009), as the fluids package has it',
	known: 'published formula',
	uncertainty: 0.4
};
export const BASSETT: Method = {
	key: 'bassett',
	range: `dividing stream, ${EQUAL_RUN}`,
	method: 'Bassett, momentum of the deflected stream, from memory',
	source: 'Bassett, Winterbone & Pearson (2001), separating flow',
	known: 'from memory',
	uncertainty: 0.4
};
export const GARDEL: Method = {
	key: 'gardel',
	range: 'three legs of one size, sharp edges, 90°',
	method: 'Gardel, polynomials in the flow ratio, from memory',
	source: 'Gardel (1957)',
	known: 'from memory',
	uncertainty: 0.4
};
export const GENERAL: Method = {
	key: 'idelchik-equation',
	range: `straight leg of uniting streams, ${EQUAL_RUN}; all else as the standard method`,
	method: 'Idelchik, general equation in place of the diagrams',
	source: 'Idelchik, Handbook of Hydraulic Resistance, 3rd ed., p. 417, read at second hand',
	known: 'published formula',
	uncertainty: 0.5
};

/** The rival methods by their keys. */
export const rivalStreams = {
	crane: craneStream,
	bassett: bassettStream,
	gardel: gardelStream,
	'idelchik-equation': generalStream
};
