/** Authors of the catalogue's methods, as a person types them: `elbow by rennels`. */
import { catalogue, type CatalogueEntry } from '$lib/engine';

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

/** How the author of a method is printed: `Idelchik, table`. */
export function authorOf(key: string): string {
	if (key === 'smacna') return 'SMACNA';
	const [name = '', ...more] = key.split('-');
	return [name.charAt(0).toUpperCase() + name.slice(1), ...more].join(', ');
}

export const AUTHORS = [...new Set(keys.map((key) => authorOf(key)))].join('; ');
