import { valueOf, type Sheet, type SheetRow } from './sheet';

/** Parts of all rows of a sheet: six in each row of the largest. Each stands in the solution with its figures. */
export const MOST_PARTS = 30_000;

/** A row never changes, so that after an edit of one row the others are not counted anew. */
const counted = new WeakMap<SheetRow, number>();

function partsOfRow(row: SheetRow): number {
	const known = counted.get(row);
	if (known !== undefined) return known;
	const parts = valueOf(row, 'parts');
	const count = parts ? Number(parts.junction !== null) + parts.fittings.length + parts.equipment.length : 0;
	counted.set(row, count);
	return count;
}

/** How many parts the rows of a sheet have together. */
export const partsOf = ({ rows }: Sheet): number => rows.reduce((sum, row) => sum + partsOfRow(row), 0);
