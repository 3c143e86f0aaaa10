import type { ContentTable } from 'pdfmake/interfaces';
import type { RevisionLine } from '$lib/report';
import { cell, grid, type GridColumn } from './grid';
import { isShort, type Sheet } from './paper';

/** Characters of a note on the cover, so that it takes two lines in the newest revision and one in those before. */
const NEWEST_NOTE = 110;
const EARLIER_NOTE = 54;
const SIZE = 9.4;

/** The newest revisions as the cover has room for them; where it leaves something out, all stand with the checks. */
export function coverRevisions(revisions: readonly RevisionLine[], sheet: Sheet): RevisionLine[] {
	return revisions
		.slice(0, isShort(sheet) ? 2 : 3)
		.map((one, place) => ({ ...one, note: cut(one.note, place === 0 ? NEWEST_NOTE : EARLIER_NOTE) }));
}

/** Whether the cover leaves out revisions or parts of notes. */
export function leavesOut(revisions: readonly RevisionLine[], sheet: Sheet): boolean {
	const told = coverRevisions(revisions, sheet);
	return revisions.some(({ note }, place) => told[place]?.note !== note);
}

function cut(note: string, most: number): string {
	return note.length <= most ? note : `${note.slice(0, most).trimEnd()}…`;
}

export function revisionTable(revisions: readonly RevisionLine[], width: number): ContentTable {
	const column = (head: string, wide: number): GridColumn => ({ width: wide, head, kind: 'entered', align: 'left' });
	const columns = [
		column('Rev.', 36),
		column('Date', 66),
		column('Status', 80),
		column('What changed', width - 36 - 66 - 80 - 84),
		column('Prepared', 84)
	];
	const body = revisions.map(({ revision, date, status, note, by, current }) =>
		[revision, date, status, note, by].map((text, place) =>
			cell(text, 'entered', { fontSize: SIZE, bold: current && place === 0 })
		)
	);
	return grid(columns, body, { fontSize: 8.8, heavy: false });
}
