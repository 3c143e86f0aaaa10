import { describe, expect, it } from 'vitest';
import { NARROW, SANS, STRONG, face, fontPaths } from './fonts';
import { readFontFile } from './font-file';
import { fitted, narrow, printable } from './printable';

describe('printable', () => {
	it.each([
		['Greek and signs stay', 'ρ √ ≤ ≥ → ² ³ Ø – −', 'ρ √ ≤ ≥ → ² ³ Ø – −'],
		['a thin space becomes the narrow no-break space of the face', '1\u2009200', '1\u00a0200'],
		['feet and inches have plain forms', '12′ 6″', '12\' 6"'],
		['a fraction is written out', '⅜', '3/8'],
		['what no face has is a question mark, never a box', '読', '?'],
		['marks that do not print are dropped', 'a\u202eb\u200b', 'ab'],
		['parts of a letter are joined', 'e\u0301', 'é']
	])('%s', (_, typed, printed) => expect(printable(typed)).toBe(printed));

	it('changes no font where the condensed face has all', () => {
		expect(narrow('Flow').text).toBe('Flow');
		expect(narrow('Re ≤ 2000').text).toEqual([{ text: 'Re ' }, { text: '≤', font: STRONG }, { text: ' 2000' }]);
	});
});

it('fits a text to a line, and says where something is left out', () => {
	const cut = fitted('Larkmoor Public Library, ground floor', SANS, 'bold', 9, 100);
	expect(cut.endsWith('…')).toBe(true);
	expect(face(SANS, 'bold').widthOf(cut, 9)).toBeLessThanOrEqual(100);
	expect(fitted('Short', SANS, 'bold', 9, 100)).toBe('Short');
});

describe('a font file', () => {
	// Advances as another reader of the same files (fontkit) gives them, in thousandths of an em.
	it.each([
		[SANS, 'normal', '0', 580],
		[SANS, 'normal', '1', 454],
		[SANS, 'bold', '7', 538],
		[SANS, 'normal', '–', 740],
		[NARROW, 'normal', '–', 564],
		[NARROW, 'normal', '\u00a0', 158]
	] as const)('%s %s has %s of %d', (family, weight, character, thousandths) => {
		expect(readFontFile(fontPaths()[family][weight]).widthOf(character, 1000)).toBeCloseTo(thousandths, 6);
	});

	it('is refused when it is none', () => {
		expect(() => readFontFile(new URL(import.meta.url).pathname)).toThrow('no TrueType or WOFF font');
	});
});
