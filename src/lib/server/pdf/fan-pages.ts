import type { Content, TableCell } from 'pdfmake/interfaces';
import type { Report } from '$lib/report';
import { cell, grid, type GridColumn } from './grid';
import { heading, notes, pageHead } from './page-head';
import type { Sheet } from './paper';
import { sans } from './printable';

const SIZE = 9.75;

/** The duty of the fan on every basis, then the cautions. */
export function fanPages({ fan, heading: { title }, cautions }: Report, sheet: Sheet): Content[] {
	const width = Math.min(sheet.content.width, 620);
	const columns: GridColumn[] = [
		{ width: 196, head: 'Fan duty', kind: 'entered', align: 'left' },
		{ width: 66, head: 'Value', kind: 'computed', align: 'right' },
		{ width: 56, head: 'Unit', kind: 'computed', align: 'left' },
		{ width: width - 318, head: 'Basis', kind: 'entered', align: 'left' }
	];
	const body = fan.lines.map(({ label, value, unit, note, strong }): TableCell[] => [
		cell(label, 'entered', { fontSize: SIZE, bold: strong }),
		cell(value, 'computed', { fontSize: SIZE, bold: strong, alignment: 'right' }),
		cell(unit, 'computed', { fontSize: SIZE }),
		cell(note, 'entered', { fontSize: 9, color: '#333333' })
	]);
	return [
		pageHead('fan', 'Fan duty', title),
		grid(columns, body, { fontSize: 9, pad: 3 }),
		notes(fan.notes),
		heading('Cautions', 16),
		...cautions.map((caution): Content => ({
			columns: [
				sans(caution.title, { width: 130, bold: true } as object),
				sans(caution.text, { width: '*' } as object)
			] as Content[],
			columnGap: 8,
			fontSize: 9.4,
			margin: [0, 0, 0, 4]
		}))
	];
}
