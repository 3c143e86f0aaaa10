import type { Content, TableCell } from 'pdfmake/interfaces';
import type { Account, AccountLine, Ledger, Report } from '$lib/report';
import { columnWidths, type ColumnText } from './column-widths';
import { cell, grid, tagCell, type GridColumn } from './grid';
import { keyLine, notes, pageHead } from './page-head';
import type { Sheet } from './paper';
import { sans } from './printable';
import { columnsOn, placed } from './beside';

const SIZE = 8.4;
/** An account up to this length stays on one page. */
const TOGETHER = 34;

/** Every path as an account of total pressure, the index path first. */
export function ledgerPages({ ledger }: Report, sheet: Sheet): Content[] {
	const { count, width } = columnsOn(sheet);
	const { widths, fontSize } = columnWidths(textsOf(ledger), width, SIZE);
	const columns = ledger.columns.map((column, place) => ({ ...column, width: widths[place] ?? 0 }));
	const accounts = ledger.accounts.map((account) => accountTable(account, columns, fontSize));
	return [
		pageHead('ledger', 'Paths and ledger', titleOf(ledger), keyLine()),
		notes(ledger.notes),
		...placed(accounts, count)
	];
}

function titleOf({ accounts }: Ledger): string {
	return accounts.length === 1 ? '1 path' : `${accounts.length} paths, index path first`;
}

function textsOf({ columns, accounts }: Ledger): ColumnText[] {
	const lines = accounts.flatMap((account) => account.lines);
	return columns.map(({ key, head, unit }, place): ColumnText => {
		if (key === 'step') return { head, unit, texts: [], holds: 'rest', least: 84 };
		if (key === 'loss')
			return { head, unit, texts: lines.map(({ lossText }) => lossText), holds: 'figures', least: 44 };
		if (key === 'total')
			return { head, unit, texts: lines.map(({ totalText }) => totalText), holds: 'figures', least: 56 };
		const texts = lines.map(({ cells }) => cells[place - 1] ?? '');
		return key === 'size'
			? { head, unit, texts, holds: 'words', most: 76 }
			: { head, unit, texts, holds: 'figures', least: 40 };
	});
}

function accountTable(account: Account, columns: readonly GridColumn[], fontSize: number) {
	const { rank, outlet, serves, index, lines, requirementText, spareText } = account;
	const unit = columns.at(-1)?.unit ?? '';
	const body = lines.map((line) => rowOf(line, index, columns, fontSize));
	const table = grid(columns, body, {
		fontSize,
		heavy: false,
		pad: 1.5,
		lineAbove: (row) => row === 1 || lines[row]?.kind === 'end'
	});
	const title: Content = {
		columns: [
			{
				width: '*',
				text: [
					sans(`${rank}\u00a0\u00a0\u00a0`, { color: '#333333' }),
					sans(outlet, { bold: true }),
					sans(serves === '' || serves === outlet ? '' : `\u00a0\u00a0\u00a0${serves}`)
				],
				fontSize: 10.2
			},
			{
				width: 'auto',
				text: [
					sans(`requires ${requirementText} ${unit}`, { bold: true }),
					sans(index ? '\u00a0\u00a0\u00a0index path' : `\u00a0\u00a0\u00a0spare ${spareText} ${unit}`, { bold: index })
				],
				fontSize: 9.4
			}
		],
		columnGap: 10,
		margin: [0, 10, 0, 3]
	};
	return { content: { stack: [title, table] }, whole: lines.length <= TOGETHER };
}

function rowOf(line: AccountLine, index: boolean, columns: readonly GridColumn[], fontSize: number): TableCell[] {
	const { kind, name, cells, lossText, totalText } = line;
	const figure = (text: string, place: number, bold = false) => {
		const column = columns[place];
		return cell(text, column?.kind ?? 'computed', { fontSize, alignment: column?.align ?? 'right', bold });
	};
	const width = columns[0]?.width ?? 0;
	const first =
		kind === 'row' ? tagCell(name, index, width, fontSize) : cell(name, 'entered', { fontSize, bold: kind === 'end' });
	const middle = cells.map((text, place) => figure(text, place + 1));
	return [
		first,
		...middle,
		figure(lossText, columns.length - 2),
		figure(totalText, columns.length - 1, kind === 'start' || kind === 'end')
	];
}
