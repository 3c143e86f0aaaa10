import type { FittingDefinition } from './definition';
import { CAP_DISTANCE, flatCapSmacna } from './hood-tables';
import { heldWithin, numberParameter } from './parameters';
import type { CatalogueEntry } from './types';

/** A flat cap over a duct end; the exhaust loses the velocity pressure of the duct as well. */
export const flatCap = (
	way: 'intake' | 'exhaust',
	words: Pick<CatalogueEntry, 'key' | 'name' | 'family' | 'caution'>
) => {
	const definition: FittingDefinition = {
		entry: {
			...words,
			shapes: ['round'],
			parameters: [
				numberParameter('distanceRatio', 'Distance of the cap over diameter', '', 0.5, { min: 0.05, max: 10 })
			],
			reference: 'row',
			plot: { along: 'distanceRatio' },
			range: 'distance 0.1 to 1 diameter; beyond, the last value',
			method: 'Table of the distance',
			source: 'SMACNA, HVAC Systems Duct Design, after Idelchik, from memory',
			known: 'from memory',
			uncertainty: 0.4,
			picture: 'louvre',
			drawing: 'cap'
		},
		coefficient(values, _context, note) {
			const within = { min: CAP_DISTANCE.min, max: Infinity };
			return flatCapSmacna(heldWithin(values.number('distanceRatio'), within, 'distance over diameter', note), way);
		}
	};
	return definition;
};
