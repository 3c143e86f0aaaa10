import type { Paper } from '$lib/report';

/** One page: its size and where its frame, its block and its content stand [pt]. */
export interface Sheet {
	readonly width: number;
	readonly height: number;
	readonly frame: { readonly left: number; readonly top: number; readonly right: number; readonly bottom: number };
	/** Upper edge of the title block. */
	readonly blockTop: number;
	readonly content: { readonly left: number; readonly width: number };
	/** Left, top, right, bottom. */
	readonly margins: [number, number, number, number];
	/** Wide enough for two columns of an upright page side by side. */
	readonly wide: boolean;
}

/** Where the foot of a page begins: what stands in it is placed from there [pt]. */
export function footOrigin(sheet: Sheet): number {
	return sheet.height - sheet.margins[3];
}

/** Upright paper with little height, where the cover must be thrifty to stay one page. */
export const isShort = (sheet: Sheet): boolean => !sheet.wide && sheet.height < 800;

/** Upright: width, height [pt]. */
const SIZES: Readonly<Record<Paper, readonly [number, number]>> = {
	A4: [595.28, 841.89],
	A3: [841.89, 1190.55],
	Letter: [612, 792],
	Tabloid: [792, 1224]
};
const EDGE = 22.5;
/** More at the left, where a report is bound. */
const BINDING = 28.5;
const BLOCK = 55.5;
const INSIDE = 13.5;

/** A4 and Letter stand upright but for the schedule; A3 and Tabloid always lie. */
export function sheetOf(paper: Paper, use: 'text' | 'schedule'): Sheet {
	const large = paper === 'A3' || paper === 'Tabloid';
	const [short, long] = SIZES[paper];
	const [width, height] = large || use === 'schedule' ? [long, short] : [short, long];
	const frame = { left: BINDING, top: EDGE, right: width - EDGE, bottom: height - EDGE };
	const blockTop = frame.bottom - BLOCK;
	return {
		width,
		height,
		frame,
		blockTop,
		content: { left: frame.left + INSIDE, width: frame.right - frame.left - 2 * INSIDE },
		margins: [frame.left + INSIDE, frame.top + INSIDE + 1.5, EDGE + INSIDE, height - blockTop + 9],
		wide: large
	};
}
