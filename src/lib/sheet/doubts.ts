import { quoted, type UnitSystem } from '$lib/engine';
import type { Edit } from './edit';
import { isRowField, ROW_READERS } from './fields';

/** Cells that are looked through: reading each again takes time. */
const MOST_LOOKED_AT = 20_000;

/**
 * What a person should know of pasted figures that are other figures elsewhere, as 1.200: one that is typed is told in
 * its echo, many that are pasted are told at once. Blank where there is no doubt.
 */
export function doubtsOf(edit: Edit | null, units: UnitSystem): string {
	let [count, looked] = [0, 0];
	let first = '';
	for (const [field, text] of typedIn(edit)) {
		if (!isRowField(field) || !/\d[.,]\d{3}(?!\d)/.test(text) || (looked += 1) > MOST_LOOKED_AT) continue;
		const reading = ROW_READERS[field](text, units);
		if (!reading.ok || !isDoubt(reading)) continue;
		count += 1;
		first ||= `${quoted(text)} is read as ${reading.words}`;
	}
	if (count === 0) return '';
	return `${count === 1 ? 'One figure' : `${count} figures`} of these could be read otherwise: ${first}. Undo takes the paste back.`;
}

function* typedIn(edit: Edit | null): Generator<readonly [string, string]> {
	for (const one of edit?.kind === 'batch' ? edit.edits : edit ? [edit] : []) {
		if (one.kind === 'set') yield [one.field, one.typed];
		else if (one.kind === 'insert')
			for (const { cells } of one.rows) for (const [field, { typed }] of Object.entries(cells)) yield [field, typed];
	}
}

const isDoubt = ({ other, why }: { readonly other: string | null; readonly why: string | null }) =>
	why !== null && (other !== null || / is read as (?:thousands|the decimal point)/.test(why));
