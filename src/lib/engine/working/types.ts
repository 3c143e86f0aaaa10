/** A figure of a step: entered, known, or the result of an earlier step. */
export interface WorkingValue {
	readonly symbol: string;
	/** In words, as 'Length of S05'. */
	readonly name: string;
	readonly value: number | string;
	/** SI; '' for a pure number or a word. */
	readonly unit: string;
	/** `settled`: what the iteration of leakage and pressures came to. */
	readonly from: 'entered' | 'default' | 'settled' | 'step';
	/** Place of the step that it comes from. */
	readonly step?: number;
}

export interface WorkingStep {
	/** Key of the formula: `formulaOf(key)` computes the step again. */
	readonly formula: string;
	/** As it is written, with the symbols of the inputs. */
	readonly expression: string;
	readonly source: string;
	/** What lies outside the range of the source; null where nothing does. */
	readonly range: string | null;
	readonly inputs: readonly WorkingValue[];
	readonly result: { readonly symbol: string; readonly name: string; readonly value: number; readonly unit: string };
}

/** How one figure of a solution comes about, each step after those it rests on. The last step is the figure itself. */
export interface Working {
	/** Path in the solution, as `rows.S05.loss` or `fan.totalPressure`. */
	readonly figure: string;
	readonly value: number;
	readonly unit: string;
	readonly steps: readonly WorkingStep[];
}
