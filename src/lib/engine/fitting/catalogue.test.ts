import { describe, expect, it } from 'vitest';
import { frictionFactor } from '../friction';
import type { Size } from '../shape';
import { catalogue, coefficientOf, fittingEntry, type CatalogueEntry, type FittingContext } from '.';
import { conicalExpansionIdelchik } from './area-change-idelchik';
import { roundElbowSmacna } from './elbow-tables';

const SIZES: Readonly<Record<Size['shape'], Size>> = {
	round: { shape: 'round', diameter: 0.4 },
	rectangular: { shape: 'rectangular', width: 0.4, height: 0.4 },
	oval: { shape: 'oval', width: 0.6, height: 0.3 }
};

function rowOf(size: Size, reynolds = 300_000): FittingContext {
	const relativeRoughness = 0.000225;
	const friction = frictionFactor({ reynolds, relativeRoughness });
	return { size, reynolds, velocity: 8, relativeRoughness, frictionFactor: friction };
}

const round = rowOf(SIZES.round);
const square = rowOf(SIZES.rectangular);

/** Those along a row; a junction sees other legs and has tests of its own. */
const inRows = catalogue.filter((entry) => entry.place !== 'junction');

/** Each rival method of an entry, but none where there is only one. */
const rivalled = inRows.flatMap((entry) => (entry.rivals ?? []).map((rival) => [entry.key, rival.key, entry] as const));

const PICKS = ['default', 'min', 'max'] as const;
/** All parameters at one end, a choice at its first or last. */
const at = (entry: CatalogueEntry, pick: (typeof PICKS)[number]) =>
	Object.fromEntries(
		entry.parameters.map((one) => [one.name, one.options ? one.options.at(pick === 'max' ? -1 : 0) : one[pick]])
	);

describe('the catalogue', () => {
	it('has keys of their own, which find their entry', () => {
		expect(new Set(catalogue.map((one) => one.key)).size).toBe(catalogue.length);
		for (const entry of catalogue) {
			expect(fittingEntry(entry.key)).toBe(entry);
			expect(entry.key).toMatch(/^[a-z]+(-[a-z]+)*$/);
		}
		expect(fittingEntry('constructor')).toBeNull();
		expect(fittingEntry('fixed')).toBeNull();
	});

	it('is plain data', () => {
		expect(JSON.parse(JSON.stringify(catalogue))).toEqual(structuredClone(catalogue));
		expect(structuredClone(catalogue)).toEqual(catalogue);
	});

	it.each(catalogue.map((entry) => [entry.key, entry] as const))('%s is whole', (_key, entry) => {
		for (const text of [entry.name, entry.range, entry.method, entry.source]) expect(text.length).toBeGreaterThan(4);
		expect(entry.uncertainty).toBeGreaterThan(0);
		expect(entry.uncertainty).toBeLessThan(1);
		for (const parameter of entry.parameters) {
			if (parameter.options) expect(parameter.options).toContain(parameter.default);
			else {
				expect(Number(parameter.default)).toBeGreaterThanOrEqual(parameter.min);
				expect(Number(parameter.default)).toBeLessThanOrEqual(parameter.max);
			}
		}
		for (const one of [entry, ...(entry.rivals ?? [])])
			expect(one.known === 'from memory', one.method).toBe(/from memory/.test(`${one.source} ${one.method}`));
	});

	it.each(inRows.map((entry) => [entry.key, entry] as const))(
		'%s is drawn, and plotted along a figure',
		(_key, entry) => {
			expect(entry.drawing).toBeTruthy();
			const figures = entry.parameters
				.filter((one) => !one.options && one.name !== 'coefficient')
				.map((one) => one.name);
			// What is entered by hand is its own plot.
			if (figures.length > 0 && entry.known !== 'entered by hand') expect(figures).toContain(entry.plot?.along);
			else expect(entry.plot).toBeUndefined();
		}
	);

	it.each(rivalled)('%s by %s is whole, and has a loss at every limit', (key, method, entry) => {
		expect(entry.standardMethod).not.toBe(method);
		for (const shape of entry.shapes)
			for (const reynolds of [1e-3, 3_000, 1e5, 1e7])
				for (const pick of PICKS) {
					const result = coefficientOf(key, { ...at(entry, pick), method }, rowOf(SIZES[shape], reynolds));
					expect(result.methodKey).toBe(method);
					expect(Number.isFinite(result.coefficient)).toBe(true);
					expect(result.coefficient).toBeGreaterThanOrEqual(0);
				}
		const standard = coefficientOf(key, {}, rowOf(SIZES[entry.shapes[0] ?? 'round']));
		expect(standard.methodKey).toBe(entry.standardMethod);
	});

	it.each(inRows.map((entry) => [entry.key, entry] as const))('%s has a loss at every limit', (key, entry) => {
		for (const shape of entry.shapes)
			for (const reynolds of [1e-3, 3_000, 1e5, 1e7])
				for (const pick of PICKS) {
					const { coefficient } = coefficientOf(key, at(entry, pick), rowOf(SIZES[shape], reynolds));
					expect(Number.isFinite(coefficient)).toBe(true);
					expect(coefficient).toBeGreaterThanOrEqual(0);
					expect(Object.is(coefficient, -0)).toBe(false);
				}
	});

	it.each(inRows.map((entry) => [entry.key, entry] as const))('%s stands by its defaults', (key, entry) => {
		const shape = entry.shapes[0] ?? 'round';
		const defaults = Object.fromEntries(entry.parameters.map((one) => [one.name, one.default]));
		const result = coefficientOf(key, {}, rowOf(SIZES[shape]));
		expect(result).toEqual(coefficientOf(key, defaults, rowOf(SIZES[shape])));
		expect(result).toMatchObject({ source: entry.source, method: entry.method });
		// Two elbows always act on one another, and what nobody has entered cannot stand for itself.
		if (entry.family === 'offsets') expect(result.rangeNote).toContain('interaction of the two elbows is taken as 1');
		else if (entry.known === "maker's data" || entry.known === 'entered by hand')
			expect(result).toMatchObject({ coefficient: 0, rangeNote: expect.stringContaining('is entered, so that no') });
		else expect(result).toMatchObject({ inRange: true, rangeNote: null });
	});
});

describe('the coefficient of a fitting', () => {
	const value = (kind: string, parameters: Record<string, unknown>, row = round) =>
		coefficientOf(kind, parameters, row).coefficient;

	// Borda and Carnot: (1 - 0.5)^2 = 0.25 on the smaller leg, four times that on the larger
	it('is on the velocity pressure of the row, whichever leg it is (Borda and Carnot)', () => {
		expect(value('sudden-expansion', { areaRatio: 0.5, leg: 'smaller' })).toBeCloseTo(0.25, 12);
		expect(value('sudden-expansion', { areaRatio: 0.5, leg: 'larger' })).toBeCloseTo(1, 12);
	});

	it('is that of the sources: Idelchik diagrams 6-1, 6-7, 3-1, 3-4', () => {
		expect(value('round-elbow-smooth', { radiusRatio: 1, angle: 90 })).toBeCloseTo(0.21 * (11.5 / 300_000 ** 0.19), 3);
		expect(value('round-elbow-smooth', { radiusRatio: 1 }, rowOf(SIZES.round, 1e6))).toBeCloseTo(0.21, 10);
		expect(value('round-elbow-mitred', { angle: 60 })).toBeCloseTo(0.5484, 3);
		expect(value('rectangular-elbow-mitred', { angle: 90 }, square)).toBeCloseTo(1.185, 3);
		expect(value('entry-flush', {})).toBe(0.5);
		expect(value('entry-plain-end', {})).toBe(1);
		expect(value('entry-projecting', { thicknessRatio: 0.02, lengthRatio: 0.5 })).toBeCloseTo(0.72, 12);
		expect(value('entry-bellmouth', { radiusRatio: 0.05 })).toBeCloseTo(0.4, 12);
		expect(value('exit-plain', {})).toBe(1);
	});

	it('is that of SMACNA table A-7 for segmented elbows', () => {
		expect(value('round-elbow-segmented', { pieces: 3, radiusRatio: 1.5 })).toBeCloseTo(0.34, 12);
		expect(value('round-elbow-segmented', { pieces: 5, radiusRatio: 1, angle: 45 })).toBeCloseTo(0.33 * 0.6, 12);
	});

	// SMACNA, HVAC Systems Duct Design, single-thickness vanes: 0.12, 0.15, 0.18 by radius and spacing (from memory)
	it('of turning vanes lies within the printed ones (SMACNA)', () => {
		expect(value('rectangular-elbow-vaned', {}, square)).toBeGreaterThanOrEqual(0.12);
		expect(value('rectangular-elbow-vaned', {}, square)).toBeLessThanOrEqual(0.18);
	});

	it('of an exit diffuser is that of the cone and of the velocity left', () => {
		const { frictionFactor: f } = round;
		const friction = (f * (1 - 0.25)) / (8 * Math.sin((5 * Math.PI) / 180));
		const cone = conicalExpansionIdelchik(10, 0.5) + friction;
		expect(value('exit-diffuser', { areaRatio: 0.5, angle: 10 })).toBeCloseTo(cone + 0.25, 12);
		expect(value('gradual-expansion', { areaRatio: 0.5, angle: 10, leg: 'smaller' })).toBeCloseTo(cone, 12);
	});

	it('turns the aspect of a rectangle with the plane of the bend', () => {
		const wide = rowOf({ shape: 'rectangular', width: 0.8, height: 0.2 });
		const tall = rowOf({ shape: 'rectangular', width: 0.2, height: 0.8 });
		for (const kind of ['rectangular-elbow-smooth', 'rectangular-elbow-mitred', 'rectangular-elbow-splitter']) {
			expect(value(kind, { plane: 'height' }, wide)).toBe(value(kind, { plane: 'width' }, tall));
			expect(value(kind, { plane: 'width' }, wide)).not.toBe(value(kind, { plane: 'height' }, wide));
		}
	});

	it('is of the order of the rival table for a long-radius elbow', () => {
		expect(value('round-elbow-smooth', {}) / roundElbowSmacna(1.5, 90)).toBeGreaterThan(0.8);
		expect(value('round-elbow-smooth', {}) / roundElbowSmacna(1.5, 90)).toBeLessThan(1.5);
	});
});

describe('a fitting outside its source', () => {
	it('says what is outside and where it was taken', () => {
		const low = coefficientOf('round-elbow-smooth', { radiusRatio: 1.5 }, rowOf(SIZES.round, 5_000));
		expect(low.inRange).toBe(false);
		expect(low.rangeNote).toContain('Reynolds number 5000');
		const short = coefficientOf('round-elbow-segmented', { pieces: 5, radiusRatio: 0.5 }, round);
		expect(short.rangeNote).toContain('r/D 0.5 is outside 0.75 to 2');
		expect(short.coefficient).toBeCloseTo(0.46, 12);
	});

	it('says that a rectangular method stands in for a flat oval', () => {
		const { inRange, rangeNote } = coefficientOf('rectangular-elbow-smooth', {}, rowOf(SIZES.oval));
		expect(inRange).toBe(false);
		expect(rangeNote).toContain('flat oval');
	});

	it('says that the shape is another', () => {
		expect(coefficientOf('damper-parallel-blades', {}, round).rangeNote).toContain('round ducts');
	});

	it('takes a parameter beyond its limits at the limit, and a broken one at its default', () => {
		const held = coefficientOf('sudden-expansion', { areaRatio: 2 }, round);
		expect(held).toMatchObject({ coefficient: 0, inRange: false });
		for (const broken of [NaN, Infinity, '1', null, {}])
			expect(coefficientOf('sudden-expansion', { areaRatio: broken, leg: broken }, round)).toEqual(
				coefficientOf('sudden-expansion', {}, round)
			);
	});

	it('refuses a key that the catalogue does not have', () => {
		expect(() => coefficientOf('no-such-fitting', {}, round)).toThrow('no-such-fitting');
	});
});
