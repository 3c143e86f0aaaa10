import type { SheetProblem } from './sheet-problem';
import { valueOf, type SheetRow } from './sheet';

/** Which row joins which. */
export interface Links {
	/** The row on the fan's side; null where a row meets the fan; absent where the link is at fault. */
	readonly parent: ReadonlyMap<string, SheetRow | null>;
	readonly children: ReadonlyMap<string, readonly SheetRow[]>;
	/** Every row that can be reached from the fan, a row before those that join it. */
	readonly fromFan: readonly SheetRow[];
	/** Rows whose tag or link is at fault. */
	readonly faulty: ReadonlySet<string>;
}

/** Reads the tags that rows join, in whatever order the rows stand, and says what is wrong with them. */
export function linksOf(rows: readonly SheetRow[], problems: SheetProblem[] = []): Links {
	const byTag = new Map<string, SheetRow[]>();
	for (const row of rows) {
		const tag = valueOf(row, 'tag');
		if (tag !== null) add(byTag, tag, row);
	}
	const faulty = new Set<string>();
	const fault = (row: SheetRow, field: 'tag' | 'joins', message: string, expected: string) => {
		faulty.add(row.id);
		problems.push({ row: row.id, field, message, expected });
	};
	for (const [tag, same] of byTag)
		if (same.length > 1)
			for (const row of same)
				fault(row, 'tag', `${same.length} rows have the tag ${tag}.`, 'a tag that no other row has');

	const parent = new Map<string, SheetRow | null>();
	const children = new Map<string, SheetRow[]>();
	for (const row of rows) {
		const joins = valueOf(row, 'joins');
		if (row.cells.joins && joins === null) continue;
		const [found, another] = joins === null ? [null, undefined] : (byTag.get(joins) ?? []);
		if (found === row) fault(row, 'joins', `${joins} joins itself.`, 'another row, or a blank where it meets the fan');
		else if (found === undefined) fault(row, 'joins', `No row has the tag ${joins}.`, likeIt(joins ?? '', byTag));
		else if (!another) {
			parent.set(row.id, found);
			if (found) add(children, found.id, row);
		}
	}
	const fromFan = walk(rows, parent, children);
	const reached = new Set(fromFan);
	for (const row of ringsOf(rows, parent, reached))
		fault(
			row,
			'joins',
			`${valueOf(row, 'tag') ?? 'This row'} leads back to itself: ${ringText(row, parent)}.`,
			'runs that end at the fan'
		);
	return { parent, children, fromFan, faulty };
}

function add(lists: Map<string, SheetRow[]>, key: string, row: SheetRow): void {
	const list = lists.get(key);
	if (list) list.push(row);
	else lists.set(key, [row]);
}

/** The tag that was meant, where capitals or blanks alone set it apart. */
function likeIt(joins: string, byTag: ReadonlyMap<string, unknown>): string {
	const bare = (tag: string) => tag.toLowerCase().replace(/[\s_-]/g, '');
	const like = [...byTag.keys()].find((tag) => bare(tag) === bare(joins));
	return like === undefined ? 'the tag of the row on the fan’s side' : `${like}, as that row has it`;
}

/** From the rows that meet the fan, or that name no row which is there, outward. */
function walk(rows: readonly SheetRow[], parent: Map<string, SheetRow | null>, children: Map<string, SheetRow[]>) {
	const order: SheetRow[] = rows.filter(({ id }) => !parent.get(id)).reverse();
	const out: SheetRow[] = [];
	for (let row = order.pop(); row; row = order.pop()) {
		out.push(row);
		order.push(...[...(children.get(row.id) ?? [])].reverse());
	}
	return out;
}

/** Rows of a ring itself: following the links from one of them comes back to it. */
function ringsOf(rows: readonly SheetRow[], parent: Map<string, SheetRow | null>, reached: Set<SheetRow>): SheetRow[] {
	const done = new Set<SheetRow>(reached);
	const rings: SheetRow[] = [];
	for (const start of rows) {
		const trail: SheetRow[] = [];
		const place = new Map<SheetRow, number>();
		let row: SheetRow | null | undefined = start;
		while (row && !done.has(row) && !place.has(row)) {
			place.set(row, trail.length);
			trail.push(row);
			row = parent.get(row.id);
		}
		if (row && place.has(row)) rings.push(...trail.slice(place.get(row)));
		for (const seen of trail) done.add(seen);
	}
	return rings;
}

function ringText(row: SheetRow, parent: Map<string, SheetRow | null>): string {
	const tags = [valueOf(row, 'tag')];
	let next = parent.get(row.id);
	while (next && next !== row && tags.length < 6) {
		tags.push(valueOf(next, 'tag'));
		next = parent.get(next.id);
	}
	return `${tags.join(' joins ')} joins ${next === row ? valueOf(row, 'tag') : '…'}`;
}
