/** Somebody's turn, to be given back. */
export type GiveBack = () => void;

/**
 * Turns at work that few can do at once. Each firm has one at a time, and firms come one after another, however many
 * turns one of them waits for.
 */
export class Turns {
	readonly #most: number;
	readonly #mostWaiting: number;
	readonly #waiting = new Map<string, ((giveBack: GiveBack) => void)[]>();
	readonly #busy = new Set<string>();

	constructor(atOnce: number, mostWaiting: number) {
		this.#most = atOnce;
		this.#mostWaiting = mostWaiting;
	}

	/** Waits for a turn of a firm; null where too many of its own wait already. */
	take(firm: string): Promise<GiveBack> | null {
		const own = this.#waiting.get(firm) ?? [];
		if (own.length >= this.#mostWaiting) return null;
		return new Promise((resolve) => {
			own.push(resolve);
			this.#waiting.set(firm, own);
			this.#next();
		});
	}

	#next(): void {
		for (const [firm, own] of this.#waiting) {
			if (this.#busy.size >= this.#most) return;
			if (this.#busy.has(firm)) continue;
			const begin = own.shift();
			// Behind all others, or out of the line.
			this.#waiting.delete(firm);
			if (own.length > 0) this.#waiting.set(firm, own);
			if (!begin) continue;
			this.#busy.add(firm);
			begin(() => {
				this.#busy.delete(firm);
				this.#next();
			});
		}
	}
}
