import { face, NARROW, SANS } from './fonts';
import { CELL_SIDE } from './grid';
import { printable } from './printable';

/** Width of a tabular figure of Sofia Sans [em]; the same in all weights. */
export const TABULAR_FIGURE = 0.63;
const SMALLEST = 5.5;
const STEP = 0.3;

/** What a column must hold. */
export interface ColumnText {
	readonly head: string;
	readonly unit?: string;
	readonly texts: readonly string[];
	/** Figures never break; words may, within `least` and `most` [pt]; one column stretches over what is left. */
	readonly holds: 'figures' | 'words' | 'rest';
	readonly least?: number;
	readonly most?: number;
	/** Room before the text, as for a bar [pt]. */
	readonly before?: number;
}

/** Widths of the columns [pt], padding included, and the largest size of type at which no figure breaks. */
export function columnWidths(
	columns: readonly ColumnText[],
	width: number,
	largest: number
): { readonly widths: readonly number[]; readonly fontSize: number } {
	let fontSize = largest;
	for (;;) {
		const natural = columns.map((column) =>
			column.holds === 'rest' ? (column.least ?? 0) : naturalOf(column, fontSize)
		);
		const rest = width - natural.reduce((sum, one) => sum + one, 0);
		if (rest >= 0 || fontSize - STEP < SMALLEST) {
			const stretching = columns.filter(({ holds }) => holds === 'rest').length;
			const scale = rest >= 0 ? 1 : width / (width - rest);
			const share = rest > 0 ? rest / Math.max(1, stretching) : 0;
			const widths = natural.map((one, place) => (columns[place]?.holds === 'rest' ? one + share : one) * scale);
			return { widths, fontSize };
		}
		fontSize -= STEP;
	}
}

function naturalOf(
	{ head, unit = '', texts, holds, least = 0, most = Infinity, before = 0 }: ColumnText,
	size: number
): number {
	const narrow = face(NARROW, 'bold');
	const heads = Math.max(narrow.widthOf(head, size), narrow.widthOf(unit, size));
	const widest = [...new Set(texts)].reduce((wide, text) => Math.max(wide, figureWidth(text, size)), 0);
	const natural = Math.max(heads, widest) + before + 2 * CELL_SIDE + 1.5;
	const wide = Math.max(natural, least);
	return holds === 'figures' ? wide : Math.min(wide, most);
}

/** Width of a text in semibold Sofia Sans with tabular figures, the widest that a cell may be set in [pt]. */
export function figureWidth(text: string, size: number): number {
	const printed = printable(text);
	const digits = printed.replace(/\D/g, '').length;
	return face(SANS, 'bold').widthOf(printed.replace(/\d/g, ''), size) + digits * TABULAR_FIGURE * size;
}
