import type { EntryNote } from '$lib/methods';

/** The words of a search, in small letters. */
export const wordsOf = (query: string): readonly string[] => query.toLowerCase().split(/\s+/).filter(Boolean);

/** Whether a text has every word. */
export const hasWords = (text: string, words: readonly string[]): boolean => words.every((word) => text.includes(word));

/** All that a search looks at in an entry, in small letters. */
export function searchText({ entry }: EntryNote, family: string): string {
	const { key, name, method, source, range, known, caution, shapes, parameters, rivals = [] } = entry;
	const ofRivals = rivals.flatMap((rival) => [rival.key, rival.method, rival.source]);
	const labels = parameters.flatMap(({ label, options = [] }) => [label, ...options]);
	return [family, key, name, method, source, range, known, caution, ...shapes, ...labels, ...ofRivals]
		.join(' ')
		.toLowerCase();
}
