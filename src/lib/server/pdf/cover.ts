import type { Content, TableCell } from 'pdfmake/interfaces';
import type { Labelled, Report } from '$lib/report';
import { cell, grid, RULE } from './grid';
import { heading, notes } from './page-head';
import { pageList } from './page-list';
import type { Sheet } from './paper';
import { narrow, sans } from './printable';
import { resultBand } from './result-band';
import { coverRevisions, leavesOut, revisionTable } from './revision-table';
import { STAMP_WIDTH, stamp } from './stamp';

/** Open items told on the cover; all stand on the page of the checks. */
const COVER_ITEMS = 4;
const GAP = 19.5;
const WIDE_GAP = 34;

/** The cover: whose it is, what it rests on, what came out and what is still open. */
export function coverPages(report: Report, sheet: Sheet): Content[] {
	const width = sheet.wide ? (sheet.content.width - WIDE_GAP) / 2 : sheet.content.width;
	const first = [...headOf(report, width), ...resultOf(report, width)];
	const second = [...openOf(report, width), ...recordOf(report, sheet, width), pageList(width)];
	if (!sheet.wide) return [...first, ...second];
	return [
		{
			columns: [
				{ width, stack: first },
				{ width, stack: second }
			],
			columnGap: WIDE_GAP
		}
	];
}

function headOf({ heading: { kind, title, place, identity, stamp: status }, basis }: Report, width: number): Content[] {
	const half = (width - GAP) / 2;
	return [
		{
			columns: [
				{
					width: width - STAMP_WIDTH - 16,
					stack: [
						sans(kind, { fontSize: 9.75, color: '#333333' }),
						sans(title, { fontSize: 21.75, bold: true, lineHeight: 0.98 }),
						sans(place, { fontSize: 11.25, margin: [0, 2, 0, 0] })
					]
				},
				stamp(status)
			],
			columnGap: 16
		},
		{
			columns: [
				{ width: half, stack: [heading('Record', 6), pairs(identity, half)] },
				{ width: half, stack: [heading('Basis of design', 6, 'basis'), pairs(basis, half)] }
			],
			columnGap: GAP
		}
	];
}

function pairs(lines: readonly Labelled[], width: number): Content {
	const label = 66;
	return {
		width,
		table: {
			widths: [label, width - label],
			body: lines.map(({ label: name, value }): TableCell[] => [
				narrow(name, { fontSize: 9, color: '#333333', margin: [0, 0.6, 0, 0] }),
				sans(value, { fontSize: 9.6, fontFeatures: ['tnum'] })
			])
		},
		layout: {
			hLineWidth: (i) => (i === 0 ? 0.75 : 0.4),
			hLineColor: (i) => (i === 0 ? '#000000' : RULE),
			vLineWidth: () => 0,
			paddingLeft: () => 0,
			paddingRight: () => 0,
			paddingTop: () => 1,
			paddingBottom: () => 1
		}
	} as Content;
}

function resultOf({ result }: Report, width: number): Content[] {
	return [heading('Result', 8), resultBand(result, width), notes(result.notes)];
}

function openOf({ toBeConfirmed, criteria, checks }: Report, width: number): Content[] {
	const half = (width - GAP) / 2;
	const told = toBeConfirmed.slice(0, COVER_ITEMS);
	const more = toBeConfirmed.length - told.length;
	const items: Content[] = told.map(
		({ text }, place) =>
			({
				columns: [sans(`${place + 1}.`, { width: 12 } as object), sans(text, { width: half - 16 } as object)],
				columnGap: 4,
				fontSize: 9.6,
				margin: [0, 0, 0, 2.5]
			}) as Content
	);
	if (more > 0) items.push(reference(`and ${more} more, on page `, 'checks'));
	if (toBeConfirmed.length === 0) items.push(sans('Nothing is marked as to be confirmed.', { fontSize: 9.6 }));

	const found = checks.reduce((sum, { findings }) => sum + findings.length, 0);
	const limits: TableCell[][] = criteria.map(({ label, found: worst, verdict }) => [
		cell(label, 'entered', { fontSize: 9.4 }),
		cell(worst, 'computed', { fontSize: 9.4, alignment: 'right' }),
		cell(verdict, 'entered', { fontSize: 9.4, alignment: 'right', bold: verdict !== 'met' })
	]);
	const columns = [
		{ width: half - 44 - 40, head: 'Limit of the design', kind: 'entered', align: 'left' },
		{ width: 44, head: 'Worst', kind: 'computed', align: 'right' },
		{ width: 40, head: '', kind: 'entered', align: 'right' }
	] as const;
	const right: Content[] = [heading('Checks', 8)];
	if (limits.length > 0) right.push(grid(columns, limits, { fontSize: 8.8, heavy: false, pad: 1.8 }));
	else right.push(sans('The design names no limits of its own.', { fontSize: 9.6 }));
	right.push(
		found === 0
			? notes(['The engine flagged nothing.'])
			: reference(`${found} flagged by the engine, on page `, 'checks', 4)
	);
	return [
		{
			columns: [
				{ width: half, stack: [heading('To be confirmed', 8), ...items] },
				{ width: half, stack: right }
			],
			columnGap: GAP
		}
	];
}

function recordOf({ revisions }: Report, sheet: Sheet, width: number): Content[] {
	const latest = coverRevisions(revisions, sheet);
	const table: Content[] =
		latest.length > 0
			? [revisionTable(latest, width)]
			: [sans('None: this sheet was not saved as a version.', { fontSize: 9.6 })];
	const some = latest.length < revisions.length ? `, the latest ${latest.length} of ${revisions.length}` : '';
	// Where something is left out, this id is that of the whole table, with the checks.
	const id = leavesOut(revisions, sheet) ? undefined : 'revisions';
	return [{ stack: [heading(`Revisions${some}`, 8, id), ...table], unbreakable: true }];
}

function reference(text: string, id: string, top = 0): Content {
	return {
		text: [sans(text), { pageReference: id, noWrap: true }],
		fontSize: 9,
		color: '#333333',
		margin: [0, top, 0, 0]
	};
}
