import { velocityPressure } from '../air';
import type { JunctionContext } from '../fitting';
import { sectionOf } from '../shape';
import type { Network } from './network';
import type { RowAir } from './row-airs';

/** A node as one of its streams sees it, with the row that is its common leg. */
export interface JunctionView {
	readonly context: JunctionContext;
	/** Place of the common leg. */
	readonly common: number;
	/** Tag of the common leg. */
	readonly tag: string;
	/** Velocity pressure of the common leg, at the node [Pa]. */
	readonly velocityPressure: number;
}

/** Mass flows at the nodes [kg/s]. */
export interface MassFlows {
	/** Of each row where it joins, or meets the fan. */
	readonly leg: Float64Array;
	/** Of each row where others join it, or at its outlet. */
	readonly common: Float64Array;
}

interface Node {
	/** Place of the straight leg; -1 where none goes straight on. */
	straight: number;
	branches: number;
	/** Flow of all branches [kg/s]. */
	branchFlow: number;
	/** Place of the branch with the greatest flow; -1 without one. */
	greatest: number;
}

/**
 * What the junction of each row is asked with: flows and areas of the node, as the sheet has them.
 *
 *   q = m_leg/m_common, a = A_leg/A_common
 *
 * @param network rows as trees
 * @param airs of each row: density [kg/m3]
 * @param massFlows of each row at the node where it joins [kg/s], and of the common leg at that node
 * @param farFlows of each row where others join it [m3/s]
 * @returns for each row with a junction of the catalogue its view of the node; undefined for the others
 * @source Conservation of mass
 * @check none: the balance at each node is a law under test
 */
export function junctionViews(
	{ rows, parents, order }: Network,
	airs: readonly RowAir[],
	massFlows: MassFlows,
	farFlows: Float64Array
): readonly (JunctionView | undefined)[] {
	const asked = (place: number) => {
		const kind = rows[place]?.junction?.kind;
		return kind !== undefined && kind !== 'fixed' && (parents[place] ?? -1) >= 0;
	};
	const views = new Array<JunctionView | undefined>(rows.length).fill(undefined);
	if (!rows.some((_, place) => asked(place))) return views;

	const nodes = new Map<number, Node>();
	for (let i = 0; i < order.length; i += 1) {
		const place = order[i] ?? 0;
		const parent = parents[place] ?? -1;
		if (parent < 0) continue;
		let node = nodes.get(parent);
		if (!node) nodes.set(parent, (node = { straight: -1, branches: 0, branchFlow: 0, greatest: -1 }));
		if (rows[place]?.junction?.leg === 'straight') {
			node.straight = place;
			continue;
		}
		const flow = massFlows.leg[place] ?? 0;
		node.branches += 1;
		node.branchFlow += flow;
		if (node.greatest < 0 || flow > (massFlows.leg[node.greatest] ?? 0)) node.greatest = place;
	}

	const areas = rows.map(({ size }) => sectionOf(size).area);
	rows.forEach((row, place) => {
		const parent = parents[place] ?? -1;
		const node = nodes.get(parent);
		const commonRow = rows[parent];
		if (!asked(place) || !node || !commonRow) return;
		const [own, common] = [areas[place] ?? 0, areas[parent] ?? 0];
		const through = massFlows.common[parent] ?? 0;
		const ratio = (flow: number) => (through > 0 ? flow / through : 0);
		const areaOf = (at: number) => (areas[at] ?? 0) / common;
		const leg = row.junction?.leg ?? 'branch';
		const flowRatio = ratio(massFlows.leg[place] ?? 0);
		const context: JunctionContext = {
			direction: row.side === 'supply' ? 'diverging' : 'converging',
			leg,
			flowRatio,
			branchFlowRatio: leg === 'branch' ? flowRatio : ratio(node.branchFlow),
			areaRatio: own / common,
			branchAreaRatio: leg === 'branch' ? own / common : node.greatest < 0 ? 1 : areaOf(node.greatest),
			straightAreaRatio: node.straight < 0 ? null : areaOf(node.straight),
			branches: node.branches,
			commonSize: commonRow.size,
			size: row.size
		};
		// Where the common leg leaks, its flow at the node is not the mean one.
		const pv = velocityPressure(airs[parent]?.density ?? 0, (farFlows[parent] ?? 0) / common);
		views[place] = { context, common: parent, tag: commonRow.tag, velocityPressure: pv };
	});
	return views;
}
