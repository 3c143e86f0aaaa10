import type { CatalogueEntry, FittingContext } from './types';

/** The parameters of one fitting, each within its hard limits. */
export interface ParameterValues {
	number(name: string): number;
	choice(name: string): string;
}

/** Takes the notes of a coefficient that was asked outside its source. */
export type Note = (note: string) => void;

/** An entry and its coefficient on the row's own velocity pressure; a note means outside the range. */
export interface FittingDefinition {
	readonly entry: CatalogueEntry;
	readonly coefficient: (values: ParameterValues, context: FittingContext, note: Note) => number;
}
