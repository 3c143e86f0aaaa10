// Gradual changes of area that are no cones: pyramids, changes of shape, and those with one straight side.
import { CONE_ANGLE, coneFriction, conicalContractionIdelchik, conicalExpansionIdelchik } from './area-change-idelchik';
import {
	NOZZLE_TABLE_ANGLE,
	PYRAMID_TABLE_ANGLE,
	gradualContractionSmacna,
	pyramidalExpansionIdelchik,
	pyramidalExpansionSmacna
} from './area-change-tables';
import type { FittingDefinition, Note } from './definition';
import { equivalentAngle } from './equivalent-angle';
import { choiceParameter, heldWithin, numberParameter } from './parameters';
import { coefficientOfLeg } from './reference-change';
import { SMACNA_MEMORY, idelchik } from './sources';
import type { CatalogueEntry } from './types';

const areaRatio = numberParameter('areaRatio', 'Smaller over larger area', '', 0.5, { min: 0.01, max: 1 });
const angle = numberParameter('angle', 'Included angle', '°', 30, CONE_ANGLE);
const slope = numberParameter('angle', 'Angle of the sloping side', '°', 15, { min: 1.5, max: 90 });
const lengthRatio = numberParameter('lengthRatio', 'Length over root of the smaller area', '', 1, {
	min: 0.05,
	max: 50
});
type Change = 'expansion' | 'contraction';
/** The row after the fitting, unless it is said otherwise. */
const legAfter = (change: Change) =>
	choiceParameter('leg', 'This row is the leg that is', change === 'expansion' ? 'larger' : 'smaller', [
		'smaller',
		'larger'
	]);
const FRICTION_NOTE = 'The wall friction is in the coefficient: leave its length out of the row.';

type Transition = Pick<CatalogueEntry, 'key' | 'name' | 'shapes' | 'parameters' | 'plot' | 'range' | 'method'> &
	Pick<CatalogueEntry, 'source' | 'known' | 'uncertainty' | 'drawing' | 'caution' | 'rivals' | 'standardMethod'>;
const entryOf = (transition: Transition): CatalogueEntry => ({
	...transition,
	family: 'area-changes',
	reference: 'smaller leg',
	picture: 'transition'
});

/** Local loss and friction of an expansion or a contraction by the formulas for cones, on the smaller leg. */
function asCone(change: Change, d: number, a: number, f: number): number {
	const local = change === 'contraction' ? conicalContractionIdelchik(d, a) : conicalExpansionIdelchik(d, a);
	return local + coneFriction(d, a, f);
}

const pyramidWider: FittingDefinition = {
	entry: entryOf({
		key: 'pyramidal-expansion',
		name: 'Pyramidal expansion',
		shapes: ['rectangular'],
		parameters: [areaRatio, angle, legAfter('expansion')],
		plot: { along: 'angle' },
		range: '16 to 180° included, area ratio from 0.1; from 0.5 straight to nothing at 1',
		method: 'Table of angle and area',
		source: SMACNA_MEMORY,
		known: 'from memory',
		uncertainty: 0.4,
		standardMethod: 'smacna',
		rivals: [
			{
				key: 'idelchik',
				range: 'a uniform velocity at the entry, both pairs of sides at the same angle: in a duct it loses more',
				method: 'Idelchik, table of the shock coefficient and wall friction',
				source: idelchik('5-4'),
				known: 'published table, interpolated',
				uncertainty: 0.5
			}
		],
		drawing: 'pyramid',
		caution: FRICTION_NOTE
	}),
	coefficient(values, _context, note) {
		const a = values.number('areaRatio');
		const d = heldWithin(values.number('angle'), PYRAMID_TABLE_ANGLE, 'angle', note);
		return coefficientOfLeg(pyramidalExpansionSmacna(d, a), a, values.choice('leg'));
	},
	rivals: {
		idelchik(values, { reynolds, frictionFactor }) {
			const a = values.number('areaRatio');
			const d = values.number('angle');
			const smaller = pyramidalExpansionIdelchik(d, a, reynolds) + coneFriction(d, a, frictionFactor);
			return coefficientOfLeg(smaller, a, values.choice('leg'));
		}
	}
};

const pyramidNarrower: FittingDefinition = {
	entry: entryOf({
		key: 'pyramidal-contraction',
		name: 'Pyramidal contraction',
		shapes: ['rectangular'],
		parameters: [areaRatio, angle, legAfter('contraction')],
		plot: { along: 'angle' },
		range: '3 to 180° included; the local part is that of cones, by the same author',
		method: 'Idelchik, polynomial and wall friction',
		source: idelchik('5-23'),
		known: 'published formula',
		uncertainty: 0.3,
		standardMethod: 'idelchik',
		rivals: [
			{
				key: 'smacna',
				range: '10 to 180° included, area ratio from 0.1; from 0.5 straight to nothing at 1',
				method: 'Table of angle and area',
				source: SMACNA_MEMORY,
				known: 'from memory',
				uncertainty: 0.3
			}
		],
		drawing: 'pyramid',
		caution: FRICTION_NOTE
	}),
	coefficient(values, { frictionFactor }) {
		const a = values.number('areaRatio');
		return coefficientOfLeg(asCone('contraction', values.number('angle'), a, frictionFactor), a, values.choice('leg'));
	},
	rivals: {
		smacna(values, _context, note) {
			const a = values.number('areaRatio');
			const d = heldWithin(values.number('angle'), NOZZLE_TABLE_ANGLE, 'angle', note);
			return coefficientOfLeg(gradualContractionSmacna(d, a), a, values.choice('leg'));
		}
	}
};

const coneAngle = (d: number, note: Note) => heldWithin(d, CONE_ANGLE, 'included angle', note);
const coneSource = (change: Change) => idelchik(change === 'expansion' ? '5-4' : '5-23');

/** Another shape at the other end; the order of the shapes is in the words alone. */
function reshaped(key: string, name: string, change: Change): FittingDefinition {
	return {
		entry: entryOf({
			key: `${key}-${change}`,
			name: `${name}, ${change}`,
			shapes: ['round', 'rectangular'],
			parameters: [areaRatio, lengthRatio, legAfter(change)],
			plot: { along: 'lengthRatio' },
			range: '3 to 180° of the cone of the same areas and length; the change of shape itself is not counted',
			method: 'Idelchik, the cone of the same areas and length stands in, with wall friction',
			source: coneSource(change),
			known: 'published formula',
			uncertainty: 0.4,
			drawing: 'square-to-round',
			caution: FRICTION_NOTE
		}),
		coefficient(values, { frictionFactor }, note) {
			const a = values.number('areaRatio');
			const d = coneAngle(equivalentAngle(a, values.number('lengthRatio')), note);
			return coefficientOfLeg(asCone(change, d, a, frictionFactor), a, values.choice('leg'));
		}
	};
}

function oneSided(change: Change): FittingDefinition {
	return {
		entry: entryOf({
			key: `one-sided-${change}`,
			name: `Gradual ${change} with one sloping side`,
			shapes: ['rectangular', 'round', 'oval'],
			parameters: [areaRatio, slope, legAfter(change)],
			plot: { along: 'angle' },
			range: 'slope 1.5 to 90°; the cone of twice that angle stands in',
			method:
				'Idelchik, for the cone of twice the angle: the straight side is taken as the middle of a symmetrical one (our reasoning), with wall friction',
			source: coneSource(change),
			known: 'published formula',
			uncertainty: 0.5,
			drawing: 'one-sided',
			caution: FRICTION_NOTE
		}),
		coefficient(values, { frictionFactor }) {
			const a = values.number('areaRatio');
			const smaller = asCone(change, 2 * values.number('angle'), a, frictionFactor);
			return coefficientOfLeg(smaller, a, values.choice('leg'));
		}
	};
}

const CHANGES: readonly Change[] = ['expansion', 'contraction'];

export const transitions: readonly FittingDefinition[] = [
	pyramidWider,
	pyramidNarrower,
	...CHANGES.flatMap((change) => [
		reshaped('rectangular-to-round', 'Rectangular to round', change),
		reshaped('round-to-rectangular', 'Round to rectangular', change),
		oneSided(change)
	])
];
