import { describe, expect, it } from 'vitest';
import fixture from '../../../fixtures/versions/engine-1.0.0.json';
import { ENGINE_VERSION, solveDesign, validateDocument } from '.';

/** A solver of Colebrook and White's equation that ends in other last bits came with 1.1.0: a part in 1e13. */
const LAST_BITS = 1e-13;
/** Below it a figure is taken for what is left of a difference [Pa, m3/s or the like]. */
const SMALL = 1e-6;

/** What of a stored value is not found again: keys that were added since are no matter. */
function differences(stored: unknown, again: unknown, path = ''): string[] {
	if (typeof stored === 'number') {
		const allowed = LAST_BITS * Math.max(Math.abs(stored), SMALL);
		return typeof again === 'number' && Math.abs(again - stored) <= allowed ? [] : [`${path}: ${stored}, ${again}`];
	}
	if (typeof stored !== 'object' || stored === null) return stored === again ? [] : [`${path}: ${stored}, ${again}`];
	return Object.entries(stored).flatMap(([key, value]) =>
		differences(value, (again as Record<string, unknown> | undefined)?.[key], `${path}/${key}`)
	);
}

describe(`figures that engine ${fixture.engine} stored`, () => {
	it('were stored by an older engine than this', () => expect(fixture.engine).not.toBe(ENGINE_VERSION));

	it.each(fixture.stored)('$name: are found again, to the last bits of friction', ({ document, solution }) => {
		const opened = validateDocument(document);
		if (!opened.ok) throw new Error(JSON.stringify(opened.problems));
		expect(opened.document).toEqual(document);
		const again = solveDesign(opened.document);
		if (!again.ok) throw new Error(JSON.stringify(again.problems));
		const { engineVersion, ...figures } = solution;
		expect(engineVersion).toBe(fixture.engine);
		expect(differences(figures, again.solution)).toEqual([]);
	});

	it('would be missed by another figure, text or key', () => {
		expect(differences({ a: 1 }, { a: 1 + 1e-12 })).toHaveLength(1);
		expect(differences({ a: 'x' }, { a: 'y' })).toHaveLength(1);
		expect(differences({ a: [1, 2] }, { a: [1] })).toHaveLength(1);
		expect(differences({ a: 1 }, { a: 1, b: 2 })).toEqual([]);
	});
});
