import { describe, expect, it } from 'vitest';
import { solutionOf } from '../../../../tests/engine/any-design';
import {
	alone,
	both,
	design,
	every,
	exhaust,
	filter,
	outdoor,
	outletLoss,
	part,
	rectangular,
	round,
	row,
	same,
	SOUND,
	without,
	withoutKeys,
	type Patch
} from '../../../../tests/engine/tiny-design';
import type { DesignDocument } from '../document/types';
import { checkList, checksOf, NOT_SHOWN } from '.';

/** A design that passes; one that is flagged, and at which row; one it does not apply to. Null where none can be. */
type Line = readonly [Patch | null, readonly [Patch, string | null] | null, Patch | null];

const laboratory = both(design({ service: 'laboratory' }), exhaust);
const grease = both(
	design({ service: 'kitchen-grease' }),
	exhaust,
	every((one) => ({ ...one, fittings: [], rise: -0.5, ...round(0.25) }))
);
const fireDamper = row('A', { equipment: [{ name: 'Fire damper', loss: 8 }] });
const fan = (one: NonNullable<DesignDocument['fan']>) => design({ fan: one });
const margins = (...list: NonNullable<DesignDocument['margins']>) => design({ margins: list });
const override = { check: 'fittings-apart', row: 'B', reason: 'measured', by: 'A', at: '2026-12-01' };
const noRecord = (key: string): Line => [same, [design({ record: {} }), null], key === 'checker' ? same : null];
const high = outletLoss(900);
const sucked = every((one) => (one.outlet ? { ...one, outlet: { flow: 0.1, loss: 0, pressure: -200 } } : one));

const TABLE: Readonly<Record<string, Line>> = {
	'flows-close': [same, null, null],
	'sides-close': [outdoor(), [outdoor({ outlet: { flow: 0.4, loss: 15 } }), null], same],
	'both-sides-in-the-duty': [outdoor(), [same, null], null],
	'room-pressures-stated': [
		both(laboratory, row('B', { outlet: { flow: 0.15, loss: 20, pressure: -10 } })),
		[both(laboratory, row('B', { outlet: { flow: 0.15, loss: 20, pressure: 10 } })), 'B'],
		same
	],

	'velocity-low-pressure': [
		same,
		[row('A', round(0.28)), 'A'],
		every({ outlet: { flow: 0.1, loss: 900 }, joins: null })
	],
	'friction-low-pressure': [
		both(row('A', round(0.45)), row('C', round(0.4))),
		[row('B', round(0.2)), 'B'],
		every({ outlet: { flow: 0.1, loss: 900 }, joins: null })
	],
	'velocity-medium-pressure': [high, [both(high, row('A', round(0.22))), 'A'], same],
	'friction-medium-pressure': [high, [both(high, row('B', round(0.15))), 'B'], both(high, exhaust)],
	'velocity-transfer': [
		row('B', { serves: 'Transfer to the lobby' }),
		[row('C', { serves: 'Transfer to the lobby' }), 'C'],
		same
	],
	'friction-transfer': [
		row('B', { serves: 'Transfer', ...round(0.315) }),
		[row('B', { serves: 'Transfer', ...round(0.2) }), 'B'],
		same
	],
	'velocity-near-outlets': [same, [row('B', round(0.16)), 'B'], every({ side: 'outdoor' })],
	'static-near-outlets': [same, [outletLoss(60), 'B'], exhaust],
	'limit-main-velocity': [same, [design({ criteria: { mainVelocity: 4 } }), 'A'], without('criteria')],
	'limit-run-out-velocity': [same, [design({ criteria: { runOutVelocity: 1 } }), 'B'], without('criteria')],
	'limit-friction-rate': [same, [design({ criteria: { frictionRate: 0.3 } }), 'B'], without('criteria')],
	'figures-plausible': [same, [both(without('leakage'), without('criteria'), row('B', round(0.05))), 'B'], null],
	'flow-turbulent': [same, [row('B', round(4)), 'B'], null],

	'aspect-ratio': [row('A', rectangular(0.6, 0.3)), [row('A', rectangular(1.2, 0.25)), 'A'], same],
	'aspect-ratio-greatest': [row('A', rectangular(1.2, 0.25)), [row('A', rectangular(1.6, 0.2)), 'A'], same],
	'least-round': [same, [row('B', round(0.08)), 'B'], every({ ...rectangular(0.4, 0.3), fittings: [] })],
	'least-side': [row('A', rectangular(0.6, 0.3)), [row('A', rectangular(0.6, 0.12)), 'A'], same],
	'rise-within-length': [row('B', { rise: 6 }), [row('B', { rise: -6.5 }), 'B'], same],

	'fittings-entered': [same, [every(withoutKeys('fittings', 'junction')), null], null],
	'throat-radius': [
		row('A', { fittings: [part({ kind: 'round-elbow-smooth', radiusRatio: 1.25 })] }),
		[row('A', { fittings: [part({ kind: 'round-elbow-smooth', radiusRatio: 1 })] }), 'A'],
		row('A', { fittings: [part({ kind: 'rectangular-elbow-splitter' })], ...rectangular(0.4, 0.3) })
	],
	'mitred-without-vanes': [
		row('A', { fittings: [part({ kind: 'round-elbow-mitred', angle: 45 })] }),
		[row('A', { fittings: [{ kind: 'round-elbow-mitred' }] }), 'A'],
		same
	],
	'vanes-single-thickness': [
		row('A', { fittings: [part({ kind: 'rectangular-elbow-vaned' })], ...rectangular(0.4, 0.3) }),
		[row('A', { fittings: [part({ kind: 'rectangular-elbow-vaned-double' })], ...rectangular(0.4, 0.3) }), 'A'],
		same
	],
	'fittings-apart': [same, [row('B', { length: 0.5 }), 'B'], every({ fittings: [] })],
	'coefficients-in-range': [
		row('C', { junction: { kind: 'fixed', coefficient: 0.1 } }),
		[row('A', { fittings: [part({ kind: 'round-elbow-smooth', radiusRatio: 9 })] }), 'A'],
		null
	],
	'coefficients-by-hand': [
		row('B', { junction: { kind: 'tee', leg: 'branch' } }),
		[same, 'B'],
		every(withoutKeys('fittings', 'junction'))
	],
	'junctions-counted': [same, [row('B', withoutKeys('junction')), 'B'], both(alone, every(withoutKeys('junction')))],
	'junctions-negative': [
		row('C', { junction: { kind: 'fixed', coefficient: 0.1 } }),
		[row('B', { junction: { kind: 'fixed', coefficient: -0.2 } }), 'B'],
		every(withoutKeys('junction'))
	],
	'sections-lose': [same, [row('B', { junction: { kind: 'fixed', coefficient: -9 } }), 'B'], null],

	'flexible-length': [
		row('B', { flexible: { length: 1.5 } }),
		[row('B', { flexible: { length: 1.6 } }), 'B'],
		row('B', { flexible: { length: 0 } })
	],
	'flexible-connector': [row('B', { flexible: { length: 4 } }), [row('B', { flexible: { length: 4.3 } }), 'B'], same],
	'limit-flexible-length': [
		row('B', { flexible: { length: 2 } }),
		[row('B', { flexible: { length: 2.1 } }), 'B'],
		without('criteria')
	],
	'flexible-compression': [
		row('B', { flexible: { length: 1, compression: 0.15 } }),
		[row('B', { flexible: { length: 1, compression: 0.2 } }), 'B'],
		row('B', { flexible: { length: 1 } })
	],
	'flexible-assumption': [
		row('B', { flexible: { length: 1, factor: 4 } }),
		[row('B', { flexible: { length: 1 } }), 'B'],
		same
	],

	'ends-to-the-open': [outdoor(), [outdoor({ outlet: { flow: 0.6, loss: 0 } }), 'O'], same],
	'ends-once': [same, [row('B', { fittings: [{ kind: 'exit-plain' }] }), 'B'], null],
	'terminals-stated': [same, [row('B', { outlet: { flow: 0.15 } }), 'B'], exhaust],
	'terminal-loss-basis': [
		same,
		[row('B', { outlet: { flow: 0.15, loss: 20 } }), null],
		every((one) => (one.outlet ? { ...one, outlet: { flow: 0.1 } } : one))
	],
	'apparatus-counted': [same, [row('A', { equipment: [] }), null], null],
	'filter-basis': [filter('dirty'), [row('A', { equipment: [{ name: 'Bag filter', loss: 90 }] }), 'A'], same],

	'governing-path': [same, null, null],
	'duty-positive': [
		same,
		[every((one) => (one.outlet ? { ...one, outlet: { flow: 0.1, loss: 0, pressure: -500 } } : one)), null],
		null
	],
	'pressure-class-named': [every({ pressureClass: 500 }), [row('A', { pressureClass: 500 }), 'B'], null],
	'static-class': [every({ pressureClass: 500 }), [every({ pressureClass: 20 }), 'A'], same],
	'sign-of-static-pressure': [same, [sucked, 'B'], null],

	'density-of-equipment': [same, [design({ air: { temperature: 20, elevation: 1_500 } }), null], null],
	elevation: [same, [design({ air: { temperature: 20, elevation: 501 } }), null], design({ air: { density: 1.2 } })],
	'temperature-near-standard': [same, [row('B', { temperature: 40 }), 'B'], design({ air: { density: 1.2 } })],
	'flow-basis-stated': [
		design({ air: { temperature: 20, elevation: 1_500 }, flowBasis: 'actual' }),
		[design({ air: { temperature: 20, elevation: 1_500 } }), null],
		same
	],
	'streams-mix': [row('B', { temperature: 30 }), [both(exhaust, row('B', { temperature: 60 })), 'A'], same],
	'no-condensation': [
		row('B', { temperature: 18 }),
		[both(design({ air: { temperature: 25, relativeHumidity: 0.8 } }), row('B', { temperature: 10 })), 'B'],
		same
	],

	'leakage-class-named': [same, [without('leakage'), null], null],
	'leakage-class-everywhere': [
		both(without('leakage'), every({ leakage: { class: 'C' } })),
		[both(without('leakage'), row('A', { leakage: { class: 'C' } })), 'B'],
		same
	],
	'leakage-share': [same, [design({ leakage: { cl: 900 } }), null], without('leakage')],
	'leakage-settled': [same, [sucked, 'B'], without('leakage')],
	'leakage-test-named': [high, [both(design({ leakage: { class: 'C' } }), high), 'B'], same],
	'leakage-test-pressure': [same, [high, 'B'], without('leakage')],

	'branch-dampers': [
		same,
		[row('B', { fittings: [{ kind: 'fixed', coefficient: 0.2, name: 'Fire damper' }] }), 'B'],
		alone
	],
	'dampers-not-overloaded': [same, [row('C', { outlet: { flow: 0.45, loss: 200 } }), 'B'], alone],
	'dampers-open': [same, [row('B', { fittings: [{ kind: 'damper-butterfly' }] }), 'B'], every({ fittings: [] })],
	'traverse-place': [same, [row('A', { length: 1 }), 'A'], null],

	'system-effect': [same, [row('A', { length: 0.5 }), 'A'], exhaust],
	'system-effect-inlet': [
		both(exhaust, row('A', { length: 0.3, fittings: [part({ kind: 'fan-inlet-effect', coefficient: 0.5 })] })),
		[both(exhaust, row('A', { length: 0.3 })), 'A'],
		same
	],
	'fan-gives-the-duty': [
		fan({
			curve: [
				[0, 400],
				[2, 100]
			]
		}),
		[fan({ totalPressure: 20 }), null],
		same
	],
	'fan-not-oversized': [
		fan({ totalPressure: 70 }),
		[fan({ totalPressure: 400 }), null],
		fan({
			curve: [
				[0, 400],
				[0.2, 100]
			]
		})
	],
	'fan-on-stable-side': [
		fan({
			curve: [
				[0, 300],
				[0.3, 400],
				[2, 100]
			]
		}),
		[
			fan({
				curve: [
					[0, 300],
					[1, 400],
					[2, 100]
				]
			}),
			null
		],
		fan({
			curve: [
				[0, 400],
				[2, 100]
			]
		})
	],

	'margins-once': [
		margins({ name: 'Fan', of: 'pressure', fraction: 0.05 }),
		[margins({ name: 'Safety', of: 'flow', fraction: 0.05 }, { name: 'safety ', of: 'pressure', pressure: 20 }), null],
		same
	],
	'margins-not-hidden': [
		margins({ name: 'Fan', of: 'pressure', fraction: 0.05 }),
		[row('A', { equipment: [{ name: 'Contingency', loss: 25 }] }), 'A'],
		null
	],
	'margins-complete': [
		margins({ name: 'Fan', of: 'pressure', fraction: 0.05, reason: 'unknown lengths' }),
		[margins({ name: 'Fan', of: 'pressure', reason: 'unknown lengths' }), null],
		same
	],
	'margin-on-flow': [
		margins({ name: 'Flow', of: 'flow', fraction: 0.05 }),
		[margins({ name: 'Flow', of: 'flow', fraction: 0.06 }), null],
		margins({ name: 'Fan', of: 'pressure', fraction: 0.1 })
	],
	'margin-on-pressure': [
		margins({ name: 'Fan', of: 'pressure', fraction: 0.1 }, { name: 'Flow', of: 'flow', fraction: 0.05 }),
		[margins({ name: 'Fan', of: 'pressure', pressure: 80 }), null],
		margins({ name: 'Flow', of: 'flow', fraction: 0.05 })
	],

	'service-named': [same, [design({ service: 'hazardous' }), null], null],
	'fire-dampers': [null, [fireDamper, 'A'], same],
	'fire-damper-velocity': [fireDamper, [both(fireDamper, row('A', round(0.25))), 'A'], same],
	'no-damper-in-hood-exhaust': [
		laboratory,
		[both(laboratory, row('A', { equipment: [{ name: 'FD-01', loss: 8 }] })), 'A'],
		same
	],
	'exhaust-kept-apart': [laboratory, [both(laboratory, row('B', { side: 'return' })), 'B'], same],
	'grease-velocity': [grease, [both(grease, row('B', round(0.4))), 'B'], same],
	'grease-slope': [grease, [both(grease, row('B', { rise: 0.1 })), 'B'], same],
	'grease-dampers': [grease, [both(grease, row('B', { fittings: [{ kind: 'damper-butterfly' }] })), 'B'], same],

	'nothing-to-be-confirmed': [
		same,
		[row('A', { equipment: [{ name: 'Coil', loss: 30, toBeConfirmed: true }] }), 'A'],
		null
	],
	'everything-read': [same, [(document) => ({ ...document, unknownKey: 1 }), null], null],
	'criteria-stated': [same, [design({ criteria: { flexibleLength: 2 } }), null], null],
	'codes-stated': noRecord('codes'),
	'noise-criterion-stated': noRecord('noiseCriterion'),
	'tolerance-stated': noRecord('tolerance'),
	'checked-by-another': [
		same,
		[design({ record: { originator: 'A. Person', checker: 'a. person ' } }), null],
		design({ record: {} })
	],
	'decisions-count': [
		design({ overrides: [override], checks: { elevation: { threshold: 800 } } }),
		[design({ overrides: [{ ...override, row: 'C', reason: ' ' }] }), 'C'],
		same
	]
};

function resultOf(key: string, patch: Patch) {
	const document = patch(SOUND);
	const result = checksOf(document, solutionOf(document)).find((one) => one.key === key);
	if (!result) throw new Error(`no check ${key}`);
	return result;
}

describe('the list of checks', () => {
	it('has keys of its own, and a line each in the table of this test', () => {
		expect(checkList.length).toBeGreaterThanOrEqual(30);
		expect(Object.keys(TABLE)).toEqual(checkList.map(({ key }) => key));
		for (const { key } of checkList) expect(key).toMatch(/^[a-z]+(-[a-z]+)*$/);
	});

	it('names the origin of each, claims nothing of a code, and says which pressure it means', () => {
		for (const { basis, title, looksAt, threshold, key } of checkList) {
			expect(basis.text.length, key).toBeGreaterThan(5);
			expect(basis.source === 'common practice', key).toBe(
				basis.mark === 'common practice' && basis.source.length < 16
			);
			const words = `${title} ${looksAt} ${basis.source} ${basis.text} ${threshold?.label ?? ''}`;
			expect(words).not.toMatch(/complian|approved|certified/i);
			if (threshold?.unit === 'Pa') expect(threshold.label).toMatch(/total|static/i);
		}
	});

	it('says what no document shows, and why', () => {
		expect(NOT_SHOWN.every(({ what, why }) => what.length > 5 && why.length > 5)).toBe(true);
	});
});

const lines = Object.entries(TABLE).map(([key, [pass, flag, none]]) => ({ key, pass, flag, none }));

describe('a check', () => {
	it.each(lines.flatMap(({ key, pass }) => (pass ? [{ key, pass }] : [])))('$key passes', ({ key, pass }) => {
		const result = resultOf(key, pass);
		expect(result).toMatchObject({ outcome: 'pass', findings: [], reason: null });
	});

	it.each(lines.flatMap(({ key, flag }) => (flag ? [{ key, flag }] : [])))(
		'$key flags',
		({ key, flag: [patch, at] }) => {
			const { outcome, findings } = resultOf(key, patch);
			expect(outcome).toBe('flag');
			expect(findings.map((one) => one.row)).toContain(at);
			for (const { message, value, unit } of findings) {
				expect(message).toMatch(/\.$/);
				expect(value === undefined).toBe(unit === undefined);
			}
		}
	);

	it.each(lines.flatMap(({ key, none }) => (none ? [{ key, none }] : [])))('$key does not apply', ({ key, none }) => {
		const { outcome, reason } = resultOf(key, none);
		expect(outcome).toBe('not-applicable');
		expect(reason).toMatch(/^[A-Z].*\.$/);
	});
});
