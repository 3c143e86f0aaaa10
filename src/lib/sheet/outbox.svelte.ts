import type { SentEdit } from './edit';
import { keep } from './kept-edits';
import type { EditsReply } from './server-reply';

export type SendState = 'saved' | 'saving' | 'kept' | 'refused';

/** Waits between tries while the server cannot be reached [ms]. */
const WAITS = [500, 1_000, 2_000, 5_000, 10_000];
/** Edits in one message, so that a large paste stays below the server's limit. */
const MOST_AT_ONCE = 200;

interface Options {
	readonly designId: string;
	readonly base: () => number;
	/** Called with each reply before the sent edits leave the box. */
	readonly onreply: (reply: EditsReply, sent: readonly SentEdit[]) => void;
	readonly send?: typeof fetch;
}

/** Carries edits to the server in their order, each until it is accepted or refused. Nothing leaves before that. */
export class Outbox {
	#options: Options;
	#unsent = $state.raw<readonly SentEdit[]>([]);
	#state = $state<SendState>('saved');
	#savedAt = $state<Date | null>(null);
	#reason = $state('');
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

	/** Puts an edit last and sends it as soon as those before it are through. */
	put(edit: SentEdit): void {
		this.fill([...this.#unsent, edit]);
	}

	/** Takes edits that were kept on this device. */
	fill(edits: readonly SentEdit[]): void {
		this.#unsent = edits;
		const kept = keep(this.#options.designId, edits);
		if (this.#state !== 'kept') this.#state = edits.length ? 'saving' : 'saved';
		if (!kept) this.#reason = 'This device has no room to keep edits; leave the page open until they are saved.';
		void this.flush();
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

	/** Ends the tries: what is not sent by then stays kept on this device. */
	stop(): void {
		this.#stopped = true;
		clearTimeout(this.#timer);
	}

	async #sendSome(): Promise<boolean> {
		const sent = this.#unsent.slice(0, MOST_AT_ONCE);
		const reply = await this.#post(sent);
		if (!reply) return false;
		this.#tries = 0;
		this.#options.onreply(reply, sent);
		const gone = new Set(sent.map(({ id }) => id));
		this.#unsent = this.#unsent.filter(({ id }) => !gone.has(id));
		keep(this.#options.designId, this.#unsent, gone);
		const [refused] = reply.refused;
		this.#reason = refused?.reason ?? '';
		this.#state = refused ? 'refused' : this.#unsent.length ? 'saving' : 'saved';
		this.#savedAt = new Date();
		return true;
	}

	async #post(edits: readonly SentEdit[]): Promise<EditsReply | null> {
		const send = this.#options.send ?? fetch;
		try {
			const answer = await send(`/api/v1/designs/${this.#options.designId}/edits`, {
				method: 'POST',
				headers: { 'content-type': 'application/json' },
				body: JSON.stringify({ base: this.#options.base(), edits })
			});
			const reply: unknown = answer.ok ? await answer.json() : null;
			if (isReply(reply)) return reply;
			if (answer.ok) throw new TypeError('no reply to edits');
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
