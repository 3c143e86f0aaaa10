import type { Content } from 'pdfmake/interfaces';
import type { Report } from '$lib/report';
import { STRONG } from './fonts';
import { narrow, sans } from './printable';

export const STAMP_WIDTH = 196;

/** The stamp of status: a double edge, two lines, upper case. Never round, never near the seal box. */
export function stamp({ lines, caution }: Report['heading']['stamp']): Content {
	const edge = (width: number, padding: number, inner: Content): Content => ({
		table: { widths: ['*'], body: [[inner]] },
		layout: {
			hLineWidth: () => width,
			vLineWidth: () => width,
			hLineColor: () => '#000000',
			vLineColor: () => '#000000',
			paddingLeft: () => padding,
			paddingRight: () => padding,
			paddingTop: () => padding,
			paddingBottom: () => padding
		}
	});
	const text: Content = {
		stack: [
			...lines.map((line) =>
				sans(line, {
					font: STRONG,
					bold: true,
					fontSize: 12.6,
					characterSpacing: 0.5,
					alignment: 'center',
					lineHeight: 1.05
				})
			),
			{ canvas: [{ type: 'line', x1: 0, y1: 0, x2: STAMP_WIDTH - 26, y2: 0, lineWidth: 0.75 }], margin: [4, 3, 0, 3] },
			narrow(caution, { fontSize: 8.6, alignment: 'center' })
		],
		margin: [4, 2, 4, 1]
	};
	return { width: STAMP_WIDTH, stack: [edge(0.75, 1.6, edge(1.6, 3, text))] } as Content;
}
