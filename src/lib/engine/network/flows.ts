import type { Network } from './network';
import type { RowAir } from './row-airs';

/** Density of air by which a standard flow is counted, where the design names none [kg/m3]: 20 °C, dry, at sea level. */
export const STANDARD_DENSITY = 1.204;

/** Flows of each row. */
export interface RowFlows {
	/** Where it meets the row that it joins, or the fan [m3/s]. */
	readonly fanEnd: Float64Array;
	/** At its outlet, or where rows join it [m3/s]. */
	readonly farEnd: Float64Array;
}

interface Basis {
	readonly airs: readonly RowAir[];
	/** All rows hold the same air. */
	readonly uniform: boolean;
	/** Density of standard flows [kg/m3]; null where flows are actual ones. */
	readonly standard: number | null;
	/** What escapes from each row, or is drawn into it [m3/s]; null without leakage. */
	readonly leaks: Float64Array | null;
}

/**
 * Design flow of each row: its own outlet's, or the sum of the rows that join it, and what leaks from it. Mass is
 * conserved; at one density the volumes are summed themselves.
 *
 *   m = sum of m_joining,  Q = m/rho;  Q_fan end = Q_far end + Q_leak
 *
 * @param network rows as trees, outlet flows in [m3/s]
 * @param basis densities [kg/m3], whether flows are standard ones, leakage [m3/s]
 * @returns flows [m3/s] at both ends of each row
 * @source conservation of mass
 * @check none: the balance at each node is a law under test
 */
export function designFlows({ rows, parents, order }: Network, basis: Basis): RowFlows {
	const { airs, uniform, standard, leaks } = basis;
	const farEnd = new Float64Array(rows.length);
	const fanEnd = leaks ? new Float64Array(rows.length) : farEnd;
	for (let i = order.length - 1; i >= 0; i -= 1) {
		const place = order[i] ?? 0;
		const density = airs[place]?.density ?? 1;
		const typed = rows[place]?.outlet?.flow ?? 0;
		const far = (farEnd[place] ?? 0) + (standard === null ? typed : (typed * standard) / density);
		farEnd[place] = far;
		const near = leaks ? far + (leaks[place] ?? 0) : far;
		fanEnd[place] = near;
		const parent = parents[place] ?? -1;
		if (parent < 0) continue;
		const there = uniform ? near : (near * density) / (airs[parent]?.density ?? 1);
		farEnd[parent] = (farEnd[parent] ?? 0) + there;
	}
	return { fanEnd, farEnd };
}
