import { COLUMNS } from './columns';
import { isRowField, ROW_FIELDS } from './fields';
import type { RowField } from './sheet';

/** What a line of a pasted block says of one of its columns. */
export interface HeadedColumn {
	/** Null for a column that the engine computes. */
	readonly field: RowField | null;
	/** The unit in the head, as `mm` in `Length (mm)`; '' where there is none. */
	readonly unit: string;
}

/** Other names by which people head a column. */
const ALSO: Readonly<Record<string, RowField>> = {
	name: 'tag',
	'section tag': 'tag',
	'joins to': 'joins',
	from: 'joins',
	upstream: 'joins',
	room: 'serves',
	space: 'serves',
	airflow: 'flow',
	'air flow': 'flow',
	'design flow': 'flow',
	'duct size': 'size',
	flexible: 'flex',
	'flexible length': 'flex',
	fittings: 'parts',
	terminal: 'outlet',
	liner: 'lining',
	'lining thickness': 'lining',
	'leakage class': 'leakage',
	'air temperature': 'temperature',
	'outlet loss': 'outlet',
	'room pressure': 'pressure'
};

/** Headed alike on the screen and elsewhere: a name of the screen goes before another's. */
const NAMES: ReadonlyMap<string, RowField | null> = new Map([
	...Object.entries(ALSO),
	...COLUMNS.flatMap(({ key, head }) =>
		head ? [[plain(head), isRowField(key) ? key : (ALSO[plain(head)] ?? null)] as const] : []
	),
	...ROW_FIELDS.map((field) => [field, field] as const)
]);

function plain(head: string): string {
	return head.toLowerCase().replace(/\.$/, '').replace(/\s+/g, ' ').trim();
}

/**
 * The columns that the first line of a block names, where it names columns: at least two cells, each the name of one or
 * blank, no name twice, and rows below. Null for any other block.
 */
export function headerOf(cells: readonly (readonly string[])[]): readonly (HeadedColumn | null)[] | null {
	const [first, second] = cells;
	if (!first || !second) return null;
	const columns: (HeadedColumn | null)[] = [];
	const fields = new Set<RowField>();
	for (const cell of first) {
		const [, head = '', bracketed, after] = /^([^([,]*)(?:[([]([^)\]]*)[)\]]|,(.*))?\s*$/.exec(cell) ?? [];
		if (cell.trim() === '') {
			columns.push(null);
			continue;
		}
		const field = NAMES.get(plain(head));
		if (field === undefined || (field !== null && fields.has(field))) return null;
		if (field !== null) fields.add(field);
		columns.push({ field, unit: (bracketed ?? after ?? '').trim() });
	}
	return fields.size >= 2 ? columns : null;
}

const FIGURES_ALONE = /^[\s\d.,x×*/ØøФ⌀+-]+$/;
const WITH_UNIT: readonly RowField[] = [
	'flow',
	'size',
	'length',
	'rise',
	'flex',
	'outlet',
	'pressure',
	'temperature',
	'lining'
];

/** The rows of a headed block by field; a figure without a unit takes the one in its head. */
export function byHeader(
	header: readonly (HeadedColumn | null)[],
	line: readonly string[]
): (readonly [RowField, string])[] {
	return header.flatMap((column, at) => {
		if (!column?.field) return [];
		const { field, unit } = column;
		const text = line[at] ?? '';
		const bare = unit && WITH_UNIT.includes(field) && FIGURES_ALONE.test(text) && text.trim() !== '';
		return [[field, bare ? `${text.trim()} ${unit}` : text] as const];
	});
}
