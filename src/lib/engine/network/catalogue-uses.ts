import type { CatalogueUse, Fitting, Junction } from '../document/types';
import type { CatalogueEntry, CoefficientResult } from '../fitting';
import { parametersInWords } from './parameters-in-words';

/** Gives what the catalogue says of a part as it was used; parts with the same parameters share it. */
export type CatalogueUses = (
	part: Fitting | Junction,
	entry: CatalogueEntry,
	result: CoefficientResult
) => CatalogueUse;

/** Keys of a part on which its parameters and its method do not depend. */
const BESIDE: ReadonlySet<string> = new Set(['kind', 'count', 'name', 'toBeConfirmed', 'leg', 'id', 'note']);

/** A design has many fittings and few distinct ones: words and figures of each are put together once in a solve. */
export function catalogueUses(): CatalogueUses {
	const known = new Map<string, CatalogueUse>();
	return (part, entry, result) => {
		const key = keyOf(part);
		let use = known.get(key);
		if (use === undefined) known.set(key, (use = useOf(entry, result)));
		// The range depends on the row as well.
		return use.rangeNote === result.rangeNote ? use : { ...use, rangeNote: result.rangeNote };
	};
}

function keyOf(part: Fitting | Junction): string {
	let key = part.kind;
	for (const name in part)
		if (!BESIDE.has(name)) key += `|${name}:${String((part as Readonly<Record<string, unknown>>)[name])}`;
	return key;
}

function useOf(entry: CatalogueEntry, result: CoefficientResult): CatalogueUse {
	const { parameters, methodKey, method, known, uncertainty, rangeNote } = result;
	const words = parametersInWords(entry, parameters);
	const use = { parameters, words, method, known, uncertainty, rangeNote, caution: entry.caution };
	return methodKey === null ? use : { ...use, methodKey };
}
