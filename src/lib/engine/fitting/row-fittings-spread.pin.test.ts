// How far published methods differ on one fitting: figures read off our own sweeps. A change of them is to be seen, not to
// be believed.
import { describe, expect, it } from 'vitest';
import { coefficientOf } from './coefficient-of';
import { bendIdelchik } from './bend-idelchik';
import { fittingEntry } from './catalogue';
import { splitterSmacna, splitterVanes } from './splitter-vanes';
import type { FittingContext } from './types';

const row: FittingContext = {
	size: { shape: 'round', diameter: 0.3 },
	reynolds: 2e5,
	velocity: 10,
	relativeRoughness: 0.0003,
	frictionFactor: 0.0177
};
const square: FittingContext = { ...row, size: { shape: 'rectangular', width: 0.3, height: 0.3 } };

/** The greatest over the least of all methods of an entry. */
function spread(kind: string, parameters: Readonly<Record<string, number | string>>): number {
	const entry = fittingEntry(kind);
	const context = entry?.shapes.includes('round') ? row : square;
	const methods = [entry?.standardMethod, ...(entry?.rivals ?? []).map(({ key }) => key)];
	const all = methods.map((method) => coefficientOf(kind, { ...parameters, method }, context).coefficient);
	return Math.max(...all) / Math.min(...all);
}

describe('the spread between all methods of a fitting, greatest over least', () => {
	it.each([
		['round-elbow-smooth', { radiusRatio: 0.75 }, 1.55],
		['round-elbow-smooth', { radiusRatio: 1 }, 1.29],
		['round-elbow-smooth', { radiusRatio: 1.5 }, 1.35],
		['round-elbow-smooth', { radiusRatio: 2 }, 1.3],
		['round-elbow-mitred', { angle: 45 }, 1.13],
		['round-elbow-mitred', { angle: 90 }, 1.02],
		['rectangular-elbow-smooth', { radiusRatio: 1 }, 1.01],
		['rectangular-elbow-smooth', { radiusRatio: 0.75 }, 1.03],
		['rectangular-elbow-mitred', { angle: 90 }, 1.02],
		['sudden-contraction', { areaRatio: 0.2 }, 1.23],
		['sudden-contraction', { areaRatio: 0.8 }, 1.49],
		['gradual-expansion', { angle: 10 }, 2.56],
		['gradual-expansion', { angle: 30 }, 1.23],
		['gradual-expansion', { angle: 60 }, 1.25],
		['gradual-contraction', { angle: 60 }, 1.04],
		['gradual-contraction', { angle: 180 }, 1.1],
		['pyramidal-expansion', { angle: 20 }, 2.25],
		['pyramidal-expansion', { angle: 45 }, 1.09],
		['pyramidal-contraction', { angle: 60 }, 1.42],
		['pyramidal-contraction', { angle: 120 }, 1.11],
		['entry-bellmouth-in-wall', { radiusRatio: 0.05 }, 1.35],
		['entry-bellmouth-in-wall', { radiusRatio: 0.2 }, 3.83],
		['screen-wire', { freeArea: 0.5 }, 1.06],
		['perforated-plate-thin', { freeArea: 0.5 }, 1.15]
	])('%s at %j: %d times', (kind, parameters, times) => {
		const found = spread(kind, parameters);
		expect(found).toBeLessThanOrEqual(times);
		expect(found).toBeGreaterThan(times - 0.02);
	});

	// The remembered table falls with the throat radius; the formula for the bends between the vanes levels out.
	it.each([
		[1, 0.5, 3.08],
		[2, 0.25, 3.79],
		[3, 0.05, 1.5]
	])('%d splitter vanes, throat %d W, table and bends between the vanes: %d times', (vanes, throat, times) => {
		const CR = splitterVanes(vanes, throat, 1).curveRatio;
		const found = bendIdelchik(90, (1 + CR) / (2 * (1 - CR))) / splitterSmacna(vanes, CR, 1);
		expect(found).toBeLessThanOrEqual(times);
		expect(found).toBeGreaterThan(times - 0.02);
	});
});
