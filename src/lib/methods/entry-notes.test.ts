import { describe, expect, it } from 'vitest';
import { catalogue, coefficientOf, junctionCoefficientOf, type CatalogueEntry } from '$lib/engine';
import { entryNote, familyNotes } from './entry-notes';
import { plottedParameter } from './fitting-plot';
import type { Plot } from './plot';
import { typicalRow } from './typical-row';

const entries = catalogue.map((entry) => ({ key: entry.key, entry }));
/** Numbers that a coefficient is computed from; where it is entered, from none. */
const numeric = ({ parameters }: CatalogueEntry) =>
	parameters.some(({ name }) => name === 'coefficient')
		? []
		: parameters.filter(({ options }) => options === undefined);

/** The value at a place of an axis, read from its marks as a reader would. */
function read(ticks: Plot['x']['ticks'], place: number): number {
	const marks = ticks.map(({ at, text }) => ({ at, value: Number(text.replace('−', '-')) }));
	const [a, b] = [marks[0], marks[marks.length - 1]];
	if (!a || !b) throw new Error('an axis without marks');
	return a.value + ((place - a.at) / (b.at - a.at)) * (b.value - a.value);
}

const isLinear = ({ y }: Plot) => {
	const values = y.ticks.map(({ text }) => Number(text.replace('−', '-')));
	return Math.abs((values[1] ?? 0) - (values[0] ?? 0) - ((values[2] ?? 0) - (values[1] ?? 0))) < 1e-9;
};

const placesOf = (path: string) =>
	[...path.matchAll(/[ML]([-\d.]+) ([-\d.]+)/g)].map(([, x, y]) => [Number(x), Number(y)] as const);

describe('the method notes', () => {
	it('have every entry of the catalogue once', () => {
		const keys = familyNotes().flatMap(({ notes }) => notes.map(({ entry }) => entry.key));
		expect([...keys].sort()).toEqual(catalogue.map(({ key }) => key).sort());
	});

	it.each(entries)('plot $key, or say why there is nothing to plot', ({ entry }) => {
		const { plots, notDrawn } = entryNote(entry);
		if (numeric(entry).length > 0 || entry.place === 'junction') expect(plots.length).toBeGreaterThan(0);
		else expect(notDrawn).toMatch(/nothing to plot/);
		for (const { curves, x, y } of plots) {
			expect(curves.length).toBeGreaterThan(0);
			expect(x.name.length * y.name.length).toBeGreaterThan(0);
			expect(x.ticks.length).toBeGreaterThan(1);
			expect(y.ticks.length).toBeGreaterThan(1);
		}
	});

	it.each(entries.filter(({ entry }) => (entry.rivals ?? []).length > 0))(
		'draw the standard method of $key and each rival that answers, by patterns of their own',
		({ entry }) => {
			const byMethod = entryNote(entry).plots.filter(({ curves }) =>
				curves.some(({ name }) => /^[A-Z]\w{2,}/.test(name))
			);
			const names = new Set(byMethod.flatMap(({ curves }) => curves.map(({ name }) => name)));
			expect(names.size).toBe(1 + (entry.rivals ?? []).length);
			for (const { curves } of byMethod) expect(new Set(curves.map(({ pattern }) => pattern)).size).toBe(curves.length);
		}
	);

	it.each(entries.filter(({ entry }) => entry.place !== 'junction' && plottedParameter(entry)))(
		'draw $key where the engine has it',
		({ entry }) => {
			const [plot] = entryNote(entry).plots;
			const along = plottedParameter(entry);
			if (!plot || !along || !isLinear(plot)) return;
			const parameters = {
				...(entry.reference === 'smaller leg' ? { leg: 'smaller' } : {}),
				...entry.plot?.at
			};
			const { context } = typicalRow(entry.shapes[0] ?? 'round');
			const places = placesOf(plot.curves[0]?.path ?? '');
			const span = read(plot.y.ticks, plot.frame.top) - read(plot.y.ticks, plot.frame.bottom);
			let compared = 0;
			for (const [px, py] of places) {
				const x = Math.min(along.max, Math.max(along.min, read(plot.x.ticks, px)));
				const slope = [x - 1e-3 * x, x + 1e-3 * x].map(
					(near) => coefficientOf(entry.key, { ...parameters, [along.name]: near }, context).coefficient
				);
				const steep = Math.abs((slope[1] ?? 0) - (slope[0] ?? 0)) > 0.02 * span;
				if (steep) continue;
				const { coefficient } = coefficientOf(entry.key, { ...parameters, [along.name]: x }, context);
				expect(Math.abs(read(plot.y.ticks, py) - coefficient), `at ${x}`).toBeLessThan(0.02 * span);
				compared += 1;
			}
			expect(compared).toBeGreaterThan(1);
		}
	);

	it('put the marks of printed figures on one of the curves', () => {
		const away = ([x, y]: readonly [number, number], path: string) => {
			const places = placesOf(path);
			const distances = places.slice(1).map(([x2, y2], i) => {
				const [x1, y1] = places[i] ?? [x2, y2];
				const length = (x2 - x1) ** 2 + (y2 - y1) ** 2;
				const share = Math.max(0, Math.min(1, ((x - x1) * (x2 - x1) + (y - y1) * (y2 - y1)) / length));
				return Math.hypot(x - x1 - share * (x2 - x1), y - y1 - share * (y2 - y1));
			});
			return Math.min(...distances);
		};
		let marks = 0;
		for (const { plots, entry } of catalogue.map(entryNote))
			for (const plot of plots)
				for (const mark of plot.marks) {
					const nearest = Math.min(...plot.curves.map(({ path }) => away(mark, path)));
					expect(nearest, `${entry.key} at ${read(plot.x.ticks, mark[0])}`).toBeLessThan(5);
					marks += 1;
				}
		expect(marks).toBeGreaterThan(40);
	});

	it('draw both legs of a tee where the engine has them', () => {
		const tee = catalogue.find(({ key }) => key === 'tee');
		if (!tee) throw new Error('no tee');
		const { plots } = entryNote(tee);
		for (const [title, direction, leg] of [
			['Branch, dividing', 'diverging', 'branch'],
			['Straight leg, uniting', 'converging', 'straight']
		] as const) {
			const plot = plots.find((one) => one.title === title);
			const curve = plot?.curves.find(({ name }) => name === 'A 1');
			if (!plot || !curve) throw new Error(`no ${title}`);
			const size = { shape: 'round', diameter: 0.5 } as const;
			for (const [px, py] of placesOf(curve.path)) {
				const q = read(plot.x.ticks, px);
				const { coefficient } = junctionCoefficientOf(
					'tee',
					{},
					{
						...{ direction, leg, flowRatio: leg === 'branch' ? q : 1 - q, branchFlowRatio: q, areaRatio: 1 },
						...{ branchAreaRatio: 1, straightAreaRatio: 1, branches: 1, commonSize: size, size }
					}
				);
				expect(Math.abs(read(plot.y.ticks, py) - coefficient), `${title} at ${q}`).toBeLessThan(0.02);
			}
		}
	});
});
