import type { Column, ContentTable, TableCell } from 'pdfmake/interfaces';
import type { CellKind } from '$lib/report';
import { narrow, sans, type TextStyle } from './printable';

/** Grey of what the engine computed: 7 % in the body, 12 % in the head. Both survive a fax. */
export const TINT = '#ededed';
export const TINT_HEAD = '#e0e0e0';
export const RULE = '#9a9a9a';
const BLACK = '#000000';

export interface GridColumn {
	/** With its padding [pt]. */
	readonly width: number;
	readonly head: string;
	readonly unit?: string;
	readonly kind: CellKind;
	readonly align: 'left' | 'right';
}
export interface GridOptions {
	readonly fontSize: number;
	/** Heavier line above the row of this number in the body. */
	readonly lineAbove?: (row: number) => boolean;
	/** A last line under the table; absent where a sum line is wanted by `lineAbove`. */
	readonly heavy?: boolean;
	readonly pad?: number;
}

/** Padding left and right of a cell [pt]. */
export const CELL_SIDE = 2.8;
/** Room for the bar of the index path [pt]. */
export const BAR = 7;

/** A table with the house's rules: horizontal lines only, units in the head, tint where the engine answers. */
export function grid(columns: readonly GridColumn[], body: readonly TableCell[][], options: GridOptions): ContentTable {
	const { fontSize, lineAbove, heavy = true, pad = 2.2 } = options;
	const heads = columns.some(({ unit }) => unit)
		? [headRow(columns, fontSize), unitRow(columns, fontSize)]
		: [headRow(columns, fontSize)];
	const last = heads.length + body.length;
	return {
		table: {
			headerRows: heads.length,
			keepWithHeaderRows: 1,
			dontBreakRows: true,
			widths: columns.map(({ width }) => width - 2 * CELL_SIDE),
			body: [...heads, ...body]
		},
		layout: {
			hLineWidth: (i) => {
				if (i === 0 || i === last) return heavy ? 1.2 : 0.75;
				if (i === heads.length) return 0.75;
				if (i < heads.length) return 0;
				return lineAbove?.(i - heads.length) ? 0.75 : 0.4;
			},
			hLineColor: (i) => (i <= heads.length || i === last || lineAbove?.(i - heads.length) ? BLACK : RULE),
			vLineWidth: () => 0,
			paddingLeft: () => CELL_SIDE,
			paddingRight: () => CELL_SIDE,
			paddingTop: (i) => (i < heads.length ? (i === 0 ? 2.5 : 0) : pad),
			paddingBottom: (i) => (i < heads.length ? (i === heads.length - 1 ? 2.5 : 0.5) : pad)
		}
	};
}

function headRow(columns: readonly GridColumn[], fontSize: number): TableCell[] {
	return columns.map(({ head, kind, align }) => ({
		...narrow(head, { fontSize, bold: true, alignment: align }),
		...tint(kind, TINT_HEAD)
	}));
}

function unitRow(columns: readonly GridColumn[], fontSize: number): TableCell[] {
	return columns.map(({ unit, kind, align }) => ({
		...narrow(unit ?? '', { fontSize: fontSize - 0.4, color: '#333333', alignment: align }),
		...tint(kind, TINT_HEAD)
	}));
}

export function tint(kind: CellKind, grey = TINT): { fillColor?: string } {
	return kind === 'computed' ? { fillColor: grey } : {};
}

/** A cell with figures or words. */
export function cell(text: string, kind: CellKind, style: TextStyle): TableCell {
	return { ...sans(text, { fontFeatures: ['tnum', 'case'], ...style }), ...tint(kind) };
}

/** The first cell of a row: a bar where it lies on the index path. */
export function tagCell(
	tag: string,
	index: boolean,
	width: number,
	fontSize: number,
	kind: CellKind = 'entered'
): TableCell {
	const style: TextStyle = { bold: true, fontSize, fontFeatures: ['tnum', 'case'] };
	if (!index) return { ...sans(tag, { ...style, margin: [BAR, 0, 0, 0] }), ...tint(kind) };
	const bar: Column = { width: BAR, canvas: [{ type: 'rect', x: 0, y: 1, w: 3, h: fontSize, color: BLACK }] };
	return { columns: [bar, { ...sans(tag, style), width: width - 2 * CELL_SIDE - BAR }], columnGap: 0, ...tint(kind) };
}
