import { sentEditSchema, type SentEdit } from './edit';

const key = (designId: string) => `evendraft/unsent/${designId}`;

/** Edits of a design that this device has not yet seen accepted; they outlive a reload and a closed browser. */
export function readKept(designId: string): SentEdit[] {
	try {
		const stored: unknown = JSON.parse(localStorage.getItem(key(designId)) ?? '[]');
		if (!Array.isArray(stored)) return [];
		// One that cannot be read takes no other along.
		return stored.flatMap((one) => sentEditSchema.safeParse(one).data ?? []);
	} catch {
		return [];
	}
}

/**
 * Keeps the unsent edits and forgets those that have gone; false when this device has no room for them. What another
 * window keeps of the same design stays.
 */
export function keep(designId: string, unsent: readonly SentEdit[], gone: ReadonlySet<string> = new Set()): boolean {
	try {
		const mine = new Set(unsent.map(({ id }) => id));
		const others = readKept(designId).filter(({ id }) => !mine.has(id) && !gone.has(id));
		const all = [...others, ...unsent];
		if (all.length) localStorage.setItem(key(designId), JSON.stringify(all));
		else localStorage.removeItem(key(designId));
		return true;
	} catch {
		return false;
	}
}

const seqKey = (designId: string) => `evendraft/seen/${designId}`;

/** Keeps how far this device has seen the log of a design. */
export function keepSeen(designId: string, seq: number): void {
	try {
		if (seq > readSeen(designId)) localStorage.setItem(seqKey(designId), String(seq));
	} catch {
		// Without room the page is as fresh as the server made it.
	}
}

/** The last entry of the log that this device has seen; 0 where it has seen none. */
export function readSeen(designId: string): number {
	try {
		return Number(localStorage.getItem(seqKey(designId)) ?? 0) || 0;
	} catch {
		return 0;
	}
}
