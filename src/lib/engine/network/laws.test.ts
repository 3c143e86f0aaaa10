import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyDesign, anyDesignOfStreams, isWithinRange, solutionOf } from '../../../../tests/engine/any-design';
import type { DesignDocument, DesignRow, Solution } from '../document/types';
import { catalogue } from '../fitting';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const near = (value: number, expected: number, scale: number, what: string) =>
	expect(Math.abs(value - expected), what).toBeLessThanOrEqual(1e-10 * (1 + Math.abs(scale)));
const scaleOf = (row: Solution['rows'][string]) => row.items.reduce((sum, { loss }) => sum + Math.abs(loss), 0);

/** Rows of coefficients alone, whose losses know neither the air nor the direction. */
function bareRows(document: DesignDocument): DesignRow[] {
	return document.rows.map(({ equipment: _equipment, temperature: _temperature, ...row }) => ({
		...row,
		...(row.junction && { junction: { kind: 'fixed', coefficient: row.junction.coefficient ?? 0.3 } }),
		...(row.outlet && { outlet: { flow: row.outlet.flow } })
	}));
}

describe('any design', { timeout: 60_000 }, () => {
	it('loses in proportion to the density, at one flow and one kinematic viscosity', () => {
		fc.assert(
			fc.property(anyDesignOfStreams, between(0.5, 2), (document, times) => {
				const { leakage: _leakage, flowBasis: _basis, ...rest } = document;
				const at = (k: number) =>
					solutionOf({
						...rest,
						air: { density: 1.2 * k, viscosity: 1.8e-5 * k },
						surroundings: { density: 1.1 * k },
						// Catalogue junctions stay: their coefficients know flows and areas alone.
						rows: document.rows.map(({ equipment: _equipment, temperature: _temperature, ...row }) => ({
							...row,
							...(row.outlet && { outlet: { flow: row.outlet.flow } })
						}))
					});
				const [one, other] = [at(1), at(times)];
				for (const [tag, row] of Object.entries(one.rows)) {
					near(other.rows[tag]?.loss ?? NaN, row.loss * times, scaleOf(row), tag);
					expect(other.rows[tag]?.flow).toBe(row.flow);
				}
				near(other.fan.totalPressure, one.fan.totalPressure * times, 1e3, 'fan');
			}),
			{ numRuns: 60 }
		);
	});

	it('has the same losses and mirrored pressures with the air turned round, for coefficients that stay', () => {
		fc.assert(
			fc.property(anyDesign, (document) => {
				const turn = { supply: 'return', return: 'supply', exhaust: 'supply', outdoor: 'supply' } as const;
				const rows = bareRows(document).filter(({ side }) => side === 'supply');
				// A rise in the direction of flow stays one.
				const turned = rows.map((row) => ({ ...row, side: turn[row.side], rise: -(row.rise ?? 0) }));
				const [supply, back] = [solutionOf({ ...document, rows }), solutionOf({ ...document, rows: turned })];
				for (const [tag, row] of Object.entries(supply.rows)) {
					const mirrored = back.rows[tag];
					near(mirrored?.loss ?? NaN, row.loss, scaleOf(row), tag);
					row.totalPressure.forEach((pressure, end) =>
						near(mirrored?.totalPressure[end] ?? NaN, -pressure, 1e3 + Math.abs(pressure), tag)
					);
				}
				near(back.fan.totalPressure, supply.fan.totalPressure, 1e3, 'fan');
				expect(back.index.return).toBe(supply.index.supply);
			}),
			{ numRuns: 60 }
		);
	});

	it('has junctions whose loss is their coefficient on the velocity pressure of the common leg, at the node', () => {
		fc.assert(
			fc.property(anyDesignOfStreams, (document) => {
				fc.pre(isWithinRange(document));
				const { rows } = solutionOf(document);
				for (const { tag, joins, junction } of document.rows) {
					const [own, common] = [rows[tag], rows[joins ?? '']];
					const item = own?.items.find(({ part }) => part === 'junction');
					if (!own || !common || !item?.reference || !junction) continue;
					const { coefficient, velocityPressure, flowRatio, areaRatio } = item.reference;
					const farFlow = common.flowEnds?.[1] ?? common.flow;
					near(velocityPressure, (common.density / 2) * (farFlow / common.area) ** 2, velocityPressure, tag);
					near(item.loss, coefficient * velocityPressure, item.loss, tag);
					near((item.coefficient ?? NaN) * own.velocityPressure, item.loss, item.loss, tag);
					near(flowRatio, ((own.flowEnds?.[0] ?? own.flow) * own.density) / (farFlow * common.density), 1, tag);
					near(areaRatio, own.area / common.area, areaRatio, tag);
				}
			}),
			{ numRuns: 60 }
		);
	});
});

/** One node: a straight leg and a branch on a common leg of Ø500, round, no duct but the junction. */
function nodeOf(kind: string, more: object, side: 'supply' | 'exhaust', q: number, a: number, s: number) {
	const size = (ratio: number) => ({ shape: 'round', diameter: 0.5 * Math.sqrt(ratio) }) as const;
	const leg = (name: 'straight' | 'branch') => ({ kind, leg: name, ...more });
	const base = { side, length: 0 };
	const { rows, flags } = solutionOf({
		format: 'evendraft/design@1',
		air: { density: 1.2 },
		rows: [
			{ ...base, tag: 'M', joins: null, size: size(1) },
			{ ...base, tag: 'B', joins: 'M', size: size(a), junction: leg('branch'), outlet: { flow: q, loss: 0 } },
			{ ...base, tag: 'S', joins: 'M', size: size(s), junction: leg('straight'), outlet: { flow: 1 - q, loss: 0 } }
		]
	});
	const [pv, branch, straight] = [rows.M?.velocityPressure, rows.B?.junctionLoss, rows.S?.junctionLoss];
	return {
		weighted: (q * (branch ?? NaN) + (1 - q) * (straight ?? NaN)) / (pv ?? NaN),
		isNoted: flags.some(({ rule }) => rule === 'coefficient-range')
	};
}

describe('both streams of a junction in a network, weighted by their flows', { timeout: 60_000 }, () => {
	const junctions = catalogue.filter(({ place }) => place === 'junction');
	const sides = ['supply', 'exhaust'] as const;
	const places = fc.tuple(between(0.02, 0.98), between(0.1, 1), between(0.3, 1));

	it.each(junctions.flatMap(({ key }) => sides.map((side) => [key, side] as const)))(
		'make no energy by the standard method: %s, %s',
		(kind, side) => {
			fc.assert(
				fc.property(places, ([q, a, s]) => {
					expect(nodeOf(kind, {}, side, q, a, s).weighted).toBeGreaterThanOrEqual(0);
				}),
				{ numRuns: 60 }
			);
		}
	);

	// Formulas of other authors do, a little: recorded here. By Idelchik's printed equation for uniting streams up to
	// 0.054 of the common velocity pressure inside its range, beyond it more, which its note then tells.
	it.each(
		junctions.flatMap(({ key, rivals = [] }) =>
			rivals.flatMap(({ key: method }) => sides.map((side) => [key, side, method] as const))
		)
	)('make hardly any by others, or are noted: %s, %s, %s', (kind, side, method) => {
		fc.assert(
			fc.property(places, ([q, a, s]) => {
				const { weighted, isNoted } = nodeOf(kind, { method }, side, q, a, s);
				expect(weighted).toBeGreaterThanOrEqual(isNoted ? -1 : -0.06);
			}),
			{ numRuns: 60 }
		);
	});
});
