import type { FittingDefinition } from './definition';
import { entryHoods } from './entry-hoods';
import {
	BELLMOUTH_RADIUS,
	EDGE_THICKNESS,
	ENTRY_ANGLE,
	PROJECTION,
	angledEntryIdelchik,
	freeBellmouthIdelchik,
	projectingEntryIdelchik,
	roundedEntryIdelchik,
	roundedEntryRennels2012
} from './entry-formulas';
import { noteOutside, numberParameter } from './parameters';
import { RENNELS, idelchik } from './sources';
import type { CatalogueEntry } from './types';

type EntryFitting = Pick<CatalogueEntry, 'key' | 'name' | 'parameters' | 'range' | 'method' | 'source' | 'known'> &
	Pick<CatalogueEntry, 'uncertainty' | 'plot' | 'drawing' | 'rivals' | 'standardMethod'>;

function entryOf(fitting: EntryFitting): CatalogueEntry {
	return {
		drawing: 'entry',
		...fitting,
		family: 'entries',
		shapes: ['round', 'rectangular', 'oval'],
		reference: 'row',
		picture: 'grille',
		caution: null
	};
}

const radiusRatio = numberParameter('radiusRatio', 'Radius of the lip over diameter', '', 0.1, { min: 0, max: 1 });

const flush: FittingDefinition = {
	entry: entryOf({
		key: 'entry-flush',
		name: 'Entry flush with a wall, sharp edge',
		parameters: [],
		range: 'square to the wall, turbulent flow',
		method: 'One value',
		source: idelchik('3-1'),
		known: 'published table, interpolated',
		uncertainty: 0.1
	}),
	coefficient: () => projectingEntryIdelchik(0, 0)
};

const plainEnd: FittingDefinition = {
	entry: entryOf({
		key: 'entry-plain-end',
		name: 'Entry at a plain duct end',
		parameters: [],
		range: 'thin edge, no wall within half a diameter',
		method: 'One value',
		source: idelchik('3-1'),
		known: 'published table, interpolated',
		uncertainty: 0.1
	}),
	coefficient: () => projectingEntryIdelchik(0, 1)
};

const projecting: FittingDefinition = {
	entry: entryOf({
		key: 'entry-projecting',
		name: 'Entry projecting through a wall',
		parameters: [
			numberParameter('thicknessRatio', 'Edge thickness over diameter', '', 0, { min: 0, max: 1 }),
			numberParameter('lengthRatio', 'Projection over diameter', '', 0.5, { min: 0, max: 100 })
		],
		range: 'edge thickness to 0.05 D, projection to 1 D; beyond, the last value',
		plot: { along: 'lengthRatio' },
		method: 'Table of thickness and projection',
		source: idelchik('3-1'),
		known: 'published table, interpolated',
		uncertainty: 0.15
	}),
	coefficient(values) {
		// The table settles at both ends, so that what lies beyond is no extrapolation.
		const thickness = Math.min(values.number('thicknessRatio'), EDGE_THICKNESS.max);
		return projectingEntryIdelchik(thickness, Math.min(values.number('lengthRatio'), PROJECTION.max));
	}
};

const bellmouth: FittingDefinition = {
	entry: entryOf({
		key: 'entry-bellmouth',
		name: 'Bellmouth entry at a free duct end',
		parameters: [radiusRatio],
		plot: { along: 'radiusRatio' },
		drawing: 'bellmouth',
		range: 'r/D to 0.2; beyond, the last value; rectangular and oval duct by the hydraulic diameter',
		method: 'Table of r/D',
		source: idelchik('3-4'),
		known: 'published table, interpolated',
		uncertainty: 0.2
	}),
	coefficient: (values) => freeBellmouthIdelchik(Math.min(values.number('radiusRatio'), BELLMOUTH_RADIUS.max))
};

const bellmouthInWall: FittingDefinition = {
	entry: entryOf({
		key: 'entry-bellmouth-in-wall',
		name: 'Bellmouth entry in a wall',
		parameters: [radiusRatio],
		plot: { along: 'radiusRatio' },
		drawing: 'bellmouth',
		standardMethod: 'rennels',
		rivals: [
			{
				key: 'idelchik',
				range: 'r/D to 0.2; beyond, the last value',
				method: 'Table of r/D',
				source: 'Idelchik, Handbook of Hydraulic Resistance, chapter 3, read at second hand',
				known: 'published table, interpolated',
				uncertainty: 0.4
			}
		],
		range: 'r/D to 1; older data give less than half at r/D 0.2; rectangular and oval duct by the hydraulic diameter',
		method: 'Rennels and Hudson',
		source: RENNELS,
		known: 'published formula',
		uncertainty: 0.4
	}),
	coefficient: (values) => roundedEntryRennels2012(values.number('radiusRatio')),
	rivals: {
		idelchik: (values) => roundedEntryIdelchik(Math.min(values.number('radiusRatio'), BELLMOUTH_RADIUS.max))
	}
};

const angled: FittingDefinition = {
	entry: entryOf({
		key: 'entry-angled',
		name: 'Entry flush with a wall, at an angle',
		parameters: [numberParameter('angle', 'Angle between duct and wall', '°', 60, { min: 0, max: 90 })],
		plot: { along: 'angle' },
		range: '20 to 90°',
		method: 'Idelchik, cosine form',
		source: 'Idelchik, Handbook of Hydraulic Resistance (1966), as recommended by Rennels & Hudson (2012)',
		known: 'published formula',
		uncertainty: 0.15
	}),
	coefficient(values, _context, note) {
		const t = values.number('angle');
		noteOutside(t, ENTRY_ANGLE, 'angle', note);
		return angledEntryIdelchik(t);
	}
};

export const entries: readonly FittingDefinition[] = [
	flush,
	plainEnd,
	projecting,
	bellmouth,
	bellmouthInWall,
	angled,
	...entryHoods
];
