import type { ContentTable, TableCell } from 'pdfmake/interfaces';
import { sans } from './printable';

/** What a reader looks for, with the ids of its heads. */
const PAGES: readonly (readonly [string, string])[] = [
	['Basis of design', 'basis'],
	['Revisions', 'revisions'],
	['Checks, to be confirmed', 'checks'],
	['Duct schedule', 'schedule'],
	['Paths and ledger', 'ledger'],
	['Parts of each section', 'parts'],
	['Fan duty, cautions', 'fan'],
	['Sources and methods', 'sources']
];

const ACROSS = 4;
const LABEL = 34;
const NUMBER = 12;

/** On which page what stands, in two rows. */
export function pageList(width: number): ContentTable {
	const name = (width - LABEL) / ACROSS - NUMBER - 4;
	const row = (label: string, from: number): TableCell[] => [
		sans(label, { fontSize: 10.5, bold: true }),
		...PAGES.slice(from, from + ACROSS).flatMap(([text, id]): TableCell[] => [
			{ pageReference: id, fontSize: 9.4, bold: true, noWrap: true },
			sans(text, { fontSize: 9.4 })
		])
	];
	return {
		table: {
			widths: [LABEL, ...PAGES.slice(0, ACROSS).flatMap(() => [NUMBER, name])],
			body: [row('Pages', 0), row('', ACROSS)]
		},
		layout: {
			hLineWidth: () => 0,
			vLineWidth: () => 0,
			paddingLeft: () => 0,
			paddingRight: (i) => (i % 2 === 1 ? 4 : 0),
			paddingTop: () => 1,
			paddingBottom: () => 1
		},
		margin: [0, 6, 0, 0]
	};
}
