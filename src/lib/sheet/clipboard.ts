/** Blocks of cells as tab-separated text, as spreadsheets put them on the clipboard. */
import Papa from 'papaparse';
import { headerOf } from './paste-header';
import { MOST_TYPED } from './storable-text';

/** Cells that one paste may bring; more would be refused by the sheet anyhow. */
export const MOST_CELLS = 200_000;

export type PasteBlock =
	| { readonly ok: true; readonly cells: readonly (readonly string[])[] }
	| { readonly ok: false; readonly message: string };

const refused = (why: string): PasteBlock => ({ ok: false, message: `Nothing was pasted: ${why}.` });
const counted = (count: number, one: string, many = `${one}s`) => `${count} ${count === 1 ? one : many}`;

/** Reads a block for a sheet with room for so many rows. Refuses, with nothing changed, what no sheet could hold. */
export function readBlock(text: string, room: number): PasteBlock {
	const lines = text.replace(/\r?\n$/, '');
	// Where a quoted cell never ends, its quote was typed for inches: then no quote is a sign of its own.
	// One line more than there is room for, and one for the names of columns.
	const read = (quoteChar: string) =>
		Papa.parse<string[]>(lines, { delimiter: '\t', quoteChar, preview: Math.max(1, room + 2) });
	const quoted = read('"');
	const data = lines === '' && text !== '' ? [['']] : quoted.errors.length ? read('\0').data : quoted.data;
	const heads = longestOf(data) <= MOST_TYPED && headerOf(data) ? 1 : 0;
	if (data.length - heads > room) {
		const rows = counted(countLines(text) - heads, 'row');
		return refused(`the clipboard holds ${rows}, and the sheet has room for ${room === 0 ? 'no' : room} more`);
	}
	const cells = data.reduce((sum, row) => sum + row.length, 0);
	if (cells > MOST_CELLS)
		return refused(`the clipboard holds ${counted(cells, 'cell')}, and at most ${MOST_CELLS} are pasted at once`);
	const longest = longestOf(data);
	if (longest > MOST_TYPED)
		return refused(
			`the clipboard holds a cell of ${counted(longest, 'character')}, and a cell of the sheet holds at most ${MOST_TYPED}`
		);
	return { ok: true, cells: data };
}

const longestOf = (cells: readonly (readonly string[])[]): number =>
	cells.reduce((most, row) => row.reduce((more, { length }) => Math.max(more, length), most), 0);

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
