import { formatFlow, formatPressure, type Solution, type UnitSystem } from '$lib/engine';
import type { Column } from './columns';
import { valueOf, type SheetRow } from './sheet';
import type { TreeLine } from './tree-lines';

/** Of one character of the sheet's type, rounded up [px]. */
const CHARACTER = 7.8;
/** Beside the text of a cell [px]. */
const PADDING = 12;
/** The drawn tree before a tag: of the first depth, and of each further one up to the deepest drawn [px]. */
const TREE = { first: 24, step: 10, deepest: 9 };
/** A tag column takes no more than this from the others [px]. */
const MOST = 230;
const PRESSURES = ['duct', 'fittings', 'equipment', 'total'];

const ofText = (characters: number) => Math.ceil(characters * CHARACTER) + PADDING;

/** The longest texts of the columns that grow with what is in them. */
export interface LongestTexts {
	/** The tag with the tree before it [px]. */
	readonly tag: number;
	/** [px] */
	readonly joins: number;
	readonly flow: number;
	readonly pressure: number;
}

/** What the columns have to hold: tags as deep as they stand, and figures of large systems. */
export function longestTexts(
	rows: readonly SheetRow[],
	lines: readonly TreeLine[],
	solution: Solution | null,
	units: UnitSystem
): LongestTexts {
	let [tag, joins] = [0, 0];
	rows.forEach((row, at) => {
		const indent = TREE.first + TREE.step * Math.min(lines[at]?.depth ?? 0, TREE.deepest);
		tag = Math.max(tag, indent + ofText((valueOf(row, 'tag') ?? '').length));
		joins = Math.max(joins, ofText((valueOf(row, 'joins') ?? '').length));
	});
	const solved = Object.values(solution?.rows ?? {});
	const flow = solved.reduce((most, row) => Math.max(most, row.flow), 0);
	const loss = solved.reduce((most, row) => Math.max(most, Math.abs(row.loss)), 0);
	return {
		tag: Math.min(tag, MOST),
		joins: Math.min(joins, MOST / 2),
		flow: ofText(formatFlow(flow, units).length),
		pressure: ofText(formatPressure(loss, units).length)
	};
}

/** Width that a column needs at least [px]. */
export function widthOf({ key, width }: Column, longest: LongestTexts): number {
	if (key === 'tag') return Math.max(width, longest.tag);
	if (key === 'joins') return Math.max(width, longest.joins);
	if (key === 'flow') return Math.max(width, longest.flow);
	return PRESSURES.includes(key) ? Math.max(width, longest.pressure) : width;
}
