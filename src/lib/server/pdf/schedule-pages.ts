import type { Content } from 'pdfmake/interfaces';
import type { Report, Schedule } from '$lib/report';
import { columnWidths, type ColumnText } from './column-widths';
import { BAR, cell, grid, tagCell } from './grid';
import { keyLine, notes, pageHead } from './page-head';
import type { Sheet } from './paper';
import { narrow } from './printable';

const SIZE = 8.6;
/** Columns of words, set in the condensed face. */
const WORDS = new Set(['serves', 'side']);

/** The duct schedule, its heads repeated on each page. */
export function schedulePages({ schedule }: Report, sheet: Sheet): Content[] {
	const { widths, fontSize } = columnWidths(textsOf(schedule, sheet), sheet.content.width, SIZE);
	const columns = schedule.columns.map((column, place) => ({ ...column, width: widths[place] ?? 0 }));
	const body = schedule.rows.map(({ tag, index, cells }) =>
		cells.map(({ text, kind }, place) => {
			const column = columns[place];
			if (place === 0 || column === undefined) return tagCell(tag, index, column?.width ?? 0, fontSize);
			if (WORDS.has(column.key)) return { ...narrow(text, { fontSize }) };
			const bold = column.key === 'total' || (column.key === 'spare' && index);
			return cell(text, kind, { fontSize, alignment: column.align, bold });
		})
	);
	return [
		pageHead('schedule', 'Duct schedule', schedule.title, keyLine()),
		grid(columns, body, { fontSize }),
		notes(schedule.notes)
	];
}

function textsOf({ columns, rows }: Schedule, sheet: Sheet): ColumnText[] {
	return columns.map(({ key, head, unit }, place): ColumnText => {
		const texts = rows.map(({ cells }) => cells[place]?.text ?? '');
		if (key === 'serves') return { head, unit, texts, holds: 'rest', least: 70 };
		if (key === 'section') return { head, unit, texts, holds: 'words', least: 40, most: 82, before: BAR };
		if (key === 'joins') return { head, unit, texts, holds: 'words', least: 30, most: 70 };
		if (key === 'side') return { head, unit, texts, holds: 'words', most: 46 };
		if (key === 'size') return { head, unit, texts, holds: 'words', most: 76 };
		return { head, unit, texts, holds: 'figures', least: sheet.wide ? 40 : 30 };
	});
}
