import type { FittingDefinition } from './definition';
import { obstruction } from './obstruction';
import { noteOutside, numberParameter } from './parameters';
import {
	thickPlateIdelchik,
	thinPlateBlevins,
	thinPlateIdelchik,
	wireScreenBlevins,
	wireScreenIdelchik
} from './screen-formulas';
import { BLEVINS, idelchik } from './sources';
import type { CatalogueEntry, Method } from './types';

type Screen = Pick<CatalogueEntry, 'key' | 'name' | 'parameters' | 'range' | 'method' | 'source' | 'known'> &
	Pick<CatalogueEntry, 'rivals' | 'standardMethod' | 'drawing'>;

function entryOf(screen: Screen): CatalogueEntry {
	return {
		...screen,
		family: 'screens',
		shapes: ['round', 'rectangular', 'oval'],
		reference: 'row',
		plot: { along: 'freeArea' },
		uncertainty: 0.25,
		picture: 'grille',
		caution: null
	};
}

const byBlevins = (range: string, method: string): Method => ({
	key: 'blevins',
	range,
	method,
	source: BLEVINS,
	known: 'published table, interpolated',
	uncertainty: 0.3
});
const BLEVINS_SCREEN = { min: 0.05, max: 0.8 };
/** Reynolds number between the wires from which the table does not fall any more; air passes it at 1 m/s and 6 mm. */
const TURBULENT_WIRE = 400;

const freeArea = numberParameter('freeArea', 'Free-area ratio', '', 0.6, { min: 0.05, max: 1 });

const wire: FittingDefinition = {
	entry: entryOf({
		standardMethod: 'idelchik',
		rivals: [
			byBlevins('Reynolds number of the space between the wires from 400, free area to 0.8', 'Table of the free area')
		],
		drawing: 'screen',
		key: 'screen-wire',
		name: 'Wire screen',
		parameters: [freeArea],
		range: 'Reynolds number of the wire above 1000',
		method: 'Idelchik',
		source: `${idelchik('8-6')}, from memory`,
		known: 'from memory'
	}),
	coefficient: (values) => wireScreenIdelchik(values.number('freeArea')),
	rivals: {
		blevins(values, _context, note) {
			noteOutside(values.number('freeArea'), BLEVINS_SCREEN, 'free-area ratio', note);
			return wireScreenBlevins(values.number('freeArea'), TURBULENT_WIRE);
		}
	}
};

const thin: FittingDefinition = {
	entry: entryOf({
		standardMethod: 'idelchik',
		rivals: [byBlevins('square edges, free area from 0.05', 'Table of the free area')],
		drawing: 'plate',
		key: 'perforated-plate-thin',
		name: 'Perforated plate, thin',
		parameters: [freeArea],
		range: 'sharp edges, thickness to 0.015 of the hole diameter',
		method: 'Idelchik',
		source: `${idelchik('8-1')}, from memory`,
		known: 'from memory'
	}),
	coefficient: (values) => thinPlateIdelchik(values.number('freeArea')),
	rivals: { blevins: (values) => thinPlateBlevins(values.number('freeArea')) }
};

const thick: FittingDefinition = {
	entry: entryOf({
		drawing: 'plate',
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

export const screens: readonly FittingDefinition[] = [wire, thin, thick, obstruction];
