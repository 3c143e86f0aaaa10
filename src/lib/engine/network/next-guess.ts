/** A guess of what flows through, and what the pressures that come of it make of it. */
export interface Trial {
	readonly guess: Float64Array;
	readonly found: Float64Array;
}

/**
 * Guess after two trials: where the line through both has its fixed point, in the direction that they differ.
 *
 *   x = g - b (g - g1), b = r (r - r1)/|r - r1|^2, r = g - x, index 1 the trial before; not below 0
 *
 * @param places that count, in an order that does not depend on the document's
 * @param last the last trial
 * @param before the one before it; null at first
 * @returns the next guess
 * @source Irons and Tuck (1969), Aitken's process for several values at once
 */
export function nextGuess(places: readonly number[], last: Trial, before: Trial | null): Float64Array {
	if (before === null) return last.found;
	let [above, below] = [0, 0];
	for (const place of places) {
		const r = (last.found[place] ?? 0) - (last.guess[place] ?? 0);
		const change = r - ((before.found[place] ?? 0) - (before.guess[place] ?? 0));
		above += r * change;
		below += change * change;
	}
	const share = below > 0 ? above / below : 0;
	const next = new Float64Array(last.found.length);
	for (const place of places) {
		const found = last.found[place] ?? 0;
		next[place] = Math.max(0, found - share * (found - (before.found[place] ?? 0)));
	}
	return next;
}
