import type { ContentTable } from 'pdfmake/interfaces';
import type { RevisionLine } from '$lib/report';
import { cell, grid, type GridColumn } from './grid';

/** Revisions on the cover; where there are more, all stand on the page of the checks. */
export const COVER_REVISIONS = 3;
/** Characters of a note on the cover. */
const COVER_NOTE = 180;
const SIZE = 9.4;

/** A note as the cover has it; where something is left out, the whole stands on the page of the checks. */
export function coverNote(note: string): string {
	return note.length <= COVER_NOTE ? note : `${note.slice(0, COVER_NOTE).trimEnd()}…`;
}

/** Whether the cover leaves out revisions or parts of notes. */
export function leavesOut(revisions: readonly RevisionLine[]): boolean {
	return revisions.length > COVER_REVISIONS || revisions.some(({ note }) => coverNote(note) !== note);
}

export function revisionTable(revisions: readonly RevisionLine[], width: number): ContentTable {
	const column = (head: string, wide: number): GridColumn => ({ width: wide, head, kind: 'entered', align: 'left' });
	const columns = [
		column('Rev.', 36),
		column('Date', 66),
		column('Status', 84),
		column('What changed', width - 36 - 66 - 84 - 96),
		column('Prepared', 96)
	];
	const body = revisions.map(({ revision, date, status, note, by, current }) =>
		[revision, date, status, note, by].map((text, place) =>
			cell(text, 'entered', { fontSize: SIZE, bold: current && place === 0 })
		)
	);
	return grid(columns, body, { fontSize: 8.8, heavy: false });
}
