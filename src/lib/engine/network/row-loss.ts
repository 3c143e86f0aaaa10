import type { DesignRow, Item, SolvedRow } from '../document/types';
import type { Hydraulics } from './hydraulics';
import {
	ductItem,
	equipmentItem,
	fittingItem,
	flexibleItem,
	gravityItem,
	junctionItem,
	outletItem,
	type RangeNote
} from './items';
import type { JunctionView } from './junction-views';
import type { Settings } from './settings';
import { thermalGravity } from './thermal-gravity';

/** A row solved but for its place in the network: `placePressures` fills in what depends on the others. */
export type RowLoss = Omit<SolvedRow, 'totalPressure' | 'staticPressure' | 'spare' | 'leakage' | 'flowEnds'> & {
	leakage?: number;
	flowEnds?: readonly [number, number];
	totalPressure: readonly [number, number];
	staticPressure: readonly [number, number];
	spare: number;
};

/**
 * Loss of total pressure along a row, in the direction of flow.
 *
 *   loss = dp/L L + flexible + sum(C n) pv + C_junction pv + equipment + outlet - thermal gravity
 *
 * @param row the row, SI units
 * @param hydraulics flow in the section of the row, SI units
 * @param view the node where the row joins another, as its junction sees it; pressures in [Pa]
 * @param settings surroundings [kg/m3] and methods
 * @param notes takes what lies outside the range of a coefficient's source
 * @returns losses [Pa], and the items whose sum is the loss; pressures and spare still 0
 * @throws {OutOfRangeError} when a formula is asked outside its range
 * @source Darcy-Weisbach, and loss coefficients on the velocity pressure of the row
 * @check fixtures/networks/hood-exhaust.json
 */
export function rowLoss(
	row: DesignRow,
	hydraulics: Hydraulics,
	view: JunctionView | undefined,
	settings: Settings,
	notes: RangeNote[]
): RowLoss {
	const { flow, air } = hydraulics;
	const { methods } = settings;
	const items: Item[] = [];
	/** Adds the item, and gives its loss. */
	const lossOf = (item: Item): number => {
		items.push(item);
		return item.loss;
	};

	const frictionLoss = lossOf(ductItem(row.length, row.size.shape, hydraulics, notes));
	const flexibleLoss = row.flexible === undefined ? 0 : lossOf(flexibleItem(row.flexible, hydraulics, notes));
	const junctionLoss =
		row.junction === undefined ? 0 : lossOf(junctionItem(row.junction, hydraulics, view, methods, notes));
	let fittingLoss = 0;
	for (const fitting of row.fittings ?? [])
		fittingLoss += lossOf(fittingItem(fitting, row, hydraulics, methods, notes));
	let equipmentLoss = 0;
	for (const equipment of row.equipment ?? []) equipmentLoss += lossOf(equipmentItem(equipment, flow, notes));
	const outletLoss = row.outlet === undefined ? 0 : lossOf(outletItem(row.outlet, row.side, hydraulics));
	const gain = gainOf(row, air.density, settings.surroundings);
	if (gain !== 0) items.push(gravityItem(gain));

	const losses = frictionLoss + flexibleLoss + fittingLoss + junctionLoss + equipmentLoss + outletLoss;
	return {
		side: row.side,
		flow,
		massFlow: flow * air.density,
		density: air.density,
		...(air.temperature !== null && { temperature: air.temperature }),
		area: hydraulics.area,
		hydraulicDiameter: hydraulics.hydraulicDiameter,
		velocity: hydraulics.velocity,
		velocityPressure: hydraulics.velocityPressure,
		reynolds: hydraulics.reynolds,
		frictionFactor: hydraulics.frictionFactor,
		frictionRate: hydraulics.frictionRate,
		frictionLoss,
		flexibleLoss,
		fittingLoss,
		junctionLoss,
		equipmentLoss,
		outletLoss,
		thermalGravity: gain,
		loss: losses - gain + 0,
		totalPressure: UNPLACED,
		staticPressure: UNPLACED,
		spare: 0,
		items: items.slice() // a list of just its length
	};
}

const UNPLACED = [0, 0] as const;

/** Supply air runs toward the far end, all other air away from it. */
function gainOf({ rise = 0, side }: DesignRow, density: number, surroundings: number): number {
	return thermalGravity(surroundings, density, side === 'supply' ? rise : -rise);
}
