// Two elbows that move a duct aside. Their interaction is known to be there, but not by a formula: it is taken as 1.
import {
	BEND_ASPECT,
	BEND_RADIUS,
	BEND_REYNOLDS,
	bendAspectFactorIdelchik,
	bendIdelchik,
	bendReynoldsFactorIdelchik
} from './bend-idelchik';
import type { FittingContext } from './types';
import type { FittingDefinition, Note, ParameterValues } from './definition';
import { aspectInPlane, plane } from './elbow-aspect';
import { MITRE_ANGLE, MITRE_ASPECT, mitreAspectFactorIdelchik, mitreIdelchik } from './mitre-idelchik';
import { mitreReynoldsFactorSmacna } from './elbow-tables';
import { choiceParameter, heldWithin, noteOutside, numberParameter } from './parameters';
import { SMACNA_ELBOWS, idelchik } from './sources';
import type { CatalogueEntry } from './types';

/** Diameters of straight duct between two bends from which they do not act on one another (common practice). */
const APART = 10;

const angle = numberParameter('angle', 'Angle of each elbow', '°', 45, { min: 0, max: 90 });
const radiusRatio = (standard: number, what: string) =>
	numberParameter('radiusRatio', `Radius to centre line over ${what}`, '', standard, { min: 0.5, max: 10 });
const spacing = numberParameter('spacing', 'Straight duct between them over diameter', '', 2, { min: 0, max: 100 });
const second = choiceParameter('second', 'The second elbow turns', 'back', ['back', 'onward', 'across']);

const CAUTION =
	'The sum of two elbows: what the first does to the second is taken as 1. An offset in a vertical plane loses what it does in a horizontal one: only which sides bend is asked.';
const RANGE = 'each elbow by its own range; the straight duct between them belongs to the length of the row';

type Offset = Pick<CatalogueEntry, 'key' | 'name' | 'shapes' | 'parameters' | 'method' | 'source'>;
const entryOf = (offset: Offset): CatalogueEntry => ({
	...offset,
	family: 'offsets',
	reference: 'row',
	plot: { along: 'angle' },
	range: RANGE,
	known: 'from memory',
	uncertainty: 0.4,
	picture: 'transition',
	drawing: 'offset',
	caution: CAUTION
});

function noteInteraction(values: ParameterValues, note: Note): void {
	if (values.number('spacing') >= APART) return;
	note(
		values.choice('second') === 'across'
			? 'interaction of the two elbows is taken as 1; nearer than 10 diameters and out of one plane they lose more than the sum'
			: 'interaction of the two elbows is taken as 1; nearer than 10 diameters they lose 0.6 to 1.1 of the sum (from memory)'
	);
}

/** Reynolds number held within the range of the bends. */
const held = ({ reynolds }: FittingContext, note: Note) => heldWithin(reynolds, BEND_REYNOLDS, 'Reynolds number', note);

const round: FittingDefinition = {
	entry: entryOf({
		key: 'offset-round',
		name: 'Offset of two smooth elbows, round',
		shapes: ['round'],
		parameters: [angle, radiusRatio(1.5, 'diameter'), spacing, second],
		method: 'Twice the smooth elbow of Idelchik; interaction 1, its range from memory',
		source: idelchik('6-1')
	}),
	coefficient(values, context, note) {
		const R = values.number('radiusRatio');
		noteOutside(R, BEND_RADIUS, 'r/D', note);
		noteInteraction(values, note);
		return 2 * bendIdelchik(values.number('angle'), R) * bendReynoldsFactorIdelchik(R, held(context, note));
	}
};

const rectangular: FittingDefinition = {
	entry: entryOf({
		key: 'offset-rectangular',
		name: 'Offset of two smooth elbows, rectangular',
		shapes: ['rectangular', 'oval'],
		parameters: [angle, radiusRatio(1, 'side in the plane'), spacing, second, plane],
		method: 'Twice the smooth elbow of Idelchik, its factor C1 from memory; interaction 1, its range from memory',
		source: idelchik('6-1')
	}),
	coefficient(values, context, note) {
		const R = values.number('radiusRatio');
		noteOutside(R, BEND_RADIUS, 'r/W', note);
		noteInteraction(values, note);
		const first = aspectInPlane(context.size, values.choice('plane'), note);
		const square = bendIdelchik(values.number('angle'), R) * bendReynoldsFactorIdelchik(R, held(context, note));
		return (
			square *
			sumOver(first, values.choice('second'), (one) => {
				return bendAspectFactorIdelchik(heldWithin(one, BEND_ASPECT, 'H/W', note));
			})
		);
	}
};

const mitred: FittingDefinition = {
	entry: entryOf({
		key: 'offset-mitred',
		name: 'Offset of two mitred elbows',
		shapes: ['rectangular', 'round', 'oval'],
		parameters: [angle, spacing, second, plane],
		method: 'Twice the mitred elbow of Idelchik, its factors from memory; interaction 1, its range from memory',
		source: `${idelchik('6-7')}; ${SMACNA_ELBOWS}`
	}),
	coefficient(values, context, note) {
		const d = values.number('angle');
		noteOutside(d, MITRE_ANGLE, 'angle', note);
		noteInteraction(values, note);
		const first = aspectInPlane(context.size, values.choice('plane'), note);
		const square = mitreIdelchik(d) * mitreReynoldsFactorSmacna(held(context, note));
		return (
			square *
			sumOver(first, values.choice('second'), (one) => {
				return mitreAspectFactorIdelchik(heldWithin(one, MITRE_ASPECT, 'H/W', note));
			})
		);
	}
};

/** Factor of both elbows together; the second of two that turn across bends the other side. */
function sumOver(first: number, second: string, factor: (aspect: number) => number): number {
	return factor(first) + factor(second === 'across' ? 1 / first : first);
}

export const offsets: readonly FittingDefinition[] = [round, rectangular, mitred];
