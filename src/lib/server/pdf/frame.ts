import type { CanvasElement, Content } from 'pdfmake/interfaces';
import type { TitleBlock } from '$lib/report';
import { NARROW, SANS, STRONG, type Family, type Weight } from './fonts';
import { footOrigin, type Sheet } from './paper';
import { fitted, narrow, sans, type TextStyle } from './printable';

const LINE = 1.125; // 1.5 px, the frame of the sheet
const HAIR = 0.75;
const BLACK = '#000000';
const SOFT = '#333333';

/** Frame and lines of the block, behind the content of every page. */
export function frameLines(sheet: Sheet): Content {
	const { left, top, right, bottom } = sheet.frame;
	const lines: CanvasElement[] = [
		{ type: 'rect', x: left, y: top, w: right - left, h: bottom - top, lineWidth: LINE, lineColor: BLACK },
		line(left, sheet.blockTop, right, sheet.blockTop, LINE)
	];
	for (const { x } of cellsOf(sheet).slice(1)) lines.push(line(x, sheet.blockTop, x, bottom, HAIR));
	return { canvas: lines, absolutePosition: { x: 0, y: 0 } };
}

/** The text of the title block, at the foot of every page. */
export function blockText(sheet: Sheet, block: TitleBlock, name: string, page: number, pages: number): Content {
	const top = sheet.blockTop + 3 - footOrigin(sheet);
	const cells = cellsOf(sheet);
	const placed: Content[] = [];
	const put = (cell: number, y: number, content: object) => {
		const { x, width } = cells[cell] ?? { x: 0, width: 0 };
		placed.push({
			columns: [{ width: width - 8, ...content }],
			absolutePosition: { x: x + 5.5, y: top + y }
		} as Content);
	};
	const caption = (cell: number, y: number, text: string) => put(cell, y, narrow(text, { fontSize: 8, color: SOFT }));
	const value = (cell: number, y: number, text: string, size = 9.4) =>
		put(cell, y, one(text, SANS, 'bold', size, (cells[cell]?.width ?? 0) - 9));

	const [first] = cells;
	placed.push({ canvas: mark(), absolutePosition: { x: (first?.x ?? 0) + 5.5, y: top + 2 } });
	placed.push({
		columns: [sans('Evendraft', { font: STRONG, bold: true, fontSize: 10.5 })],
		absolutePosition: { x: (first?.x ?? 0) + 20, y: top }
	});
	put(0, 14.5, one(name, NARROW, 'normal', 8.25, (first?.width ?? 0) - 9, { color: SOFT }));
	put(0, 24.5, narrow(block.caution, { fontSize: 8.25, color: SOFT }));

	caption(1, 0, 'Firm');
	value(1, 9, block.firm);
	caption(1, 24, 'Project');
	value(1, 33, block.project);
	caption(2, 0, 'System');
	value(2, 9, block.system);
	caption(2, 24, 'Units');
	value(2, 33, block.units);
	caption(3, 0, 'Revision');
	put(3, 10, one(block.revision, STRONG, 'bold', 18, (cells[3]?.width ?? 0) - 9));
	caption(4, 0, 'Status');
	value(4, 9, block.status);
	caption(4, 24, 'Date');
	value(4, 33, block.date);
	caption(5, 0, 'Page');
	const size = page > 99 ? 13 : 18;
	put(5, 10, {
		text: [
			{ text: String(page), font: STRONG, bold: true, fontSize: size },
			{ text: ` of ${pages}`, font: STRONG, fontSize: 9 }
		]
	});
	return { stack: placed };
}

function one(text: string, font: Family, weight: Weight, size: number, width: number, style: TextStyle = {}) {
	const all: TextStyle = { ...style, fontSize: size, bold: weight === 'bold', noWrap: true };
	const whole = fitted(text, font, weight, size, width);
	if (font !== NARROW && !whole.endsWith('…')) return sans(whole, { ...all, font });
	return narrow(fitted(text, NARROW, weight, size, width), all);
}

/** Cells of the block, left to right; identity takes what the record leaves. */
function cellsOf(sheet: Sheet): { x: number; width: number }[] {
	const { left, right } = sheet.frame;
	const whole = right - left;
	const record = [80, 46, 86, 50]; // system, revision, status, page
	const rest = whole - record.reduce((sum, width) => sum + width, 0);
	const widths = [Math.min(rest * 0.455, 190), 0, ...record];
	widths[1] = rest - (widths[0] ?? 0);
	let x = left;
	return widths.map((width) => {
		const cell = { x, width };
		x += width;
		return cell;
	});
}

function line(x1: number, y1: number, x2: number, y2: number, lineWidth: number): CanvasElement {
	return { type: 'line', x1, y1, x2, y2, lineWidth, lineColor: BLACK };
}

/** A trunk with three branches that end on one line. */
function mark(): CanvasElement[] {
	const scale = 11.25 / 24;
	const stroke = (...points: [number, number][]): CanvasElement => ({
		type: 'polyline',
		lineWidth: 2.6 * scale,
		lineColor: BLACK,
		points: points.map(([x, y]) => ({ x: x * scale, y: y * scale }))
	});
	return [
		stroke([4.5, 23], [4.5, 7], [8, 3.5], [20.5, 3.5]),
		stroke([4.5, 14], [8, 10.5], [20.5, 10.5]),
		stroke([4.5, 21], [8, 17.5], [20.5, 17.5])
	];
}
