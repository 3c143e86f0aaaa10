import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fittingEntry } from '../fitting';
import { validateDocument } from './validate';
import type { Problem } from './types';

type Json = Record<string, unknown>;

const round = { shape: 'round', diameter: 0.3 };
const first: Json = { id: 'r-1', tag: 'S1', joins: null, side: 'supply', size: round, length: 12 };
const last: Json = { tag: 'S2', joins: 'S1', side: 'supply', size: round, length: 4, outlet: { flow: 0.3, loss: 25 } };
const sound: Json = { format: 'evendraft/design@1', air: { temperature: 20 }, rows: [first, last] };

/** Another author's method than that which stands. */
const rivalOf = (key: string): string => fittingEntry(key)?.rivals?.[0]?.key ?? 'none';
const [RIVAL, TEE_RIVAL] = [rivalOf('round-elbow-smooth'), rivalOf('tee')];

const withRows = (...rows: unknown[]): Json => ({ ...sound, rows });
const withFirst = (keys: Json): Json => withRows({ ...first, ...keys }, last);
const withLast = (keys: Json): Json => withRows(first, { ...last, ...keys });
const withFitting = (fitting: unknown): Json => withFirst({ fittings: [fitting] });

function problemsOf(input: unknown): readonly Problem[] {
	const result = validateDocument(input);
	return result.ok ? [] : result.problems;
}

describe('a sound document', () => {
	it('is accepted, and handed back as a copy', () => {
		const result = validateDocument(sound);
		expect(result).toEqual({ ok: true, document: sound });
		if (result.ok) expect(result.document).not.toBe(sound);
	});

	it('may have keys of other versions', () => expect(problemsOf(withFirst({ colour: 'red' }))).toEqual([]));

	it.each<[string, Json]>([
		['a leakage class', { leakage: { class: 'B' } }],
		['a leakage class by its printed name', { leakage: { class: 'ATC 6' } }],
		['an inch-pound leakage class', { leakage: { cl: 0 } }],
		['a lining', { lining: { thickness: 0.025, sizeIs: 'metal' } }],
		['compressed flexible duct', { flexible: { length: 2, compression: 0.3 } }],
		["a maker's points", { equipment: [{ name: 'Coil', points: [[0.2, 12], [0.4, 41]] }] }], // prettier-ignore
		['a filter', { equipment: [{ name: 'Filter', filter: { clean: 60, final: 200, state: 'mean' } }] }],
		['a temperature', { temperature: 14 }],
		['a rival method', { fittings: [{ kind: 'round-elbow-smooth', method: RIVAL }] }]
	])('may have %s', (_what, keys) => expect(problemsOf(withFirst(keys))).toEqual([]));

	it('may have a junction of the catalogue, its method chosen for all or for one', () => {
		const tee = { kind: 'tee', leg: 'branch' };
		expect(
			problemsOf({ ...withLast({ junction: { ...tee, method: TEE_RIVAL } }), methods: { tee: TEE_RIVAL } })
		).toEqual([]);
		expect(problemsOf(withLast({ junction: { kind: 'fixed', coefficient: -0.1 } }))).toEqual([]);
	});

	it('may have a curve of the fan, given air and any side', () => {
		const other = { ...last, tag: 'R1', joins: null, side: 'return' };
		const exhaust = { ...last, tag: 'E1', joins: 'R1', side: 'exhaust' };
		const { outlet: _outlet, ...middle }: Json = other;
		const fan = {
			curve: [
				[0, 500],
				[1, 300]
			]
		};
		expect(problemsOf({ ...sound, air: { density: 1.2 }, fan, rows: [first, last, middle, exhaust] })).toEqual([]);
	});
});

const bad: readonly (readonly [string, unknown, string, string])[] = [
	['no object', null, 'type', '$'],
	['a list', [], 'type', '$'],
	['a text', 'rows', 'type', '$'],
	['a function', () => 1, 'type', '$'],
	['no format', { ...sound, format: undefined }, 'format', 'format'],
	['another format', { ...sound, format: 'evendraft/design@2' }, 'format', 'format'],
	['no air', { ...sound, air: undefined }, 'missing', 'air'],
	['air of nothing', { ...sound, air: {} }, 'missing', 'air'],
	['air as a number', { ...sound, air: 20 }, 'type', 'air'],
	['hot text', { ...sound, air: { temperature: 'hot' } }, 'type', 'air.temperature'],
	[
		'more than moist',
		{ ...sound, air: { temperature: 20, relativeHumidity: 50 } },
		'out-of-range',
		'air.relativeHumidity'
	],
	['no density', { ...sound, air: { density: 0 } }, 'out-of-range', 'air.density'],
	['no rows', withRows(), 'no-rows', 'rows'],
	['rows as an object', { ...sound, rows: {} }, 'type', 'rows'],
	['a row as null', withRows(first, last, null), 'type', 'rows[2]'],
	['a missing tag', withFirst({ tag: undefined }), 'missing', 'rows[0].tag'],
	['an empty tag', withFirst({ tag: '' }), 'text-length', 'rows[0].tag'],
	['a tag without end', withFirst({ tag: 'x'.repeat(101) }), 'text-length', 'rows[0].tag'],
	['a tag twice', withRows(first, last, { ...last }), 'duplicate-tag', 'rows[2].tag'],
	['an id twice', withLast({ id: 'r-1' }), 'duplicate-id', 'rows[1].id'],
	['a row on itself', withLast({ joins: 'S2' }), 'joins-itself', 'rows[1].joins'],
	['a row on nothing', withLast({ joins: 'S9' }), 'joins-unknown', 'rows[1].joins'],
	['joins left out', withFirst({ joins: undefined }), 'missing', 'rows[0].joins'],
	['joins as a number', withFirst({ joins: 3 }), 'type', 'rows[0].joins'],
	['two rows in a ring', withFirst({ joins: 'S2' }), 'ring', 'rows[0].joins'],
	['another side', withLast({ side: 'return' }), 'side-differs', 'rows[1].side'],
	['an unknown side', withLast({ side: 'up' }), 'unknown-key-value', 'rows[1].side'],
	['no outlet at the end', withLast({ outlet: undefined }), 'outlet-missing', 'rows[1].outlet'],
	['an outlet in the middle', withFirst({ outlet: { flow: 1 } }), 'outlet-in-middle', 'rows[0].outlet'],
	['no flow', withLast({ outlet: { flow: 0 } }), 'flow-zero', 'rows[1].outlet.flow'],
	['a flow inward', withLast({ outlet: { flow: -1 } }), 'negative', 'rows[1].outlet.flow'],
	['a flow left out', withLast({ outlet: {} }), 'missing', 'rows[1].outlet.flow'],
	['an infinite flow', withLast({ outlet: { flow: Infinity } }), 'not-finite', 'rows[1].outlet.flow'],
	['a loss that is nothing', withLast({ outlet: { flow: 1, loss: NaN } }), 'not-finite', 'rows[1].outlet.loss'],
	[
		'a loss of another kind',
		withLast({ outlet: { flow: 1, lossIs: 'some' } }),
		'unknown-key-value',
		'rows[1].outlet.lossIs'
	],
	['a negative length', withFirst({ length: -3 }), 'negative', 'rows[0].length'],
	['a length of text', withFirst({ length: '12' }), 'type', 'rows[0].length'],
	['a length to the moon', withFirst({ length: 4e8 }), 'out-of-range', 'rows[0].length'],
	['a negative roughness', withFirst({ roughness: -1e-5 }), 'negative', 'rows[0].roughness'],
	['no diameter', withFirst({ size: { shape: 'round' } }), 'missing', 'rows[0].size.diameter'],
	['a diameter of nothing', withFirst({ size: { shape: 'round', diameter: 0 } }), 'zero-size', 'rows[0].size.diameter'],
	['a negative side', withFirst({ size: { shape: 'oval', width: -1, height: 1 } }), 'negative', 'rows[0].size.width'],
	['an unknown shape', withFirst({ size: { shape: 'star' } }), 'unknown-key-value', 'rows[0].size.shape'],
	['a size of text', withFirst({ size: '300' }), 'type', 'rows[0].size'],
	['an unknown material', withFirst({ material: 'cheese' }), 'unknown-material', 'rows[0].material'],
	['an unknown material for all', { ...sound, material: 'cheese' }, 'unknown-material', 'material'],
	['an unknown fitting', withFitting({ kind: 'knot' }), 'unknown-fitting', 'rows[0].fittings[0].kind'],
	['a fitting without a kind', withFitting({}), 'missing', 'rows[0].fittings[0].kind'],
	[
		'a fixed fitting of nothing',
		withFitting({ kind: 'fixed' }),
		'parameter-missing',
		'rows[0].fittings[0].coefficient'
	],
	['half a fitting', withFitting({ kind: 'fixed', coefficient: 1, count: 0.5 }), 'type', 'rows[0].fittings[0].count'],
	['no fitting', withFitting({ kind: 'fixed', coefficient: 1, count: 0 }), 'out-of-range', 'rows[0].fittings[0].count'],
	[
		'a bend too far',
		withFitting({ kind: 'round-elbow-smooth', angle: 400 }),
		'parameter-range',
		'rows[0].fittings[0].angle'
	],
	[
		'a strange word',
		withFitting({ kind: 'round-elbow-smooth', wings: 2 }),
		'parameter-unknown',
		'rows[0].fittings[0].wings'
	],
	[
		'a parameter of text',
		withFitting({ kind: 'round-elbow-smooth', angle: '90' }),
		'type',
		'rows[0].fittings[0].angle'
	],
	['an unknown junction', withLast({ junction: { kind: 'knot' } }), 'unknown-fitting', 'rows[1].junction.kind'],
	[
		'a junction of nothing',
		withLast({ junction: { kind: 'fixed' } }),
		'parameter-missing',
		'rows[1].junction.coefficient'
	],
	[
		'a fitting as a junction',
		withLast({ junction: { kind: 'round-elbow-smooth' } }),
		'unknown-fitting',
		'rows[1].junction.kind'
	],
	['a junction as a fitting', withFitting({ kind: 'tee' }), 'unknown-fitting', 'rows[0].fittings[0].kind'],
	[
		'a leg that is none',
		withLast({ junction: { kind: 'tee', leg: 'left' } }),
		'unknown-key-value',
		'rows[1].junction.leg'
	],
	[
		'a strange word of a junction',
		withLast({ junction: { kind: 'tee', wings: 2 } }),
		'parameter-unknown',
		'rows[1].junction.wings'
	],
	[
		'a junction at no angle',
		withLast({ junction: { kind: 'wye', angle: 400 } }),
		'parameter-range',
		'rows[1].junction.angle'
	],
	[
		'a method of nobody',
		withFitting({ kind: 'round-elbow-smooth', method: 'nobody' }),
		'unknown-method',
		'rows[0].fittings[0].method'
	],
	[
		'a junction by nobody',
		withLast({ junction: { kind: 'tee', method: 'nobody' } }),
		'unknown-method',
		'rows[1].junction.method'
	],
	['a method of nobody for all', { ...sound, methods: { tee: 'nobody' } }, 'unknown-method', 'methods.tee'],
	['a method of no fitting', { ...sound, methods: { knot: 'idelchik' } }, 'unknown-fitting', 'methods.knot'],
	[
		'two straight legs at a node',
		withRows(first, ...['S2', 'S3'].map((tag) => ({ ...last, tag, junction: { kind: 'tee', leg: 'straight' } }))),
		'two-straight',
		'rows[2].junction.leg'
	],
	[
		'warmth of air by its density',
		{ ...withFirst({ temperature: 30 }), air: { density: 1.2 } },
		'temperature-unknown',
		'rows[0].temperature'
	],
	[
		'an unknown leakage class',
		withFirst({ leakage: { class: 'Z' } }),
		'unknown-leakage-class',
		'rows[0].leakage.class'
	],
	['leakage of no class', { ...sound, leakage: {} }, 'unknown-leakage-class', 'leakage'],
	[
		'a lining that fills its duct',
		withFirst({ lining: { thickness: 0.15, sizeIs: 'metal' } }),
		'lining-fills',
		'rows[0].lining.thickness'
	],
	[
		'a lining of an unknown side',
		withFirst({ lining: { thickness: 0.02, sizeIs: 'outer' } }),
		'unknown-key-value',
		'rows[0].lining.sizeIs'
	],
	[
		'flexible duct pressed to nothing',
		withFirst({ flexible: { length: 1, compression: 0.9 } }),
		'out-of-range',
		'rows[0].flexible.compression'
	],
	['equipment without a loss', withFirst({ equipment: [{ name: 'x' }] }), 'loss-missing', 'rows[0].equipment[0].loss'],
	[
		'equipment with two losses',
		withFirst({ equipment: [{ name: 'x', loss: 5, points: [[1, 2]] }] }),
		'loss-missing',
		'rows[0].equipment[0].loss'
	],
	[
		'points that fall',
		withFirst({ equipment: [{ name: 'x', points: [[1, 20], [2, 10]] }] }), // prettier-ignore
		'out-of-range',
		'rows[0].equipment[0].points[1]'
	],
	['no points', withFirst({ equipment: [{ name: 'x', points: [] }] }), 'out-of-range', 'rows[0].equipment[0].points'],
	[
		'a filter cleaner when dirty',
		withFirst({ equipment: [{ name: 'x', filter: { clean: 90, final: 40, state: 'mean' } }] }),
		'out-of-range',
		'rows[0].equipment[0].filter.final'
	],
	['equipment without a name', withFirst({ equipment: [{ loss: 5 }] }), 'missing', 'rows[0].equipment[0].name'],
	[
		'equipment that gives',
		withFirst({ equipment: [{ name: 'x', loss: -5 }] }),
		'negative',
		'rows[0].equipment[0].loss'
	],
	['a fan curve of one point', { ...sound, fan: { curve: [[1, 1]] } }, 'fan-curve', 'fan.curve'],
	[
		'a fan curve that turns back',
		{
			...sound,
			fan: {
				curve: [
					[1, 300],
					[1, 200]
				]
			}
		},
		'fan-curve',
		'fan.curve[1][0]'
	],
	['an unknown service', { ...sound, service: 'magic' }, 'unknown-key-value', 'service'],
	['a criterion of text', { ...sound, criteria: { mainVelocity: 'slow' } }, 'type', 'criteria.mainVelocity'],
	['too many rows', withRows(...Array.from({ length: 20_001 }, () => last)), 'too-many-rows', 'rows'],
	['a key named __proto__', JSON.parse('{"__proto__": {"a": 1}}'), 'type', '$'],
	[
		'a proxy that throws',
		new Proxy(
			{},
			{
				ownKeys: () => {
					throw new Error('no');
				}
			}
		),
		'unreadable',
		'$'
	]
];

describe('a bad document', () => {
	it.each(bad)('%s is told by its code and place', (_name, input, code, path) => {
		const problems = problemsOf(input);
		expect(problems.map((problem) => [problem.code, problem.path])).toContainEqual([code, path]);
		for (const problem of problems) {
			expect(problem.message).not.toBe('');
			expect(problem.expected).not.toBe('');
		}
	});

	it('has all its faults told at once, with tag, id and key of the row', () => {
		const problems = problemsOf(
			withRows(
				{ ...first, length: -1, material: 'cheese' },
				{ ...last, joins: 'S7', size: { shape: 'round', diameter: 0 } }
			)
		);
		expect(problems.map(({ code, row, id, field }) => [code, row, id, field])).toEqual([
			['negative', 'S1', 'r-1', 'length'],
			['outlet-missing', 'S1', 'r-1', 'outlet'],
			['unknown-material', 'S1', 'r-1', 'material'],
			['zero-size', 'S2', null, 'size'],
			['joins-unknown', 'S2', null, 'joins']
		]);
	});

	it('has each fault told once', () => {
		for (const [, input] of bad) {
			const told = problemsOf(input).map((problem) => `${problem.code} ${problem.path}`);
			expect(new Set(told).size).toBe(told.length);
		}
	});

	it('names the rows of a ring once, however many hang on it', () => {
		const row = (tag: string, joins: string) => ({ ...first, id: tag, tag, joins });
		const problems = problemsOf(withRows(row('A', 'C'), row('B', 'A'), row('C', 'B'), { ...last, joins: 'B' }));
		expect(problems.filter((problem) => problem.code === 'ring')).toHaveLength(1);
		expect(problems[0]?.message).toMatch(/A.*C.*B/);
	});

	it('stays readable when objects form a ring', () => {
		const ring: Json = { ...sound };
		ring.fan = ring;
		expect(problemsOf(ring).map((problem) => problem.code)).toContain('too-deep');
	});

	it('stays readable when nested without end', () => {
		let deep: unknown = 1;
		for (let i = 0; i < 50_000; i += 1) deep = [deep];
		expect(problemsOf(deep).map((problem) => problem.code)).toContain('too-deep');
	});
});

describe('any input', () => {
	const spoilt = fc
		.tuple(fc.constantFrom(...bad.map(([, input]) => input), sound), fc.jsonValue(), fc.nat())
		.map(([input, value, at]): unknown => {
			if (typeof input !== 'object' || input === null) return value;
			const copy = structuredClone(JSON.parse(JSON.stringify(sound))) as Json;
			const rows = copy.rows as Json[];
			const holder = [copy, rows[0], rows[1], rows[1]?.outlet as Json, rows[0]?.size as Json][at % 5] ?? copy;
			const keys = Object.keys(holder);
			holder[keys[at % keys.length] ?? 'x'] = value;
			return copy;
		});

	it('gets an answer, never an exception', () => {
		fc.assert(
			fc.property(fc.oneof(fc.jsonValue(), fc.anything(), spoilt), (input) => {
				const result = validateDocument(input);
				expect(result.ok || result.problems.length > 0).toBe(true);
			}),
			{ numRuns: 1_000 }
		);
	});
});
