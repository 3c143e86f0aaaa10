import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyDesign, solutionOf } from '../../../../tests/engine/any-design';
import type { DesignDocument, DesignRow, Solution } from '../document/types';
import { solveDesign } from './solve';

/** Sums of the same figures may round differently. */
const near = (a: number, b: number, scale = 1) =>
	expect(Math.abs(a - b)).toBeLessThanOrEqual(1e-12 * Math.max(1, Math.abs(a), Math.abs(b)) * scale);

function law(name: string, holds: (document: DesignDocument, solution: Solution) => void): void {
	it(name, () => fc.assert(fc.property(anyDesign, (document) => holds(document, solutionOf(document)))));
}

function allNumbers(value: unknown): number[] {
	if (typeof value === 'number') return [value];
	return typeof value === 'object' && value !== null ? Object.values(value).flatMap(allNumbers) : [];
}

describe('any design, solved', () => {
	law('keeps the mass balance at each node and at the fan', ({ rows }, solution) => {
		const flowInto = (tag: string | null) =>
			rows.filter((row) => row.joins === tag).reduce((sum, row) => sum + (solution.rows[row.tag]?.flow ?? NaN), 0);
		for (const row of rows)
			near(solution.rows[row.tag]?.flow ?? NaN, row.outlet === undefined ? flowInto(row.tag) : row.outlet.flow);
		near(solution.totals.supplyFlow + solution.totals.returnFlow, flowInto(null), 10);
		expect(solution.fan.flow).toBe(Math.max(solution.totals.supplyFlow, solution.totals.returnFlow));
	});

	law('has rows that lose what their items lose, and their parts', (_document, solution) => {
		for (const row of Object.values(solution.rows)) {
			const scale = row.items.reduce((sum, item) => sum + Math.abs(item.loss), 1);
			near(
				row.items.reduce((sum, item) => sum + item.loss, 0),
				row.loss,
				scale
			);
			const parts = row.frictionLoss + row.flexibleLoss + row.fittingLoss + row.junctionLoss;
			near(parts + row.equipmentLoss + row.outletLoss - row.thermalGravity, row.loss, scale);
			near(row.frictionRate * row.hydraulicDiameter, row.frictionFactor * row.velocityPressure);
			near(row.flow, row.velocity * row.area);
		}
	});

	law('has paths that lose what their rows lose, from the fan to an outlet', ({ rows }, solution) => {
		expect(solution.paths.map((path) => path.outlet)).toEqual(
			rows.filter((row) => row.outlet !== undefined).map((row) => row.tag)
		);
		const joins = new Map(rows.map((row) => [row.tag, row.joins]));
		for (const path of solution.paths) {
			const losses = path.rows.map((tag) => solution.rows[tag]?.loss ?? NaN);
			near(
				path.loss,
				losses.reduce((sum, loss) => sum + loss, 0),
				losses.reduce((sum, loss) => sum + Math.abs(loss), 1)
			);
			expect(path.rows.at(-1)).toBe(path.outlet);
			expect(path.rows.map((tag) => joins.get(tag))).toEqual([null, ...path.rows.slice(0, -1)]);
		}
	});

	law('has nothing to spare on the index path of each side, and nowhere less than nothing', (_document, solution) => {
		for (const path of solution.paths) {
			expect(path.spare).toBeGreaterThanOrEqual(0);
			if (path.outlet === solution.index.supply || path.outlet === solution.index.return) expect(path.spare).toBe(0);
		}
		for (const half of ['supply', 'return'] as const) {
			const paths = solution.paths.filter((path) => (path.side === 'supply') === (half === 'supply'));
			const asks = paths.map((path) => path.loss + (half === 'supply' ? path.roomPressure : -path.roomPressure));
			const most = paths.length === 0 ? 0 : Math.max(...asks);
			// Of several that ask as much, any may be the index.
			const governing = paths.filter((_path, i) => asks[i] === most).map((path) => path.outlet);
			expect(paths.length === 0 ? [null] : governing).toContain(solution.index[half]);
			expect(half === 'supply' ? solution.fan.supplyPressure : solution.fan.returnPressure).toBe(most);
			paths.forEach((path, i) => near(path.spare, most - (asks[i] ?? NaN)));
		}
		near(solution.fan.totalPressure, solution.fan.supplyPressure + solution.fan.returnPressure);
	});

	law('gives each row the least spare of the paths through it', (_document, solution) => {
		for (const [tag, row] of Object.entries(solution.rows)) {
			const spares = solution.paths.filter((path) => path.rows.includes(tag)).map((path) => path.spare);
			expect(row.spare).toBe(Math.min(...spares));
		}
	});

	law('has a pressure line that meets the rooms with what each path has to spare', ({ rows }, solution) => {
		for (const row of rows) {
			const solved = solution.rows[row.tag];
			if (solved === undefined) throw new Error(row.tag);
			const sign = row.side === 'supply' ? 1 : -1;
			const [fanEnd, farEnd] = solved.totalPressure;
			const scale = 10 + Math.abs(fanEnd) + Math.abs(farEnd);
			near(sign * (fanEnd - farEnd), solved.loss, scale);
			const duty = row.side === 'supply' ? solution.fan.supplyPressure : -solution.fan.returnPressure;
			near(fanEnd, row.joins === null ? duty : (solution.rows[row.joins]?.totalPressure[1] ?? NaN), scale);
			near(solved.staticPressure[0], fanEnd - solved.velocityPressure);
			near(solved.staticPressure[1], farEnd - solved.velocityPressure);
			const path = solution.paths.find((one) => one.outlet === row.tag);
			if (path !== undefined) near(sign * (farEnd - path.roomPressure), path.spare, scale * 10);
		}
	});

	it('does not depend on the order of the rows, to the last bit', () => {
		const shuffled = anyDesign.chain((document) =>
			fc
				.shuffledSubarray([...document.rows], { minLength: document.rows.length })
				.map((rows) => [document, { ...document, rows }] as const)
		);
		fc.assert(
			fc.property(shuffled, ([document, other]) => {
				const one = solutionOf(document);
				const two = solutionOf(other);
				const sorted = (paths: Solution['paths']) => [...paths].sort((a, b) => (a.outlet < b.outlet ? -1 : 1));
				expect(two.rows).toEqual(one.rows);
				expect(sorted(two.paths)).toEqual(sorted(one.paths));
				expect([two.fan, two.index, two.totals]).toEqual([one.fan, one.index, one.totals]);
				expect(two.flags).toHaveLength(one.flags.length);
			})
		);
	});

	it('keeps its friction factors, and has twice the flow and four times the loss, at half the viscosity times flow', () => {
		// Similarity: with velocity and viscosity doubled the Reynolds number stays, and all losses grow with the square.
		fc.assert(
			fc.property(anyDesign, (document) => {
				const at = (times: number): DesignDocument => ({
					...document,
					air: { density: 1.2, viscosity: 1.8e-5 * times },
					surroundings: { density: 1.2 },
					rows: document.rows.map((row): DesignRow => {
						const { outlet, equipment: _equipment, ...rest } = row;
						return outlet === undefined ? rest : { ...rest, outlet: { flow: outlet.flow * times } };
					})
				});
				const one = solutionOf(at(1));
				const two = solutionOf(at(2));
				for (const [tag, row] of Object.entries(one.rows)) {
					expect(two.rows[tag]?.frictionFactor).toBeCloseTo(row.frictionFactor, 12);
					near(two.rows[tag]?.loss ?? NaN, 4 * row.loss, 1_000 + 4 * Math.abs(row.loss));
				}
				expect(two.index).toEqual(one.index);
			})
		);
	});

	law('is plain data: finite numbers, no -0, equal after JSON and structuredClone', (_document, solution) => {
		expect(JSON.parse(JSON.stringify(solution))).toStrictEqual(solution);
		expect(structuredClone(solution)).toStrictEqual(solution);
		for (const number of allNumbers(solution)) {
			expect(Number.isFinite(number)).toBe(true);
			expect(Object.is(number, -0)).toBe(false);
		}
	});

	law('leaves the document as it was, and comes out the same again', (document, solution) => {
		const before = structuredClone(document);
		expect(solutionOf(document)).toStrictEqual(solution);
		expect(document).toEqual(before);
	});
});

describe('rows that are no trees', () => {
	it('are problems of the solve too, not an exception', () => {
		const row = {
			tag: 'A',
			joins: 'B',
			side: 'supply',
			size: { shape: 'round', diameter: 0.2 },
			length: 1,
			outlet: { flow: 1 }
		} as const;
		const result = solveDesign({ format: 'evendraft/design@1', air: { density: 1.2 }, rows: [row] });
		expect(result.ok ? [] : result.problems.map((one) => [one.code, one.row])).toEqual([['joins-unknown', 'A']]);
	});
});

describe('a formula asked outside its range', () => {
	const row = {
		tag: 'A',
		joins: null,
		side: 'supply',
		size: { shape: 'round', diameter: 0.001 },
		roughness: 0.1,
		length: 1,
		outlet: { flow: 1 }
	} as const;

	it('is a problem beside its row', () => {
		const result = solveDesign({ format: 'evendraft/design@1', air: { density: 1.2 }, rows: [row] });
		expect(result.ok ? [] : result.problems.map((one) => [one.code, one.path, one.row])).toEqual([
			['outside-formula', 'rows[0]', 'A']
		]);
	});

	it('is a problem of the air when the air is so', () => {
		const result = solveDesign({ format: 'evendraft/design@1', air: { temperature: 900 }, rows: [row] });
		expect(result.ok ? [] : result.problems.map((one) => [one.code, one.path])).toEqual([['outside-formula', 'air']]);
	});
});

describe('tags with a meaning of their own in JavaScript', () => {
	it.each(['__proto__', 'constructor', '0', 'toString'])('%s is a tag like any other', (tag) => {
		const row = { side: 'supply', size: { shape: 'round', diameter: 0.2 }, length: 1 };
		const solution = solutionOf({
			format: 'evendraft/design@1',
			air: { density: 1.2 },
			rows: [
				{ ...row, tag, joins: null },
				{ ...row, tag: 'end', joins: tag, outlet: { flow: 0.1 } }
			]
		});
		expect(Object.keys(solution.rows).sort()).toEqual([tag, 'end'].sort());
		expect(solution.paths[0]?.rows).toEqual([tag, 'end']);
		expect(JSON.parse(JSON.stringify(solution))).toEqual(solution);
	});
});
