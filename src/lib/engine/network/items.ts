import type { DesignRow, Equipment, Item, Outlet } from '../document/types';
import { filterLoss, lossFromPoints, ratedLoss, type LossPoint } from '../fitting';
import {
	COLEBROOK_ROUGHNESS,
	darcyWeisbach,
	findMaterial,
	flexibleStretchFactor,
	frictionFactor,
	regime
} from '../friction';
import type { Hydraulics } from './hydraulics';

export const BY_HAND = 'entered by hand';
/** Times the rigid friction rate, where the design names no factor; illustrative, for a length not fully stretched. */
const FLEXIBLE_FACTOR = 4;
const STRETCHED_ROUGHNESS = findMaterial('flexible-extended')?.roughness ?? 0; // m

/** A coefficient outside the range of its source, or used beside its purpose. */
export interface RangeNote {
	readonly name: string;
	readonly inRange: boolean;
	readonly note: string;
}

/** The friction law that holds for the row, by its regime. */
const FRICTION = {
	laminar: 'Darcy–Weisbach, laminar law',
	transition: 'Darcy–Weisbach, blend between the laminar law and Colebrook–White',
	turbulent: 'Darcy–Weisbach, Colebrook–White'
} as const;

export function ductItem(
	length: number,
	shape: DesignRow['size']['shape'],
	hydraulics: Hydraulics,
	notes: RangeNote[]
): Item {
	const { frictionRate, relativeRoughness, reynolds } = hydraulics;
	const law = regime(reynolds);
	if (law !== 'turbulent' && shape === 'oval')
		notes.push({
			name: 'Duct',
			inRange: false,
			note: 'no laminar law of flat ovals is carried; 64/Re of round ducts stands in'
		});
	if (relativeRoughness > COLEBROOK_ROUGHNESS.max)
		notes.push({ name: 'Duct', inRange: false, note: 'the relative roughness is above the range of Colebrook–White' });
	return plainItem('duct', 'Duct', frictionRate * length, FRICTION[law]);
}

export function flexibleItem(
	{ length, factor, compression }: NonNullable<DesignRow['flexible']>,
	hydraulics: Hydraulics,
	notes: RangeNote[]
): Item {
	const { frictionRate, hydraulicDiameter } = hydraulics;
	if (compression !== undefined && factor === undefined) {
		const stretch = flexibleStretchFactor(hydraulicDiameter, compression);
		if (stretch.note !== null) notes.push({ name: 'Flexible duct', inRange: false, note: stretch.note });
		const source = 'Abushakra, Walker & Sherman (2004), by its compression, from memory; on the rate of stretched duct';
		return plainItem('flexible', 'Flexible duct', stretch.factor * stretchedRate(hydraulics) * length, source);
	}
	const source =
		factor === undefined ? `${FLEXIBLE_FACTOR} times the rigid rate: the program’s default, illustrative` : BY_HAND;
	return plainItem('flexible', 'Flexible duct', (factor ?? FLEXIBLE_FACTOR) * frictionRate * length, source);
}

/** Friction rate of flexible duct that is fully stretched [Pa/m], in the section of the row. */
function stretchedRate({ reynolds, hydraulicDiameter, air, velocity }: Hydraulics): number {
	const factor = frictionFactor({ reynolds, relativeRoughness: STRETCHED_ROUGHNESS / hydraulicDiameter });
	return darcyWeisbach(factor, 1, hydraulicDiameter, air.density, velocity);
}

const STATE = { clean: 'clean', mean: 'mean of clean and final', dirty: 'final, as it is changed' } as const;

/** Without the flow it was given at, a loss is that at the design flow. */
export function equipmentItem(equipment: Equipment, flow: number, notes: RangeNote[]): Item {
	const { name, loss = 0, atFlow = flow, exponent = 2, points, filter, toBeConfirmed } = equipment;
	if (points) {
		const found = lossFromPoints(points as readonly LossPoint[], flow);
		if (found.note !== null) notes.push({ name, inRange: false, note: found.note });
		const source = 'points of the maker, a power law between them';
		return plainItem('equipment', name, found.loss, source, toBeConfirmed);
	}
	if (filter) {
		const found = filterLoss({ ...filter, atFlow, exponent: equipment.exponent ?? 1 }, flow);
		return plainItem('equipment', name, found, `filter, ${STATE[filter.state]}`, toBeConfirmed);
	}
	return plainItem('equipment', name, ratedLoss(loss, atFlow, flow, exponent), BY_HAND, toBeConfirmed);
}

/** At its design flow an outlet loses what was entered; without a figure it is an open end of one velocity pressure. */
export function outletItem(outlet: Outlet, side: DesignRow['side'], { velocityPressure: pv }: Hydraulics): Item {
	const { name = side === 'supply' ? 'Outlet' : 'Inlet', toBeConfirmed } = outlet;
	if (outlet.loss === undefined)
		return {
			...plainItem('outlet', name, pv, 'open end, one velocity pressure', toBeConfirmed),
			coefficient: 1
		};
	const loss = outlet.lossIs === 'static' ? outlet.loss + pv : outlet.loss;
	return plainItem('outlet', name, loss, BY_HAND, toBeConfirmed);
}

export function gravityItem(gain: number): Item {
	return plainItem('gravity', 'Thermal gravity', -gain, 'g (ρ surroundings − ρ) Δz');
}

/** An item without a coefficient. Adding 0 turns -0 into 0. */
function plainItem(part: Item['part'], name: string, loss: number, source: string, toBeConfirmed = false): Item {
	return {
		part,
		name,
		kind: null,
		count: null,
		coefficient: null,
		loss: loss + 0,
		source,
		catalogue: null,
		toBeConfirmed
	};
}
