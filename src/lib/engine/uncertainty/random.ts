import { cos, log, PI } from '../arithmetic';

/** Beyond this many standard deviations a draw is drawn again: no coefficient becomes absurd. */
export const BOUND = 3.5;

/**
 * Draws of the standard normal distribution, bounded at 3.5, the same for the same seed on any machine.
 *
 *   z = sqrt(-2 ln u1) cos(2 pi u2)
 *
 * @param seed any whole number
 * @returns the next draw [-]
 * @source Box and Muller (1958); uniform draws by a 32-bit generator of the xorshift kind, Marsaglia (2003)
 */
export function normalDraws(seed: number): () => number {
	let state = (seed | 0) === 0 ? 0x9e3779b9 | 0 : seed | 0;
	const uniform = (): number => {
		state ^= state << 13;
		state ^= state >>> 17;
		state ^= state << 5;
		return ((state >>> 0) + 0.5) / 4294967296;
	};
	// The first draws of a small seed are alike.
	for (let skipped = 0; skipped < 20; skipped += 1) uniform();
	return () => {
		for (;;) {
			const z = Math.sqrt(-2 * log(uniform())) * cos(2 * PI * uniform());
			if (z >= -BOUND && z <= BOUND) return z;
		}
	};
}
