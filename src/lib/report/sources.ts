import { fittingEntry, type Item } from '$lib/engine';
import type { ReportInput } from './input';
import type { SourceUsed } from './model';
import { rowsFromFan } from './network-order';
import { PART } from './wording';

const UNSTATED = 'not stated';

/** The sources and methods of all items, numbered in the order of their first use from the fan. */
export function sourcesOf({ document, solution }: ReportInput): SourceUsed[] {
	const uses = new Map<string, Set<string>>();
	for (const { tag } of rowsFromFan(document)) {
		for (const item of solution.rows[tag]?.items ?? []) {
			const text = sourceText(item);
			const found = uses.get(text);
			if (found) found.add(useOf(item));
			else uses.set(text, new Set([useOf(item)]));
		}
	}
	return [...uses].map(([text, names], place) => ({ number: place + 1, text, uses: [...names].join('; ') }));
}

/** Method and source of one item, as the list of sources has it. */
export function sourceText({ kind, source }: Item): string {
	const entry = kind === null ? null : fittingEntry(kind);
	if (entry === null) return source ?? UNSTATED;
	const named = source ?? entry.source;
	const band = `known to about ±${Math.round(entry.uncertainty * 100)} %`;
	// A source that says itself how it is known is not told so twice.
	const isSaid = entry.known === 'published formula' || named.includes(entry.known);
	const how = ` (${isSaid ? '' : `${entry.known}; `}${band})`;
	return named.includes(entry.method) ? `${named}${how}` : `${named}${how}; method: ${entry.method}`;
}

function useOf({ kind, part }: Item): string {
	const entry = kind === null ? null : fittingEntry(kind);
	return entry === null ? PART[part] : entry.name;
}
