import type { Content, TableCell } from 'pdfmake/interfaces';
import type { Check, Report } from '$lib/report';
import { cell, grid, type GridColumn } from './grid';
import { heading, notes, pageHead } from './page-head';
import type { Sheet } from './paper';
import { sans } from './printable';
import { leavesOut, revisionTable } from './revision-table';

const SIZE = 8.8;
/** Sections named in one cell; more go on in the next row, so that no row is taller than a page. */
const IN_ONE_CELL = 40;

/** All checks with threshold and basis, and the whole list of what is to be confirmed. */
export function checksPages({ checks, toBeConfirmed, revisions }: Report, sheet: Sheet): Content[] {
	const columns = columnsOf(sheet.content.width);
	const count = checks.reduce((sum, { findings }) => sum + findings.length, 0);
	const body = checks.flatMap((check) => rowsOf(check, columns));
	const open = toBeConfirmed.map(({ text }, place) => ({
		columns: [
			sans(`${place + 1}.`, { width: 22, alignment: 'right', fontFeatures: ['tnum'] } as object),
			sans(text, { width: '*' } as object)
		],
		columnGap: 5,
		fontSize: 9.4,
		margin: [0, 0, 0, 2]
	}));
	return [
		pageHead('checks', 'Checks', count === 0 ? 'Nothing was found' : `${count} found by ${counted(checks)}`),
		...(body.length > 0
			? [grid(columns, body, { fontSize: SIZE })]
			: [notes(['No check of the engine found anything to look at. That is no proof that nothing is wrong.'])]),
		heading('To be confirmed'),
		...(open.length > 0 ? (open as Content[]) : [notes(['Nothing is marked as to be confirmed.'])]),
		...(leavesOut(revisions, sheet)
			? [heading('All revisions', 10, 'revisions'), revisionTable(revisions, sheet.content.width)]
			: [])
	];
}

function counted({ length }: readonly unknown[]): string {
	return length === 1 ? '1 rule' : `${length} rules`;
}

function columnsOf(width: number): GridColumn[] {
	const part = (share: number, head: string, kind: GridColumn['kind']): GridColumn => ({
		width: width * share,
		head,
		kind,
		align: 'left'
	});
	return [
		part(0.2, 'Check', 'entered'),
		part(0.09, 'Kind', 'computed'),
		part(0.12, 'Threshold', 'entered'),
		part(0.22, 'Section, and what was found', 'computed'),
		part(0.37, 'What it says, and its basis', 'entered')
	];
}

function rowsOf({ title, severity, threshold, basis, findings }: Check, columns: readonly GridColumn[]): TableCell[][] {
	const byMessage = new Map<string, string[]>();
	for (const { row, found, message } of findings) {
		const where = [row ?? 'whole design', ...(found === '–' ? [] : [found])].join('\u00a0');
		const same = byMessage.get(message);
		if (same) same.push(where);
		else byMessage.set(message, [where]);
	}
	const put = (place: number, text: string, bold = false) =>
		cell(text, columns[place]?.kind ?? 'entered', { fontSize: SIZE, bold });
	return [...byMessage].flatMap(([message, places]) => {
		const rows: TableCell[][] = [];
		for (let i = 0; i < places.length; i += IN_ONE_CELL) {
			const some = places.slice(i, i + IN_ONE_CELL).join(', ');
			rows.push([
				put(0, title, true),
				put(1, severity),
				put(2, threshold),
				put(3, some),
				{ text: [sans(message), sans(` Basis: ${basis}.`, { color: '#333333' })], fontSize: SIZE }
			]);
		}
		return rows;
	});
}
