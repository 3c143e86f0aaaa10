import { describe, expect, it } from 'vitest';
import fixture from '../../../fixtures/versions/engine-1.0.0.json';
import type { DesignDocument, Solution } from '$lib/engine';
import { reportOf } from '.';
import { inputOf } from './sample-input';

describe('the report of figures that an older engine stored', () => {
	it.each(fixture.stored)('$name: is whole, and names that engine', ({ document, solution }) => {
		// As it comes from the database: without the keys that were added since.
		const stored = { document: document as unknown as DesignDocument, solution: solution as unknown as Solution };
		const report = JSON.stringify(reportOf(inputOf(stored.document, { solution: stored.solution })));
		expect(report).toContain('engine 1.0.0');
		expect(report).not.toMatch(/NaN|undefined/);
	});
});
