import { leakageClasses, quoted, type Reader } from '$lib/engine';

/** Inch-pound classes that are usual, from unsealed down. */
const INCH_CLASSES = [48, 24, 12, 6, 3];
const MOST_CL = 1000;

/** Classes to choose from; other inch-pound classes can be typed. */
export const LEAKAGES = [
	...leakageClasses.map(({ key, name }) => ({ key, name })),
	...INCH_CLASSES.map((cl) => ({ key: `CL${cl}`, name: `CL ${cl}` }))
];

const EXPECTED = 'A, B, C or D, ATC 1 to ATC 6, or an inch-pound class such as CL 24; none for tight ductwork';
const bare = (text: string) => text.toLowerCase().replace(/[\s-]+/g, '');

/** A class of the list by its key, `ATC3`, or an inch-pound class, `CL24`; `CL0` for none. */
export const readLeakage: Reader<string> = (text) => {
	const typed = bare(text);
	const found = leakageClasses.find(({ key, name }) => bare(key) === typed || bare(name) === typed);
	if (found) return { ok: true, value: found.key, words: found.name, why: found.caution, other: null };
	if (typed === 'none') return { ok: true, value: 'CL0', words: 'no leakage', why: null, other: null };
	const figure = /^cl(\d{1,4}(?:[.,]\d{1,3})?)$/.exec(typed)?.[1]?.replace(',', '.');
	if (figure === undefined)
		return { ok: false, message: `${quoted(text.trim())} is no leakage class.`, expected: EXPECTED };
	const cl = Number(figure);
	if (cl > MOST_CL)
		return {
			ok: false,
			message: `${quoted(text.trim())}: too leaky for a class (most CL ${MOST_CL}).`,
			expected: EXPECTED
		};
	return { ok: true, value: `CL${cl}`, words: `CL ${cl}`, why: 'cfm by 100 square feet at 1 in. w.g.', other: null };
};

/** The class as it is printed. */
export function leakageName(key: string): string {
	if (key === 'CL0') return 'none';
	return LEAKAGES.find((one) => one.key === key)?.name ?? key.replace(/^CL/, 'CL ');
}

/** The class as the design document holds it. */
export const leakageOf = (key: string) => (key.startsWith('CL') ? { cl: Number(key.slice(2)) } : { class: key });
