// Entries with something before the duct: hoods that catch, caps and louvres that keep the weather out.
import type { FittingDefinition } from './definition';
import { flatCap } from './flat-cap';
import { HOOD_ANGLE, taperedHoodAcgih } from './hood-tables';
import { byMaker } from './makers-data';
import { heldWithin, numberParameter } from './parameters';
import type { CatalogueEntry } from './types';

const HOOD = 'ACGIH, Industrial Ventilation, hood entry loss, from memory';
const CAUTION =
	'The loss at the duct alone: what a hood must catch, and what codes ask of kitchen, laboratory and dust exhaust, are not worked out.';

type Hood = Pick<CatalogueEntry, 'key' | 'name' | 'parameters' | 'plot' | 'range' | 'method' | 'uncertainty'>;
const entryOf = (hood: Hood): CatalogueEntry => ({
	...hood,
	family: 'entries',
	shapes: ['round', 'rectangular', 'oval'],
	reference: 'row',
	source: HOOD,
	known: 'from memory',
	picture: 'grille',
	drawing: 'hood',
	caution: CAUTION
});

const plain: FittingDefinition = {
	entry: entryOf({
		key: 'hood-plain',
		name: 'Hood: plain opening',
		parameters: [],
		range: 'a duct end without flange; 0.90 to 0.93 in the printings',
		method: 'One value',
		uncertainty: 0.15
	}),
	coefficient: () => 0.93
};

const flanged: FittingDefinition = {
	entry: entryOf({
		key: 'hood-flanged',
		name: 'Hood: flanged opening',
		parameters: [],
		range: 'a wide flange square to the duct; 0.49 to 0.50 in the printings',
		method: 'One value',
		uncertainty: 0.15
	}),
	coefficient: () => 0.49
};

const tapered: FittingDefinition = {
	entry: entryOf({
		key: 'hood-tapered',
		name: 'Hood: tapered',
		parameters: [numberParameter('angle', 'Included angle', '°', 90, { min: 5, max: 180 })],
		plot: { along: 'angle' },
		range: '15 to 180° included, face at least twice the area of the duct; rectangular faces stand for oval ones',
		method: 'Table of the angle',
		uncertainty: 0.3
	}),
	coefficient(values, { size }, note) {
		const d = heldWithin(values.number('angle'), HOOD_ANGLE, 'angle', note);
		return taperedHoodAcgih(d, size.shape === 'round' ? 'round' : 'rectangular');
	}
};

const intakeHood = byMaker({
	key: 'intake-hood',
	name: 'Intake hood or cowl',
	family: 'entries',
	picture: 'louvre',
	drawing: 'hood',
	caution: null
});
const intakeLouvre = byMaker({
	key: 'intake-louvre',
	name: 'Intake louvre',
	family: 'entries',
	picture: 'louvre',
	drawing: 'louvre',
	caution: 'Makers give the loss at the velocity in the face or in the free area: bring it to that of the row.'
});

export const entryHoods: readonly FittingDefinition[] = [
	plain,
	flanged,
	tapered,
	flatCap('intake', { key: 'intake-cap', name: 'Intake under a flat cap', family: 'entries', caution: null }),
	intakeHood,
	intakeLouvre
];
