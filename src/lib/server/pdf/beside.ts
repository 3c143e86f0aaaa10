import type { Content } from 'pdfmake/interfaces';
import type { Sheet } from './paper';

const GAP = 28;

/** On a wide sheet two blocks stand beside each other, each about as wide as an upright page. */
export function columnsOn(sheet: Sheet): { readonly count: 1 | 2; readonly width: number } {
	if (!sheet.wide) return { count: 1, width: sheet.content.width };
	return { count: 2, width: (sheet.content.width - GAP) / 2 };
}

/** Blocks one under the other, or two by two; those that stay whole alone stay whole together. */
export function placed(
	blocks: readonly { readonly content: Content; readonly whole: boolean }[],
	count: 1 | 2
): Content[] {
	const lines: Content[] = [];
	for (let i = 0; i < blocks.length; i += count) {
		const line = blocks.slice(i, i + count);
		const unbreakable = line.every(({ whole }) => whole);
		const content = line.map((block) => block.content);
		if (count === 1) lines.push({ stack: content, unbreakable });
		else lines.push({ columns: [...content, ...(line.length < count ? [''] : [])], columnGap: GAP, unbreakable });
	}
	return lines;
}
