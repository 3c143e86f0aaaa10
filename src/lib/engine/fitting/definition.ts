import type { CatalogueEntry, FittingContext, JunctionContext } from './types';

/** The parameters of one fitting, each within its hard limits. */
export interface ParameterValues {
	number(name: string): number;
	choice(name: string): string;
}

/** Takes the notes of a coefficient that was asked outside its source. */
export type Note = (note: string) => void;

type Coefficient<Context> = (values: ParameterValues, context: Context, note: Note) => number;

export interface Definition<Context> {
	readonly entry: CatalogueEntry;
	/** A note means outside the range. */
	readonly coefficient: Coefficient<Context>;
	/** By the keys of the entry's rivals. */
	readonly rivals?: Readonly<Record<string, Coefficient<Context>>>;
}

/** An entry and its coefficient on the row's own velocity pressure. */
export type FittingDefinition = Definition<FittingContext>;

/** An entry for the place where a row joins another: its coefficient is on the velocity pressure of the common leg. */
export type JunctionDefinition = Definition<JunctionContext>;
