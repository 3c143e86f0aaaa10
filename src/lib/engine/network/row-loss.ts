import type { DesignRow, Item, SolvedRow } from '../document/types';
import { fittingItem, junctionItem } from './coefficient-items';
import type { Hydraulics } from './hydraulics';
import { ductItem, equipmentItem, flexibleItem, gravityItem, outletItem, type RangeNote } from './items';
import type { JunctionView } from './junction-views';
import type { Settings } from './settings';
import { thermalGravity } from './thermal-gravity';

/** A row solved but for its place in the network: `placePressures` fills in what depends on the others. */
export type RowLoss = Omit<
	SolvedRow,
	'totalPressure' | 'staticPressure' | 'spare' | 'leakage' | 'flowEnds' | 'leakagePressure'
> & {
	leakage?: number;
	flowEnds?: readonly [number, number];
	leakagePressure?: number;
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
	const { fittings = NONE, equipment = NONE } = row;
	const gain = gainOf(row, air.density, settings.surroundings);
	// Of just its length: lists that grow keep room that is never used.
	const items = new Array<Item>(itemCount(row, gain));
	let at = 0;

	const duct = ductItem(row.length, row.size.shape, hydraulics, notes);
	items[at++] = duct;
	let flexibleLoss = 0;
	if (row.flexible !== undefined) flexibleLoss = (items[at++] = flexibleItem(row.flexible, hydraulics, notes)).loss;
	let junctionLoss = 0;
	if (row.junction !== undefined)
		junctionLoss = (items[at++] = junctionItem(row.junction, hydraulics, view, settings, notes)).loss;
	let fittingLoss = 0;
	for (const one of fittings) fittingLoss += (items[at++] = fittingItem(one, hydraulics, settings, notes)).loss;
	let equipmentLoss = 0;
	for (const one of equipment) equipmentLoss += (items[at++] = equipmentItem(one, flow, notes)).loss;
	let outletLoss = 0;
	if (row.outlet !== undefined) outletLoss = (items[at++] = outletItem(row.outlet, row.side, hydraulics)).loss;
	if (gain !== 0) items[at] = gravityItem(gain);

	const frictionLoss = duct.loss;
	const losses = frictionLoss + flexibleLoss + fittingLoss + junctionLoss + equipmentLoss + outletLoss;
	const solved: RowLoss = {
		side: row.side,
		flow,
		massFlow: flow * air.density,
		density: air.density,
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
		items
	};
	return air.temperature === null ? solved : { ...solved, temperature: air.temperature };
}

const UNPLACED = [0, 0] as const;
const NONE = [] as const;

function itemCount({ flexible, junction, fittings, equipment, outlet }: DesignRow, gain: number): number {
	const once = 1 + Number(flexible !== undefined) + Number(junction !== undefined) + Number(outlet !== undefined);
	return once + (fittings?.length ?? 0) + (equipment?.length ?? 0) + Number(gain !== 0);
}

/** Supply air runs toward the far end, all other air away from it. */
function gainOf({ rise = 0, side }: DesignRow, density: number, surroundings: number): number {
	return thermalGravity(surroundings, density, side === 'supply' ? rise : -rise);
}
