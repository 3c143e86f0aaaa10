/** Phrases of the trade beside the names of the catalogue's own keys, and how each of them is spelled. */
import type { PartWord } from './parts';

export interface Phrase {
	/** In any order, after `SPELLINGS`. */
	readonly words: string;
	/** A key of the catalogue, or a kind that the row decides: see `by-place.ts`. */
	readonly kind: string;
	readonly word: PartWord;
}

/** Kinds that become an entry of the catalogue by the sizes and the side of the row. */
export const TRANSITIONS = {
	transition: { expansion: 'gradual-expansion', contraction: 'gradual-contraction' },
	'sudden-transition': { expansion: 'sudden-expansion', contraction: 'sudden-contraction' },
	'one-sided-transition': { expansion: 'one-sided-expansion', contraction: 'one-sided-contraction' },
	'pyramidal-transition': { expansion: 'pyramidal-expansion', contraction: 'pyramidal-contraction' },
	'rectangular-to-round': {
		expansion: 'rectangular-to-round-expansion',
		contraction: 'rectangular-to-round-contraction'
	},
	'round-to-rectangular': {
		expansion: 'round-to-rectangular-expansion',
		contraction: 'round-to-rectangular-contraction'
	}
} as const satisfies Readonly<Record<string, Readonly<Record<'expansion' | 'contraction', string>>>>;

export type TransitionKind = keyof typeof TRANSITIONS;
export const isTransition = (kind: string): kind is TransitionKind => Object.hasOwn(TRANSITIONS, kind);

const phrase = (kind: string, word: PartWord, ...all: string[]): Phrase[] =>
	all.map((words) => ({ words, kind, word }));

export const PHRASES: readonly Phrase[] = [
	...phrase('transition', 'transition', 'transition', 'reducer', 'increaser', 'gradual transition'),
	...phrase('sudden-transition', 'transition', 'sudden transition'),
	...phrase('one-sided-transition', 'transition', 'one sided', 'one sided transition'),
	...phrase('pyramidal-transition', 'transition', 'pyramidal', 'pyramidal transition'),
	...phrase('rectangular-to-round', 'transition', 'rectangular to round', 'square to round'),
	...phrase('round-to-rectangular', 'transition', 'round to rectangular', 'round to square'),
	...phrase('offset', 'transition', 'offset'),
	...phrase('rectangular-elbow-vaned-double', 'elbow', 'elbow double vaned', 'elbow double thickness vaned'),
	...phrase('cap', 'exit', 'cap', 'roof cap', 'rain cap'),
	...phrase('hood-plain', 'entry', 'hood'),
	...phrase('intake-hood', 'entry', 'intake cowl'),
	...phrase('exhaust-hood', 'exit', 'exhaust cowl', 'discharge cowl', 'discharge hood', 'exhaust hood cowl'),
	...phrase('exhaust-louvre', 'exit', 'discharge louvre'),
	...phrase('discharge-against-wall', 'exit', 'exit against wall', 'exit against a wall'),
	...phrase('damper-fire-curtain', 'damper', 'fire damper', 'fd', 'curtain fire damper'),
	...phrase('damper-gate', 'damper', 'gate', 'blast gate', 'slide damper', 'slide gate'),
	...phrase('screen-wire', 'device', 'screen', 'mesh', 'wire mesh', 'bird screen', 'insect screen', 'wire screen'),
	...phrase('perforated-plate', 'device', 'perforated plate'),
	...phrase('fan-inlet-effect', 'device', 'system effect inlet', 'system effect fan inlet'),
	...phrase('fan-outlet-effect', 'device', 'system effect outlet', 'system effect fan outlet')
];

/** A hood at the end of an exhaust takes air in or lets it out: its words do not tell which. */
export const UNCLEAR = 'exhaust-hood';

const spellings = new Map<string, string>();
for (const [one, others] of Object.entries({
	louvre: 'louver louvers louvres',
	mitred: 'mitered mitre miter',
	segmented: 'gored',
	splitter: 'splitters',
	vaned: 'vane vanes',
	rectangular: 'rect',
	elbow: 'elbows bend bends ell ells',
	double: 'hollow airfoil aerofoil',
	sudden: 'abrupt',
	gradual: 'tapered conical',
	reducer: 'reducers',
	transition: 'transitions',
	offset: 'offsets',
	cap: 'caps',
	hood: 'hoods',
	cowl: 'cowls',
	damper: 'dampers',
	gate: 'gates',
	screen: 'screens',
	obstruction: 'obstructions'
}))
	for (const typed of others.split(' ')) spellings.set(typed, one);

/** Of two words that one name could mean: a hood is tapered, a transition gradual. */
const KEPT = /\bhoods?\b/;

/** The words of a text, each in the one form that names have. */
export function wordsOf(typed: string): string[] {
	// The vanes of a splitter elbow are no turning vanes.
	const text = typed.replace(/\bsplitter vanes?\b/g, 'splitter');
	const isHood = KEPT.test(text);
	return text
		.split(/[^a-z]+/)
		.filter((word) => word !== '')
		.map((word) => (isHood && word === 'tapered' ? word : (spellings.get(word) ?? word)));
}

export const isSpelling = (word: string): boolean => spellings.has(word);
