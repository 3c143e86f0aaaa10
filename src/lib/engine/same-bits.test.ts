import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';

const ROOT = import.meta.dirname;
/** Exact by the standard of the language, and thus the same in every engine. */
const ALLOWED = ['sqrt', 'abs', 'min', 'max', 'floor'];

/** Text without comments and strings, whose words are no code. */
function codeOf(text: string): string {
	return text.replace(/\/\*[\s\S]*?\*\/|\/\/[^\n]*|'(?:\\.|[^'\\\n])*'|"(?:\\.|[^"\\\n])*"/g, ' ');
}

/** What in the code may differ from engine to engine, or from run to run. */
function offences(text: string): string[] {
	const code = codeOf(text);
	const maths = [...code.matchAll(/\bMath\s*(?:\.\s*(\w+)|\[)/g)]
		.filter((found) => !ALLOWED.includes(found[1] ?? ''))
		.map((found) => found[0]);
	const taken = [...code.matchAll(/(?<![.\w])Math\b(?!\s*[.[])/g)].map((found) => `${found[0]} as a value`);
	const others = [
		...code.matchAll(/\*\*|\bDate\b|\bperformance\b|\bcrypto\b|\bIntl\b|\btoLocale\w+|\blocaleCompare\b/g)
	];
	return [...maths, ...taken, ...others.map((found) => found[0])];
}

const files = readdirSync(ROOT, { recursive: true, encoding: 'utf8' })
	.filter((name) => name.endsWith('.ts') && !name.endsWith('.test.ts') && !name.endsWith('.d.ts'))
	.sort();

describe('the engine gives the same bits everywhere', () => {
	it('has files to look at', () => expect(files.length).toBeGreaterThan(30));

	it.each(files)('%s uses only what is exact', (name) => {
		expect(offences(readFileSync(join(ROOT, name), 'utf8'))).toEqual([]);
	});
});

describe('the look-out itself', () => {
	it.each([
		['const y = Math.pow(x, 2);', 'Math.pow'],
		['const y = Math.log10(x);', 'Math.log10'],
		['const y = Math.random();', 'Math.random'],
		['const y = Math["exp"](x);', 'Math['],
		['const { sin } = Math;', 'Math as a value'],
		['const y = x ** 0.5;', '**'],
		['const t = new Date();', 'Date'],
		['rows.sort((a, b) => a.localeCompare(b));', 'localeCompare']
	])('finds the fault in %s', (text, offence) => expect(offences(text)).toContain(offence));

	it.each(['Math.sqrt(x) + Math.abs(y)', '/** e ** x, Math.exp */ a * b', "'2 ** 3'", '// Math.sin'])(
		'lets %s pass',
		(text) => expect(offences(text)).toEqual([])
	);
});
