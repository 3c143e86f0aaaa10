/** Settings that choose, of several authors' methods, the one by which fittings and junctions of a kind are computed. */
import { authorOf, catalogue, quoted, type CatalogueEntry, type Reader } from '$lib/engine';
import { methodKeyOf, methodsOf } from './parts/authors';
import type { MethodField, Sheet } from './sheet';

export interface MethodSetting {
	readonly field: MethodField;
	readonly entry: CatalogueEntry;
	/** Keys of the methods, that of the catalogue first. */
	readonly methods: readonly string[];
}

const fieldOf = (key: string): MethodField => `method-${key}`;

/** One for each entry of the catalogue that has rivals. */
export const METHOD_SETTINGS: readonly MethodSetting[] = catalogue
	.filter(({ rivals }) => rivals?.length)
	.map((entry) => ({ field: fieldOf(entry.key), entry, methods: methodsOf(entry) }));

const byField: ReadonlyMap<string, MethodSetting> = new Map(METHOD_SETTINGS.map((one) => [one.field, one]));

/** The setting of a field, or null where it is another's. */
export const methodSetting = (field: string): MethodSetting | null => byField.get(field) ?? null;

function readerOf({ methods }: MethodSetting): Reader<string> {
	return (text) => {
		const key = methodKeyOf(text.replace(/,/g, ' '));
		if (key !== null && methods.includes(key))
			return { ok: true, value: key, words: authorOf(key), why: null, other: null };
		return {
			ok: false,
			message: `${quoted(text.trim())} is the author of no method here.`,
			expected: methods.map(authorOf).join('; ')
		};
	};
}

export const METHOD_READERS: Readonly<Record<MethodField, Reader<string>>> = Object.fromEntries(
	METHOD_SETTINGS.map((one) => [one.field, readerOf(one)])
);

/** The methods that a sheet names, by the keys of the catalogue; null where it names none. */
export function methodsOfSheet(sheet: Sheet): Readonly<Record<string, string>> | null {
	const named = METHOD_SETTINGS.flatMap(({ field, entry }) => {
		const method = sheet.settings[field]?.value;
		return method === undefined || method === null ? [] : [[entry.key, method] as const];
	});
	return named.length ? Object.fromEntries(named) : null;
}
