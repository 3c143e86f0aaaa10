import type { Column, Content } from 'pdfmake/interfaces';
import { narrow, sans } from './printable';

/** Width of the key at the right of a page's head [pt]. */
const KEY = 182;

/** Name of a page, its subject, and what stands at the right. */
export function pageHead(id: string, kind: string, title: string, right: Content | null = null): Content {
	const left: Column = {
		width: '*',
		stack: [
			sans(kind, { fontSize: 9.75, color: '#333333', id }),
			sans(title, { fontSize: 16.5, bold: true, lineHeight: 1.02 })
		]
	};
	return {
		columns: right === null ? [left] : [left, { width: KEY, stack: [right], margin: [0, 18, 0, 0] }],
		columnGap: 12,
		margin: [0, 0, 0, 7]
	};
}

/** What white, tint and bar mean. */
export function keyLine(): Content {
	const word = (text: string, width: number) => ({ ...narrow(text, { fontSize: 9, noWrap: true }), width });
	return {
		columns: [
			{ width: 22, canvas: [{ type: 'line', x1: 0, y1: 10, x2: 20, y2: 10, lineWidth: 0.75 }] },
			word('entered', 34),
			{ width: 22, canvas: [{ type: 'rect', x: 0, y: 1, w: 20, h: 10, color: '#e0e0e0' }] },
			word('computed', 42),
			{ width: 6, canvas: [{ type: 'rect', x: 0, y: 1, w: 3, h: 10, color: '#000000' }] },
			word('index path', 40)
		],
		columnGap: 3
	} as Content;
}

export function heading(text: string, top = 10, id?: string): Content {
	return sans(text, { fontSize: 10.5, bold: true, margin: [0, top, 0, 3], ...(id !== undefined && { id }) });
}

export function notes(lines: readonly string[]): Content {
	return {
		stack: lines.map((text) => sans(text, { fontSize: 9, color: '#333333', lineHeight: 1.1 })),
		margin: [0, 5, 0, 0]
	};
}
