import { describe, expect, it } from 'vitest';
import { blankWords } from './blank-words';
import { ROW_FIELDS, ROW_READERS } from './fields';

describe('the echo of an empty cell', () => {
	it.each(ROW_FIELDS.flatMap((field) => (['SI', 'IP'] as const).map((units) => [field, units] as const)))(
		'of %s in %s gives examples that the cell takes',
		(field, units) => {
			for (const example of blankWords(field, units).examples)
				expect([example, ROW_READERS[field](example, units).ok]).toEqual([example, true]);
		}
	);

	it('lists several parts, and says that a row may have none', () => {
		const { words, examples } = blankWords('parts', 'SI');
		expect(words).toBe('Blank: no parts');
		expect(examples.join(' ')).toMatch(/elbow.*tee branch.*FD.*silencer/);
	});

	it('says that a blank outlet is an open end', () =>
		expect(blankWords('outlet', 'SI').words).toBe('Blank: an open end, one velocity pressure'));
});
