// The printed factors of junctions jump where an area or flow ratio passes a limit. A solver cannot cross a jump, so the
// catalogue goes from one printed branch to the next along a smooth step just above the limit.

/** Width of the bands above a printed limit in which the two printed branches are mixed [-]. */
export const BAND = 0.04;

/**
 * Smooth step from 0 to 1 just above a printed limit, with no slope at either end.
 *
 *   t = (x - limit)/0.04, held to 0 to 1; s = t^2 (3 - 2 t)
 *
 * @param x ratio [-]
 * @param limit at and below which the step is 0 [-]
 * @returns s share of the branch above the limit [-]
 * @source common practice; the band is ours, above the limit since the sources print "up to and including"
 * @check none: a blend of ours, held to its ends and slopes by a test of junction-smooth
 */
export function stepAbove(x: number, limit: number): number {
	const t = Math.min(Math.max((x - limit) / BAND, 0), 1);
	return t * t * (3 - 2 * t);
}

/**
 * Mean of two values by the share of the second.
 *
 *   y = (1 - s) low + s high
 *
 * @param low value where the share is 0 [-]
 * @param high value where the share is 1 [-]
 * @param share s [-], 0 to 1
 * @returns y [-]
 * @source Weighted mean
 * @check none: plain arithmetic, seen through the values of every junction
 */
export function mixed(low: number, high: number, share: number): number {
	return share === 0 ? low : share === 1 ? high : (1 - share) * low + share * high;
}
