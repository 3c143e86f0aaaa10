/** Blocks of cells as tab-separated text, as spreadsheets put them on the clipboard. */
import Papa from 'papaparse';
import { MOST_TYPED } from './storable-text';

/** Cells that one paste may bring; more would be refused by the sheet anyhow. */
export const MOST_CELLS = 200_000;

export type PasteBlock =
	| { readonly ok: true; readonly cells: readonly (readonly string[])[] }
	| { readonly ok: false; readonly message: string };

const refused = (message: string): PasteBlock => ({ ok: false, message: `${message} Nothing was pasted.` });

/** Reads a block for a sheet with room for so many rows. Refuses, with nothing changed, what no sheet could hold. */
export function readBlock(text: string, room: number): PasteBlock {
	const lines = text.replace(/\r?\n$/, '');
	// Where a quoted cell never ends, its quote was typed for inches: then no quote is a sign of its own.
	const read = (quoteChar: string) =>
		Papa.parse<string[]>(lines, { delimiter: '\t', quoteChar, preview: Math.max(1, room + 1) });
	const quoted = read('"');
	const data = lines === '' && text !== '' ? [['']] : quoted.errors.length ? read('\0').data : quoted.data;
	if (data.length > room)
		return refused(`The clipboard holds ${countLines(text)} rows; there is room for ${room} more.`);
	const cells = data.reduce((sum, row) => sum + row.length, 0);
	if (cells > MOST_CELLS)
		return refused(`The clipboard holds ${cells} cells; at most ${MOST_CELLS} are pasted at once.`);
	const longest = data.reduce((most, row) => row.reduce((more, { length }) => Math.max(more, length), most), 0);
	if (longest > MOST_TYPED)
		return refused(`The clipboard holds a cell of ${longest} characters; a cell of the sheet holds ${MOST_TYPED}.`);
	return { ok: true, cells: data };
}

function countLines(text: string): number {
	let lines = text && !text.endsWith('\n') ? 1 : 0;
	for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) lines++;
	return lines;
}

/** Writes a block. A blank last line is closed, so that it is read as one. */
export function writeBlock(cells: readonly (readonly string[])[]): string {
	const text = Papa.unparse(cells as string[][], { delimiter: '\t', newline: '\n' });
	return text === '' || text.endsWith('\n') ? `${text}\n` : text;
}
