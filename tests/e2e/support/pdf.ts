/** The text of a PDF, page by page and line by line. */
import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';

export interface PdfPage {
	/** All its text, one space between words. */
	readonly text: string;
	/** Its lines from the top, each as the pieces that stand beside each other. */
	readonly lines: readonly (readonly string[])[];
}

export async function readPdf(bytes: Uint8Array): Promise<PdfPage[]> {
	const task = getDocument({
		data: new Uint8Array(bytes),
		useSystemFonts: false,
		isEvalSupported: false,
		verbosity: 0
	});
	const document = await task.promise;
	const pages: PdfPage[] = [];
	for (let number = 1; number <= document.numPages; number += 1) {
		const { items } = await (await document.getPage(number)).getTextContent();
		const placed = items.flatMap((item) =>
			'str' in item && item.str.trim()
				? [{ text: item.str.trim(), x: Number(item.transform[4]), y: Number(item.transform[5]) }]
				: []
		);
		const heights = [...new Set(placed.map(({ y }) => Math.round(y)))].sort((a, b) => b - a);
		const lines = heights.map((height) =>
			placed
				.filter(({ y }) => Math.round(y) === height)
				.sort((a, b) => a.x - b.x)
				.map(({ text }) => text)
		);
		pages.push({
			text: placed
				.map(({ text }) => text)
				.join(' ')
				.replace(/\s+/g, ' '),
			lines
		});
	}
	await task.destroy();
	return pages;
}
