import { describe, expect, it } from 'vitest';
import { rowId } from '../../../tests/sheet/any-sheet';
import { editsBodySchema } from './edit';

const move = { kind: 'move', rows: [rowId(1)], before: null };
const set = { kind: 'set', row: rowId(1), field: 'length', typed: '5', units: 'SI' };
const body = (...edits: object[]) => ({ base: 0, edits: edits.map((edit, at) => ({ id: rowId(at + 1), edit })) });
const batch = (edit: object, times: number) => ({ kind: 'batch', edits: Array<object>(times).fill(edit) });

describe('a message of edits', () => {
	it('writes many cells, and deletes or moves the rows of a full sheet one by one', () => {
		expect(editsBodySchema.safeParse(body(batch(set, 60_000))).success).toBe(true);
		expect(editsBodySchema.safeParse(body(batch(move, 5_000))).success).toBe(true);
	});

	it.each([[batch(move, 5_001)], [batch(move, 3_000), batch(move, 3_000)]])(
		'does not go through the whole sheet again and again',
		(...edits) => {
			const read = editsBodySchema.safeParse(body(...edits));
			expect(read.error?.issues[0]?.message).toBe('A message inserts, deletes or moves rows at most 5000 times.');
		}
	);
});
