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
import {
	conicalContractionRennels2012,
	conicalExpansionRennels2012,
	suddenContractionRennels2012
} from './area-change-rennels';
import { conicalExpansionTableIdelchik } from './area-change-tables';
import { coefficientOfLeg } from './reference-change';
import { RENNELS, RENNELS_METHOD, idelchik } from './sources';
import { transitions } from './transitions';
import type { CatalogueEntry, Method } from './types';

const areaRatio = numberParameter('areaRatio', 'Smaller over larger area', '', 0.5, { min: 0.01, max: 1 });
const angle = numberParameter('angle', 'Included angle', '°', 30, CONE_ANGLE);
const legOf = (standard: 'smaller' | 'larger') =>
	choiceParameter('leg', 'This row is the leg that is', standard, ['smaller', 'larger']);

const CONE_NOTE = 'The wall friction of the cone is in the coefficient: leave its length out of the row.';

type AreaChange = Pick<CatalogueEntry, 'key' | 'name' | 'parameters' | 'range' | 'method' | 'source' | 'uncertainty'> &
	Pick<CatalogueEntry, 'caution' | 'plot' | 'drawing' | 'rivals' | 'standardMethod'>;

const SUDDEN = { plot: { along: 'areaRatio' }, drawing: 'step' } as const;
const GRADUAL = { plot: { along: 'angle' }, drawing: 'transition' } as const;
const byRennels = (range: string, uncertainty: number): Method => ({
	key: 'rennels',
	range,
	method: RENNELS_METHOD,
	source: RENNELS,
	known: 'published formula',
	uncertainty
});
const TABLE: Method = {
	key: 'idelchik-table',
	range: 'cones of 3 to 180° included, area ratio to 0.6, beyond it straight to nothing; friction of 20° held above',
	method: 'Idelchik, table and wall friction',
	source: idelchik('5-2'),
	known: 'published table, interpolated',
	uncertainty: 0.3
};

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
		...SUDDEN,
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
		...SUDDEN,
		standardMethod: 'idelchik',
		rivals: [byRennels('any area ratio, turbulent flow, sharp edge', 0.15)],
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
	},
	rivals: {
		rennels(values) {
			const a = values.number('areaRatio');
			return coefficientOfLeg(suddenContractionRennels2012(a), a, values.choice('leg'));
		}
	}
};

const PYRAMID_NOTE = 'the formula is for cones; a pyramid loses some 1.25 to 1.4 times as much (from memory)';
const CONE_ONLY = 'the formula is for cones';
/** Included angle up to which the table's author gives the friction of a cone [°]. */
const FRICTION_ANGLE = 20;

/** A formula of angle [°], area ratio and friction factor, put on the row's own leg; the note where the duct is not round. */
function onLeg(
	notRound: string,
	smaller: (angle: number, areaRatio: number, f: number) => number
): FittingDefinition['coefficient'] {
	return (values, { size, frictionFactor }, note) => {
		if (size.shape !== 'round') note(notRound);
		const a = values.number('areaRatio');
		return coefficientOfLeg(smaller(values.number('angle'), a, frictionFactor), a, values.choice('leg'));
	};
}

function conicalExpansionByTable(d: number, a: number, f: number): number {
	return conicalExpansionTableIdelchik(d, a) + coneFriction(Math.min(d, FRICTION_ANGLE), a, f);
}

const cone: FittingDefinition = {
	entry: entryOf({
		...GRADUAL,
		standardMethod: 'idelchik',
		rivals: [TABLE, byRennels('cones, any angle; wall friction to 60°', 0.3)],
		key: 'gradual-expansion',
		name: 'Gradual expansion',
		parameters: [areaRatio, angle, legOf('larger')],
		range:
			'cones; shock term to 60° included, sudden expansion from 90°; other authors give half as much at 10° and a quarter more at 60°',
		method: 'Idelchik, shock term and wall friction',
		source: idelchik('5-4'),
		uncertainty: 0.3,
		caution: CONE_NOTE
	}),
	coefficient: onLeg(PYRAMID_NOTE, (d, a, f) => conicalExpansionIdelchik(d, a) + coneFriction(d, a, f)),
	rivals: {
		'idelchik-table': onLeg(PYRAMID_NOTE, conicalExpansionByTable),
		rennels: onLeg(PYRAMID_NOTE, conicalExpansionRennels2012)
	}
};

const nozzle: FittingDefinition = {
	entry: entryOf({
		...GRADUAL,
		standardMethod: 'idelchik',
		rivals: [byRennels('cones, any angle', 0.25)],
		key: 'gradual-contraction',
		name: 'Gradual contraction',
		parameters: [areaRatio, angle, legOf('smaller')],
		range: 'cones of 3 to 180° included',
		method: 'Idelchik, polynomial and wall friction',
		source: idelchik('5-23'),
		uncertainty: 0.25,
		caution: CONE_NOTE
	}),
	coefficient: onLeg(CONE_ONLY, (d, a, f) => conicalContractionIdelchik(d, a) + coneFriction(d, a, f)),
	rivals: { rennels: onLeg(CONE_ONLY, conicalContractionRennels2012) }
};

export const areaChanges: readonly FittingDefinition[] = [suddenWider, suddenNarrower, cone, nozzle, ...transitions];
