import type { Content, TableCell } from 'pdfmake/interfaces';
import type { PartLine, PartsOfRow, Report } from '$lib/report';
import { columnsOn, placed } from './beside';
import { cell, grid, tagCell, tint, type GridColumn } from './grid';
import { keyLine, notes, pageHead } from './page-head';
import type { Sheet } from './paper';
import { sans } from './printable';

const SIZE = 8.4;
/** Lines in one column of a wide sheet. */
const IN_A_COLUMN = 36;

/** What each section's loss is made of, and the number of each source. */
export function partsPages({ parts, remarks, schedule, ledger }: Report, sheet: Sheet): Content[] {
	const unit = ledger.columns.at(-1)?.unit ?? '';
	const { count, width } = columnsOn(sheet);
	const columns = columnsOf(width, unit);
	const runs = count === 1 ? [parts] : columnsFull(parts);
	const blocks = runs.map((some) => ({ content: tableOf(some, columns), whole: count > 1 }));
	return [
		pageHead('parts', 'Parts of each section', schedule.title, keyLine()),
		...placed(blocks, count),
		notes([
			'Coefficients are on the section’s own velocity pressure, of one piece; the loss is of all pieces. Numbers of sources are those of the list of sources and methods; figures in brackets are remarks.',
			...remarks.map(({ number, text }) => `(${number}) ${text}`)
		])
	];
}

/** On a wide sheet the sections fill one column after the other, so that they read on within a page. */
function columnsFull(parts: readonly PartsOfRow[]): PartsOfRow[][] {
	const runs: PartsOfRow[][] = [];
	let lines = Infinity;
	for (const part of parts) {
		if (lines + part.lines.length > IN_A_COLUMN) {
			runs.push([]);
			lines = 0;
		}
		runs.at(-1)?.push(part);
		lines += part.lines.length;
	}
	return runs;
}

function columnsOf(width: number, unit: string): GridColumn[] {
	const columns: GridColumn[] = [
		{ width: 64, head: 'Section', kind: 'entered', align: 'left' },
		{ width: 62, head: 'Part', kind: 'entered', align: 'left' },
		{ width: 0, head: 'Name', kind: 'entered', align: 'left' },
		{ width: 34, head: 'Count', kind: 'entered', align: 'right' },
		{ width: 40, head: 'Coeff.', kind: 'computed', align: 'right' },
		{ width: 42, head: 'Vel. pr.', unit, kind: 'computed', align: 'right' },
		{ width: 42, head: 'Loss', unit, kind: 'computed', align: 'right' },
		{ width: 46, head: 'Section', unit, kind: 'computed', align: 'right' },
		{ width: 36, head: 'Source', kind: 'entered', align: 'right' }
	];
	const rest = width - columns.reduce((sum, one) => sum + one.width, 0);
	return columns.map((one) => (one.width === 0 ? { ...one, width: rest } : one));
}

function tableOf(parts: readonly PartsOfRow[], columns: readonly GridColumn[]): Content {
	const starts = new Set<number>();
	const body: TableCell[][] = [];
	for (const part of parts) {
		starts.add(body.length);
		part.lines.forEach((line, place) => body.push(rowOf(part, line, place === 0, columns)));
	}
	return grid(columns, body, { fontSize: SIZE, pad: 1.4, lineAbove: (row) => starts.has(row) });
}

/** The tag of a section on its further lines, so that a page which begins within it still names it. */
function tagAgain(tag: string): TableCell {
	return { text: sans(tag), fontSize: SIZE - 1.4, color: '#777777', margin: [8, 0.8, 0, 0], ...tint('entered') };
}

function rowOf(part: PartsOfRow, line: PartLine, first: boolean, columns: readonly GridColumn[]): TableCell[] {
	const put = (place: number, text: string, bold = false) =>
		cell(text, columns[place]?.kind ?? 'entered', { fontSize: SIZE, alignment: columns[place]?.align ?? 'left', bold });
	const name: TableCell = {
		text: [
			sans(line.name),
			sans(line.remarks.length ? ` (${line.remarks.join(', ')})` : ''),
			sans(line.toBeConfirmed ? `${line.name === '' ? '' : ', '}to be confirmed` : '', { bold: true })
		],
		fontSize: SIZE,
		...tint('entered')
	};
	return [
		first ? tagCell(part.tag, part.index, columns[0]?.width ?? 0, SIZE) : tagAgain(part.tag),
		put(1, line.part),
		name,
		put(3, line.count),
		cell(line.coefficient, line.coefficientKind, { fontSize: SIZE, alignment: 'right' }),
		put(5, first ? part.velocityPressure : ''),
		cell(line.loss, line.lossKind, { fontSize: SIZE, alignment: 'right' }),
		put(7, first ? part.loss : '', true),
		put(8, line.source === null ? '–' : String(line.source))
	];
}
