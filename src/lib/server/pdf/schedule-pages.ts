import type { Content } from 'pdfmake/interfaces';
import type { Report, Schedule } from '$lib/report';
import { cell, grid, tagCell, type GridColumn } from './grid';
import { keyLine, notes, pageHead } from './page-head';
import type { Sheet } from './paper';

const SIZE = 8.4;
/** Least widths [pt]; what is left over goes to the columns of words. */
const WIDTHS: Readonly<Record<string, number>> = {
	section: 52,
	joins: 44,
	side: 42,
	serves: 60,
	flow: 40,
	size: 64,
	length: 36,
	flexible: 32,
	velocity: 36,
	rate: 44,
	spare: 38,
	total: 40
};
const FIGURE = 38;

/** The duct schedule, its heads repeated on each page. */
export function schedulePages({ schedule }: Report, sheet: Sheet): Content[] {
	const columns = columnsOf(schedule, sheet);
	const body = schedule.rows.map(({ tag, index, cells }) =>
		cells.map(({ text, kind }, place) => {
			const column = columns[place];
			if (place === 0) return tagCell(tag, index, column?.width ?? 0, SIZE);
			const key = schedule.columns[place]?.key;
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
	const shares: Readonly<Record<string, number>> = { section: 0.12, joins: 0.12, serves: 0.64, size: 0.12 };
	return columns.map(({ key, head, unit, kind, align }, place) => ({
		width: (widths[place] ?? FIGURE) + spare * (shares[key] ?? 0),
		head,
		unit,
		kind,
		align
	}));
}
