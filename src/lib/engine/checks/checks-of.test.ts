import { performance } from 'node:perf_hooks';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyDesignOfStreams, isWithinRange, solutionOf } from '../../../../tests/engine/any-design';
import { part, SOUND } from '../../../../tests/engine/tiny-design';
import type { DesignDocument, DesignRow } from '../document/types';
import { checkList, checksOf } from '.';

/** Conservation and the choice of the index path hold of any design that is solved. */
const LAWS = ['flows-close', 'governing-path'];

describe('checks of any design', () => {
	const off = Object.fromEntries(checkList.map(({ key }) => [key, { off: { reason: 'not asked' } }]));

	it('write nothing, give plain data, and find nothing where all are left out', { timeout: 60_000 }, () => {
		fc.assert(
			fc.property(anyDesignOfStreams, (document) => {
				fc.pre(isWithinRange(document));
				const solution = solutionOf(document);
				const before = JSON.stringify([document, solution]);
				const results = checksOf(document, solution);
				expect(JSON.stringify([document, solution])).toBe(before);
				expect(JSON.parse(JSON.stringify(results))).toEqual(results);
				expect(structuredClone(results)).toEqual(results);
				for (const law of LAWS) expect(results.find(({ key }) => key === law)?.outcome).toBe('pass');
				const silent = checksOf({ ...document, checks: off }, solution);
				expect(new Set(silent.map(({ outcome }) => outcome))).toEqual(new Set(['not-applicable']));
			}),
			{ numRuns: 60 }
		);
	});

	it('name rows of the design only, and findings where they flag and nowhere else', { timeout: 60_000 }, () => {
		fc.assert(
			fc.property(anyDesignOfStreams, (document) => {
				fc.pre(isWithinRange(document));
				const tags = new Set<string | null>([null, ...document.rows.map(({ tag }) => tag)]);
				for (const { outcome, findings, answered, reason } of checksOf(document, solutionOf(document))) {
					expect([outcome === 'flag', outcome === 'not-applicable']).toEqual([findings.length > 0, reason !== null]);
					expect(answered).toEqual([]);
					for (const { row, value = 0 } of findings)
						expect([tags.has(row), Number.isFinite(value)]).toEqual([true, true]);
				}
			}),
			{ numRuns: 60 }
		);
	});

	it('depend on frozen input as on any other', () => {
		const frozen = deepFreeze(structuredClone(SOUND));
		const solution = deepFreeze(solutionOf(frozen));
		expect(checksOf(frozen, solution)).toEqual(checksOf(SOUND, solutionOf(SOUND)));
	});

	it('are those of the stored figures of engine 1.0.0 too, which had neither balance of mass nor leakage', () => {
		const { massBalance: _balance, leakage: _leakage, ...stored } = solutionOf(SOUND);
		const outcomes = new Map(checksOf(SOUND, stored).map(({ key, outcome }) => [key, outcome]));
		expect(outcomes.get('flows-close')).toBe('not-applicable');
		expect(outcomes.get('leakage-share')).toBe('not-applicable');
	});
});

describe('the time of the checks', () => {
	it('is printed for 10,000 rows', { timeout: 30_000 }, () => {
		const branch = SOUND.rows[1] as DesignRow;
		const rows = Array.from({ length: 10_000 }, (_, at): DesignRow => {
			const { outlet, junction, ...inner } = branch;
			const ends = at % 10 === 9;
			return {
				...inner,
				tag: `R${at}`,
				...(at % 10 === 0 ? { joins: null } : { joins: `R${at - 1}`, ...(junction && { junction }) }),
				fittings: [...(inner.fittings ?? []), part({ kind: 'round-elbow-smooth', radiusRatio: 1 })],
				...(ends && outlet && { outlet })
			};
		});
		const overrides = rows.map(({ tag }) => ({
			...{ check: 'fittings-apart', row: tag, reason: 'measured', by: 'A', at: '2026-12-01' }
		}));
		const document: DesignDocument = { ...SOUND, rows, overrides };
		const solution = solutionOf(document);
		const times = [0, 1, 2, 3, 4].map(() => {
			const begun = performance.now();
			expect(checksOf(document, solution)).toHaveLength(checkList.length);
			return performance.now() - begun;
		});
		process.stdout.write(`checks of 10,000 rows: ${times.map((one) => one.toFixed(0)).join(', ')} ms\n`);
	});
});

function deepFreeze<T>(value: T): T {
	if (typeof value === 'object' && value !== null) {
		Object.values(value).forEach(deepFreeze);
		Object.freeze(value);
	}
	return value;
}
