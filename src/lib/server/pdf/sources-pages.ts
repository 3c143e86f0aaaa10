import type { Content } from 'pdfmake/interfaces';
import type { Report } from '$lib/report';
import { cell, grid, type GridColumn } from './grid';
import { notes, pageHead } from './page-head';
import type { Sheet } from './paper';

const SIZE = 9.2;

/** Where each coefficient and each method comes from. */
export function sourcesPages({ sources }: Report, sheet: Sheet): Content[] {
	const { width } = sheet.content;
	const columns: GridColumn[] = [
		{ width: 30, head: 'No.', kind: 'entered', align: 'right' },
		{ width: (width - 30) * 0.62, head: 'Method and source', kind: 'entered', align: 'left' },
		{ width: (width - 30) * 0.38, head: 'Used for', kind: 'entered', align: 'left' }
	];
	const body = sources.map(({ number, text, uses }) => [
		cell(String(number), 'entered', { fontSize: SIZE, alignment: 'right' }),
		cell(text, 'entered', { fontSize: SIZE }),
		cell(uses, 'entered', { fontSize: SIZE })
	]);
	return [
		{ stack: [pageHead('sources', 'Sources and methods', 'Where the losses come from')], margin: [0, 20, 0, 0] },
		grid(columns, body, { fontSize: 9 }),
		notes([
			'Friction: Darcy–Weisbach on the hydraulic diameter and the mean velocity, with the Colebrook–White factor. Each stream keeps its own total pressure where streams split and meet.',
			'“Entered by hand” means that a person gave the figure and the program did not check it.'
		])
	];
}
