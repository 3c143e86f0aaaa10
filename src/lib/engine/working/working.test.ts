import { readdirSync, readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyDesign, anyDesignOfStreams, isWithinRange, solutionOf } from '../../../../tests/engine/any-design';
import type { DesignDocument, Solution } from '../document/types';
import { formulaOf, ROW_FIGURES, workingOf, type FigureName, type Working } from '.';

const folder = new URL('../../../../fixtures/networks/', import.meta.url);
const worked = readdirSync(folder)
	.filter((file) => file.endsWith('.json'))
	.map((file) => [file, JSON.parse(readFileSync(new URL(file, folder), 'utf8')) as { document?: unknown }] as const);

/** Works each step again from its inputs, and follows each input to the step that gave it. */
function replay({ steps, value }: Working): void {
	steps.forEach((step, place) => {
		const inputs = Object.fromEntries(step.inputs.map((input) => [input.symbol, input.value]));
		expect(formulaOf(step.formula).compute(inputs), step.result.name).toBe(step.result.value);
		for (const input of step.inputs) {
			if (input.from !== 'step') continue;
			expect(input.step).toBeLessThan(place);
			expect(steps[input.step ?? -1]?.result.value).toBe(input.value);
		}
		expect(step.source.length).toBeGreaterThan(4);
		expect(step.expression.length).toBeGreaterThan(2);
	});
	expect(steps.at(-1)?.result.value).toBe(value);
}

function figuresOf(solution: Solution): readonly (readonly [FigureName, number])[] {
	const rows = Object.entries(solution.rows).flatMap(([row, solved]) =>
		ROW_FIGURES.map((figure) => [{ row, figure }, solved[figure]] as const)
	);
	const paths = solution.paths.flatMap(({ outlet: path, loss, spare }) => [
		[{ path, figure: 'loss' }, loss] as const,
		[{ path, figure: 'spare' }, spare] as const
	]);
	const fan = (['totalPressure', 'supplyPressure', 'returnPressure'] as const).map(
		(one) => [{ fan: one }, solution.fan[one]] as const
	);
	return [...rows, ...paths, ...fan];
}

/** Every figure of a design, worked anew, to the last bit. */
function check(document: DesignDocument): number {
	const solution = solutionOf(document);
	const figures = figuresOf(solution);
	for (const [name, value] of figures) {
		const working = workingOf(document, solution, name);
		expect(working?.value, JSON.stringify(name)).toBe(value);
		if (working) replay(working);
	}
	return figures.length;
}

describe('the working of a figure', () => {
	it.each(worked)('%s: leads to every figure of the solution', (_file, fixture) => {
		expect(check((fixture.document ?? fixture) as DesignDocument)).toBeGreaterThan(20);
	});

	it('leads to every figure of any design, to the last bit', { timeout: 60_000 }, () => {
		fc.assert(
			fc.property(fc.oneof(anyDesign, anyDesignOfStreams), (document) => {
				fc.pre(isWithinRange(document));
				check(document);
			}),
			{ numRuns: 30, endOnFailure: true }
		);
	});

	it('has no figure of a row or path that is not there', () => {
		const [, fixture] = worked[0] ?? [];
		const document = (fixture?.document ?? fixture) as DesignDocument;
		const solution = solutionOf(document);
		expect(workingOf(document, solution, { row: 'nowhere', figure: 'loss' })).toBeNull();
		expect(workingOf(document, solution, { path: 'nowhere', figure: 'loss' })).toBeNull();
	});
});
