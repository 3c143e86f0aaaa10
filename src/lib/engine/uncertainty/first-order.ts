import type { Solution } from '../document/types';
import type { Effects } from './effects';
import type { Influence, Uncertain, Uncertainty } from './types';

const MEANING =
	'One standard deviation of what is stated of each method and input, combined as the root of the sum of squares: about two thirds of cases lie within it.';

/** Effects of all inputs on one path: those of its rows added, input by input [Pa]. */
export function effectsOfPath(rows: readonly string[], { inputs, ofRow }: Effects): Float64Array {
	const sums = new Float64Array(inputs.length);
	for (const tag of rows) for (const [input, effect] of ofRow.get(tag) ?? []) sums[input] = (sums[input] ?? 0) + effect;
	return sums;
}

/**
 * First-order uncertainty of every path and of the fan's duty. The duty is that of the index paths.
 *
 *   u = sqrt(sum of squared effects), share = effect^2/u^2
 *
 * @param solution paths and duty [Pa]
 * @param effects of each input on the losses of each row [Pa]
 * @returns ± of fan and paths [Pa], with the inputs that make it
 */
export function firstOrder(solution: Solution, effects: Effects): Uncertainty {
	const paths = solution.paths.map(({ outlet, rows, loss }) => ({
		outlet,
		...uncertain(loss, effectsOfPath(rows, effects), effects)
	}));
	const duty = new Float64Array(effects.inputs.length);
	for (const outlet of [solution.index.supply, solution.index.return]) {
		const path = solution.paths.find((one) => one.outlet === outlet);
		if (path) effectsOfPath(path.rows, effects).forEach((effect, at) => (duty[at] = (duty[at] ?? 0) + effect));
	}
	const fan = uncertain(solution.fan.totalPressure, duty, effects);
	return { fan, paths, most: fan.influences.slice(0, 5), meaning: MEANING };
}

function uncertain(value: number, sums: Float64Array, { inputs }: Effects): Uncertain {
	const variance = sums.reduce((sum, effect) => sum + effect * effect, 0);
	const influences = inputs
		.flatMap((input, at): Influence[] => {
			const effect = sums[at] ?? 0;
			return effect === 0 ? [] : [{ ...input, effect, share: (effect * effect) / variance }];
		})
		.sort((a, b) => b.share - a.share || (a.key < b.key ? -1 : 1));
	const plusMinus = Math.sqrt(variance);
	return { value, plusMinus, relative: value === 0 ? null : plusMinus / Math.abs(value), influences };
}
