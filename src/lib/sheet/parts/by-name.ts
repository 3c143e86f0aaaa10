import { catalogue, type CatalogueEntry, type Family } from '$lib/engine';
import type { PartWord } from './parts';

/** Shapes may be left out: the row has one. */
const SHAPES = ['round', 'rectangular', 'oval'];

interface Named {
	readonly entry: CatalogueEntry;
	/** Words of its key, without a shape in front. */
	readonly words: readonly string[];
}

const named: readonly Named[] = catalogue
	.filter(({ place }) => place !== 'junction')
	.map((entry) => {
		const words = entry.key.split('-');
		const bare = SHAPES.includes(words[0] ?? '') && words[1] !== 'to' ? words.slice(1) : words;
		return { entry, words: bare };
	})
	// The longest name first: `gradual expansion` before `expansion`.
	.sort((a, b) => b.words.length - a.words.length);

const WORD_OF: Readonly<Partial<Record<Family, PartWord>>> = {
	'elbows-round': 'elbow',
	'elbows-rectangular': 'elbow',
	'elbows-oval': 'elbow',
	offsets: 'transition',
	'area-changes': 'transition',
	entries: 'entry',
	exits: 'exit',
	dampers: 'damper'
};

/** One form for what people spell in several ways. */
const SPELLINGS: Readonly<Record<string, string>> = {
	louver: 'louvre',
	mitered: 'mitred',
	gored: 'segmented',
	splitters: 'splitter',
	vanes: 'vaned',
	rect: 'rectangular'
};

/** Words that stand in the name of a fitting: with a coefficient of its own it is one all the same. */
const nameWords = new Set(named.flatMap(({ words }) => words));
export const isNameWord = (word: string): boolean => nameWords.has(SPELLINGS[word] ?? word);

/**
 * The entry of the catalogue whose name is among the words, in any order: every fitting can be typed by its own name.
 * Null where no whole name is there.
 */
export function entryByName(typed: string): { readonly entry: CatalogueEntry; readonly word: PartWord } | null {
	const said = typed
		.toLowerCase()
		.split(/[^a-z]+/)
		.map((word) => SPELLINGS[word] ?? word);
	const words = new Set(said);
	const inOrder = ({ words: own }: Named) => !own.includes('to') || said.join(' ').includes(own.slice(0, 3).join(' '));
	const asked = named.filter((one) => one.words.every((word) => words.has(word)) && inOrder(one));
	const most = asked[0]?.words.length;
	// Of equal names that differ by their shape alone, the one whose shape is said, or the first: the row's shape decides.
	const equal = asked.filter(({ words: own }) => own.length === most);
	const [first] = equal.filter(({ entry }) => words.has(entry.key.split('-')[0] ?? '')).concat(equal);
	return first ? { entry: first.entry, word: WORD_OF[first.entry.family] ?? 'device' } : null;
}
