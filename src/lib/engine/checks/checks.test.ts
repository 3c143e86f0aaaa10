import { performance } from 'node:perf_hooks';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyDesignOfStreams, isWithinRange, solutionOf } from '../../../../tests/engine/any-design';
import type { DesignDocument, DesignRow } from '../document/types';
import { checkList, checksOf, marginLedger, NOT_SHOWN } from '.';

type Patch = (document: DesignDocument) => DesignDocument;

/** A main with a branch and a straight way, as it should be. */
const SOUND: DesignDocument = {
	format: 'evendraft/design@1',
	air: { temperature: 20 },
	leakage: { class: 'C', testPressure: 500 },
	record: { codes: 'the local mechanical code, its edition', noiseCriterion: 'NC 35', originator: 'A', checker: 'B' },
	rows: [
		{
			...{ tag: 'A', joins: null, side: 'supply', size: { shape: 'round', diameter: 0.4 }, length: 8 },
			fittings: [{ kind: 'round-elbow-segmented', radiusRatio: 1.5 } as never],
			equipment: [{ name: 'Coil', loss: 30 }]
		},
		{
			...{ tag: 'B', joins: 'A', side: 'supply', size: { shape: 'round', diameter: 0.25 }, length: 6 },
			junction: { kind: 'fixed', coefficient: 0.6 },
			fittings: [{ kind: 'damper-butterfly', angle: 0 } as never],
			outlet: { flow: 0.15, loss: 20 }
		},
		{
			...{ tag: 'C', joins: 'A', side: 'supply', size: { shape: 'round', diameter: 0.355 }, length: 6 },
			junction: { kind: 'tee', leg: 'straight' },
			fittings: [{ kind: 'damper-butterfly', angle: 0 } as never],
			outlet: { flow: 0.45, loss: 20 }
		}
	]
};

const row =
	(tag: string, patch: Partial<DesignRow> | ((row: DesignRow) => DesignRow)): Patch =>
	(document) => ({
		...document,
		rows: document.rows.map((one) =>
			one.tag !== tag ? one : typeof patch === 'function' ? patch(one) : { ...one, ...patch }
		)
	});
const every =
	(patch: Partial<DesignRow>): Patch =>
	(document) => ({ ...document, rows: document.rows.map((one) => ({ ...one, ...patch })) });
const design =
	(patch: Partial<DesignDocument>): Patch =>
	(document) => ({ ...document, ...patch });
const without =
	(...keys: readonly (keyof DesignDocument)[]): Patch =>
	(document) =>
		Object.fromEntries(Object.entries(document).filter(([key]) => !keys.includes(key as never))) as never;
const same: Patch = (document) => document;
const both =
	(...patches: readonly Patch[]): Patch =>
	(document) =>
		patches.reduce((made, patch) => patch(made), document);
const rectangular = (width: number, height: number) => ({ size: { shape: 'rectangular', width, height } }) as const;
const outdoor =
	(more: Partial<DesignRow> = {}): Patch =>
	(document) => ({
		...document,
		rows: [
			...document.rows,
			{
				...{ tag: 'O', joins: null, side: 'outdoor', size: { shape: 'round', diameter: 0.4 }, length: 4 },
				outlet: { flow: 0.6, loss: 15 },
				...more
			}
		]
	});
const noOutletLoss = (one: DesignRow): DesignRow => ({ ...one, outlet: { flow: one.outlet?.flow ?? 0.1 } });
const filter = (state: 'clean' | 'dirty'): Patch =>
	row('A', { equipment: [{ name: 'Filter', filter: { clean: 60, final: 150, state }, atFlow: 0.6 }] });
const exhaust = every({ side: 'exhaust' });

/** For each check: a design that passes, one that is flagged at a row, one that it does not apply to; null where none can be. */
const TABLE: Readonly<Record<string, readonly [Patch | null, readonly [Patch, string | null] | null, Patch | null]>> = {
	'flows-close': [same, null, null],
	'sides-close': [outdoor(), [outdoor({ outlet: { flow: 0.4, loss: 15 } }), null], same],
	'room-pressures-stated': [
		both(design({ service: 'laboratory' }), row('B', { outlet: { flow: 0.15, loss: 20, pressure: -10 } })),
		[design({ service: 'laboratory' }), null],
		same
	],
	'leakage-share': [same, [design({ leakage: { cl: 900 } }), null], without('leakage')],
	'leakage-class-named': [same, [without('leakage'), null], null],
	'leakage-test-named': [
		row('B', { outlet: { flow: 0.15, loss: 1_200 } }),
		[both(design({ leakage: { class: 'C' } }), row('B', { outlet: { flow: 0.15, loss: 1_200 } })), 'B'],
		same
	],
	'velocity-low-pressure': [
		same,
		[row('A', { size: { shape: 'round', diameter: 0.28 } }), 'A'],
		every({ outlet: { flow: 0.1, loss: 900 }, joins: null })
	],
	'friction-low-pressure': [
		both(row('A', { size: { shape: 'round', diameter: 0.45 } }), row('C', { size: { shape: 'round', diameter: 0.4 } })),
		[row('B', { size: { shape: 'round', diameter: 0.2 } }), 'B'],
		row('B', { outlet: { flow: 0.15, loss: 2_000 } })
	],
	'velocity-medium-pressure': [
		row('B', { outlet: { flow: 0.15, loss: 900 } }),
		[
			both(row('B', { outlet: { flow: 0.15, loss: 900 } }), row('A', { size: { shape: 'round', diameter: 0.22 } })),
			'A'
		],
		same
	],
	'friction-medium-pressure': [
		row('B', { outlet: { flow: 0.15, loss: 900 } }),
		[row('B', { size: { shape: 'round', diameter: 0.15 }, outlet: { flow: 0.15, loss: 900 } }), 'B'],
		same
	],
	'velocity-near-outlets': [same, [row('B', { size: { shape: 'round', diameter: 0.16 } }), 'B'], null],
	'limits-of-the-design': [same, [design({ criteria: { runOutVelocity: 1 } }), 'B'], null],
	'figures-plausible': [
		same,
		[both(without('leakage'), row('B', { size: { shape: 'round', diameter: 0.05 } })), 'B'],
		null
	],
	'flow-turbulent': [same, [row('B', { size: { shape: 'round', diameter: 4 } }), 'B'], null],
	'aspect-ratio': [row('A', rectangular(0.6, 0.3)), [row('A', rectangular(1.2, 0.25)), 'A'], same],
	'aspect-ratio-greatest': [row('A', rectangular(1.2, 0.25)), [row('A', rectangular(1.6, 0.2)), 'A'], same],
	'least-round': [same, [row('B', { size: { shape: 'round', diameter: 0.08 } }), 'B'], every(rectangular(0.4, 0.3))],
	'least-side': [row('A', rectangular(0.6, 0.3)), [row('A', rectangular(0.6, 0.12)), 'A'], same],
	'throat-radius': [
		same,
		[row('A', { fittings: [{ kind: 'round-elbow-smooth', radiusRatio: 1 } as never] }), 'A'],
		row('A', { fittings: [] })
	],
	'mitred-without-vanes': [same, [row('A', { fittings: [{ kind: 'round-elbow-mitred' }] }), 'A'], null],
	'fittings-apart': [same, [row('B', { length: 0.5 }), 'B'], every({ fittings: [] })],
	'coefficients-in-range': [
		row('C', { junction: { kind: 'fixed', coefficient: 0.1 } }),
		[row('A', { fittings: [{ kind: 'round-elbow-smooth', radiusRatio: 9 } as never] }), 'A'],
		null
	],
	'coefficients-by-hand': [row('B', { junction: { kind: 'tee', leg: 'branch' } }), [same, 'B'], null],
	'junctions-counted': [
		same,
		[
			row('B', (one) => {
				const { junction: _junction, ...rest } = one;
				return rest;
			}),
			'B'
		],
		null
	],
	'junctions-negative': [same, [row('B', { junction: { kind: 'fixed', coefficient: -0.2 } }), 'B'], null],
	'sections-lose': [same, [row('B', { rise: 20 }), 'B'], null],
	'flexible-length': [row('B', { flexible: { length: 1 } }), [row('B', { flexible: { length: 3 } }), 'B'], same],
	'flexible-compression': [
		row('B', { flexible: { length: 1, compression: 0.05 } }),
		[row('B', { flexible: { length: 1, compression: 0.2 } }), 'B'],
		same
	],
	'flexible-assumption': [same, [row('B', { flexible: { length: 1 } }), 'B'], null],
	'ends-to-the-open': [outdoor(), [outdoor({ outlet: { flow: 0.6, loss: 0 } }), 'O'], same],
	'ends-once': [same, [row('B', { fittings: [{ kind: 'exit-plain' }] }), 'B'], null],
	'terminals-stated': [same, [row('B', noOutletLoss), 'B'], null],
	'apparatus-counted': [same, [row('A', { equipment: [] }), null], null],
	'filter-basis': [filter('dirty'), [filter('clean'), 'A'], same],
	'branch-dampers': [
		same,
		[row('B', { fittings: [] }), 'B'],
		(document) => ({ ...document, rows: [{ ...(document.rows[1] as DesignRow), joins: null }] })
	],
	'dampers-not-overloaded': [same, [row('C', { outlet: { flow: 0.45, loss: 200 } }), 'B'], null],
	'dampers-open': [same, [row('B', { fittings: [{ kind: 'damper-butterfly' }] }), 'B'], null],
	'governing-path': [same, null, null],
	'duty-positive': [
		same,
		[
			both(
				row('B', { outlet: { flow: 0.15, loss: 0, pressure: -500 } }),
				row('C', { outlet: { flow: 0.45, loss: 0, pressure: -500 } })
			),
			null
		],
		null
	],
	'static-class': [every({ pressureClass: 500 }), [every({ pressureClass: 20 }), 'A'], same],
	'system-effect': [same, [row('A', { length: 0.5 }), 'A'], exhaust],
	'traverse-place': [same, [row('A', { length: 1 }), 'A'], null],
	'margins-once': [
		design({ margins: [{ name: 'Fan', of: 'pressure', fraction: 0.05 }] }),
		[
			design({
				margins: [
					{ name: 'Fan', of: 'pressure', fraction: 0.05 },
					{ name: 'fan ', of: 'pressure', pressure: 20 }
				]
			}),
			null
		],
		same
	],
	'margin-on-flow': [
		design({ margins: [{ name: 'Flow', of: 'flow', fraction: 0.05 }] }),
		[design({ margins: [{ name: 'Flow', of: 'flow', fraction: 0.1 }] }), null],
		same
	],
	'margin-on-pressure': [
		design({ margins: [{ name: 'Fan', of: 'pressure', fraction: 0.1 }] }),
		[design({ margins: [{ name: 'Fan', of: 'pressure', pressure: 80 }] }), null],
		same
	],
	'density-of-equipment': [same, [design({ air: { temperature: 20, elevation: 1_500 } }), null], null],
	elevation: [same, [design({ air: { temperature: 20, elevation: 1_500 } }), null], design({ air: { density: 1.2 } })],
	'temperature-near-standard': [same, [row('B', { temperature: 40 }), 'B'], design({ air: { density: 1.2 } })],
	'streams-mix': [same, [both(exhaust, row('B', { temperature: 60 })), 'A'], null],
	'no-condensation': [
		same,
		[both(design({ air: { temperature: 25, relativeHumidity: 0.8 } }), row('B', { temperature: 10 })), 'B'],
		null
	],
	'service-named': [same, [design({ service: 'hazardous' }), null], null],
	'fire-dampers': [same, [row('A', { equipment: [{ name: 'Fire damper', loss: 8 }] }), 'A'], null],
	'no-damper-in-hood-exhaust': [
		both(design({ service: 'laboratory' }), exhaust),
		[
			both(design({ service: 'laboratory' }), exhaust, row('A', { equipment: [{ name: 'Fire damper', loss: 8 }] })),
			'A'
		],
		same
	],
	'grease-velocity': [
		both(design({ service: 'kitchen-grease' }), exhaust),
		[both(design({ service: 'kitchen-grease' }), exhaust, row('B', { size: { shape: 'round', diameter: 0.4 } })), 'B'],
		same
	],
	'grease-dampers': [
		both(design({ service: 'kitchen-grease' }), exhaust, row('B', { fittings: [] }), row('C', { fittings: [] })),
		[both(design({ service: 'kitchen-grease' }), exhaust), 'B'],
		same
	],
	'nothing-to-be-confirmed': [
		same,
		[row('A', { equipment: [{ name: 'Coil', loss: 30, toBeConfirmed: true }] }), 'A'],
		null
	],
	'everything-read': [same, [design({ unknownKey: 1 } as never), null], null],
	'codes-stated': [same, [design({ record: {} }), null], null],
	'noise-criterion-stated': [same, [design({ record: {} }), null], null],
	'checked-by-another': [
		same,
		[design({ record: { originator: 'A. Person', checker: 'a. person ' } }), null],
		design({ record: {} })
	]
};

function outcome(key: string, patch: Patch) {
	const document = patch(SOUND);
	const result = checksOf(document, solutionOf(document)).find((one) => one.key === key);
	if (!result) throw new Error(`no check ${key}`);
	return result;
}

describe('the checks', () => {
	it('are at least thirty, each with a key of its own, an origin, and a row in the table of this test', () => {
		expect(checkList.length).toBeGreaterThanOrEqual(30);
		expect(new Set(checkList.map(({ key }) => key)).size).toBe(checkList.length);
		expect(Object.keys(TABLE).sort()).toEqual(checkList.map(({ key }) => key).sort());
		for (const { basis, title, looksAt } of checkList) {
			expect(basis.source.length).toBeGreaterThan(5);
			expect(`${title} ${looksAt} ${basis.source}`).not.toMatch(/compliant|approved|certified/i);
		}
		expect(NOT_SHOWN.every(({ what, why }) => what.length > 5 && why.length > 5)).toBe(true);
	});

	const rows = Object.entries(TABLE).map(([key, [pass, flag, none]]) => ({ key, pass, flag, none }));
	it.each(rows.filter(({ pass }) => pass))('$key passes', ({ key, pass }) => {
		const result = outcome(key, pass as Patch);
		expect(result.findings).toEqual([]);
		expect(result.outcome).toBe('pass');
	});
	it.each(rows.filter(({ flag }) => flag))('$key flags what it is there for', ({ key, flag }) => {
		const [patch, at] = flag as readonly [Patch, string | null];
		const result = outcome(key, patch);
		expect(result.outcome).toBe('flag');
		expect(result.findings.map((one) => one.row)).toContain(at);
		for (const { message } of result.findings) expect(message).toMatch(/\.$/);
	});
	it.each(rows.filter(({ none }) => none))('$key says where it does not apply', ({ key, none }) => {
		const result = outcome(key, none as Patch);
		expect(result.outcome).toBe('not-applicable');
		expect(result.reason).toMatch(/\.$/);
	});
});

describe('what a firm and a reviewer decide', () => {
	const short = row('B', { length: 0.5 });

	it('is an edited threshold, told as such', () => {
		const edited = outcome('fittings-apart', both(short, design({ checks: { 'fittings-apart': { threshold: 1 } } })));
		expect(edited.outcome).toBe('pass');
		expect(edited.threshold).toMatchObject({ value: 1, isEdited: true, default: 5 });
	});

	it('is a check left out, with its reason', () => {
		const off = outcome(
			'fittings-apart',
			both(short, design({ checks: { 'fittings-apart': { off: { reason: 'measured as a whole' } } } }))
		);
		expect(off).toMatchObject({ outcome: 'not-applicable', reason: 'Left out: measured as a whole' });
		const silent = outcome(
			'fittings-apart',
			both(short, design({ checks: { 'fittings-apart': { off: { reason: ' ' } } } }))
		);
		expect(silent.outcome).toBe('flag');
	});

	it('is an override with who and why; without a reason it does not count', () => {
		const by = { check: 'fittings-apart', row: 'B', by: 'Checking engineer', at: '2026-12-01' };
		const answered = outcome(
			'fittings-apart',
			both(short, design({ overrides: [{ ...by, reason: 'tested together' }] }))
		);
		expect(answered.outcome).toBe('overridden');
		expect(answered.answered[0]).toMatchObject({
			row: 'B',
			override: { by: 'Checking engineer', reason: 'tested together' }
		});
		const empty = outcome('fittings-apart', both(short, design({ overrides: [{ ...by, reason: '' }] })));
		expect(empty.outcome).toBe('flag');
		const elsewhere = outcome(
			'fittings-apart',
			both(short, design({ overrides: [{ ...by, row: 'C', reason: 'tested' }] }))
		);
		expect(elsewhere.outcome).toBe('flag');
	});
});

describe('the margin ledger', () => {
	it('names each allowance once, and multiplies before it adds', () => {
		const document = design({
			margins: [
				{ name: 'Flow for the future', of: 'flow', fraction: 0.05 },
				{ name: 'Calculation', of: 'pressure', fraction: 0.1 },
				{ name: 'Filter', of: 'pressure', pressure: 40 }
			]
		})(SOUND);
		const solution = solutionOf(document);
		const ledger = marginLedger(document, solution);
		expect(ledger.repeated).toEqual([]);
		expect(ledger.flowFactor).toBe(1.05);
		expect(ledger.selectionFlow).toBe(solution.fan.flow * 1.05);
		expect(ledger.selectionPressure).toBeCloseTo(solution.fan.totalPressure * 1.1 + 40, 9);
		expect(ledger.basis).toBe('fan total pressure');
	});

	it('is the duty itself without a margin', () => {
		const solution = solutionOf(SOUND);
		expect(marginLedger(SOUND, solution)).toMatchObject({ lines: [], selectionPressure: solution.fan.totalPressure });
	});
});

describe('checks of any design', () => {
	it('are plain data, write nothing, and find nothing where all are left out', { timeout: 60_000 }, () => {
		const checks = Object.fromEntries(checkList.map(({ key }) => [key, { off: { reason: 'not asked' } }]));
		fc.assert(
			fc.property(anyDesignOfStreams, (document) => {
				fc.pre(isWithinRange(document));
				const solution = solutionOf(document);
				const before = JSON.stringify([document, solution]);
				const results = checksOf(document, solution);
				expect(JSON.stringify([document, solution])).toBe(before);
				expect(JSON.parse(JSON.stringify(results))).toEqual(results);
				expect(results.find(({ key }) => key === 'flows-close')?.outcome).toBe('pass');
				expect(results.find(({ key }) => key === 'governing-path')?.outcome).toBe('pass');
				expect(checksOf({ ...document, checks }, solution).every((one) => one.outcome === 'not-applicable')).toBe(true);
			}),
			{ numRuns: 60 }
		);
	});

	it('take little time', () => {
		const rows = Array.from({ length: 5_000 }, (_, at): DesignRow => ({
			...(SOUND.rows[1] as DesignRow),
			tag: `R${at}`,
			joins: null
		}));
		const document = { ...SOUND, rows };
		const solution = solutionOf(document);
		const begun = performance.now();
		expect(checksOf(document, solution)).toHaveLength(checkList.length);
		process.stdout.write(`checks of 5,000 rows: ${(performance.now() - begun).toFixed(0)} ms\n`);
	});
});
