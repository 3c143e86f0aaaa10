import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { rowId } from '../../../tests/sheet/any-sheet';
import type { SentEdit } from './edit';
import { keep, readKept } from './kept-edits';
import { Outbox } from './outbox.svelte';
import type { EditsReply } from './server-reply';
import { readSetAside, setAsideWords } from './set-aside';

const DESIGN = 'design-1';

/** The browser's store, with room for so many characters. */
function storeOf(room = Infinity): Storage {
	const kept = new Map<string, string>();
	return {
		get length() {
			return kept.size;
		},
		key: (at) => [...kept.keys()][at] ?? null,
		clear: () => kept.clear(),
		getItem: (key) => kept.get(key) ?? null,
		removeItem: (key) => void kept.delete(key),
		setItem: (key, text) => {
			if (text.length > room) throw new DOMException('full', 'QuotaExceededError');
			kept.set(key, text);
		}
	};
}

const edit = (n: number, typed = String(n)): SentEdit => ({
	id: rowId(n),
	edit: { kind: 'set', row: rowId(900), field: 'tag', typed, units: 'SI' }
});
const idsOf = (edits: readonly SentEdit[]) => edits.map(({ id }) => id);

interface Posted {
	readonly base: number;
	readonly edits: SentEdit[];
}
type Answer = (posted: Posted) => Response | Promise<Response>;

/** A server that numbers what it accepts and knows an edit that it has seen. */
function serverOf() {
	const log: string[] = [];
	const posts: Posted[] = [];
	const accept: Answer = ({ base, edits }) => {
		for (const { id } of edits) if (!log.includes(id)) log.push(id);
		const entries = log.slice(base).map((id, at) => ({
			...{ seq: base + at + 1, id, entry: { kind: 'delete', rows: [] } as const }
		}));
		const reply: EditsReply = { entries, seq: log.length, refused: [], figures: null, problems: 0 };
		return Response.json(reply);
	};
	const answers: Answer[] = [];
	const send: typeof fetch = async (_address, { body } = {}) => {
		const posted = JSON.parse(String(body)) as Posted;
		posts.push(posted);
		return (answers.shift() ?? accept)(posted);
	};
	return { log, posts, answers, accept, send };
}

function boxOf(send: typeof fetch, designId = DESIGN) {
	let base = 0;
	const replies: { seq: number; sent: string[]; unsent: string[] }[] = [];
	const box: Outbox = new Outbox({
		designId,
		base: () => base,
		send,
		onreply: (reply, sent) => {
			base = reply.seq;
			replies.push({ seq: reply.seq, sent: idsOf(sent), unsent: idsOf(box.unsent) });
		}
	});
	return { box, replies };
}

const settled = () => vi.advanceTimersByTimeAsync(0);

beforeEach(() => {
	vi.useFakeTimers();
	vi.stubGlobal('localStorage', storeOf());
});
afterEach(() => {
	vi.useRealTimers();
	vi.unstubAllGlobals();
});

describe('the outbox', () => {
	it('sends edits in their order, each once', async () => {
		const server = serverOf();
		const { box } = boxOf(server.send);
		for (let n = 1; n <= 30; n++) {
			box.put(edit(n));
			if (n % 7 === 0) await settled();
		}
		await settled();
		expect(server.log).toEqual(Array.from({ length: 30 }, (_, n) => rowId(n + 1)));
		expect(server.posts.flatMap(({ edits }) => idsOf(edits))).toEqual(server.log);
		expect([box.state, box.unsent]).toEqual(['saved', []]);
		expect(box.savedAt).toBeInstanceOf(Date);
	});

	it('keeps each edit until the answer is there', async () => {
		const server = serverOf();
		let answer = () => {};
		server.answers.push((posted) => new Promise((resolve) => (answer = () => resolve(server.accept(posted)))));
		const { box, replies } = boxOf(server.send);
		box.put(edit(1));
		await settled();
		expect([box.state, idsOf(box.unsent), idsOf(readKept(DESIGN))]).toEqual(['saving', [rowId(1)], [rowId(1)]]);
		box.put(edit(2));
		await settled();
		expect(server.posts).toHaveLength(1);
		answer();
		await settled();
		expect(replies[0]).toMatchObject({ sent: [rowId(1)], unsent: [rowId(1), rowId(2)] });
		expect(server.log).toEqual([rowId(1), rowId(2)]);
		expect(readKept(DESIGN)).toEqual([]);
	});

	it.each<[string, Answer, string]>([
		['the server cannot be reached', () => Promise.reject(new TypeError('failed')), 'The server cannot be reached.'],
		[
			'the session has ended',
			() => new Response(null, { status: 401 }),
			'You are signed out. Sign in again in another tab.'
		],
		['the server says why', () => Response.json({ title: 'Out of order' }, { status: 503 }), 'Out of order'],
		['the server says nothing', () => new Response('<html>', { status: 502 }), 'The server answered 502.'],
		['a page stands in its place', () => new Response('<html>'), 'The server cannot be reached.'],
		['something else answers', () => Response.json({ hello: 1 }), 'The server cannot be reached.']
	])('where %s, waits and sends the same edits again', async (_what, failure, reason) => {
		const server = serverOf();
		server.answers.push(failure, failure);
		const { box } = boxOf(server.send);
		box.put(edit(1));
		await settled();
		expect([box.state, box.reason, idsOf(readKept(DESIGN))]).toEqual(['kept', reason, [rowId(1)]]);
		await vi.advanceTimersByTimeAsync(500);
		expect(server.posts).toHaveLength(2);
		await vi.advanceTimersByTimeAsync(1_000);
		expect(server.posts.map(({ edits }) => idsOf(edits))).toEqual([[rowId(1)], [rowId(1)], [rowId(1)]]);
		expect([box.state, box.reason, server.log]).toEqual(['saved', '', [rowId(1)]]);
	});

	it('is applied once, though the answer to the first sending was lost', async () => {
		const server = serverOf();
		server.answers.push(async (posted) => {
			await server.accept(posted);
			throw new TypeError('the line is cut');
		});
		const { box, replies } = boxOf(server.send);
		box.put(edit(1));
		await settled();
		expect(box.state).toBe('kept');
		await box.flush();
		expect([server.log, replies.map(({ seq }) => seq), box.unsent]).toEqual([[rowId(1)], [1], []]);
	});

	it('gives up a connection that never answers, and sends the edits anew', async () => {
		vi.spyOn(AbortSignal, 'timeout').mockImplementation((wait) => {
			const cut = new AbortController();
			setTimeout(() => cut.abort(new DOMException('too long', 'TimeoutError')), wait);
			return cut.signal;
		});
		const server = serverOf();
		let hung = 0;
		const { box } = boxOf((address, init) => {
			if (hung++ > 0) return server.send(address, init);
			return new Promise((_, reject) => init?.signal?.addEventListener('abort', () => reject(init.signal?.reason)));
		});
		box.put(edit(1));
		await vi.advanceTimersByTimeAsync(14_000);
		expect([box.state, hung]).toEqual(['saving', 1]);
		await vi.advanceTimersByTimeAsync(1_000);
		expect([box.state, box.reason]).toEqual(['kept', 'The server cannot be reached.']);
		await vi.advanceTimersByTimeAsync(500);
		expect([box.state, server.log]).toEqual(['saved', [rowId(1)]]);
	});

	it('waits longer each time, up to ten seconds, and not at all once told to', async () => {
		const server = serverOf();
		for (let n = 0; n < 9; n++) server.answers.push(() => Promise.reject(new TypeError('failed')));
		const { box } = boxOf(server.send);
		box.put(edit(1));
		await settled();
		for (const wait of [500, 1_000, 2_000, 5_000, 10_000, 10_000]) {
			const before = server.posts.length;
			await vi.advanceTimersByTimeAsync(wait - 1);
			expect(server.posts).toHaveLength(before);
			await vi.advanceTimersByTimeAsync(1);
			expect(server.posts).toHaveLength(before + 1);
		}
		await box.flush();
		expect(server.posts).toHaveLength(8);
		box.stop();
		await vi.advanceTimersByTimeAsync(60_000);
		expect(server.posts).toHaveLength(8);
	});

	it('begins no new wait when it is stopped while an answer is under way', async () => {
		const server = serverOf();
		let fail = () => {};
		server.answers.push(() => new Promise((_, reject) => (fail = () => reject(new TypeError('failed')))));
		const { box } = boxOf(server.send);
		box.put(edit(1));
		await settled();
		box.stop();
		fail();
		await vi.advanceTimersByTimeAsync(60_000);
		expect(server.posts).toHaveLength(1);
		expect(idsOf(readKept(DESIGN))).toEqual([rowId(1)]);
	});

	it('lets a refused edit go, with the reason', async () => {
		const server = serverOf();
		const reason = 'A sheet holds at most 5000 rows; this would make 5001.';
		server.answers.push(() =>
			Response.json({ entries: [], seq: 0, refused: [{ id: rowId(1), reason }], figures: null, problems: 0 })
		);
		const { box } = boxOf(server.send);
		box.put(edit(1));
		await settled();
		expect([box.state, box.reason, box.unsent, readKept(DESIGN)]).toEqual(['refused', reason, [], []]);
		box.put(edit(2));
		await settled();
		expect([box.state, box.reason]).toEqual(['saved', '']);
	});

	it('sends a long queue in parts', async () => {
		const server = serverOf();
		const { box } = boxOf(server.send);
		box.fill(Array.from({ length: 450 }, (_, n) => edit(n)));
		await settled();
		expect(server.posts.map(({ edits }) => edits.length)).toEqual([200, 200, 50]);
		expect(server.posts.map(({ base }) => base)).toEqual([0, 200, 400]);
	});
});

describe('an edit that the server can never take', () => {
	/** Takes messages but those with one of these edits. */
	const without = (server: ReturnType<typeof serverOf>, bad: readonly number[], status = 422) => {
		const posts: number[] = [];
		const send: typeof fetch = async (address, init) => {
			const { edits } = JSON.parse(String(init?.body)) as Posted;
			posts.push(edits.length);
			const isBad = edits.some(({ id }) => bad.some((n) => id === rowId(n)));
			return isBad ? Response.json({ title: 'Not of the form' }, { status }) : server.send(address, init);
		};
		return { posts, send };
	};
	const words = 'Not taken by the server: Not of the form. It was “2”.';

	it.each([400, 413, 422])('is set aside at an answer of %d, and those behind it are sent', async (status) => {
		const server = serverOf();
		const { box, replies } = boxOf(without(server, [2], status).send);
		box.fill([edit(1), edit(2), edit(3)]);
		await settled();
		expect(server.log).toEqual([rowId(1), rowId(3)]);
		expect(box.setAside).toEqual([{ ...edit(2), reason: 'Not of the form' }]);
		expect([box.state, box.reason, box.unsent, readKept(DESIGN)]).toEqual(['refused', words, [], []]);
		// The sheet is told which edit did not go in, so that it leaves the screen.
		expect(replies.map(({ sent }) => sent)).toContainEqual([rowId(2)]);
	});

	it('is found among two hundred in few messages', async () => {
		const server = serverOf();
		const { posts, send } = without(server, [137]);
		const { box } = boxOf(send);
		box.fill(Array.from({ length: 200 }, (_, n) => edit(n)));
		await settled();
		expect(server.log).toEqual(Array.from({ length: 200 }, (_, n) => rowId(n)).filter((id) => id !== rowId(137)));
		expect(idsOf(box.setAside)).toEqual([rowId(137)]);
		expect(posts.length).toBeLessThan(25);
	});

	it('is one of several, each set aside by itself', async () => {
		const server = serverOf();
		const { box } = boxOf(without(server, [0, 7, 8, 19]).send);
		box.fill(Array.from({ length: 20 }, (_, n) => edit(n)));
		await settled();
		expect(idsOf(box.setAside)).toEqual([0, 7, 8, 19].map(rowId));
		expect(server.log).toHaveLength(16);
	});

	it('outlives a reload, and is told of until a person puts it away', async () => {
		const { box } = boxOf(without(serverOf(), [2]).send);
		box.put(edit(2));
		await settled();
		const again = boxOf(serverOf().send).box;
		again.recall();
		expect([again.state, again.reason, idsOf(again.setAside)]).toEqual(['refused', words, [rowId(2)]]);
		again.put(edit(5));
		await settled();
		expect([again.state, again.reason]).toEqual(['refused', words]);
		again.letGo(rowId(2));
		expect([again.state, again.reason, again.setAside]).toEqual(['saved', '', []]);
		expect(readSetAside(DESIGN)).toEqual([]);
	});

	it('is not blamed where the server takes no message at all', async () => {
		const server = serverOf();
		const refuse: Answer = () => Response.json({ title: 'This is not JSON.' }, { status: 400 });
		server.answers.push(refuse, refuse);
		const { box } = boxOf(server.send);
		box.put(edit(1));
		await settled();
		expect([box.state, box.reason, box.setAside]).toEqual(['kept', 'This is not JSON.', []]);
		expect(idsOf(readKept(DESIGN))).toEqual([rowId(1)]);
		await vi.advanceTimersByTimeAsync(500);
		expect([box.state, server.log]).toEqual(['saved', [rowId(1)]]);
	});

	it('waits where the line is cut before it is set aside', async () => {
		const server = serverOf();
		server.answers.push(
			() => Response.json({ title: 'Not of the form' }, { status: 422 }),
			() => Promise.reject(new TypeError('failed'))
		);
		const { box } = boxOf(server.send);
		box.put(edit(1));
		await settled();
		expect([box.state, box.setAside, idsOf(readKept(DESIGN))]).toEqual(['kept', [], [rowId(1)]]);
	});

	it('is told of with what was typed, also of several cells', () => {
		const wordsOf = (one: SentEdit['edit']) => setAsideWords({ id: rowId(1), edit: one, reason: 'Too large.' });
		const sets = ['24x12', '5', 'a', 'b'].map((typed, n) => ({
			...{ kind: 'set' as const, row: rowId(n), field: 'tag', typed, units: 'SI' as const }
		}));
		expect(wordsOf({ kind: 'batch', edits: sets })).toBe(
			'Not taken by the server: Too large. It was “24x12”, “5”, “a” and 1 more.'
		);
		expect(wordsOf({ kind: 'delete', rows: [rowId(1)] })).toContain('It was a deletion of rows.');
	});
});

describe('edits kept on a device', () => {
	it('outlive a reload, and are sent by the next visit in their order', async () => {
		const away = boxOf(() => Promise.reject(new TypeError('failed')));
		away.box.put(edit(1));
		away.box.put(edit(2));
		await settled();
		away.box.stop();
		const server = serverOf();
		const back = boxOf(server.send);
		back.box.fill(readKept(DESIGN));
		await settled();
		expect([server.log, readKept(DESIGN)]).toEqual([[rowId(1), rowId(2)], []]);
	});

	it('of two windows on one design stay beside each other', async () => {
		const server = serverOf();
		const [left, right] = [boxOf(() => Promise.reject(new TypeError('failed'))), boxOf(server.send)];
		left.box.put(edit(1));
		await settled();
		right.box.put(edit(2));
		expect(idsOf(readKept(DESIGN))).toEqual([rowId(1), rowId(2)]);
		await settled();
		expect(server.log).toEqual([rowId(2)]);
		expect(idsOf(readKept(DESIGN))).toEqual([rowId(1)]);
		left.box.stop();
	});

	it('are those of one design alone', () => {
		keep('one', [edit(1)]);
		keep('two', [edit(2)]);
		expect([idsOf(readKept('one')), idsOf(readKept('two'))]).toEqual([[rowId(1)], [rowId(2)]]);
	});

	it.each([['not JSON'], ['{}'], ['[{"id":"x"}]'], ['null']])('are none where the store holds %s', (text) => {
		localStorage.setItem(`evendraft/unsent/${DESIGN}`, text);
		expect(readKept(DESIGN)).toEqual([]);
		expect(keep(DESIGN, [edit(1)])).toBe(true);
		expect(idsOf(readKept(DESIGN))).toEqual([rowId(1)]);
	});

	it('are not lost with one that cannot be read', () => {
		localStorage.setItem(`evendraft/unsent/${DESIGN}`, JSON.stringify([{ id: 'x' }, edit(1)]));
		expect(idsOf(readKept(DESIGN))).toEqual([rowId(1)]);
	});

	it('are told of where the device has no room, and are sent nevertheless', async () => {
		vi.stubGlobal('localStorage', storeOf(100));
		const server = serverOf();
		const { box } = boxOf(server.send);
		box.put(edit(1, 'x'.repeat(200)));
		expect(box.reason).toBe('This device has no room to keep edits; leave the page open until they are saved.');
		await settled();
		expect([box.state, server.log]).toEqual(['saved', [rowId(1)]]);
	});
});
