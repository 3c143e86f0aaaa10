import type { Network } from './network';

/**
 * Design flow of each row: its own outlet's, or the sum of the rows that join it.
 *
 *   Q = sum of Q_joining
 *
 * @param network rows as trees, outlet flows in [m3/s]
 * @returns flows [m3/s], one for each row; exact mass balance at one density
 * @source conservation of mass, one density
 * @check none: the balance at each node is a law under test
 */
export function designFlows({ rows, parents, order }: Network): Float64Array {
	const flows = new Float64Array(rows.length);
	for (let i = order.length - 1; i >= 0; i -= 1) {
		const place = order[i] ?? 0;
		const flow = (flows[place] ?? 0) + (rows[place]?.outlet?.flow ?? 0);
		flows[place] = flow;
		const parent = parents[place] ?? -1;
		if (parent >= 0) flows[parent] = (flows[parent] ?? 0) + flow;
	}
	return flows;
}
