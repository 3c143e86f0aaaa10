import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { rowId, sheetOf, type TypedRow } from '../../../tests/sheet/any-sheet';
import { applyEntry } from './apply';
import type { Edit, SentEdit } from './edit';
import { entryOf, type LoggedEntry } from './entry';
import { readKept } from './kept-edits';
import { OpenSheet } from './open-sheet.svelte';
import { MOST_ROWS, type RowField, type Sheet } from './sheet';
import { solveSheet } from './solve-sheet';

const ROWS: TypedRow[] = [
	{ tag: 'A', size: '400x300', length: '5' },
	{ tag: 'B', joins: 'A', size: 'Ø200', length: '4', flow: '100', outlet: '10' }
];
const set = (n: number, field: RowField, typed: string): Edit => ({
	...{ kind: 'set', row: rowId(n), field, typed, units: 'SI' }
});

/** One server for all who have the design open: the order of its log decides. */
function serverOf(sheet: Sheet) {
	const log: LoggedEntry[] = [];
	const server = {
		sheet,
		isThere: true,
		refuses: (_sent: SentEdit) => false,
		take(sent: SentEdit) {
			const entry = entryOf(sent.edit);
			if (!entry || log.some(({ id }) => id === sent.id)) return;
			server.sheet = applyEntry(server.sheet, entry);
			log.push({ seq: log.length + 1, id: sent.id, entry });
		},
		fetch: async (_address: unknown, init?: RequestInit) => {
			if (!server.isThere) throw new TypeError('failed');
			const { base, edits } = JSON.parse(String(init?.body)) as { base: number; edits: SentEdit[] };
			const refused = edits.filter((one) => server.refuses(one)).map(({ id }) => ({ id, reason: 'refused' }));
			for (const sent of edits) if (!refused.some(({ id }) => id === sent.id)) server.take(sent);
			const { solution } = solveSheet(server.sheet);
			const figures = solution && { fan: solution.fan, index: solution.index, rows: 0 };
			return Response.json({ entries: log.slice(base), seq: log.length, refused, figures, problems: 0 });
		}
	};
	return server;
}

/** A worker that answers when it is told to. */
class LateWorker {
	static answers: (() => void)[] = [];
	onmessage: ((event: { data: unknown }) => void) | null = null;
	postMessage({ turn, solve, sheet }: { turn: number; solve?: boolean; sheet?: Sheet }) {
		if (!solve || !sheet) return;
		const solved = solveSheet(sheet);
		LateWorker.answers.push(() => this.onmessage?.({ data: { kind: 'solved', turn, solved, took: 30 } }));
	}
	terminate() {}
}

const opened = (sheet: Sheet) => new OpenSheet({ designId: 'design-1', sheet, seq: 0 });
const settled = () => vi.advanceTimersByTimeAsync(0);
let server: ReturnType<typeof serverOf>;

beforeEach(() => {
	vi.useFakeTimers();
	server = serverOf(sheetOf(ROWS));
	vi.stubGlobal('fetch', server.fetch);
	vi.stubGlobal('localStorage', undefined);
});
afterEach(() => {
	vi.useRealTimers();
	vi.unstubAllGlobals();
});

describe('an open sheet', () => {
	it('shows an edit at once, and is confirmed by the server’s own duty', async () => {
		const open = opened(server.sheet);
		open.do(set(1, 'length', '9'));
		expect(open.sheet.rows[1]?.cells.length?.value).toBe(9);
		expect([open.isConfirmed, open.outbox.unsent.length]).toEqual([false, 1]);
		await settled();
		expect([open.isConfirmed, open.seq]).toEqual([true, 1]);
		expect(server.sheet).toEqual(open.sheet);
	});

	it('ends as the server has it, where another person was faster', async () => {
		const open = opened(server.sheet);
		server.take({ id: rowId(501), edit: set(1, 'length', '20') });
		server.take({ id: rowId(502), edit: { kind: 'insert', rows: [{ id: rowId(9), cells: {} }], before: rowId(0) } });
		open.do(set(0, 'length', '7'));
		await settled();
		expect(open.sheet).toEqual(server.sheet);
		expect(open.sheet.rows.map(({ cells }) => cells.length?.typed)).toEqual([undefined, '7', '20']);
		expect(open.solved).toEqual(solveSheet(server.sheet));
	});

	it('keeps what is typed while the answer is under way', async () => {
		const open = opened(server.sheet);
		server.take({ id: rowId(501), edit: set(0, 'serves', 'theirs') });
		open.do(set(0, 'length', '7'));
		open.do(set(1, 'length', '8'));
		await settled();
		expect(open.sheet).toEqual(server.sheet);
		expect(open.sheet.rows.map(({ cells }) => cells.length?.typed)).toEqual(['7', '8']);
	});

	it('goes back where the server refuses an edit', async () => {
		const open = opened(server.sheet);
		server.refuses = () => true;
		open.do(set(0, 'length', '7'));
		await settled();
		expect([open.outbox.state, open.sheet]).toEqual(['refused', server.sheet]);
	});

	it('has the same text as the server, also of signs that cannot be stored', async () => {
		const open = opened(server.sheet);
		open.do(set(0, 'serves', 'a\0b \ud800'));
		expect(open.sheet.rows[0]?.cells.serves).toEqual({ typed: 'ab \ufffd', units: 'SI', value: 'ab \ufffd' });
		await settled();
		expect(open.sheet).toEqual(server.sheet);
	});

	it('keeps its figures where the worker answers late, for the sheet as it stood before', async () => {
		vi.stubGlobal('Worker', LateWorker);
		vi.stubGlobal('addEventListener', () => {});
		vi.stubGlobal('removeEventListener', () => {});
		const open = opened(server.sheet);
		const stop = open.start();
		// The page has become quick by itself before the worker has answered for the sheet as it was opened.
		await vi.advanceTimersByTimeAsync(1_000);
		expect(LateWorker.answers).toHaveLength(1);
		open.do(set(1, 'length', '90'));
		const { solved } = open;
		expect(solved.solution?.fan.totalPressure).toBeGreaterThan(solveSheet(sheetOf(ROWS)).solution!.fan.totalPressure);
		LateWorker.answers[0]!();
		expect(open.solved).toBe(solved);
		await settled();
		expect(open.isConfirmed).toBe(true);
		stop();
	});

	it('asks for what the page before it sent while this one was on its way', async () => {
		const kept = new Map<string, string>();
		vi.stubGlobal('localStorage', {
			getItem: (key: string) => kept.get(key) ?? null,
			setItem: (key: string, text: string) => void kept.set(key, text),
			removeItem: (key: string) => void kept.delete(key)
		});
		vi.stubGlobal('Worker', LateWorker);
		vi.stubGlobal('addEventListener', () => {});
		vi.stubGlobal('removeEventListener', () => {});
		const [before, after] = [opened(server.sheet), opened(server.sheet)];
		before.do(set(0, 'serves', 'sent at last'));
		await settled();
		expect([before.outbox.state, readKept('design-1')]).toEqual(['saved', []]);
		expect(after.sheet.rows[0]?.cells.serves).toBeUndefined();
		const stop = after.start();
		await settled();
		expect(after.sheet).toEqual(server.sheet);
		expect([after.sheet.rows[0]?.cells.serves?.typed, after.seq, after.outbox.state]).toEqual([
			'sent at last',
			1,
			'saved'
		]);
		stop();
	});

	it('passes over steps of undo whose rows another person has deleted', async () => {
		const open = opened(server.sheet);
		open.do(set(0, 'length', '7'));
		open.do({ kind: 'insert', rows: [{ id: rowId(9), cells: {} }], before: null });
		await settled();
		server.take({ id: rowId(501), edit: { kind: 'delete', rows: [rowId(9)] } });
		open.do(set(1, 'length', '8'));
		await settled();
		expect(open.sheet.rows).toHaveLength(2);
		open.undo();
		open.undo();
		expect(open.sheet.rows.map(({ cells }) => cells.length?.typed)).toEqual(['5', '4']);
		expect([open.mayUndo, open.mayRedo]).toEqual([false, true]);
		await settled();
		expect(server.sheet).toEqual(open.sheet);
	});

	it('sends nothing for an edit that changes nothing', async () => {
		const open = opened(server.sheet);
		open.do({ kind: 'delete', rows: [rowId(77)] });
		open.do({ kind: 'set', row: rowId(0), field: 'no such column', typed: '1', units: 'SI' });
		expect([open.mayUndo, open.outbox.unsent]).toEqual([false, []]);
	});

	it('loses nothing while the server is away, and sends it when it is back', async () => {
		const open = opened(server.sheet);
		server.isThere = false;
		for (let n = 1; n <= 20; n++) open.do(set(n % 2, 'length', String(n)));
		open.undo();
		await settled();
		expect([open.outbox.state, open.outbox.unsent.length]).toEqual(['kept', 21]);
		server.isThere = true;
		await vi.advanceTimersByTimeAsync(30_000);
		expect([open.outbox.state, open.isConfirmed]).toEqual(['saved', true]);
		expect(server.sheet).toEqual(open.sheet);
	});

	it('does and undoes a paste over a full sheet', { timeout: 30_000 }, () => {
		const open = opened(sheetOf(Array.from({ length: MOST_ROWS }, (_, n) => ({ tag: `R${n}` }))));
		open.do({
			kind: 'batch',
			edits: open.sheet.rows.flatMap(({ id }) =>
				['serves', 'size', 'length', 'flow'].map((field) => ({
					...{ kind: 'set' as const, row: id, field, typed: '200', units: 'SI' as const }
				}))
			)
		});
		open.undo();
		expect(open.sheet.rows[MOST_ROWS - 1]?.cells.size).toBeUndefined();
	});
});
