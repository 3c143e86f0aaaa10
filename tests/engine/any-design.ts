import fc from 'fast-check';
import {
	solveDesign,
	validateDocument,
	type DesignDocument,
	type DesignRow,
	type Fitting,
	type Solution
} from '$lib/engine';

/** A design for the tests of laws: any tree of rows on both sides of a fan, within what a building has. */
export const anyDesign: fc.Arbitrary<DesignDocument> = fc
	.record({
		supply: fc.array(anySeed(), { minLength: 1, maxLength: 25 }),
		other: fc.array(anySeed(), { maxLength: 12 }),
		temperature: between(-10, 45),
		surroundings: between(-20, 40)
	})
	.map(({ supply, other, temperature, surroundings }) => ({
		format: 'evendraft/design@1',
		air: { temperature },
		surroundings: { temperature: surroundings },
		rows: [...treeOf('S', supply, ['supply']), ...treeOf('R', other, ['return', 'exhaust', 'outdoor'])]
	}));

interface Seed {
	readonly parent: number;
	readonly row: Omit<DesignRow, 'tag' | 'joins' | 'side'>;
	readonly outlet: NonNullable<DesignRow['outlet']>;
}

/** Never -0, which no document holds. */
function between(min: number, max: number): fc.Arbitrary<number> {
	return fc.double({ min, max, noNaN: true }).map((value) => value + 0);
}

function anySeed(): fc.Arbitrary<Seed> {
	const side = between(0.1, 1.2);
	const size = fc.oneof(
		fc.record({ shape: fc.constant('round' as const), diameter: side }),
		fc.record({ shape: fc.constantFrom('rectangular' as const, 'oval' as const), width: side, height: side })
	);
	const fitting: fc.Arbitrary<Fitting> = fc.oneof(
		fc.record({ kind: fc.constant('fixed'), coefficient: between(-0.2, 2), count: fc.integer({ min: 1, max: 4 }) }),
		fc.constant({ kind: 'round-elbow-smooth' })
	);
	const row = fc.record(
		{
			size,
			length: between(0, 30),
			rise: between(-10, 10),
			junction: fc.record({ kind: fc.constant('fixed'), coefficient: between(-0.3, 1.5) }),
			flexible: fc.record({ length: between(0, 3) }),
			fittings: fc.array(fitting, { maxLength: 3 }),
			equipment: fc.array(
				fc.record({
					name: fc.string({ maxLength: 8 }),
					loss: between(0, 80),
					atFlow: between(0.05, 2),
					exponent: fc.constantFrom(1, 1.7, 2)
				}),
				{ maxLength: 2 }
			)
		},
		{ requiredKeys: ['size', 'length'] }
	);
	const outlet = fc.record(
		{
			flow: between(0.01, 1),
			loss: between(0, 60),
			lossIs: fc.constantFrom('total' as const, 'static' as const),
			pressure: between(-20, 20)
		},
		{ requiredKeys: ['flow'] }
	);
	return fc.record({ parent: fc.nat(1_000), row, outlet });
}

/** Each row joins an earlier one, or the fan; rows that nothing joins have the outlet. */
function treeOf(letter: string, seeds: readonly Seed[], sides: readonly DesignRow['side'][]): DesignRow[] {
	const parents = seeds.map((seed, i) => (i === 0 ? -1 : (seed.parent % (i + 1)) - 1));
	return seeds.map((seed, i) => {
		const parent = parents[i] ?? -1;
		const ends = !parents.includes(i);
		return {
			...seed.row,
			tag: `${letter}${i}`,
			joins: parent < 0 ? null : `${letter}${parent}`,
			side: sides[i % sides.length] ?? 'supply',
			...(ends ? { outlet: seed.outlet } : {})
		};
	});
}

/** Whether every formula of a design is asked within its range: leakage is not at ten thousand pascal. */
export function isWithinRange(document: DesignDocument): boolean {
	return solveDesign(document).ok;
}

/** The solution of a document that must be sound. */
export function solutionOf(document: unknown): Solution {
	const validated = validateDocument(document);
	if (!validated.ok) throw new Error(JSON.stringify(validated.problems));
	const solved = solveDesign(validated.document);
	if (!solved.ok) throw new Error(JSON.stringify(solved.problems));
	return solved.solution;
}

const JUNCTIONS = ['tee', 'wye', 'shoe-take-off', 'conical-take-off', 'cross', 'plenum'] as const;

/** As `anyDesign`, with junctions of the catalogue, rows at temperatures of their own, and flows of standard air. */
export const anyDesignOfStreams: fc.Arbitrary<DesignDocument> = fc
	.record({
		design: anyDesign,
		kinds: fc.array(fc.option(fc.constantFrom(...JUNCTIONS), { nil: null }), { minLength: 40, maxLength: 40 }),
		temperatures: fc.array(fc.option(between(-10, 60), { nil: null, freq: 4 }), { minLength: 40, maxLength: 40 }),
		standard: fc.boolean(),
		leakage: fc.option(fc.constantFrom({ class: 'A' }, { class: 'C' }, { class: 'ATC1' }, { cl: 24 }), { nil: null }),
		lining: fc.array(fc.boolean(), { minLength: 40, maxLength: 40 })
	})
	.map(({ design, kinds, temperatures, standard, leakage, lining }) => {
		const straight = new Set<string>();
		const rows = design.rows.map((row, at): DesignRow => {
			const [kind, temperature] = [kinds[at] ?? null, temperatures[at] ?? null];
			const lined = lining[at] ? ({ thickness: 0.025, sizeIs: at % 3 === 0 ? 'clear' : 'metal' } as const) : undefined;
			const warm = {
				...row,
				...(temperature !== null && { temperature }),
				...(lined && { lining: lined }),
				...(row.flexible && at % 2 === 0 && { flexible: { length: row.flexible.length, compression: 0.1 } })
			};
			if (kind === null || row.joins === null) return warm;
			const leg = at % 2 === 0 && !straight.has(row.joins) ? 'straight' : 'branch';
			if (leg === 'straight') straight.add(row.joins);
			return { ...warm, junction: { kind, leg } };
		});
		return {
			...design,
			...(standard && { flowBasis: 'standard' as const }),
			...(leakage && { leakage: { ...leakage, testPressure: 400 } }),
			rows
		};
	});
