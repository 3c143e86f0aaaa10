import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyDesign, solutionOf } from '../../../../tests/engine/any-design';
import {
	both,
	design,
	exhaust,
	filter,
	outdoor,
	row,
	same,
	SOUND,
	type Patch
} from '../../../../tests/engine/tiny-design';
import type { DesignDocument } from '../document/types';
import { marginLedger } from '.';

type Margin = NonNullable<DesignDocument['margins']>[number];
const flow = (name: string, fraction: number): Margin => ({ name, of: 'flow', fraction });
const pressure = (name: string, fraction: number): Margin => ({ name, of: 'pressure', fraction });

function ledgerOf(margins: readonly Margin[], patch: Patch = same) {
	const document = both(patch, design({ margins }))(SOUND);
	const solution = solutionOf(document);
	return { ledger: marginLedger(document, solution), solution };
}

describe('the margin ledger', () => {
	it('is the duty itself without a margin', () => {
		const { ledger, solution } = ledgerOf([]);
		expect(ledger).toMatchObject({ lines: [], repeated: [], hidden: [], product: 1, basis: 'fan total pressure' });
		expect(ledger.selectionFlow).toBe(solution.fan.flow);
		expect(ledger.selectionPressure).toBe(solution.fan.totalPressure);
		expect(ledger.selectionStaticPressure).toBeCloseTo(solution.fan.staticPressure ?? NaN, 9);
	});

	// A duct without rooms at pressure: 1200 L/s at 148.0 Pa, 2 % on flow and 10 % on pressure once: 1224 L/s, 169 Pa.
	it('has 148 Pa with 2 % on flow and 10 % on pressure come to about 169 Pa', () => {
		const document: DesignDocument = {
			...{ format: 'evendraft/design@1', air: { density: 1.2 } },
			margins: [flow('Leakage', 0.02), pressure('Fan', 0.1)],
			rows: [
				{
					...{ tag: 'A', joins: null, side: 'supply', size: { shape: 'round', diameter: 0.5 }, length: 0 },
					outlet: { flow: 1.2, loss: 148 }
				}
			]
		};
		const ledger = marginLedger(document, solutionOf(document));
		expect(ledger.dutyPressure).toBeCloseTo(148, 9);
		expect(ledger.selectionFlow).toBeCloseTo(1.224, 12);
		expect(ledger.selectionPressure).toBeCloseTo(148 * 1.02 * 1.02 * 1.1, 9);
		expect(Math.round(ledger.selectionPressure)).toBe(169);
	});

	it('tells the product of all: 5, 10, 10 and 15 % stacked come to 1.46', () => {
		const { ledger } = ledgerOf([
			flow('Flow', 0.05),
			pressure('Losses', 0.1),
			pressure('Unknown', 0.1),
			pressure('Fan', 0.15)
		]);
		expect(ledger.product).toBeCloseTo(1.46, 2);
		expect(ledger.flowFactor).toBe(1.05);
		expect(ledger.pressureFactor).toBeCloseTo(1.1 * 1.1 * 1.15, 12);
		expect(ledger.hidden.map(({ message }) => message)).toEqual([
			'Margins on pressure are stacked, and multiply: “Losses”, “Unknown”, “Fan”.'
		]);
	});

	it('multiplies before it adds, whatever the order', () => {
		const filterChange: Margin = { name: 'Filter change', of: 'pressure', pressure: 40 };
		const { ledger, solution } = ledgerOf([filterChange, pressure('Fan', 0.1)]);
		expect(ledger.selectionPressure).toBeCloseTo(solution.fan.totalPressure * 1.1 + 40, 9);
		expect(ledger.lines[0]).toEqual({
			...{ name: 'Filter change', of: 'pressure', factor: 1, pressure: 40 },
			...{ basis: 'fan total pressure', reason: null }
		});
	});

	it('leaves pressures of rooms and thermal gravity as they are when the flow grows', () => {
		const patch = row('B', { outlet: { flow: 0.15, loss: 100, lossIs: 'total', pressure: 80 } });
		const { ledger, solution } = ledgerOf([flow('Flow', 0.1)], patch);
		const losses = solution.fan.totalPressure - 80;
		expect(ledger.selectionPressure).toBeCloseTo(80 + losses * 1.1 * 1.1, 9);
	});

	it('takes the velocity pressure of the greater flow off for the static pressure', () => {
		const { ledger, solution } = ledgerOf([flow('Flow', 0.1)]);
		const atOutlet = solution.fan.totalPressure - (solution.fan.staticPressure ?? NaN);
		expect(ledger.selectionStaticPressure).toBeCloseTo(ledger.selectionPressure - atOutlet * 1.21, 9);
		expect(ledgerOf([], exhaust).ledger.selectionStaticPressure).toBeNull();
	});

	it('names what stands twice, on flow and on pressure alike', () => {
		const { ledger } = ledgerOf([flow('Safety', 0.05), { name: ' safety', of: 'pressure', pressure: 10 }]);
		expect(ledger.repeated).toEqual([' safety']);
	});

	it.each<[string, Margin, Patch, RegExp]>([
		['leakage beside a class', flow('For leakage', 0.02), same, /leakage is counted by class/],
		['a filter beside one counted dirty', pressure('Dirty filter', 0.1), filter('dirty'), /filter is counted dirty/],
		[
			'a system effect beside one entered',
			pressure('System effect', 0.1),
			row('A', { fittings: [{ kind: 'fan-outlet-effect', coefficient: 0.4 }] }),
			/system effect is entered/
		],
		['flexible duct', pressure('Flexible duct', 0.1), row('B', { flexible: { length: 1 } }), /as installed/]
	])('finds %s', (_what, margin, patch, told) => {
		const { ledger } = ledgerOf([margin], patch);
		expect(ledger.hidden.map(({ message }) => message)).toEqual([expect.stringMatching(told)]);
	});

	it('finds an allowance among the losses, at its row', () => {
		const patch = row('B', { fittings: [{ kind: 'fixed', coefficient: 0.3, name: 'Allowance for offsets' }] });
		expect(ledgerOf([], patch).ledger.hidden).toEqual([
			{
				row: 'B',
				message: '“Allowance for offsets” is an allowance among the losses: it belongs in the margin ledger.'
			}
		]);
	});

	it('does not find a clean filter, a design without leakage, or one margin alone', () => {
		const bare: Patch = (document) => {
			const { leakage: _leakage, ...rest } = document;
			return rest;
		};
		expect(ledgerOf([pressure('Dirty filter', 0.1)], filter('clean')).ledger.hidden).toEqual([]);
		expect(ledgerOf([flow('Leakage', 0.02)], bare).ledger.hidden).toEqual([]);
		expect(ledgerOf([pressure('Fan', 0.1), flow('Flow', 0.05)], outdoor()).ledger.hidden).toEqual([]);
	});
});

describe('the margin ledger of any design', () => {
	const anyMargin = fc.record(
		{
			name: fc.string({ minLength: 1, maxLength: 12 }),
			of: fc.constantFrom('flow' as const, 'pressure' as const),
			fraction: fc.double({ min: -0.2, max: 0.5, noNaN: true }).map((value) => value + 0),
			pressure: fc.integer({ min: -50, max: 100 })
		},
		{ requiredKeys: ['name', 'of'] }
	);

	it('closes: the duty with what each line adds is the selection', () => {
		fc.assert(
			fc.property(anyDesign, fc.array(anyMargin, { maxLength: 6 }), (document, margins) => {
				const { lines, dutyPressure, selectionPressure } = marginLedger({ ...document, margins }, solutionOf(document));
				const sum = lines.reduce((all, line) => all + line.pressure, dutyPressure);
				expect(Math.abs(sum - selectionPressure)).toBeLessThan(1e-9 * Math.max(1, Math.abs(selectionPressure)) * 10);
			}),
			{ numRuns: 100 }
		);
	});

	it('takes flow margins by the law that the network itself obeys where all losses go with the square', () => {
		const at = (factor: number): DesignDocument => ({
			...{ format: 'evendraft/design@1', air: { density: 1.2 } },
			rows: SOUND.rows.map((one) => ({
				...one,
				length: 0,
				fittings: [{ kind: 'fixed', coefficient: 0.7 }],
				equipment: [{ name: 'Coil', loss: 30, atFlow: 0.6 }],
				...(one.joins !== null && { junction: { kind: 'fixed', coefficient: 0.4 } }),
				...(one.outlet && { outlet: { flow: one.outlet.flow * factor } })
			}))
		});
		const { selectionPressure } = marginLedger({ ...at(1), margins: [flow('Flow', 0.2)] }, solutionOf(at(1)));
		expect(selectionPressure / solutionOf(at(1.2)).fan.totalPressure).toBeCloseTo(1, 12);
	});
});
