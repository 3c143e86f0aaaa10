import type { Content } from 'pdfmake/interfaces';
import type { Report, Schedule } from '$lib/report';
import { cell, grid, tagCell, type GridColumn } from './grid';
import { keyLine, notes, pageHead } from './page-head';
import type { Sheet } from './paper';
import { narrow } from './printable';

const SIZE = 8.4;
/** Least widths [pt]; what is left over goes to the columns of words. */
const WIDTHS: Readonly<Record<string, number>> = {
	section: 44,
	joins: 34,
	side: 38,
	serves: 60,
	flow: 34,
	size: 53,
	length: 32,
	flexible: 27,
	rate: 37,
	fittings: 35,
	total: 35
};
const FIGURE = 31;
const WORDS = new Set(['serves', 'side']);

/** The duct schedule, its heads repeated on each page. */
export function schedulePages({ schedule }: Report, sheet: Sheet): Content[] {
	const columns = columnsOf(schedule, sheet);
	const body = schedule.rows.map(({ tag, index, cells }) =>
		cells.map(({ text, kind }, place) => {
			const column = columns[place];
			if (place === 0) return tagCell(tag, index, column?.width ?? 0, SIZE);
			const key = schedule.columns[place]?.key;
			if (key !== undefined && WORDS.has(key)) return { ...narrow(text, { fontSize: SIZE }) };
			const bold = key === 'total' || (key === 'spare' && index);
			return cell(text, kind, { fontSize: SIZE, alignment: column?.align ?? 'left', bold });
		})
	);
	return [
		pageHead('schedule', 'Duct schedule', schedule.title, keyLine()),
		grid(columns, body, { fontSize: SIZE }),
		notes(schedule.notes)
	];
}

function columnsOf({ columns }: Schedule, sheet: Sheet): GridColumn[] {
	const widths = columns.map(({ key }) => WIDTHS[key] ?? FIGURE);
	const spare = sheet.content.width - widths.reduce((sum, width) => sum + width, 0);
	const shares: Readonly<Record<string, number>> = { section: 0.1, joins: 0.1, serves: 0.72, size: 0.08 };
	return columns.map(({ key, head, unit, kind, align }, place) => ({
		width: (widths[place] ?? FIGURE) + spare * (shares[key] ?? 0),
		head,
		unit,
		kind,
		align
	}));
}
