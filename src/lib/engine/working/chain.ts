import { formulaOf, type FormulaKey, type Inputs } from './formulas';
import type { WorkingStep, WorkingValue } from './types';

/** What a step gave, to be put into later ones. */
export interface Ref {
	readonly value: number;
	readonly symbol: string;
	readonly name: string;
	readonly unit: string;
	readonly step: number;
}

type Given = Omit<WorkingValue, 'symbol'>;
export type Input = Given | Ref;

export const entered = (name: string, value: number | string, unit = ''): Given => ({
	...{ name, value, unit, from: 'entered' }
});
export const standing = (name: string, value: number | string, unit = ''): Given => ({
	...{ name, value, unit, from: 'default' }
});

export const settled = (name: string, value: number, unit = ''): Given => ({
	...{ name, value, unit, from: 'settled' }
});

/** Steps in the order in which they are worked, each computed by its formula; what was worked once is not worked again. */
export class Chain {
	readonly steps: WorkingStep[] = [];
	readonly #known = new Map<string, Ref>();

	/**
	 * Works a step, unless one of the same name was worked before.
	 *
	 * @param key of the formula
	 * @param result symbol, name and unit of what it gives
	 * @param inputs by the symbols of the formula
	 * @param more source and range where they are those of a catalogue's entry
	 */
	work(
		key: FormulaKey,
		result: { readonly symbol: string; readonly name: string; readonly unit: string },
		inputs: Readonly<Record<string, Input>>,
		more: { readonly source?: string; readonly range?: string | null; readonly expression?: string } = {}
	): Ref {
		const known = this.#known.get(result.name);
		if (known) return known;
		const formula = formulaOf(key);
		const values: Inputs = Object.fromEntries(Object.entries(inputs).map(([symbol, { value }]) => [symbol, value]));
		const value = formula.compute(values);
		this.steps.push({
			formula: key,
			expression: more.expression ?? formula.expression,
			source: more.source ?? formula.source,
			range: more.range ?? null,
			inputs: Object.entries(inputs).map(([symbol, input]) => shownInput(symbol, input)),
			result: { ...result, value }
		});
		const ref: Ref = { ...result, value, step: this.steps.length - 1 };
		this.#known.set(result.name, ref);
		return ref;
	}
}

function shownInput(symbol: string, input: Input): WorkingValue {
	if ('from' in input) return { symbol, ...input };
	const { name, value, unit, step } = input;
	return { symbol, name, value, unit, from: 'step', step };
}
