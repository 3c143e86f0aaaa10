import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import published from '../../../../fixtures/published/leakage.json';
import { describePublished, type PublishedFile } from '../../../../fixtures/published/published-checks';
import { OutOfRangeError } from '../errors';
import { coefficientOfClass, findLeakageClass, leakageClasses, leakageFlow, measuredClass, type LeakageClass } from '.';
import { leakageChecks } from '../published/leakage';

function classOf(key: string): LeakageClass {
	const found = findLeakageClass(key);
	if (found === null) throw new Error(`no class ${key}`);
	return found;
}

describePublished('leakage against published values', published as PublishedFile, leakageChecks);

describe('the classes of air tightness', () => {
	it('have keys of their own, and each is three times tighter than the one before', () => {
		expect(new Set(leakageClasses.map(({ key }) => key)).size).toBe(leakageClasses.length);
		const en = ['A', 'B', 'C', 'D'].map((key) => classOf(key).coefficient);
		for (const [i, coefficient] of en.entries()) if (i > 0) expect((en[i - 1] ?? 0) / coefficient).toBeCloseTo(3, 10);
	});

	it.each([
		['ATC5', 'A'],
		['ATC4', 'B'],
		['ATC3', 'C'],
		['ATC2', 'D']
	])('%s is class %s', (atc, en) => expect(classOf(atc).coefficient).toBe(classOf(en).coefficient));

	it('meet the inch-pound classes: A 19.2, B 6.4, C 2.13, D 0.71 and ATC 6 48 (reference F)', () => {
		const CL = (key: string) => classOf(key).coefficient / coefficientOfClass(1);
		expect(CL('A')).toBeCloseTo(19.2, 1);
		expect(CL('B')).toBeCloseTo(6.4, 1);
		expect(CL('C')).toBeCloseTo(2.13, 2);
		expect(CL('D')).toBeCloseTo(0.71, 2);
		expect(CL('ATC6')).toBeCloseTo(48, 1);
		// In litres: 0.001407
		expect(coefficientOfClass(1) * 1000).toBeCloseTo(0.001407, 6);
	});

	it('are plain data with a source', () => {
		expect(structuredClone(leakageClasses)).toEqual(leakageClasses);
		for (const { source } of leakageClasses) expect(source).toMatch(/^EN 1/);
		expect(findLeakageClass('E')).toBeNull();
		expect(findLeakageClass('constructor')).toBeNull();
	});
});

describe('leakage', () => {
	const positive = (max: number) => fc.double({ min: 0.001, max, noNaN: true });

	it('grows with the surface and with the pressure to 0.65, whichever side is higher', () => {
		fc.assert(
			fc.property(positive(1e4), positive(2_000), positive(60), (surface, pressure, CL) => {
				const flow = leakageFlow({ CL }, surface, pressure);
				expect(leakageFlow({ CL }, 2 * surface, pressure) / flow).toBeCloseTo(2, 12);
				expect(leakageFlow({ CL }, surface, 4 * pressure) / flow).toBeCloseTo(4 ** 0.65, 12);
				expect(leakageFlow({ CL }, surface, -pressure)).toBe(flow);
				expect(leakageFlow({ coefficient: coefficientOfClass(CL) }, surface, pressure)).toBe(flow);
			})
		);
	});

	it('is nothing without pressure or surface', () => {
		expect(leakageFlow(classOf('A'), 50, 0)).toBe(0);
		expect(leakageFlow(classOf('A'), 0, 500)).toBe(0);
	});

	it('gives back the class that made it', () => {
		expect(measuredClass(leakageFlow({ CL: 6 }, 120, 750), 120, 750)).toBeCloseTo(6, 12);
		expect(measuredClass(leakageFlow({ CL: 6 }, 120, 750), 120, -750)).toBeCloseTo(6, 12);
	});

	it('refuses what is no duct', () => {
		expect(() => leakageFlow(classOf('A'), -1, 500)).toThrow(OutOfRangeError);
		expect(() => leakageFlow(classOf('A'), 1, 10_001)).toThrow(OutOfRangeError);
		expect(() => leakageFlow({ CL: -1 }, 1, 500)).toThrow(OutOfRangeError);
		expect(() => leakageFlow({ CL: NaN }, 1, 500)).toThrow(OutOfRangeError);
		expect(() => measuredClass(1, 0, 500)).toThrow(OutOfRangeError);
		expect(() => measuredClass(1, 1, 0)).toThrow(OutOfRangeError);
	});
});
