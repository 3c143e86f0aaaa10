/** Edits that the server did not take: kept on this device, with what was typed and why, until a person puts them away. */
import { z } from 'zod';
import { quoted, sentence } from '$lib/engine';
import type { Edit, SentEdit, SingleEdit } from './edit';

/** Read as it was written, since what the server does not take need not be of its form. */
const setAsideSchema = z.object({
	id: z.string(),
	edit: z.custom<Edit>((edit) => typeof edit === 'object' && edit !== null && 'kind' in edit),
	reason: z.string()
});
export type SetAside = SentEdit & { readonly reason: string };

const key = (designId: string) => `evendraft/set-aside/${designId}`;
/** Typed texts that are named one by one. */
const NAMED = 3;

export function readSetAside(designId: string): SetAside[] {
	try {
		const stored = z.array(setAsideSchema).safeParse(JSON.parse(localStorage.getItem(key(designId)) ?? '[]'));
		return stored.success ? stored.data : [];
	} catch {
		return [];
	}
}

/** False when this device has no room for them. */
export function keepSetAside(designId: string, edits: readonly SetAside[]): boolean {
	try {
		if (edits.length) localStorage.setItem(key(designId), JSON.stringify(edits));
		else localStorage.removeItem(key(designId));
		return true;
	} catch {
		return false;
	}
}

/** Why an edit was not taken, and what was typed. */
export function setAsideWords({ edit, reason }: SetAside): string {
	return `Not taken by the server: ${sentence(reason)} It was ${whatOf(edit)}.`;
}

function whatOf(edit: Edit): string {
	const singles = edit.kind === 'batch' ? edit.edits : [edit];
	const texts = singles.flatMap(textsOf).filter((text) => text.trim() !== '');
	const named = texts.slice(0, NAMED).map(quoted).join(', ');
	if (texts.length > NAMED) return `${named} and ${texts.length - NAMED} more`;
	if (named) return named;
	const [{ kind }] = singles as [SingleEdit];
	return { set: 'a cleared cell', insert: 'a new row', delete: 'a deletion of rows', move: 'a move of rows' }[kind];
}

/** All that a person typed in an edit. */
function textsOf(edit: SingleEdit): string[] {
	if (edit.kind === 'set') return [edit.typed];
	if (edit.kind !== 'insert') return [];
	return edit.rows.flatMap(({ cells }) => Object.values(cells).map(({ typed }) => typed));
}
