import fc from 'fast-check';
import { performance } from 'node:perf_hooks';
import { describe, expect, it } from 'vitest';
import { anyDesignOfStreams, isWithinRange, solutionOf } from '../../../../tests/engine/any-design';
import { building } from '../../../../tests/bench/building';
import type { DesignDocument, DesignRow } from '../document/types';
import { solveDesign } from '../network';
import { normalDraws, BOUND } from './random';
import { monteCarloOf, SPREADS, uncertaintyOf, type SpreadOptions } from '.';

const NONE: SpreadOptions = { coefficient: 0, equipment: 0, outlet: 0, flexible: 0, roughness: 0, density: 0 };
const branch = (tag: string, coefficient: number, loss = 20): DesignRow => ({
	...{ tag, joins: 'A', side: 'supply', size: { shape: 'round', diameter: 0.25 }, length: 6 },
	fittings: [{ kind: 'fixed', coefficient, name: `fitting of ${tag}` }],
	outlet: { flow: 0.2, loss }
});
const design = (...branches: readonly DesignRow[]): DesignDocument => ({
	format: 'evendraft/design@1',
	air: { temperature: 20 },
	rows: [
		{
			...{ tag: 'A', joins: null, side: 'supply', size: { shape: 'round', diameter: 0.4 }, length: 12 },
			fittings: [{ kind: 'round-elbow-smooth' }],
			equipment: [{ name: 'Coil', loss: 40 }]
		},
		...branches
	]
});
const GOVERNED = design(branch('B', 8), branch('C', 0.5));

describe('the first order', () => {
	it('is the root of the squares of what each input does, by hand', () => {
		const solution = solutionOf(GOVERNED);
		const only = (options: SpreadOptions) => uncertaintyOf(GOVERNED, solution, { ...NONE, ...options });
		const elbow = solution.rows.A?.items.find(({ part }) => part === 'fitting');
		const ofElbow = (elbow?.catalogue?.uncertainty ?? NaN) * (elbow?.loss ?? NaN);
		// The spread of a method is stated with it, and stays where all else is certain.
		expect(only({}).fan.plusMinus).toBeCloseTo(ofElbow, 10);
		const coil = 0.1 * 40;
		expect(only({ equipment: 0.1 }).fan.plusMinus).toBeCloseTo(Math.hypot(ofElbow, coil), 10);
	});

	it('grows in proportion to a spread, and has shares that are one together', () => {
		const solution = solutionOf(GOVERNED);
		const once = uncertaintyOf(GOVERNED, solution).fan;
		expect(once.influences.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
		const coilOf = (spread: number) =>
			uncertaintyOf(GOVERNED, solution, { equipment: spread }).fan.influences.find(({ key }) =>
				key.startsWith('equipment')
			)?.effect;
		expect(coilOf(0.2)).toBeCloseTo(2 * (coilOf(0.1) ?? NaN), 12);
	});

	it('names the five inputs that matter most, the greatest first', () => {
		const { most, fan, meaning } = uncertaintyOf(GOVERNED, solutionOf(GOVERNED));
		expect(most).toEqual(fan.influences.slice(0, 5));
		expect(most[0]?.name).toBe('fitting of B, coefficient entered by hand');
		expect(meaning).toContain('two thirds');
		for (const { basis } of Object.values(SPREADS)) expect(basis.length).toBeGreaterThan(10);
	});

	it('meets what solving again with a changed input gives', () => {
		const solution = solutionOf(GOVERNED);
		const { fan } = uncertaintyOf(GOVERNED, solution);
		const again = (document: DesignDocument) => solutionOf(document).fan.totalPressure - solution.fan.totalPressure;
		const effect = (start: string) => fan.influences.find(({ key }) => key.startsWith(start))?.effect ?? NaN;
		const [a, b, c] = GOVERNED.rows as [DesignRow, DesignRow, DesignRow];
		const coefficient = 8 * (1 + SPREADS.coefficient.spread);
		expect(again({ ...GOVERNED, rows: [a, branch('B', coefficient), c] })).toBeCloseTo(
			effect('coefficient fitting of B'),
			9
		);
		expect(again({ ...GOVERNED, rows: [{ ...a, equipment: [{ name: 'Coil', loss: 44 }] }, b, c] })).toBeCloseTo(
			effect('equipment'),
			9
		);
		const rough = fan.influences.find(({ key }) => key.startsWith('roughness'));
		const changed = 0.00009 * (1 + (rough?.spread ?? NaN));
		expect(again({ ...GOVERNED, roughness: changed })).toBeCloseTo(rough?.effect ?? NaN, 1);
	});

	it('does not know the order of the rows, and is finite for any design', { timeout: 60_000 }, () => {
		fc.assert(
			fc.property(anyDesignOfStreams, (document) => {
				fc.pre(isWithinRange(document));
				const solution = solutionOf(document);
				const { fan, paths } = uncertaintyOf(document, solution);
				const turned = { ...document, rows: [...document.rows].reverse() };
				expect(uncertaintyOf(turned, solutionOf(turned)).fan.plusMinus).toBeCloseTo(fan.plusMinus, 6);
				for (const { plusMinus } of [fan, ...paths]) expect(Number.isFinite(plusMinus)).toBe(true);
			}),
			{ numRuns: 60 }
		);
	});
});

describe('drawing', () => {
	const SAMPLES = 20_000;
	/** Three standard errors of a standard deviation of so many draws. */
	const within = 3 / Math.sqrt(2 * SAMPLES);

	it('has draws of mean 0 and deviation 1, within their bound, the same for the same seed', () => {
		const draw = normalDraws(7);
		const draws = Array.from({ length: 100_000 }, draw);
		const mean = draws.reduce((sum, z) => sum + z, 0) / draws.length;
		const variance = draws.reduce((sum, z) => sum + z * z, 0) / draws.length;
		expect(Math.abs(mean)).toBeLessThan(0.01);
		// Cut off at 3.5, the variance is 0.994.
		expect(Math.abs(variance - 0.994)).toBeLessThan(0.015);
		expect(Math.max(...draws.map(Math.abs))).toBeLessThanOrEqual(BOUND);
		const again = normalDraws(7);
		expect(Array.from({ length: 100 }, again)).toEqual(draws.slice(0, 100));
		expect(normalDraws(8)()).not.toBe(draws[0]);
	});

	it('agrees with the first order for every path, and for the duty where one path clearly governs', () => {
		const solution = solutionOf(GOVERNED);
		const first = uncertaintyOf(GOVERNED, solution);
		const drawn = monteCarloOf(GOVERNED, solution, { seed: 2_026, samples: SAMPLES });
		drawn.paths.forEach(({ deviation, mean }, at) => {
			const path = first.paths[at];
			expect(Math.abs(deviation / (path?.plusMinus ?? NaN) - 1)).toBeLessThan(within + 0.005);
			expect(Math.abs(mean - (path?.value ?? NaN))).toBeLessThan((4 * (path?.plusMinus ?? NaN)) / Math.sqrt(SAMPLES));
		});
		expect(Math.abs(drawn.fan.deviation / first.fan.plusMinus - 1)).toBeLessThan(within + 0.005);
		expect(drawn.paths.map(({ governs }) => governs)).toEqual([1, 0]);
		const [low, middle, high] = drawn.fan.quantiles;
		expect(middle).toBeCloseTo(drawn.fan.mean, 0);
		expect((high - low) / (2 * first.fan.plusMinus)).toBeCloseTo(1.645, 1);
	});

	it('finds the duty above the first order where two paths are nearly equal: the greater of both is taken', () => {
		const even = design(branch('B', 8), branch('C', 8));
		const solution = solutionOf(even);
		const drawn = monteCarloOf(even, solution, { seed: 5, samples: SAMPLES });
		expect(drawn.fan.mean).toBeGreaterThan(solution.fan.totalPressure + 1);
		for (const { governs } of drawn.paths) expect(governs).toBeGreaterThan(0.4);
	});

	it('gives the same figures for the same seed, and what solving each draw gives', () => {
		const solution = solutionOf(GOVERNED);
		const one = monteCarloOf(GOVERNED, solution, { seed: 11, samples: 200 });
		expect(monteCarloOf(GOVERNED, solution, { seed: 11, samples: 200 })).toEqual(one);
		// One input alone: every draw solved anew.
		const spreads = { ...NONE, equipment: 0.1 };
		const bare: DesignDocument = {
			...GOVERNED,
			rows: GOVERNED.rows.map((row) => (row.tag === 'A' ? { ...row, fittings: [] } : row))
		};
		const draw = normalDraws(11);
		const solved = Array.from({ length: 200 }, () => {
			const loss = 40 * (1 + 0.1 * draw());
			const rows = bare.rows.map((row) => (row.tag === 'A' ? { ...row, equipment: [{ name: 'Coil', loss }] } : row));
			const result = solveDesign({ ...bare, rows });
			return result.ok ? result.solution.fan.totalPressure : NaN;
		});
		const mean = solved.reduce((sum, value) => sum + value, 0) / solved.length;
		expect(monteCarloOf(bare, solutionOf(bare), { seed: 11, samples: 200, spreads }).fan.mean).toBeCloseTo(mean, 9);
	});

	it('takes little time for a building', () => {
		const document = building(1_000);
		const solution = solutionOf(document);
		const begun = performance.now();
		expect(monteCarloOf(document, solution, { seed: 1 }).samples).toBe(2_000);
		process.stdout.write(`2,000 draws of 1,000 rows: ${(performance.now() - begun).toFixed(0)} ms\n`);
	});
});
