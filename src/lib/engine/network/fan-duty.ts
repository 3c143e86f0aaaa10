import type { Solution } from '../document/types';
import type { Network } from './network';
import type { Required } from './paths';
import type { RowLoss } from './row-loss';

/** Sums of the flows at the fan [m3/s], on either side of it. */
export function totalsOf({ rows, parents, order }: Network, flows: Float64Array): Solution['totals'] {
	let supplyFlow = 0;
	let returnFlow = 0;
	for (let i = 0; i < order.length; i += 1) {
		const place = order[i] ?? 0;
		if ((parents[place] ?? -1) >= 0) continue;
		if (rows[place]?.side === 'supply') supplyFlow += flows[place] ?? 0;
		else returnFlow += flows[place] ?? 0;
	}
	return { supplyFlow, returnFlow };
}

/**
 * What the fan must give at the design flows.
 *
 *   total = requirement of the supply index + requirement of the other side's index;  static = total - pv at the outlet
 *
 * @param required requirement of each side [Pa], null without one
 * @returns flow [m3/s], the greater of both sides; pressures [Pa]
 * @source Fan static pressure = fan total pressure less the velocity pressure at its outlet: common practice (ISO 5801)
 * @check fixtures/networks/fan-both-sides.json
 */
export function fanDuty(
	network: Network,
	rowLosses: readonly RowLoss[],
	required: Required,
	{ supplyFlow, returnFlow }: Solution['totals']
): Solution['fan'] {
	const supplyPressure = (required.supply ?? 0) + 0;
	const returnPressure = (required.return ?? 0) + 0;
	const totalPressure = supplyPressure + returnPressure;
	const atOutlet = velocityPressureAtOutlet(network, rowLosses);
	return {
		flow: Math.max(supplyFlow, returnFlow),
		totalPressure,
		supplyPressure,
		returnPressure,
		staticPressure: atOutlet === null ? null : totalPressure - atOutlet
	};
}

/** Velocity pressure where the supply leaves the fan [Pa], weighted by flow; null without a supply row. */
function velocityPressureAtOutlet({ rows, parents, order }: Network, rowLosses: readonly RowLoss[]): number | null {
	let flow = 0;
	let sum = 0;
	for (let i = 0; i < order.length; i += 1) {
		const place = order[i] ?? 0;
		const solved = rowLosses[place];
		if (solved === undefined || (parents[place] ?? -1) >= 0 || rows[place]?.side !== 'supply') continue;
		// Where the row leaks, more leaves the fan than the mean flow that its velocity pressure is of.
		const atFan = solved.flowEnds?.[0] ?? solved.flow;
		const ratio = atFan / solved.flow;
		flow += atFan;
		sum += atFan * solved.velocityPressure * ratio * ratio;
	}
	return flow > 0 ? sum / flow : null;
}
