import type { SentEdit } from './edit';
import { keep, keepSeen } from './kept-edits';
import type { EditsReply } from './server-reply';
import { keepSetAside, readSetAside, setAsideWords, type SetAside } from './set-aside';

export type SendState = 'saved' | 'saving' | 'kept' | 'refused';

/** Waits between tries while the server cannot be reached [ms]. */
const WAITS = [500, 1_000, 2_000, 5_000, 10_000];
/** A connection that gives no answer by then is given up and tried anew; the ids keep an edit from being taken twice [ms]. */
const LONGEST_ANSWER = 15_000;
/** Edits in one message, so that a large paste stays below the server's limit. */
const MOST_AT_ONCE = 200;
/** Answers that the same message would get for ever: it is malformed, too large or not of the form. */
const NEVER_TAKEN = [400, 413, 422];

interface Options {
	readonly designId: string;
	readonly base: () => number;
	/** Called with each reply before the sent edits leave the box. */
	readonly onreply: (reply: EditsReply, sent: readonly SentEdit[]) => void;
	readonly send?: typeof fetch;
}

const NO_ROOM = 'This device has no room to keep edits; leave the page open until they are saved.';

/** A message that the server will never take. */
interface NotTaken {
	readonly notTaken: string;
}

/**
 * Carries edits to the server in their order, each until it is accepted or refused. Nothing leaves before that. An edit
 * that the server can never take is set aside, so that it does not hold up those behind it.
 */
export class Outbox {
	#options: Options;
	#unsent = $state.raw<readonly SentEdit[]>([]);
	#state = $state<SendState>('saved');
	#savedAt = $state<Date | null>(null);
	#reason = $state('');
	#setAside = $state.raw<readonly SetAside[]>([]);
	#atOnce = MOST_AT_ONCE;
	#running = false;
	#stopped = false;
	#tries = 0;
	#timer: ReturnType<typeof setTimeout> | undefined;

	constructor(options: Options) {
		this.#options = options;
	}

	/** Edits that the server has not yet accepted. */
	get unsent() {
		return this.#unsent;
	}
	get state() {
		return this.#state;
	}
	/** When the server last accepted something. */
	get savedAt() {
		return this.#savedAt;
	}
	/** Why edits wait or were refused. */
	get reason() {
		return this.#reason;
	}

	/** Edits that the server did not take, with why; kept on this device. */
	get setAside() {
		return this.#setAside;
	}

	/** Brings back what was set aside on an earlier visit. In the browser only. */
	recall(): void {
		this.#setAside = readSetAside(this.#options.designId);
		if (!this.#unsent.length) this.#rest();
	}

	/** Forgets an edit that was set aside, when a person has seen it. */
	letGo(id: string): void {
		this.#keepAside(this.#setAside.filter((one) => one.id !== id));
		if (!this.#unsent.length) this.#rest();
	}

	/** Puts an edit last and sends it as soon as those before it are through. */
	put(edit: SentEdit): void {
		this.fill([...this.#unsent, edit]);
	}

	/** Takes edits that were kept on this device. */
	fill(edits: readonly SentEdit[]): void {
		this.#unsent = edits;
		const kept = keep(this.#options.designId, edits);
		if (this.#state !== 'kept') {
			if (edits.length) this.#state = 'saving';
			else this.#rest();
		}
		if (!kept) this.#reason = NO_ROOM;
		// After the frame in which the edit is shown: sending takes some milliseconds of the page.
		setTimeout(() => void this.flush());
	}

	/** Tries now, as when the network comes back. */
	async flush(): Promise<void> {
		if (this.#running) return;
		this.#running = true;
		clearTimeout(this.#timer);
		try {
			while (this.#unsent.length) if (!(await this.#sendSome())) break;
		} finally {
			this.#running = false;
		}
	}

	/** Asks for what the log has beyond this page, sending nothing. */
	async ask(): Promise<void> {
		this.#state = 'saving';
		const reply = await this.#post([]);
		if (reply && !('notTaken' in reply)) this.#options.onreply(reply, []);
		if (!this.#unsent.length) this.#rest();
	}

	/** Ends the tries: what is not sent by then stays kept on this device. */
	stop(): void {
		this.#stopped = true;
		clearTimeout(this.#timer);
	}

	async #sendSome(): Promise<boolean> {
		const sent = this.#unsent.slice(0, this.#atOnce);
		const reply = await this.#post(sent);
		if (!reply) return false;
		const [first] = sent;
		if ('notTaken' in reply) {
			// Of several, the half that is taken goes its way; in the end the one at fault stands alone.
			if (!first || sent.length > 1) this.#atOnce = Math.ceil(sent.length / 2);
			else return this.#putAside(first, reply.notTaken);
			return true;
		}
		this.#accept(reply, sent);
		return true;
	}

	#accept(reply: EditsReply, sent: readonly SentEdit[]): void {
		this.#tries = 0;
		this.#options.onreply(reply, sent);
		const gone = new Set(sent.map(({ id }) => id));
		// Before the edits are forgotten: a page that is being loaded meanwhile may not have them.
		keepSeen(this.#options.designId, reply.seq);
		this.#unsent = this.#unsent.filter(({ id }) => !gone.has(id));
		keep(this.#options.designId, this.#unsent, gone);
		this.#savedAt = new Date();
		const refused = reply.refused.find(({ id }) => !this.#setAside.some((one) => one.id === id));
		if (this.#unsent.length && !refused) {
			this.#state = 'saving';
			this.#reason = '';
		} else this.#rest(refused?.reason);
	}

	/** Sets one edit aside, unless the server takes no message at all: then the edit is not at fault, and waits. */
	async #putAside(edit: SentEdit, reason: string): Promise<boolean> {
		const reply = await this.#post([]);
		if (!reply) return false;
		if ('notTaken' in reply) {
			this.#wait(reply.notTaken);
			return false;
		}
		this.#atOnce = MOST_AT_ONCE;
		this.#keepAside([...this.#setAside.filter(({ id }) => id !== edit.id), { ...edit, reason }]);
		this.#accept({ ...reply, refused: [...reply.refused, { id: edit.id, reason }] }, [edit]);
		return true;
	}

	#keepAside(edits: readonly SetAside[]): void {
		this.#setAside = edits;
		if (!keepSetAside(this.#options.designId, edits)) this.#reason = NO_ROOM;
	}

	/** The state when nothing is under way. */
	#rest(refused = ''): void {
		const last = this.#setAside.at(-1);
		this.#reason = refused || (last ? setAsideWords(last) : '');
		this.#state = this.#reason ? 'refused' : 'saved';
		this.#atOnce = MOST_AT_ONCE;
	}

	async #post(edits: readonly SentEdit[]): Promise<EditsReply | NotTaken | null> {
		const send = this.#options.send ?? fetch;
		try {
			const answer = await send(`/api/v1/designs/${this.#options.designId}/edits`, {
				method: 'POST',
				headers: { 'content-type': 'application/json' },
				body: JSON.stringify({ base: this.#options.base(), edits }),
				signal: AbortSignal.timeout(LONGEST_ANSWER)
			});
			const reply: unknown = answer.ok ? await answer.json() : null;
			if (isReply(reply)) return reply;
			if (answer.ok) throw new TypeError('no reply to edits');
			if (NEVER_TAKEN.includes(answer.status)) return { notTaken: await reasonOf(answer) };
			this.#wait(answer.status === 401 ? 'You are signed out. Sign in again in another tab.' : await reasonOf(answer));
		} catch {
			this.#wait('The server cannot be reached.');
		}
		return null;
	}

	#wait(reason: string): void {
		this.#state = 'kept';
		this.#reason = reason;
		if (this.#stopped) return;
		const wait = WAITS[Math.min(this.#tries++, WAITS.length - 1)];
		this.#timer = setTimeout(() => void this.flush(), wait);
	}
}

/** Whether this is the route's reply, and not a page that something in between put in its place. */
function isReply(reply: unknown): reply is EditsReply {
	if (typeof reply !== 'object' || !reply) return false;
	const { entries, refused, seq } = reply as Partial<Record<keyof EditsReply, unknown>>;
	return Array.isArray(entries) && Array.isArray(refused) && typeof seq === 'number';
}

async function reasonOf(answer: Response): Promise<string> {
	const body: unknown = await answer.json().catch(() => null);
	const title = typeof body === 'object' && body && 'title' in body ? String(body.title) : '';
	return title || `The server answered ${answer.status}.`;
}
