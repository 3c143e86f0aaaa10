// What holds for every fitting along a row, by every method.
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { frictionFactor } from '../friction';
import type { Shape, Size } from '../shape';
import { conicalContractionIdelchik } from './area-change-idelchik';
import { bendReynoldsFactorIdelchik } from './bend-idelchik';
import { catalogue } from './catalogue';
import { splitterSmacna, splitterVanes } from './splitter-vanes';
import { coefficientOf } from './coefficient-of';
import type { CatalogueEntry, FittingContext } from './types';

const SIZES: Readonly<Record<Shape, Size>> = {
	round: { shape: 'round', diameter: 0.4 },
	rectangular: { shape: 'rectangular', width: 0.8, height: 0.3 },
	oval: { shape: 'oval', width: 0.6, height: 0.3 }
};

function rowOf(shape: Shape, reynolds: number): FittingContext {
	const relativeRoughness = 0.000225;
	const friction = frictionFactor({ reynolds, relativeRoughness });
	return { size: SIZES[shape], reynolds, velocity: 8, relativeRoughness, frictionFactor: friction };
}

type Parameters = Readonly<Record<string, number | string>>;
const all = catalogue
	.filter((entry) => entry.place !== 'junction')
	.flatMap((entry) =>
		[entry.standardMethod ?? 'one', ...(entry.rivals ?? []).map(({ key }) => key)].map(
			(method) => [entry.key, method, entry] as const
		)
	);
const value = (entry: CatalogueEntry, parameters: Parameters, row: FittingContext) =>
	coefficientOf(entry.key, parameters, row).coefficient;

describe('a fitting along a row', () => {
	it.each(all)('%s by %s is finite and never gains, wherever within its limits', (_key, method, entry) => {
		const parameters = fc.record(
			Object.fromEntries(
				entry.parameters.map((one) => [
					one.name,
					one.options ? fc.constantFrom(...one.options) : fc.double({ min: one.min, max: one.max, noNaN: true })
				])
			)
		);
		const reynolds = fc.double({ min: 2, max: 7, noNaN: true }).map((x) => 10 ** x);
		fc.assert(
			fc.property(parameters, reynolds, fc.constantFrom(...entry.shapes), (given, Re, shape) => {
				const C = value(entry, { ...given, method }, rowOf(shape, Re));
				expect(Number.isFinite(C)).toBe(true);
				expect(C).toBeGreaterThanOrEqual(0);
			}),
			{ numRuns: 60 }
		);
	});

	it.each(all.filter(([, , entry]) => entry.family === 'area-changes'))(
		'%s by %s loses nothing when the areas are equal',
		(_key, method, entry) => {
			for (const shape of entry.shapes)
				for (const pick of ['min', 'default', 'max'] as const) {
					const others = Object.fromEntries(
						entry.parameters.filter((one) => !one.options).map((one) => [one.name, one[pick]])
					);
					for (const leg of ['smaller', 'larger']) {
						const parameters = { ...others, leg, areaRatio: 1, method };
						expect(value(entry, parameters, rowOf(shape, 3e5))).toBeLessThan(1e-12);
					}
				}
		}
	);

	it.each(all.filter(([, , entry]) => entry.parameters.some(({ name }) => name === 'leg')))(
		'%s by %s loses the same pressure whichever leg the row is',
		(_key, method, entry) => {
			const row = rowOf(entry.shapes[0] ?? 'round', 3e5);
			for (const areaRatio of [0.1, 0.4, 0.9]) {
				const onSmaller = value(entry, { areaRatio, leg: 'smaller', method }, row);
				const onLarger = value(entry, { areaRatio, leg: 'larger', method }, row);
				expect(onLarger * areaRatio * areaRatio).toBeCloseTo(onSmaller, 12);
			}
		}
	);
});

/** The largest sudden step of f between a and b beyond 1 % and 0.001: intervals are halved until they are narrow. */
function largestJump(f: (x: number) => number, a: number, b: number, narrow: number, fa = f(a), fb = f(b)): number {
	const step = Math.abs(fb - fa);
	if (step <= 0.01 * Math.max(fa, fb) + 0.001) return 0;
	if (b - a < narrow) return step;
	const middle = (a + b) / 2;
	const fm = f(middle);
	return Math.max(largestJump(f, a, middle, narrow, fa, fm), largestJump(f, middle, b, narrow, fm, fb));
}

/** What the polynomial of contractions leaves at equal areas, at the 30° of the defaults; its docstring states it. */
const leftAtEqualAreas = ({ key }: CatalogueEntry, method: string): number =>
	/contraction$/.test(key) && key !== 'sudden-contraction' && !['rennels', 'smacna'].includes(method) ? 0.0025 : 0;

describe('the coefficient along a figure', () => {
	// At Re 2e6 the Reynolds factor of Idelchik is 1; below, it jumps with the radius as its source does.
	it.each(all.filter(([, , entry]) => entry.plot))('%s by %s has no jump', (_key, method, entry) => {
		for (const { name, options, min, max } of entry.parameters) {
			if (options || name === 'coefficient') continue;
			const row = rowOf(entry.shapes[0] ?? 'round', 2e6);
			const f = (x: number) => value(entry, { [name]: x, method }, row);
			for (let i = 0; i < 40; i += 1) {
				const [a, b] = [min + ((max - min) * i) / 40, min + ((max - min) * (i + 1)) / 40];
				const stated = name === 'areaRatio' && b === 1 ? leftAtEqualAreas(entry, method) : 0;
				expect(largestJump(f, a, b, (max - min) * 1e-10), `${name} from ${a} to ${b}`).toBeLessThanOrEqual(stated);
			}
		}
	});

	it('finds a jump where there is one', () => {
		expect(largestJump((x) => (x < 0.3 ? 1 : 1.2), 0, 1, 1e-10)).toBeCloseTo(0.2, 12);
	});

	it('of a contraction by Idelchik jumps at equal areas by no more than is stated, 0.022', () => {
		for (let d = 3; d <= 180; d += 3) expect(conicalContractionIdelchik(d, 1 - 1e-9)).toBeLessThan(0.022);
	});

	it('jumps at r/D 0.55 and 0.7 with the Reynolds factor of Idelchik, by no more than the entries state', () => {
		for (let x = 4; x <= 7; x += 0.01) {
			const at = (R: number) => bendReynoldsFactorIdelchik(R, 10 ** x);
			const low = at(0.55) / at(0.549_999);
			expect(low).toBeGreaterThanOrEqual(0.995);
			expect(low).toBeLessThan(1.42);
			const high = at(0.7) / at(0.699_999);
			expect(high).toBeGreaterThan(0.83);
			expect(high).toBeLessThan(1.09);
		}
	});
});

describe('a change of shape', () => {
	const row = rowOf('round', 3e5);
	const C = (kind: string, parameters: Parameters) => coefficientOf(kind, parameters, row).coefficient;

	it('is the cone of its areas and length, and the row after it unless it is said otherwise', () => {
		// Areas 1 and 4 over a length of 2 roots of the smaller: (2 - 1)/(2 sqrt(pi)) is the tangent of half the angle
		const angle = (2 * Math.atan(1 / (2 * Math.sqrt(Math.PI))) * 180) / Math.PI;
		const parameters = { areaRatio: 0.25, lengthRatio: 2 };
		for (const change of ['expansion', 'contraction'])
			for (const kind of ['rectangular-to-round', 'round-to-rectangular'])
				expect(C(`${kind}-${change}`, parameters)).toBeCloseTo(C(`gradual-${change}`, { areaRatio: 0.25, angle }), 10);
	});

	it('on one side alone is as the cone of twice its angle', () => {
		for (const change of ['expansion', 'contraction'])
			expect(C(`one-sided-${change}`, { angle: 10 })).toBe(C(`gradual-${change}`, { angle: 20 }));
	});
});

describe('what is put into an elbow', () => {
	const row = rowOf('rectangular', 3e5);
	const C = (kind: string, parameters: Parameters, context = row) =>
		coefficientOf(kind, parameters, context).coefficient;

	it('helps: turning vanes in a mitre, and each splitter vane more in a bend', () => {
		for (const vanes of ['50/38', '114/57', '114/83'])
			expect(C('rectangular-elbow-vaned', { vanes })).toBeLessThan(C('rectangular-elbow-mitred', {}) / 3);
		for (const radiusRatio of [0.55, 0.6, 0.65]) {
			const by = [1, 2, 3].map((vanes) => C('rectangular-elbow-splitter', { radiusRatio, vanes }));
			expect(by[1]).toBeLessThan(by[0] ?? 0);
			expect(by[2]).toBeLessThan(by[1] ?? 0);
			expect(by[0]).toBeLessThan(C('rectangular-elbow-smooth', { radiusRatio }));
		}
	});

	it('as splitter vanes loses less the rounder the passages, and within 1.8 times as much with as round ones', () => {
		for (const aspect of [0.25, 0.5, 1, 1.5, 2, 3, 4, 5, 6, 7, 8]) {
			for (const vanes of [1, 2, 3])
				for (let throat = 0.05; throat < (vanes === 1 ? 0.45 : vanes === 2 ? 0.2 : 0.1); throat += 0.01) {
					const at = (R: number) => splitterSmacna(vanes, splitterVanes(vanes, R, 1).curveRatio, aspect);
					expect(at(throat + 0.01), `${vanes} vanes, ${throat}, ${aspect}`).toBeLessThanOrEqual(at(throat));
				}
			for (const CR of [0.47, 0.5, 0.55])
				for (const vanes of [2, 3]) {
					const times = splitterSmacna(vanes, CR, aspect) / splitterSmacna(1, CR, aspect);
					expect(times, `${vanes} vanes, CR ${CR}, ${aspect}`).toBeGreaterThan(1 / 1.8);
					expect(times, `${vanes} vanes, CR ${CR}, ${aspect}`).toBeLessThan(1.8);
				}
		}
	});

	it('of double thickness loses less the faster the air, and more than of one sheet', () => {
		const at = (velocity: number, vanes: string) =>
			C('rectangular-elbow-vaned-double', { vanes }, { ...row, velocity });
		for (const vanes of ['50/38', '114/83'])
			for (const V of [5, 10, 15]) {
				expect(at(V + 4, vanes)).toBeLessThan(at(V, vanes));
				expect(at(20, vanes)).toBeGreaterThan(C('rectangular-elbow-vaned', { vanes }));
			}
	});

	it('hard bends of a flat oval lose more than easy ones with a small radius, and are those of the rectangle', () => {
		const oval = rowOf('oval', 3e5);
		const box = { ...oval, size: { shape: 'rectangular', width: 0.6, height: 0.3 } } as const;
		for (const kind of ['smooth', 'mitred']) {
			const of = (bend: string) => C(`oval-elbow-${kind}`, { bend }, oval);
			expect(of('hard')).toBeGreaterThan(of('easy'));
			const parameters: Parameters = kind === 'smooth' ? { radiusRatio: 1 } : {};
			expect(of('hard')).toBe(C(`rectangular-elbow-${kind}`, { ...parameters, plane: 'width' }, box));
			expect(of('easy')).toBe(C(`rectangular-elbow-${kind}`, { ...parameters, plane: 'height' }, box));
		}
	});

	it('twice makes an offset, and across takes the other side for the second', () => {
		const round = rowOf('round', 3e5);
		expect(C('offset-round', { angle: 30 }, round)).toBe(2 * C('round-elbow-smooth', { angle: 30 }, round));
		const one = (plane: string) => C('rectangular-elbow-mitred', { angle: 45, plane });
		expect(C('offset-mitred', { angle: 45, second: 'across' })).toBeCloseTo(one('width') + one('height'), 12);
		expect(coefficientOf('offset-round', { spacing: 10 }, round).rangeNote).toBeNull();
		expect(coefficientOf('offset-round', { second: 'across' }, round).rangeNote).toContain('more than the sum');
	});
});
