import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyDesignOfStreams, isWithinRange, solutionOf } from '../../../../tests/engine/any-design';
import type { DesignDocument, DesignRow, Solution } from '../document/types';

const law = (check: (document: DesignDocument, solution: Solution) => void, numRuns = 100) =>
	fc.assert(
		fc.property(anyDesignOfStreams, (document) => {
			fc.pre(isWithinRange(document));
			check(document, solutionOf(document));
		}),
		{ numRuns }
	);
const massAt = (solution: Solution, tag: string, end: 0 | 1) => {
	const row = solution.rows[tag];
	return (row?.flowEnds?.[end] ?? row?.flow ?? NaN) * (row?.density ?? NaN);
};

describe('streams of their own air, with leakage', { timeout: 60_000 }, () => {
	it('conserve mass at each node and over each side, to 1e-12 of the fan’s', () => {
		law((document, solution) => {
			const fan = Math.max(solution.massBalance.supply.fan, solution.massBalance.return.fan);
			for (const { fan: through, outlets, leakage } of Object.values(solution.massBalance))
				expect(Math.abs(through - outlets - leakage)).toBeLessThanOrEqual(1e-12 * fan);
			for (const { tag } of document.rows) {
				const joining = document.rows.filter(({ joins }) => joins === tag);
				if (!joining.length) continue;
				const sum = joining.reduce((all, one) => all + massAt(solution, one.tag, 0), 0);
				expect(Math.abs(sum - massAt(solution, tag, 1))).toBeLessThanOrEqual(1e-12 * fan);
			}
		});
	});

	it('do not know the order of the rows, to the last bit', () => {
		law((document, solution) => {
			const turned = solutionOf({ ...document, rows: [...document.rows].reverse() });
			expect(turned.rows).toEqual(solution.rows);
			expect(turned.fan).toEqual(solution.fan);
			expect(turned.massBalance).toEqual(solution.massBalance);
		}, 60);
	});

	it('have accounts that agree wherever paths meet', () => {
		law((_document, solution) => {
			for (const { rows, outlet } of solution.paths)
				rows.forEach((tag, at) => {
					const next = solution.rows[rows[at + 1] ?? ''];
					if (next) expect(next.totalPressure[0], `${outlet} at ${tag}`).toBe(solution.rows[tag]?.totalPressure[1]);
				});
		}, 60);
	});

	it('leak what their static pressure makes them leak', () => {
		law((document, solution) => {
			if (!solution.leakage) return;
			const sum = Object.values(solution.rows).reduce((all, row) => all + (row.leakage ?? 0), 0);
			expect(sum).toBeCloseTo(solution.leakage.flow, 12);
			expect(solution.leakage.share).toBeCloseTo(solution.leakage.flow / solution.fan.flow, 12);
			expect(solution.flags.map(({ rule }) => rule)).not.toContain('leakage-not-settled');
			expect(document.leakage).toBeDefined();
		});
	});

	it('are as without leakage where the class lets nothing through', () => {
		law((document) => {
			const { leakage: _class, ...tight } = document;
			const rows = (solution: Solution) =>
				Object.entries(solution.rows).map(([tag, { leakage: _leak, flowEnds: _ends, ...row }]) => [tag, row]);
			const withClass = { ...tight, leakage: { cl: 0 } };
			fc.pre(isWithinRange(withClass));
			expect(rows(solutionOf(withClass))).toEqual(rows(solutionOf(tight)));
		}, 40);
	});

	it('change nothing by a row of no length that only goes on', () => {
		law((document, solution) => {
			const [first] = document.rows.filter(({ junction, joins }) => joins !== null && junction === undefined);
			if (!first) return;
			const link: DesignRow = { ...first, tag: 'link', length: 0, fittings: [], equipment: [], rise: 0 };
			const { outlet: _outlet, flexible: _flexible, ...bare } = link;
			const rows = [...document.rows.map((row) => (row === first ? { ...row, joins: 'link' } : row)), bare];
			// A node with a junction sees one leg more or less only where the row itself was its leg.
			if (
				document.rows.some(
					(row) => row.joins === first.joins && row !== first && row.junction?.kind !== 'fixed' && row.junction
				)
			)
				return;
			fc.pre(isWithinRange({ ...document, rows }));
			const again = solutionOf({ ...document, rows });
			expect(again.fan.totalPressure).toBeCloseTo(solution.fan.totalPressure, 8);
		}, 60);
	});
});

describe('a row of its own temperature', () => {
	const document = (more: Partial<DesignDocument> = {}): DesignDocument => ({
		format: 'evendraft/design@1',
		air: { temperature: 20 },
		rows: [
			{ tag: 'A', joins: null, side: 'supply', size: { shape: 'round', diameter: 0.4 }, length: 10, temperature: 35 },
			{
				tag: 'B',
				joins: 'A',
				side: 'supply',
				size: { shape: 'round', diameter: 0.3 },
				length: 5,
				outlet: { flow: 0.3 }
			},
			{
				...{
					tag: 'C',
					joins: 'A',
					side: 'supply',
					size: { shape: 'round', diameter: 0.3 },
					length: 5,
					temperature: 15
				},
				outlet: { flow: 0.3 }
			}
		],
		...more
	});

	it('carries the mass, not the volume, of the rows beyond it', () => {
		const { rows } = solutionOf(document());
		const [a, b, c] = [rows.A, rows.B, rows.C];
		expect(b?.temperature).toBe(35);
		expect(c?.temperature).toBe(15);
		expect(a?.massFlow).toBeCloseTo((b?.massFlow ?? 0) + (c?.massFlow ?? 0), 14);
		// Dry air: density goes as 1/T.
		expect(a?.flow).toBeCloseTo(0.3 + (0.3 * 308.15) / 288.15, 12);
	});

	it('moves the volume that standard flows take up', () => {
		const { rows } = solutionOf(document({ flowBasis: 'standard' }));
		expect(rows.B?.massFlow).toBeCloseTo(0.3 * 1.204, 14);
		expect(rows.B?.flow).toBeCloseTo((0.3 * 1.204) / (rows.B?.density ?? NaN), 14);
	});

	it('is asked for where streams unite to another temperature', () => {
		const exhaust = document();
		const rows = exhaust.rows.map((row): DesignRow => ({ ...row, side: 'exhaust' }));
		const flags = solutionOf({ ...exhaust, rows }).flags.filter(({ rule }) => rule === 'temperature-mix');
		expect(flags).toHaveLength(1);
		expect(flags[0]).toMatchObject({ row: 'A', threshold: 35 });
		expect(flags[0]?.value).toBeGreaterThan(24);
		expect(flags[0]?.value).toBeLessThan(26);
	});
});
