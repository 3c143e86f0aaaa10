import type { CatalogueUse, DesignRow, Equipment, Fitting, Item, Junction, Outlet } from '../document/types';
import { coefficientOf, fittingEntry, ratedLoss, type CatalogueEntry, type CoefficientResult } from '../fitting';
import { COLEBROOK_ROUGHNESS, regime } from '../friction';
import { parametersInWords } from './parameters-in-words';
import type { Hydraulics } from './hydraulics';

const BY_HAND = 'entered by hand';
/** Times the rigid friction rate, where the design names no factor; illustrative, for a length not fully stretched. */
const FLEXIBLE_FACTOR = 4;

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
	return item('duct', 'Duct', frictionRate * length, { source: FRICTION[law] });
}

export function flexibleItem(
	{ length, factor }: NonNullable<DesignRow['flexible']>,
	{ frictionRate }: Hydraulics
): Item {
	const source =
		factor === undefined ? `${FLEXIBLE_FACTOR} times the rigid rate: the program’s default, illustrative` : BY_HAND;
	return item('flexible', 'Flexible duct', (factor ?? FLEXIBLE_FACTOR) * frictionRate * length, { source });
}

export function junctionItem(junction: Junction, { velocityPressure }: Hydraulics): Item {
	const { coefficient = 0, kind, name = 'Junction', toBeConfirmed } = junction;
	return item('junction', name, coefficient * velocityPressure, { kind, coefficient, source: BY_HAND, toBeConfirmed });
}

export function fittingItem(fitting: Fitting, row: DesignRow, hydraulics: Hydraulics, notes: RangeNote[]): Item {
	const { kind, count = 1, toBeConfirmed } = fitting;
	const pv = hydraulics.velocityPressure;
	if (kind === 'fixed') {
		const { coefficient = 0, name = 'Fitting' } = fitting;
		const loss = coefficient * count * pv;
		return item('fitting', name, loss, { kind, count, coefficient, source: BY_HAND, toBeConfirmed });
	}
	const entry = fittingEntry(kind);
	const name = fitting.name ?? entry?.name ?? kind;
	const { reynolds, velocity, relativeRoughness, frictionFactor } = hydraulics;
	const context = { size: row.size, reynolds, velocity, relativeRoughness, frictionFactor };
	const result = coefficientOf(kind, fitting, context);
	const { coefficient, source, inRange, rangeNote } = result;
	if (!inRange || rangeNote !== null)
		notes.push({ name, inRange, note: rangeNote ?? 'outside the range of its source' });
	const catalogue = entry === null ? null : useOf(entry, result);
	return item('fitting', name, coefficient * count * pv, {
		kind,
		count,
		coefficient,
		source,
		catalogue,
		toBeConfirmed
	});
}

function useOf(entry: CatalogueEntry, { parameters, method, rangeNote }: CoefficientResult): CatalogueUse {
	const { known, uncertainty, caution } = entry;
	return { parameters, words: parametersInWords(entry, parameters), method, known, uncertainty, rangeNote, caution };
}

/** Without the flow it was given at, a loss is that at the design flow. */
export function equipmentItem(equipment: Equipment, flow: number): Item {
	const { name, loss, atFlow = flow, exponent = 2, toBeConfirmed } = equipment;
	return item('equipment', name, ratedLoss(loss, atFlow, flow, exponent), { source: BY_HAND, toBeConfirmed });
}

/** At its design flow an outlet loses what was entered; without a figure it is an open end of one velocity pressure. */
export function outletItem(outlet: Outlet, side: DesignRow['side'], { velocityPressure: pv }: Hydraulics): Item {
	const { name = side === 'supply' ? 'Outlet' : 'Inlet', toBeConfirmed } = outlet;
	if (outlet.loss === undefined)
		return item('outlet', name, pv, { coefficient: 1, source: 'open end, one velocity pressure', toBeConfirmed });
	const loss = outlet.lossIs === 'static' ? outlet.loss + pv : outlet.loss;
	return item('outlet', name, loss, { source: BY_HAND, toBeConfirmed });
}

export function gravityItem(gain: number): Item {
	return item('gravity', 'Thermal gravity', -gain, { source: 'g (ρ surroundings − ρ) Δz' });
}

type More = {
	readonly [K in 'kind' | 'count' | 'coefficient' | 'source' | 'catalogue' | 'toBeConfirmed']?: Item[K] | undefined;
};

function item(part: Item['part'], name: string, loss: number, more: More): Item {
	const {
		kind = null,
		count = null,
		coefficient = null,
		source = null,
		catalogue = null,
		toBeConfirmed = false
	} = more;
	// Adding 0 turns -0 into 0.
	const figure = coefficient === null ? null : coefficient + 0;
	return { part, name, kind, count, coefficient: figure, loss: loss + 0, source, catalogue, toBeConfirmed };
}
