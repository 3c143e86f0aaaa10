import type { CatalogueEntry, FittingContext, JunctionContext } from './types';

/** The parameters of one fitting, each within its hard limits. */
export interface ParameterValues {
	number(name: string): number;
	choice(name: string): string;
}

/** Takes what is to be said of a coefficient: that it was asked outside its source, or, within it, how it was found. */
export type Note = (note: string, isWithin?: boolean) => void;

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
