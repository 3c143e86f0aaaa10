/** Blocks of cells as tab-separated text, as spreadsheets put them on the clipboard. */
import Papa from 'papaparse';

/** Cells that one paste may bring; more would be refused by the sheet anyhow. */
export const MOST_CELLS = 200_000;

export type PasteBlock =
	| { readonly ok: true; readonly cells: readonly (readonly string[])[] }
	| { readonly ok: false; readonly message: string };

/** Reads a block. Refuses, with nothing changed, what no sheet could hold. */
export function readBlock(text: string, mostRows: number): PasteBlock {
	const lines = countLines(text);
	if (lines > mostRows)
		return {
			ok: false,
			message: `The clipboard holds ${lines} rows; a sheet holds at most ${mostRows}. Nothing was pasted.`
		};
	const { data } = Papa.parse<string[]>(text.replace(/\r?\n$/, ''), { delimiter: '\t', quoteChar: '"' });
	const cells = data.reduce((sum, row) => sum + row.length, 0);
	if (cells > MOST_CELLS)
		return {
			ok: false,
			message: `The clipboard holds ${cells} cells; at most ${MOST_CELLS} are pasted at once. Nothing was pasted.`
		};
	return { ok: true, cells: data };
}

function countLines(text: string): number {
	let lines = text && !text.endsWith('\n') ? 1 : 0;
	for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) lines++;
	return lines;
}

/** Writes a block. */
export function writeBlock(cells: readonly (readonly string[])[]): string {
	return Papa.unparse(cells as string[][], { delimiter: '\t', newline: '\n' });
}
