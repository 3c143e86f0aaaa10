import pdfmake from 'pdfmake';
import type { Report } from '$lib/report';
import { definitionOf } from './definition';
import { fontPaths } from './fonts';

/** The report as a PDF file. Reads the shipped fonts and nothing else; never the network. */
export async function reportPdf(report: Report): Promise<Buffer> {
	const fonts = fontPaths();
	const files = new Set(Object.values(fonts).flatMap((family) => Object.values(family)));
	pdfmake.setFonts(fonts);
	pdfmake.setUrlAccessPolicy(() => false);
	pdfmake.setLocalAccessPolicy((path) => files.has(path));
	return pdfmake.createPdf(definitionOf(report, new Date(report.printedAt))).getBuffer();
}
