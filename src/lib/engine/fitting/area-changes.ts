import {
	CONE_ANGLE,
	coneFriction,
	conicalContractionIdelchik,
	conicalExpansionIdelchik,
	suddenContractionIdelchik,
	suddenExpansion
} from './area-change-idelchik';
import type { FittingDefinition } from './definition';
import { choiceParameter, numberParameter } from './parameters';
import { coefficientOfLeg } from './reference-change';
import { idelchik } from './sources';
import type { CatalogueEntry } from './types';

const areaRatio = numberParameter('areaRatio', 'Smaller over larger area', '', 0.5, { min: 0.01, max: 1 });
const angle = numberParameter('angle', 'Included angle', '°', 30, CONE_ANGLE);
const legOf = (standard: 'smaller' | 'larger') =>
	choiceParameter('leg', 'This row is the leg that is', standard, ['smaller', 'larger']);

const CONE_NOTE = 'The wall friction of the cone is in the coefficient: leave its length out of the row.';

type AreaChange = Pick<CatalogueEntry, 'key' | 'name' | 'parameters' | 'range' | 'method' | 'source' | 'uncertainty'> &
	Pick<CatalogueEntry, 'caution'>;

function entryOf(change: AreaChange): CatalogueEntry {
	return {
		...change,
		family: 'area-changes',
		shapes: ['round', 'rectangular', 'oval'],
		reference: 'smaller leg',
		known: 'published formula',
		picture: 'transition'
	};
}

const suddenWider: FittingDefinition = {
	entry: entryOf({
		key: 'sudden-expansion',
		name: 'Sudden expansion',
		parameters: [areaRatio, legOf('larger')],
		range: 'any area ratio, turbulent flow',
		method: 'Borda and Carnot',
		source: idelchik('4-1'),
		uncertainty: 0.1,
		caution: null
	}),
	coefficient(values) {
		const a = values.number('areaRatio');
		return coefficientOfLeg(suddenExpansion(a), a, values.choice('leg'));
	}
};

const suddenNarrower: FittingDefinition = {
	entry: entryOf({
		key: 'sudden-contraction',
		name: 'Sudden contraction',
		parameters: [areaRatio, legOf('smaller')],
		range: 'any area ratio, turbulent flow, sharp edge',
		method: 'Idelchik, 0.5 (1 - a)^0.75',
		source: idelchik('4-9'),
		uncertainty: 0.15,
		caution: null
	}),
	coefficient(values) {
		const a = values.number('areaRatio');
		return coefficientOfLeg(suddenContractionIdelchik(a), a, values.choice('leg'));
	}
};

const cone: FittingDefinition = {
	entry: entryOf({
		key: 'gradual-expansion',
		name: 'Gradual expansion',
		parameters: [areaRatio, angle, legOf('larger')],
		range: 'cones; shock term to 60° included, sudden expansion from 90°',
		method: 'Idelchik, shock term and wall friction',
		source: idelchik('5-4'),
		uncertainty: 0.3,
		caution: CONE_NOTE
	}),
	coefficient(values, { size, frictionFactor }, note) {
		const a = values.number('areaRatio');
		const d = values.number('angle');
		if (size.shape !== 'round')
			note('the formula is for cones; a pyramid loses some 1.25 to 1.4 times as much (from memory)');
		const smaller = conicalExpansionIdelchik(d, a) + coneFriction(d, a, frictionFactor);
		return coefficientOfLeg(smaller, a, values.choice('leg'));
	}
};

const nozzle: FittingDefinition = {
	entry: entryOf({
		key: 'gradual-contraction',
		name: 'Gradual contraction',
		parameters: [areaRatio, angle, legOf('smaller')],
		range: 'cones of 3 to 180° included',
		method: 'Idelchik, polynomial and wall friction',
		source: idelchik('5-23'),
		uncertainty: 0.25,
		caution: CONE_NOTE
	}),
	coefficient(values, { size, frictionFactor }, note) {
		const a = values.number('areaRatio');
		const d = values.number('angle');
		if (size.shape !== 'round') note('the formula is for cones');
		const smaller = conicalContractionIdelchik(d, a) + coneFriction(d, a, frictionFactor);
		return coefficientOfLeg(smaller, a, values.choice('leg'));
	}
};

export const areaChanges: readonly FittingDefinition[] = [suddenWider, suddenNarrower, cone, nozzle];
