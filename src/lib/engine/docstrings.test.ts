import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';

const ROOT = import.meta.dirname;
const PROJECT = join(ROOT, '../../..');
/** Rooms whose exported functions are formulas. */
const ROOMS = ['arithmetic', 'air', 'friction', 'shape', 'leakage', 'fitting'];
/** Exported functions that look up, read or do the bookkeeping of digits: they hold no formula. */
const NO_FORMULA = [
	'arithmetic/float-parts.ts scale',
	'arithmetic/float-parts.ts nearestExponent',
	'arithmetic/two-part.ts exactSum',
	'arithmetic/two-part.ts exactProduct',
	'arithmetic/two-part.ts addParts',
	'arithmetic/two-part.ts multiplyParts',
	'arithmetic/logarithm.ts logParts',
	'arithmetic/exponential.ts expOfParts',
	'friction/friction-factor.ts regime',
	'friction/materials.ts findMaterial',
	'leakage/leakage-class.ts findLeakageClass',
	'fitting/author.ts authorOf',
	'fitting/catalogue.ts fittingEntry',
	'fitting/catalogue.ts findDefinition',
	'fitting/catalogue.ts findJunction',
	'fitting/coefficient-of.ts coefficientOf',
	'fitting/coefficient-of.ts junctionCoefficientOf',
	'fitting/interpolate.ts interpolate',
	'fitting/interpolate.ts interpolateTable',
	'fitting/junction-methods.ts streamBy',
	'fitting/junction-view.ts branchingOf',
	'fitting/junction-view.ts noteBranching',
	'fitting/junction-view.ts noteForms',
	'fitting/junction-view.ts noteGain',
	'fitting/junction-view.ts noteEqualRun',
	'fitting/parameters.ts numberParameter',
	'fitting/parameters.ts choiceParameter',
	'fitting/parameters.ts heldWithin',
	'fitting/parameters.ts noteOutside',
	'fitting/parameters.ts readParameters'
];

interface Formula {
	readonly name: string;
	readonly doc: string;
	readonly parameters: readonly string[];
}

/** Exported functions of a file with the comment right above each. */
function formulasOf(text: string): Formula[] {
	const pattern = /(?:(\/\*\*(?:(?!\*\/)[\s\S])*\*\/)\n)?export function (\w+)(?:<[^>]*>)?\(([^)]*)\)/g;
	return [...text.matchAll(pattern)].map(([, doc = '', name = '', list = '']) => {
		const parameters = list.trim().startsWith('{') ? [] : [...list.matchAll(/(\w+)\??:/g)].map((one) => one[1] ?? '');
		return { name, doc, parameters };
	});
}

/** The tags of a comment, each with its text on one line. */
function tagsOf(doc: string): { readonly tag: string; readonly text: string }[] {
	const plain = doc.replace(/^\s*\/?\*+\/?/gm, ' ');
	return [...plain.matchAll(/@(\w+)\s+([^@]*)/g)].map(([, tag = '', text = '']) => ({
		tag,
		text: text.replace(/\s+/g, ' ').trim()
	}));
}

const isCheck = (text: string): boolean =>
	/^none: .{15,}$/.test(text) || (/^fixtures\/\S+\.json$/.test(text) && existsSync(join(PROJECT, text)));

/** What is missing in the docstring of a formula. */
function faults({ doc, parameters }: Formula): string[] {
	const tags = tagsOf(doc);
	const found: string[] = [];
	const params = tags.filter((one) => one.tag === 'param');
	for (const parameter of parameters) {
		const text = params.find((one) => one.text.startsWith(`${parameter} `))?.text;
		if (text === undefined) found.push(`no @param ${parameter}`);
		// A choice of words has no unit.
		else if (!/\[[^\]]+\]/.test(text) && !/ or |leg that/.test(text)) found.push(`no unit of ${parameter}`);
	}
	const returns = tags.find((one) => one.tag === 'returns');
	if (!returns || !/\[[^\]]+\]/.test(returns.text)) found.push('no unit of the result');
	if (!tags.some((one) => one.tag === 'source' && one.text.length > 5)) found.push('no @source');
	if (!tags.some((one) => one.tag === 'check' && isCheck(one.text))) found.push('no @check');
	return found;
}

const all = ROOMS.flatMap((room) =>
	readdirSync(join(ROOT, room))
		.filter((file) => file.endsWith('.ts') && !/\.(test|d)\.ts$/.test(file) && file !== 'index.ts')
		.flatMap((file) =>
			formulasOf(readFileSync(join(ROOT, room, file), 'utf8')).map((formula) => ({ at: `${room}/${file}`, formula }))
		)
).map(({ at, formula }) => ({ title: `${at} ${formula.name}`, formula }));

describe('the docstring of every formula', () => {
	const formulas = all.filter(({ title }) => !NO_FORMULA.includes(title));

	it('is looked for in enough places', () => {
		expect(formulas.length).toBeGreaterThan(50);
		expect(NO_FORMULA.filter((title) => !all.some((one) => one.title === title))).toEqual([]);
	});

	it.each(formulas)('$title names units, source and check', ({ formula }) => expect(faults(formula)).toEqual([]));
});

describe('the look-out itself', () => {
	const good = `/**
 * Pressure.
 *
 * @param z elevation [m]
 * @returns p pressure [Pa]
 * @source U.S. Standard Atmosphere, 1976
 * @check fixtures/published/air.json
 */
export function pressure(z: number): number {`;

	it('finds nothing wrong with a whole one', () => expect(formulasOf(good).flatMap(faults)).toEqual([]));

	it.each([
		[' [m]', 'no unit of z'],
		[' [Pa]', 'no unit of the result'],
		[' * @source U.S. Standard Atmosphere, 1976\n', 'no @source'],
		[' * @check fixtures/published/air.json\n', 'no @check'],
		['air.json', 'no @check'],
		['@param z', 'no @param z']
	])('misses %j', (part, fault) => expect(formulasOf(good.replace(part, '')).flatMap(faults)).toContain(fault));

	it('wants a reason for no check', () => {
		const without = (text: string) => formulasOf(good.replace('fixtures/published/air.json', text)).flatMap(faults);
		expect(without('none')).toContain('no @check');
		expect(without('none: compared with a second method')).toEqual([]);
	});
});
