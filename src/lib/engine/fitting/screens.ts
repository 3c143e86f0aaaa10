import type { FittingDefinition } from './definition';
import { numberParameter } from './parameters';
import { thickPlateIdelchik, thinPlateIdelchik, wireScreenIdelchik } from './screen-formulas';
import { idelchik } from './sources';
import type { CatalogueEntry } from './types';

type Screen = Pick<CatalogueEntry, 'key' | 'name' | 'parameters' | 'range' | 'method' | 'source' | 'known'>;

function entryOf(screen: Screen): CatalogueEntry {
	return {
		...screen,
		family: 'screens',
		shapes: ['round', 'rectangular', 'oval'],
		reference: 'row',
		uncertainty: 0.25,
		picture: 'grille',
		caution: null
	};
}

const freeArea = numberParameter('freeArea', 'Free-area ratio', '', 0.6, { min: 0.05, max: 1 });

const wire: FittingDefinition = {
	entry: entryOf({
		key: 'screen-wire',
		name: 'Wire screen',
		parameters: [freeArea],
		range: 'Reynolds number of the wire above 1000',
		method: 'Idelchik',
		source: `${idelchik('8-6')}, from memory`,
		known: 'from memory'
	}),
	coefficient: (values) => wireScreenIdelchik(values.number('freeArea'))
};

const thin: FittingDefinition = {
	entry: entryOf({
		key: 'perforated-plate-thin',
		name: 'Perforated plate, thin',
		parameters: [freeArea],
		range: 'sharp edges, thickness to 0.015 of the hole diameter',
		method: 'Idelchik',
		source: `${idelchik('8-1')}, from memory`,
		known: 'from memory'
	}),
	coefficient: (values) => thinPlateIdelchik(values.number('freeArea'))
};

const thick: FittingDefinition = {
	entry: entryOf({
		key: 'perforated-plate-thick',
		name: 'Perforated plate or grid, thick',
		parameters: [
			freeArea,
			numberParameter('thicknessRatio', 'Thickness over hole diameter', '', 0.5, { min: 0, max: 2.4 })
		],
		range: 'thickness to 2.4 hole diameters; the friction factor of the row stands for that in the holes',
		method: 'Idelchik',
		source: idelchik('8-3'),
		known: 'published formula'
	}),
	coefficient: (values, { frictionFactor }) =>
		thickPlateIdelchik(values.number('freeArea'), values.number('thicknessRatio'), frictionFactor)
};

export const screens: readonly FittingDefinition[] = [wire, thin, thick];
