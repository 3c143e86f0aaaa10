import { catalogue, fittingEntry, type Family, type Picture } from '$lib/engine';
import type { Role } from './lexicon';
import type { PartWord } from './parts';
import { isSpelling, PHRASES, TRANSITIONS, wordsOf } from './phrases';

/** Shapes may be left out: the row has one. */
const SHAPES = ['round', 'rectangular', 'oval'];

interface Named {
	readonly kind: string;
	readonly word: PartWord;
	readonly words: readonly string[];
}

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

const named: readonly Named[] = [
	...catalogue
		.filter(({ place }) => place !== 'junction')
		.map(({ key, family }): Named => {
			const words = key.split('-');
			const bare = SHAPES.includes(words[0] ?? '') && words[1] !== 'to' ? words.slice(1) : words;
			return { kind: key, word: WORD_OF[family] ?? 'device', words: bare };
		}),
	...PHRASES.map(({ kind, word, words }): Named => ({ kind, word, words: words.split(' ') }))
	// The longest name first: `gradual expansion` before `expansion`.
].sort((a, b) => b.words.length - a.words.length);

/** Words that stand in the name of a fitting: with a coefficient of its own it is one all the same. */
const nameWords = new Set(named.flatMap(({ words }) => words));
export const isNameWord = (word: string): boolean =>
	nameWords.has(word) || isSpelling(word) || word.split('-').every((one) => nameWords.has(one) || isSpelling(one));

/** What makes a text another part than the name within it: `weather louvre + screen` is no screen. */
const OTHER: Readonly<Partial<Record<Role, PartWord>>> = {
	elbow: 'elbow',
	damper: 'damper',
	butterfly: 'damper',
	transition: 'transition',
	expansion: 'transition',
	contraction: 'transition',
	entry: 'entry',
	bellmouth: 'entry',
	exit: 'exit'
};
const ALWAYS_OTHER: readonly Role[] = [
	...(['device', 'special-damper', 'junction', 'shoe', 'take-off', 'wye', 'cross', 'bullhead', 'chamber'] as const)
];

export interface NamedPart {
	readonly kind: string;
	readonly word: PartWord;
	readonly picture: Picture;
}

/**
 * The entry of the catalogue whose name, or a phrase of the trade for it, is among the words, in any order. Null where
 * no whole name is there, or where a word of another part stands beside it.
 *
 * @param typed without its figures, in small letters
 * @param roleOf what a word tells by itself
 */
export function entryByName(typed: string, roleOf: (word: string) => Role | null): NamedPart | null {
	const said = wordsOf(typed);
	const words = new Set(said);
	const inOrder = (own: readonly string[]) => !own.includes('to') || said.join(' ').includes(own.slice(0, 3).join(' '));
	const asked = named.filter((one) => one.words.every((word) => words.has(word)) && inOrder(one.words));
	const most = asked[0]?.words.length;
	// Of equal names that differ by their shape alone, the one whose shape is said, or the first: the row's shape decides.
	const equal = asked.filter(({ words: own }) => own.length === most);
	const [first] = equal.filter(({ kind }) => words.has(kind.split('-')[0] ?? '')).concat(equal);
	if (!first) return null;
	const isOther = (word: string): boolean => {
		const role = first.words.includes(word) ? null : roleOf(word);
		if (role === null) return false;
		if (ALWAYS_OTHER.includes(role)) return true;
		if (role === 'leg' || role === 'straight') return first.word === 'transition';
		return OTHER[role] !== undefined && OTHER[role] !== first.word;
	};
	if (said.some(isOther)) return null;
	return { kind: first.kind, word: first.word, picture: pictureOf(first) };
}

function pictureOf({ kind, word }: Named): Picture {
	const transition: string | undefined = (TRANSITIONS as Partial<Record<string, { expansion: string }>>)[kind]
		?.expansion;
	const key = transition ?? PLACED[kind] ?? kind;
	return fittingEntry(key)?.picture ?? (word === 'damper' ? 'damper' : 'transition');
}

/** Entries that stand for the kinds that the row decides. */
const PLACED: Readonly<Record<string, string>> = {
	cap: 'exhaust-cap',
	offset: 'offset-round',
	'perforated-plate': 'perforated-plate-thin'
};
