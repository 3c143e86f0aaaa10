/** Authors of the catalogue's methods, as a person types them: `elbow by rennels`. */
import { authorOf, catalogue, type CatalogueEntry } from '$lib/engine';

/** Keys of the methods of an entry, its own first; none where it has one alone. */
export function methodsOf({ standardMethod, rivals = [] }: CatalogueEntry): string[] {
	return standardMethod === undefined ? [] : [standardMethod, ...rivals.map(({ key }) => key)];
}

const keys = [...new Set(catalogue.flatMap(methodsOf))].sort();

/** The key of a method as typed, `idelchik table`, or null where no entry has it. */
export function methodKeyOf(typed: string): string | null {
	const key = typed.trim().toLowerCase().replace(/ +/g, '-');
	return keys.includes(key) ? key : null;
}

export const AUTHORS = [...new Set(keys.map((key) => authorOf(key)))].join('; ');
