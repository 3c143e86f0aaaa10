/** An input whose figure is known only so far. */
export interface SpreadInput {
	readonly key: string;
	readonly name: string;
	/** Fraction of the figure, one standard deviation. */
	readonly spread: number;
	/** Where the spread comes from. */
	readonly basis: string;
}

/** What one input does to a figure. */
export interface Influence extends SpreadInput {
	/** Change of the figure for one spread of the input [Pa]. */
	readonly effect: number;
	/** Part of the variance, 0 to 1. */
	readonly share: number;
}

/** A pressure with its ±: one standard deviation, within which about two thirds of cases lie. */
export interface Uncertain {
	readonly value: number; // Pa
	readonly plusMinus: number; // Pa
	/** Of the value; null where the value is 0. */
	readonly relative: number | null;
	/** Every input that moves it, the greatest first. */
	readonly influences: readonly Influence[];
}

export interface UncertainPath extends Uncertain {
	readonly outlet: string;
}

export interface Uncertainty {
	readonly fan: Uncertain;
	readonly paths: readonly UncertainPath[];
	/** The five inputs that matter most for the fan. */
	readonly most: readonly Influence[];
	/** What the ± means. */
	readonly meaning: string;
}

export interface Sampled {
	readonly mean: number; // Pa
	readonly deviation: number; // Pa
	/** 5, 50 and 95 % [Pa]. */
	readonly quantiles: readonly [number, number, number];
}

export interface MonteCarlo {
	readonly seed: number;
	readonly samples: number;
	readonly fan: Sampled;
	readonly paths: readonly (Sampled & {
		readonly outlet: string;
		/** How often it governs its side, 0 to 1. */
		readonly governs: number;
	})[];
}
