import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { Solution } from '..';
import { solutionOf } from '../../../../tests/engine/any-design';

interface Figure {
	readonly of: readonly (string | number)[];
	readonly printed: number;
	readonly unit: string;
	readonly si_per_unit: number;
	readonly tolerance: { readonly relative?: number; readonly absolute?: number };
}

const folder = new URL('../../../../fixtures/networks/', import.meta.url);
const files = readdirSync(folder).filter((file) => file.endsWith('.json'));

function valueAt(solution: Solution, path: Figure['of']): unknown {
	return path.reduce<unknown>((value, step) => (value as Record<string | number, unknown>)[step], solution);
}

describe('worked systems', () => {
	it('are all there', () => expect(files.length).toBeGreaterThanOrEqual(14));
});

for (const file of files) {
	const fixture: { id?: string; source: string; published: Figure[] } = JSON.parse(
		readFileSync(new URL(file, folder), 'utf8')
	);
	describe(`${fixture.id ?? file}: ${fixture.source}`, () => {
		const solution = solutionOf(fixture);
		it.each(fixture.published)('gives $printed $unit for $of', (figure) => {
			const value = Number(valueAt(solution, figure.of)) / figure.si_per_unit;
			const { relative = 0, absolute = 0 } = figure.tolerance;
			const allowed = Math.max(absolute, relative * Math.abs(figure.printed));
			expect(allowed).toBeGreaterThan(0);
			expect(Math.abs(value - figure.printed)).toBeLessThanOrEqual(allowed);
		});
	});
}
