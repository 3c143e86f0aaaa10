import type { Content, ContentSection, TDocumentDefinitions } from 'pdfmake/interfaces';
import type { Report } from '$lib/report';
import { checksPages } from './checks-pages';
import { coverPages } from './cover';
import { fanPages } from './fan-pages';
import { SANS } from './fonts';
import { blockText, frameLines } from './frame';
import { ledgerPages } from './ledger-pages';
import { sheetOf, type Sheet } from './paper';
import { partsPages } from './parts-pages';
import { printable } from './printable';
import { schedulePages } from './schedule-pages';
import { coverFoot, coverFootHeight } from './seal-box';
import { sourcesPages } from './sources-pages';

/** The pages of a report for pdfmake. Made anew for each print, since pdfmake writes into what it is given. */
export function definitionOf(report: Report, printedAt: Date): TDocumentDefinitions {
	const { heading, titleBlock, verification } = report;
	const text = sheetOf(report.paper, 'text');
	const wide = sheetOf(report.paper, 'schedule');
	const [left, top, right, bottom] = text.margins;
	const cover: Sheet = { ...text, margins: [left, top, right, bottom + coverFootHeight(text)] };

	const section = (sheet: Sheet, name: string, content: Content[], first: Content | null = null): ContentSection => ({
		section: content,
		pageSize: { width: sheet.width, height: sheet.height },
		pageOrientation: sheet.width > sheet.height ? 'landscape' : 'portrait',
		pageMargins: sheet.margins,
		background: () => frameLines(sheet),
		footer: (page, pages) => ({
			stack: [blockText(sheet, titleBlock, name, page, pages), ...(page === 1 && first !== null ? [first] : [])]
		})
	});
	return {
		content: [
			section(cover, 'Calculation report, cover', coverPages(report, cover), coverFoot(cover, verification)),
			section(text, 'Checks', checksPages(report, text)),
			section(wide, 'Duct schedule', schedulePages(report, wide)),
			section(text, 'Paths and ledger', ledgerPages(report, text)),
			section(text, 'Parts of each section', partsPages(report, text)),
			section(text, 'Fan duty, cautions, sources', [...fanPages(report, text), ...sourcesPages(report, text)])
		],
		defaultStyle: { font: SANS, fontSize: 9.75, color: '#000000' },
		info: {
			title: printable(`${heading.kind} ${titleBlock.project} ${titleBlock.system} ${titleBlock.revision}`),
			author: printable(titleBlock.firm),
			creator: 'Evendraft',
			producer: 'Evendraft',
			creationDate: printedAt,
			modDate: printedAt
		},
		language: 'en-GB',
		displayTitle: true,
		pageSize: { width: text.width, height: text.height }
	};
}
