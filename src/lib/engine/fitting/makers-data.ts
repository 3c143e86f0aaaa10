import type { FittingDefinition } from './definition';
import { numberParameter } from './parameters';
import type { CatalogueEntry } from './types';

const coefficient = numberParameter('coefficient', 'Coefficient of the maker', '', 0, { min: 0, max: 100 });

type Made = Pick<CatalogueEntry, 'key' | 'name' | 'family' | 'picture' | 'drawing' | 'caution'>;

/** A part whose coefficient only its maker knows: it is entered, and a missing one is told. */
export const byMaker = (made: Made): FittingDefinition => ({
	entry: {
		...made,
		shapes: ['round', 'rectangular', 'oval'],
		parameters: [coefficient],
		reference: 'row',
		range: 'as the maker states: size, flow and whether the velocity pressure of the duct is in it',
		method: 'Coefficient entered from the data of the maker',
		source: 'The maker of the part',
		known: "maker's data",
		uncertainty: 0.15
	},
	coefficient(values, _context, note) {
		const C = values.number('coefficient');
		if (C === 0) note('no coefficient of the maker is entered, so that no loss is counted');
		return C;
	}
});
