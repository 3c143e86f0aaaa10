import type { Solution } from '../document/types';
import type { Effects } from './effects';
import { effectsOfPath } from './first-order';
import { normalDraws } from './random';
import type { MonteCarlo, Sampled } from './types';

interface SparsePath {
	readonly outlet: string;
	readonly side: 'supply' | 'return';
	readonly required: number;
	readonly inputs: Int32Array;
	readonly effects: Float64Array;
}

/**
 * Draws every input at once, many times, and takes the greatest path of each side anew: the index may change. The losses
 * go in proportion to what is drawn, as in the first order; what the first order does not see is that another path may
 * come to govern.
 *
 * @param solution paths and duty [Pa]
 * @param effects of each input on the losses of each row [Pa]
 * @param seed whole number; the same seed gives the same figures
 * @param samples how many draws
 * @returns mean, standard deviation and quantiles [Pa] of fan and paths, and how often each path governs [-]
 */
export function monteCarlo(solution: Solution, effects: Effects, seed: number, samples: number): MonteCarlo {
	const paths = solution.paths.map((path): SparsePath => {
		const sums = effectsOfPath(path.rows, effects);
		const inputs = Int32Array.from([...sums.keys()].filter((at) => sums[at] !== 0));
		const side = path.side === 'supply' ? 'supply' : 'return';
		return {
			outlet: path.outlet,
			side,
			required: path.loss + (side === 'supply' ? path.roomPressure : -path.roomPressure),
			inputs,
			effects: Float64Array.from(inputs, (at) => sums[at] ?? 0)
		};
	});
	const draw = normalDraws(seed);
	const z = new Float64Array(effects.inputs.length);
	const drawn = paths.map(() => new Float64Array(samples));
	const governed = new Int32Array(paths.length);
	const fan = new Float64Array(samples);
	for (let sample = 0; sample < samples; sample += 1) {
		for (let at = 0; at < z.length; at += 1) z[at] = draw();
		const greatest = { supply: -1, return: -1 };
		const most = { supply: -Infinity, return: -Infinity };
		paths.forEach((path, place) => {
			let required = path.required;
			for (let k = 0; k < path.inputs.length; k += 1)
				required += (path.effects[k] ?? 0) * (z[path.inputs[k] ?? 0] ?? 0);
			(drawn[place] as Float64Array)[sample] = required;
			if (required > most[path.side]) {
				most[path.side] = required;
				greatest[path.side] = place;
			}
		});
		for (const place of [greatest.supply, greatest.return])
			if (place >= 0) governed[place] = (governed[place] ?? 0) + 1;
		fan[sample] = (greatest.supply < 0 ? 0 : most.supply) + (greatest.return < 0 ? 0 : most.return);
	}
	return {
		seed,
		samples,
		fan: sampled(fan),
		paths: paths.map(({ outlet }, place) => ({
			outlet,
			...sampled(drawn[place] as Float64Array),
			governs: (governed[place] ?? 0) / samples
		}))
	};
}

function sampled(values: Float64Array): Sampled {
	const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
	const squares = values.reduce((sum, value) => sum + (value - mean) * (value - mean), 0);
	const sorted = Float64Array.from(values).sort();
	const at = (share: number) => sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? NaN;
	return {
		mean,
		deviation: values.length > 1 ? Math.sqrt(squares / (values.length - 1)) : 0,
		quantiles: [at(0.05), at(0.5), at(0.95)]
	};
}
