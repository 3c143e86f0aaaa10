import { describe, expect, it } from 'vitest';
import { validateDocument } from '../document';
import type { Size } from '../shape';
import { catalogue, fittingEntry, junctionCoefficientOf, type JunctionContext } from '.';
import { branchConvergingCrane2009, straightConvergingCrane2009 } from './junction-crane';
import {
	branchConvergingIdelchik,
	branchDivergingIdelchik,
	straightConvergingGeneralIdelchik,
	straightConvergingIdelchik
} from './junction-idelchik';
import { branchDivergingAddingIdelchik } from './junction-idelchik-adding';
import { branchDivergingBassett2001, branchDivergingGardel1957 } from './junction-rivals';

const entries = catalogue.filter((entry) => entry.place === 'junction');
const round = (area: number): Size => ({ shape: 'round', diameter: Math.sqrt(area) });

/** A round junction with a common leg of 1 m diameter. */
function viewOf(
	direction: JunctionContext['direction'],
	leg: JunctionContext['leg'],
	{ q, a, s = 1, branches = 1 }: { q: number; a: number; s?: number; branches?: number }
): JunctionContext {
	const isBranch = leg === 'branch';
	return {
		direction,
		leg,
		flowRatio: isBranch ? q : 1 - q,
		branchFlowRatio: q,
		areaRatio: isBranch ? a : s,
		branchAreaRatio: a,
		straightAreaRatio: s,
		branches,
		commonSize: round(1),
		size: round(isBranch ? a : s)
	};
}

const value = (kind: string, parameters: Record<string, unknown>, context: JunctionContext) =>
	junctionCoefficientOf(kind, parameters, context).coefficient;
const noteOf = (kind: string, parameters: Record<string, unknown>, context: JunctionContext) =>
	junctionCoefficientOf(kind, parameters, context).rangeNote ?? '';

describe('the junctions of the catalogue', () => {
	it('are seven, by their trade words', () => {
		expect(entries.map((entry) => entry.key)).toEqual([
			'tee',
			'wye',
			'shoe-take-off',
			'conical-take-off',
			'bullhead-tee',
			'cross',
			'plenum'
		]);
	});

	it.each(entries.map((entry) => [entry.key, entry] as const))(
		'%s is on the common leg, with its rivals whole',
		(_key, entry) => {
			expect(entry.reference).toBe('common leg');
			expect(entry.plot?.along ?? 'none').toSatisfy(
				(name: string) => name === 'none' || entry.parameters.some((one) => one.name === name && !one.options)
			);
			for (const rival of entry.rivals ?? []) {
				expect(entry.standardMethod).toBe('idelchik');
				expect(rival.key).not.toBe('idelchik');
				expect(rival.known === 'from memory').toBe(/from memory/.test(`${rival.source} ${rival.method}`));
				const named = junctionCoefficientOf(
					entry.key,
					{ method: rival.key },
					viewOf('diverging', 'branch', { q: 0.3, a: 1 })
				);
				expect(named).toMatchObject({ methodKey: rival.key, source: rival.source });
			}
		}
	);

	it.each(entries.map((entry) => [entry.key, entry] as const))(
		'%s is finite for every leg, method and flow',
		(key, entry) => {
			for (const method of ['idelchik', ...(entry.rivals ?? []).map((one) => one.key)])
				for (const direction of ['diverging', 'converging'] as const)
					for (const leg of ['branch', 'straight'] as const)
						for (const q of [-0.2, 0, 0.3, 0.7, 1, 1.3])
							for (const a of [0.05, 0.35, 0.42, 1, 1.5])
								for (const s of [0.2, 0.6, 1, 1.4]) {
									const result = junctionCoefficientOf(key, { method }, viewOf(direction, leg, { q, a, s }));
									expect(result.coefficient).toSatisfy(Number.isFinite);
									expect(Object.is(result.coefficient, -0)).toBe(false);
									expect(JSON.parse(JSON.stringify(result))).toEqual(result);
								}
		}
	);

	it.each(['tee', 'wye', 'shoe-take-off'])('%s stands by its defaults, within its range', (key) => {
		const defaults = Object.fromEntries((fittingEntry(key)?.parameters ?? []).map((one) => [one.name, one.default]));
		const context = viewOf('diverging', 'branch', { q: 0.3, a: 0.3 });
		const result = junctionCoefficientOf(key, {}, context);
		expect(result).toEqual(junctionCoefficientOf(key, defaults, context));
		expect(result).toMatchObject({ inRange: true, rangeNote: null, methodKey: 'idelchik' });
	});

	it.each(['conical-take-off', 'bullhead-tee', 'cross', 'plenum'])(
		'%s stands by its defaults, within its range',
		(key) => {
			const branches = key === 'conical-take-off' ? 1 : 2;
			expect(junctionCoefficientOf(key, {}, viewOf('diverging', 'branch', { q: 0.3, a: 0.3, branches }))).toMatchObject(
				{
					inRange: true,
					rangeNote: null
				}
			);
		}
	);
});

describe('a tee or wye of the sheet', () => {
	// Idelchik, section 7, as checked against published values
	it('is Idelchik for either leg and direction', () => {
		expect(value('tee', {}, viewOf('diverging', 'branch', { q: 0.5, a: 1 }))).toBeCloseTo(1.075, 12);
		expect(value('tee', {}, viewOf('converging', 'branch', { q: 0.1, a: 1 }))).toBeCloseTo(-0.4941, 4);
		expect(value('tee', {}, viewOf('converging', 'straight', { q: 0.25, a: 1 }))).toBeCloseTo(0.325, 12);
		expect(value('wye', { angle: 45 }, viewOf('diverging', 'straight', { q: 0.385, a: 1 }))).toBeCloseTo(-0.06818, 4);
		expect(value('shoe-take-off', { angle: 60 }, viewOf('diverging', 'branch', { q: 0.4, a: 0.5 }))).toBe(
			value('wye', { angle: 60 }, viewOf('diverging', 'branch', { q: 0.4, a: 0.5 }))
		);
	});

	it('keeps a negative coefficient', () => {
		const result = junctionCoefficientOf('tee', {}, viewOf('converging', 'branch', { q: 0.1, a: 1 }));
		expect(result.coefficient).toBeLessThan(-0.4);
		expect(result.inRange).toBe(true);
	});

	it('takes the form for areas that add up where they do, and says so between', () => {
		const adding = viewOf('diverging', 'branch', { q: 0.4, a: 0.4, s: 0.6 });
		expect(value('wye', { angle: 30 }, adding)).toBeCloseTo(branchDivergingAddingIdelchik(0.4, 0.4, 30), 9);
		expect(noteOf('wye', { angle: 30 }, adding)).toBe('');
		const between = viewOf('diverging', 'branch', { q: 0.4, a: 0.4, s: 0.8 });
		const middle = (branchDivergingAddingIdelchik(0.4, 0.4, 30) + branchDivergingIdelchik(0.4, 0.4, 30, 1)) / 2;
		expect(value('wye', { angle: 30 }, between)).toBeCloseTo(middle, 12);
		expect(noteOf('wye', { angle: 30 }, between)).toContain('lie between');
	});

	it('takes a straight leg that is nearly as wide as the common one without a word', () => {
		for (const direction of ['diverging', 'converging'] as const)
			for (const leg of ['branch', 'straight'] as const)
				expect(noteOf('tee', {}, viewOf(direction, leg, { q: 0.3, a: 0.8, s: 0.95 }))).toBe('');
	});

	it('sees the height of a rectangular branch: free up to two thirds, then less and less', () => {
		const rectangle = (width: number, height: number): Size => ({ shape: 'rectangular', width, height });
		const view = { ...viewOf('diverging', 'branch', { q: 0.4, a: 0.5 }), commonSize: rectangle(0.6, 0.6) };
		expect(value('tee', {}, { ...view, size: rectangle(0.45, 0.4) })).toBeCloseTo(1 + 0.64, 9);
		expect(value('tee', {}, { ...view, size: rectangle(0.36, 0.5) })).toBeCloseTo(1 + 0.65 * 0.64, 9);
		expect(value('tee', {}, { ...view, size: rectangle(0.3, 0.6) })).toBeCloseTo(1 + 0.3 * 0.64, 9);
	});

	it.each([
		['tee', {}, viewOf('diverging', 'branch', { q: 1.2, a: 0.5 }), 'flow ratio of the branch 1.2 is outside 0 to 1'],
		[
			'tee',
			{},
			viewOf('diverging', 'branch', { q: 0.2, a: 0.05 }),
			'area ratio of the branch 0.05 is outside 0.1 to 1'
		],
		['tee', {}, viewOf('diverging', 'branch', { q: 0.2, a: 0.5, branches: 3 }), 'one branch; here there are 3'],
		['tee', {}, viewOf('diverging', 'branch', { q: 0.2, a: 0.5, s: 1.2 }), 'wider than the common one'],
		['tee', {}, viewOf('diverging', 'branch', { q: 0.2, a: 0.5, s: 0.3 }), 'narrower than the common one'],
		[
			'tee',
			{},
			{ ...viewOf('diverging', 'branch', { q: 1, a: 1 }), straightAreaRatio: null },
			'nothing goes straight on'
		],
		['wye', {}, viewOf('diverging', 'straight', { q: 0.1, a: 0.5, s: 0.5 }), 'from memory'],
		['wye', { angle: 15 }, viewOf('diverging', 'branch', { q: 0.36, a: 0.44 }), 'together gain 0.021'],
		[
			'wye',
			{ angle: 80 },
			viewOf('diverging', 'branch', { q: 0.36, a: 0.3 }),
			'angle of the branch 80 is outside 15 to 75'
		]
	] as const)('%s %j says what is outside', (kind, parameters, context, text) => {
		const { inRange, rangeNote } = junctionCoefficientOf(kind, parameters, context);
		expect(inRange).toBe(false);
		expect(rangeNote).toContain(text);
	});
});

describe('a rival method that a design names', () => {
	const tee = viewOf('diverging', 'branch', { q: 0.4, a: 1 });

	it('is used', () => {
		expect(value('tee', { method: 'gardel' }, tee)).toBe(branchDivergingGardel1957(0.4));
		expect(value('tee', { method: 'bassett' }, tee)).toBe(branchDivergingBassett2001(0.4, 1, 90));
		const uniting = { q: 0.3, a: 0.5 };
		expect(value('wye', { method: 'crane' }, viewOf('converging', 'branch', uniting))).toBe(
			branchConvergingCrane2009(0.3, 0.5, 45)
		);
		expect(value('wye', { method: 'crane' }, viewOf('converging', 'straight', uniting))).toBe(
			straightConvergingCrane2009(0.3, 0.5, 45)
		);
		expect(value('wye', { method: 'idelchik-equation' }, viewOf('converging', 'straight', uniting))).toBe(
			straightConvergingGeneralIdelchik(0.3, 0.5, 45)
		);
	});

	it('gives way to Idelchik where it is silent or in doubt, and says so', () => {
		const uniting = viewOf('converging', 'branch', { q: 0.4, a: 1 });
		expect(value('tee', { method: 'bassett' }, uniting)).toBe(branchConvergingIdelchik(0.4, 1, 90));
		expect(noteOf('tee', { method: 'bassett' }, uniting)).toContain('Idelchik is used');
		expect(value('tee', { method: 'crane' }, tee)).toBe(value('tee', {}, tee));
		expect(noteOf('tee', { method: 'crane' }, tee)).toContain('in doubt');
	});

	it('says where it does not hold', () => {
		const view = viewOf('diverging', 'branch', { q: 0.4, a: 0.3, s: 0.8 });
		expect(noteOf('tee', { method: 'gardel' }, view)).toContain('three legs of one size');
		expect(noteOf('tee', { method: 'bassett' }, view)).toContain('as wide as the common one');
		const square: Size = { shape: 'rectangular', width: 0.3, height: 0.3 };
		expect(noteOf('tee', { method: 'crane' }, { ...view, size: square })).toContain('round pipes');
	});
});

describe('the other junctions', () => {
	// Idelchik, diagram 7-29: 1 + 1.5 (0.5/0.5)^2, 1 + 0.3, and 3.778 where streams unite at a = 0.3
	it('a bullhead tee is that of the diagram, by its edges where it divides', () => {
		const legs = { q: 0.5, a: 0.5, branches: 2 };
		expect(value('bullhead-tee', {}, viewOf('diverging', 'branch', legs))).toBe(2.5);
		expect(value('bullhead-tee', { edges: 'rounded' }, viewOf('diverging', 'branch', legs))).toBe(1.3);
		expect(value('bullhead-tee', {}, viewOf('converging', 'branch', { ...legs, a: 0.3 }))).toBeCloseTo(3.7778, 4);
		expect(noteOf('bullhead-tee', {}, viewOf('diverging', 'branch', { ...legs, branches: 3 }))).toContain('two legs');
	});

	it('a conical take-off follows the velocity ratio, and is a sharp junction where streams unite', () => {
		expect(value('conical-take-off', {}, viewOf('diverging', 'branch', { q: 0.3, a: 0.3 }))).toBeCloseTo(0.42, 12);
		expect(value('conical-take-off', { angle: 45 }, viewOf('diverging', 'branch', { q: 0.24, a: 0.3 }))).toBeCloseTo(
			0.27,
			12
		);
		expect(value('conical-take-off', {}, viewOf('diverging', 'straight', { q: 0.2, a: 0.3 }))).toBeCloseTo(0.02, 12);
		expect(noteOf('conical-take-off', {}, viewOf('diverging', 'branch', { q: 0.6, a: 0.3 }))).toContain(
			'Vb/Vc 2 is outside'
		);
		const uniting = viewOf('converging', 'straight', { q: 0.3, a: 0.3 });
		expect(value('conical-take-off', { angle: 45 }, uniting)).toBe(straightConvergingIdelchik(0.3, 0.3, 45));
		expect(noteOf('conical-take-off', {}, uniting)).toContain('stands in');
		const square: Size = { shape: 'rectangular', width: 0.3, height: 0.3 };
		expect(noteOf('conical-take-off', {}, { ...uniting, size: square })).toContain('not for rectangular ducts');
	});

	it('a cross is two tees in series', () => {
		const view = viewOf('converging', 'straight', { q: 0.4, a: 0.3, branches: 2 });
		expect(value('cross', {}, view)).toBeCloseTo(2 * (1.55 * 0.2 - 0.04), 12);
		expect(value('cross', {}, viewOf('converging', 'branch', { q: 0.2, a: 0.3, branches: 2 }))).toBe(
			branchConvergingIdelchik(0.2, 0.3, 90)
		);
		expect(noteOf('cross', {}, viewOf('converging', 'branch', { q: 0.2, a: 0.3 }))).toContain('two branches');
	});

	// Borda and Carnot into a large chamber lose the whole velocity pressure, a sharp entry half of the leg's
	it('a plenum loses the jet into it and the entry out of it', () => {
		const legs = { q: 0.3, a: 0.3 };
		expect(value('plenum', { areaRatio: 0.001 }, viewOf('diverging', 'branch', legs))).toBeCloseTo(1.5, 2);
		expect(value('plenum', { areaRatio: 0.001 }, viewOf('converging', 'branch', legs))).toBeCloseTo(1.5, 2);
		expect(value('plenum', { areaRatio: 0.001 }, viewOf('converging', 'branch', { q: 0.6, a: 0.3 }))).toBeCloseTo(
			4.5,
			2
		);
		expect(value('plenum', { areaRatio: 0.001 }, viewOf('diverging', 'branch', { q: 0.6, a: 0.3 }))).toBeCloseTo(3, 2);
		expect(value('plenum', { areaRatio: 1 }, viewOf('diverging', 'straight', { q: 0, a: 0.5 }))).toBe(0);
	});
});

describe('a junction among the fittings along a row', () => {
	it.each(entries.map((entry) => entry.key))('is refused: %s', (kind) => {
		const size = { shape: 'round', diameter: 0.3 };
		const row = { tag: 'S1', joins: null, side: 'supply', size, length: 4, outlet: { flow: 0.3, loss: 25 } };
		const document = {
			format: 'evendraft/design@1',
			air: { temperature: 20 },
			rows: [{ ...row, fittings: [{ kind }] }]
		};
		expect(validateDocument(document)).toMatchObject({ ok: false, problems: [{ code: 'unknown-fitting' }] });
	});
});
