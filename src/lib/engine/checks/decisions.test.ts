import { describe, expect, it } from 'vitest';
import { solutionOf } from '../../../../tests/engine/any-design';
import { both, design, row, SOUND, type Patch } from '../../../../tests/engine/tiny-design';
import { checksOf } from '.';

const KEY = 'fittings-apart';
const short = both(row('B', { length: 0.5 }), row('C', { length: 0.5 }));
const by = { check: KEY, row: 'B', by: 'Checking engineer', at: '2026-12-01' };

function resultOf(patch: Patch, key = KEY) {
	const document = both(short, patch)(SOUND);
	const result = checksOf(document, solutionOf(document)).find((one) => one.key === key);
	if (!result) throw new Error(`no check ${key}`);
	return result;
}

describe('a threshold', () => {
	it('is the default, told as such', () => {
		const { outcome, threshold, findings } = resultOf(design({}));
		expect(outcome).toBe('flag');
		expect(findings.map((one) => one.row)).toEqual(['B', 'C']);
		expect(threshold).toMatchObject({ value: 4, default: 4, isEdited: false });
	});

	it('can be edited by firm or project, in both directions', () => {
		const edited = resultOf(design({ checks: { [KEY]: { threshold: 1 } } }));
		expect(edited).toMatchObject({ outcome: 'pass', threshold: { value: 1, default: 4, isEdited: true } });
		const stricter = resultOf(
			design({ checks: { 'velocity-near-outlets': { threshold: 1 } } }),
			'velocity-near-outlets'
		);
		expect(stricter.findings.map((one) => one.row)).toEqual(['B', 'C']);
	});

	it('stands once where the engine flags the matter: the limit is that of the design', () => {
		const flat = row('A', { size: { shape: 'rectangular', width: 0.6, height: 0.3 } });
		expect(resultOf(both(flat, design({ criteria: { aspectRatio: 1.5 } })), 'aspect-ratio')).toMatchObject({
			...{ outcome: 'flag', threshold: null },
			findings: [{ row: 'A', value: 2, unit: '', limit: 1.5 }]
		});
	});
});

describe('a check that is left out', () => {
	it('does not apply, and says why', () => {
		const off = resultOf(design({ checks: { [KEY]: { off: { reason: 'measured as a whole' } } } }));
		expect(off).toMatchObject({ outcome: 'not-applicable', reason: 'Left out: measured as a whole', findings: [] });
	});

	it('is made all the same without a reason', () => {
		const silent = design({ checks: { [KEY]: { off: { reason: ' ' } } } });
		expect(resultOf(silent).outcome).toBe('flag');
		expect(resultOf(silent, 'decisions-count').findings).toHaveLength(1);
	});
});

describe('an override', () => {
	it('answers the finding at its row, and leaves the others open', () => {
		const { outcome, findings, answered } = resultOf(design({ overrides: [{ ...by, reason: 'tested together' }] }));
		expect(outcome).toBe('flag');
		expect(findings.map((one) => one.row)).toEqual(['C']);
		expect(answered.map((one) => one.row)).toEqual(['B']);
		expect(answered[0]?.override).toEqual({
			...{ row: 'B', by: 'Checking engineer', at: '2026-12-01', reason: 'tested together' }
		});
	});

	it('without a row answers all that the check finds; one for the row goes first', () => {
		const all = { ...by, row: null, by: 'Lead', reason: 'tested together' };
		const { outcome, findings, answered } = resultOf(design({ overrides: [all, { ...by, reason: 'a long bend' }] }));
		expect([outcome, findings]).toEqual(['overridden', []]);
		expect(answered.map(({ row, override }) => [row, override.by])).toEqual([
			['B', 'Checking engineer'],
			['C', 'Lead']
		]);
	});

	it.each([
		['a reason', { ...by, reason: '' }],
		['a reason but blanks', { ...by, reason: ' \t' }],
		['a name', { ...by, reason: 'tested', by: '' }],
		['the right row', { ...by, reason: 'tested', row: 'A' }],
		['the right check', { ...by, reason: 'tested', check: 'elevation' }]
	])('does not count without %s', (_what, override) => {
		expect(resultOf(design({ overrides: [override] }))).toMatchObject({ outcome: 'flag', answered: [] });
	});

	it('makes no flag of a check that passes', () => {
		const override = { ...by, check: 'least-round', row: null, reason: 'as drawn' };
		expect(resultOf(design({ overrides: [override] }), 'least-round').outcome).toBe('pass');
	});
});

describe('decisions that cannot count', () => {
	it('are told: an unknown check, a threshold where there is none, a row that is gone', () => {
		const document = design({
			checks: { 'no-such-check': {}, 'flows-close': { threshold: 1 } },
			overrides: [{ ...by, row: 'Z', reason: 'tested' }]
		});
		expect(resultOf(document, 'decisions-count').findings.map(({ message }) => message)).toEqual([
			'No check is called “no-such-check”.',
			'“flows-close” has no threshold to edit.',
			'An override of “fittings-apart” names a row that is not there: “Z”.'
		]);
	});
});
