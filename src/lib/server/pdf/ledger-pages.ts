import type { Content, TableCell } from 'pdfmake/interfaces';
import type { Account, AccountLine, Ledger, Report } from '$lib/report';
import { cell, grid, tagCell, type GridColumn } from './grid';
import { keyLine, notes, pageHead } from './page-head';
import type { Sheet } from './paper';
import { sans } from './printable';
import { columnsOn, placed } from './beside';

const SIZE = 8.4;
const FIGURE = 38;
const WIDTHS: Readonly<Record<string, number>> = { step: 92, size: 58, flow: 40, loss: 42, total: 52 };
/** An account up to this length stays on one page. */
const TOGETHER = 30;

/** Every path as an account of total pressure, the index path first. */
export function ledgerPages({ ledger }: Report, sheet: Sheet): Content[] {
	const { count, width } = columnsOn(sheet);
	const columns = columnsOf(ledger, width);
	const accounts = ledger.accounts.map((account) => accountTable(account, ledger, columns));
	return [
		pageHead('ledger', 'Paths and ledger', titleOf(ledger), keyLine()),
		notes(ledger.notes),
		...placed(accounts, count)
	];
}

function titleOf({ accounts }: Ledger): string {
	return accounts.length === 1 ? '1 path' : `${accounts.length} paths, index path first`;
}

function columnsOf({ columns }: Ledger, width: number): GridColumn[] {
	const widths = columns.map(({ key }) => WIDTHS[key] ?? FIGURE);
	const scale = width / widths.reduce((sum, one) => sum + one, 0);
	return columns.map(({ head, unit, kind, align }, place) => ({
		width: (widths[place] ?? FIGURE) * scale,
		head,
		unit,
		kind,
		align
	}));
}

function accountTable(account: Account, { columns }: Ledger, grids: readonly GridColumn[]) {
	const { rank, outlet, serves, index, lines, requirementText, spareText } = account;
	const unit = columns.at(-1)?.unit ?? '';
	const body = lines.map((line) => rowOf(line, index, grids));
	const table = grid(grids, body, {
		fontSize: SIZE,
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

function rowOf(line: AccountLine, index: boolean, columns: readonly GridColumn[]): TableCell[] {
	const { kind, name, cells, lossText, totalText } = line;
	const figure = (text: string, place: number, bold = false) => {
		const column = columns[place];
		return cell(text, column?.kind ?? 'computed', { fontSize: SIZE, alignment: column?.align ?? 'right', bold });
	};
	const width = columns[0]?.width ?? 0;
	const first =
		kind === 'row'
			? tagCell(name, index, width, SIZE)
			: cell(name, 'entered', { fontSize: SIZE, bold: kind === 'end' });
	const middle = cells.map((text, place) => figure(text, place + 1));
	return [
		first,
		...middle,
		figure(lossText, columns.length - 2),
		figure(totalText, columns.length - 1, kind === 'start' || kind === 'end')
	];
}
