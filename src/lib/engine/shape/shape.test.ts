import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { describePublished } from '../../../../fixtures/published/published-checks';
import published from '../../../../fixtures/published/shape.json';
import { equivalentDiameter, laminarRectangle, sectionOf } from '.';
import { shapeChecks } from '../published/shape';

describePublished('shapes against published values', published, shapeChecks);

const side = fc.double({ min: 0.05, max: 3, noNaN: true });

describe('a section', () => {
	it('has the same figures with width and height exchanged', () => {
		fc.assert(
			fc.property(side, side, fc.constantFrom('rectangular', 'oval'), (a, b, shape) => {
				expect(sectionOf({ shape, width: a, height: b })).toEqual(sectionOf({ shape, width: b, height: a }));
				expect(equivalentDiameter({ shape, width: a, height: b })).toBe(
					equivalentDiameter({ shape, width: b, height: a })
				);
			})
		);
	});

	it('is a circle when the sides of an oval are equal', () => {
		fc.assert(
			fc.property(side, (D) => {
				const oval = sectionOf({ shape: 'oval', width: D, height: D });
				const round = sectionOf({ shape: 'round', diameter: D });
				expect(oval.area / round.area).toBeCloseTo(1, 14);
				expect(oval.hydraulicDiameter / D).toBeCloseTo(1, 14);
			})
		);
	});

	it('grows in proportion', () => {
		fc.assert(
			fc.property(side, side, fc.constantFrom('rectangular', 'oval'), (width, height, shape) => {
				const one = sectionOf({ shape, width, height });
				const two = sectionOf({ shape, width: 2 * width, height: 2 * height });
				expect(two.area / one.area).toBeCloseTo(4, 12);
				expect(two.hydraulicDiameter / one.hydraulicDiameter).toBeCloseTo(2, 12);
				const equivalent = equivalentDiameter({ shape, width: 2 * width, height: 2 * height });
				expect(equivalent / equivalentDiameter({ shape, width, height })).toBeCloseTo(2, 12);
			})
		);
	});

	it('has a hydraulic diameter between the lesser side and twice it', () => {
		fc.assert(
			fc.property(side, side, (width, height) => {
				const { hydraulicDiameter } = sectionOf({ shape: 'rectangular', width, height });
				const least = Math.min(width, height);
				expect(hydraulicDiameter).toBeGreaterThanOrEqual(least * (1 - 1e-12));
				expect(hydraulicDiameter).toBeLessThan(2 * least);
			})
		);
	});
});

describe('laminar friction of a rectangle', () => {
	// Shah & London (1978), exact series; f Re of Darcy, from memory
	it.each([
		[1, 56.91],
		[2, 62.19],
		[4, 72.93],
		[10, 84.68]
	])('agrees with the exact series at %d to 1 (Shah & London 1978)', (aspect, exact) => {
		expect(Math.abs(laminarRectangle(aspect, 1) / exact - 1)).toBeLessThan(0.001);
	});
});

describe('the equivalent diameter', () => {
	// Friction goes by the hydraulic diameter and the true velocity; the equivalent one is for changing a shape.
	it('is named in no file that works out friction', () => {
		const root = join(import.meta.dirname, '..');
		const texts = readdirSync(root, { recursive: true, encoding: 'utf8' })
			.filter((name) => name.endsWith('.ts') && !name.endsWith('.test.ts') && !name.endsWith('index.ts'))
			.map((name) => ({ name, text: readFileSync(join(root, name), 'utf8') }))
			.filter(({ text }) => /\b(darcyWeisbach|frictionFactor|reynoldsNumber)\(/.test(text));
		expect(texts.map(({ name }) => name)).toContain(join('network', 'hydraulics.ts'));
		for (const { name, text } of texts) expect(text, name).not.toMatch(/\bequivalent(Diameter|Rectangle|Oval)/);
	});
});
