import type { DesignRow, Item } from '../document/types';
import { hydraulicsOf, type Hydraulics } from './hydraulics';
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
import type { Settings } from './settings';
import { thermalGravity } from './thermal-gravity';

/** What a row loses, part by part [Pa]. */
export interface RowLoss {
	readonly hydraulics: Hydraulics;
	readonly frictionLoss: number;
	readonly flexibleLoss: number;
	readonly fittingLoss: number;
	readonly junctionLoss: number;
	readonly equipmentLoss: number;
	readonly outletLoss: number;
	/** Gain in the direction of flow. */
	readonly thermalGravity: number;
	readonly loss: number;
	readonly items: readonly Item[];
	readonly rangeNotes: readonly RangeNote[];
}

/**
 * Loss of total pressure along a row, in the direction of flow.
 *
 *   loss = dp/L L + flexible + sum(C n) pv + C_junction pv + equipment + outlet - thermal gravity
 *
 * @param row the row, SI units
 * @param flow design flow [m3/s], above 0
 * @param settings air and roughness
 * @returns losses [Pa], and the items whose sum is the loss
 * @throws {OutOfRangeError} when a formula is asked outside its range
 * @source Darcy-Weisbach, and loss coefficients on the velocity pressure of the row
 * @check fixtures/networks/hood-exhaust.json
 */
export function rowLoss(row: DesignRow, flow: number, settings: Settings): RowLoss {
	const hydraulics = hydraulicsOf(row, flow, settings);
	const rangeNotes: RangeNote[] = [];
	const items: Item[] = [];
	/** Adds the item, and gives its loss. */
	const lossOf = (item: Item): number => {
		items.push(item);
		return item.loss;
	};

	const frictionLoss = lossOf(ductItem(row.length, hydraulics));
	const flexibleLoss = row.flexible === undefined ? 0 : lossOf(flexibleItem(row.flexible, hydraulics));
	const junctionLoss = row.junction === undefined ? 0 : lossOf(junctionItem(row.junction, hydraulics));
	let fittingLoss = 0;
	for (const fitting of row.fittings ?? []) fittingLoss += lossOf(fittingItem(fitting, row, hydraulics, rangeNotes));
	let equipmentLoss = 0;
	for (const equipment of row.equipment ?? []) equipmentLoss += lossOf(equipmentItem(equipment, flow));
	const outletLoss = row.outlet === undefined ? 0 : lossOf(outletItem(row.outlet, row.side, hydraulics));
	const gain = gainOf(row, settings);
	if (gain !== 0) items.push(gravityItem(gain));

	const losses = frictionLoss + flexibleLoss + fittingLoss + junctionLoss + equipmentLoss + outletLoss;
	return {
		hydraulics,
		frictionLoss,
		flexibleLoss,
		fittingLoss,
		junctionLoss,
		equipmentLoss,
		outletLoss,
		thermalGravity: gain,
		loss: losses - gain + 0,
		items,
		rangeNotes
	};
}

/** Supply air runs toward the far end, all other air away from it. */
function gainOf({ rise = 0, side }: DesignRow, { air, surroundings }: Settings): number {
	return thermalGravity(surroundings, air.density, side === 'supply' ? rise : -rise);
}
