import { describe, expect, it } from 'vitest';
import { ROW_READERS, SETTING_READERS } from './fields';
import { MOST_TYPED } from './storable-text';

/** Repeated to the longest text of a cell: a pattern that tries every way through one of these takes seconds or days. */
const PIECES = [
	...['1', '0', ' ', '1 ', ',', '.', '1.', '1,', '-', '--', '+1', '1*', '=1+', '(', '()', '1/2 ', "1'", '1"', '"'],
	...[
		'x',
		'1x',
		'200x',
		'a',
		'a ',
		'Ø',
		'°',
		'45°',
		'9e',
		'%',
		'1 %',
		'?',
		'/',
		'Pa ',
		'1 Pa at ',
		'mm ',
		'at ',
		'by '
	],
	...[
		'elbow ',
		'elbow r',
		'elbow r1.0 C',
		'2x ',
		'C0.',
		'tee branch ',
		'by idelchik ',
		'damper ',
		'filter 1 ',
		'²',
		'１'
	]
];
const texts = PIECES.flatMap((piece) =>
	['', 'elbow '].flatMap((before) =>
		['', '!', 'x'].map((after) => (before + piece.repeat(MOST_TYPED)).slice(0, MOST_TYPED - 1) + after)
	)
);

describe('texts of the longest length', () => {
	it.each(Object.entries({ ...ROW_READERS, ...SETTING_READERS }))(
		'are all answered by the reader of %s',
		(_of, read) => {
			for (const text of texts)
				for (const units of ['SI', 'IP'] as const) {
					const reading = read(text, units);
					if (!reading.ok) expect(reading.message.length).toBeGreaterThan(0);
					else expect(reading.words.length).toBeGreaterThanOrEqual(text.trim() === '' ? 0 : 1);
				}
		}
	);
});
