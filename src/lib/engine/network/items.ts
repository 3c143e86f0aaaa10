import type { DesignDocument, DesignRow, Equipment, Fitting, Item, Junction, Outlet } from '../document/types';
import {
	coefficientOf,
	filterLoss,
	fittingEntry,
	junctionCoefficientOf,
	lossFromPoints,
	ratedLoss,
	type CoefficientResult,
	type LossPoint
} from '../fitting';
import {
	COLEBROOK_ROUGHNESS,
	darcyWeisbach,
	findMaterial,
	flexibleStretchFactor,
	frictionFactor,
	regime
} from '../friction';
import type { CatalogueUses } from './catalogue-uses';
import type { Hydraulics } from './hydraulics';
import type { JunctionView } from './junction-views';

const BY_HAND = 'entered by hand';
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

/**
 * What a junction costs the stream of its row. A coefficient of the catalogue is on the velocity pressure of the common
 * leg; the item gives it on the row's own, and the other beside it.
 */
export function junctionItem(
	junction: Junction,
	{ velocityPressure }: Hydraulics,
	view: JunctionView | undefined,
	{ methods, uses }: Catalogued,
	notes: RangeNote[]
): Item {
	const { coefficient: given = 0, kind, toBeConfirmed = false } = junction;
	const entry = kind === 'fixed' || !view ? null : fittingEntry(kind);
	if (!entry || !view) {
		// Where a row meets the fan there is no node: a flag says so.
		const coefficient = kind === 'fixed' ? given : 0;
		const { name = 'Junction' } = junction;
		const loss = coefficient * velocityPressure + 0;
		return {
			...{ part: 'junction', name, kind, count: null, coefficient: coefficient + 0 },
			...{ loss, source: BY_HAND, catalogue: null, toBeConfirmed }
		};
	}
	const { context, tag } = view;
	const name = junction.name ?? `${entry.name}, ${context.leg}`;
	const result = junctionCoefficientOf(kind, withMethod(junction, methods), context);
	noteRange(name, result, notes);
	const loss = result.coefficient * view.velocityPressure;
	return {
		part: 'junction',
		name,
		kind,
		count: null,
		coefficient: loss / velocityPressure + 0,
		loss: loss + 0,
		source: result.source,
		reference: {
			leg: 'common',
			row: tag,
			coefficient: result.coefficient,
			velocityPressure: view.velocityPressure,
			flowRatio: context.flowRatio,
			areaRatio: context.areaRatio
		},
		catalogue: uses(junction, entry, result),
		toBeConfirmed
	};
}

/** The parameters with the method that the design has chosen for the kind, where the fitting names none of its own. */
function withMethod<F extends { readonly kind: string; readonly method?: string | undefined }>(
	fitting: F,
	methods: DesignDocument['methods']
): F {
	const chosen = methods && Object.hasOwn(methods, fitting.kind) ? methods[fitting.kind] : undefined;
	return fitting.method === undefined && chosen !== undefined ? { ...fitting, method: chosen } : fitting;
}

function noteRange(name: string, { inRange, rangeNote }: CoefficientResult, notes: RangeNote[]): void {
	if (!inRange || rangeNote !== null)
		notes.push({ name, inRange, note: rangeNote ?? 'outside the range of its source' });
}

/** What a part of the catalogue is asked with beside its row. */
interface Catalogued {
	readonly methods: DesignDocument['methods'];
	readonly uses: CatalogueUses;
}

export function fittingItem(
	fitting: Fitting,
	row: DesignRow,
	hydraulics: Hydraulics,
	{ methods, uses }: Catalogued,
	notes: RangeNote[]
): Item {
	const { kind, count = 1, toBeConfirmed = false } = fitting;
	const pv = hydraulics.velocityPressure;
	if (kind === 'fixed') {
		const { coefficient = 0, name = 'Fitting' } = fitting;
		return {
			part: 'fitting',
			name,
			kind,
			count,
			coefficient: coefficient + 0,
			loss: coefficient * count * pv + 0,
			source: BY_HAND,
			catalogue: null,
			toBeConfirmed
		};
	}
	const entry = fittingEntry(kind);
	const name = fitting.name ?? entry?.name ?? kind;
	const { reynolds, velocity, relativeRoughness } = hydraulics;
	const context = {
		size: row.size,
		reynolds,
		velocity,
		relativeRoughness,
		frictionFactor: hydraulics.frictionFactor
	};
	const result = coefficientOf(kind, withMethod(fitting, methods), context);
	noteRange(name, result, notes);
	return {
		part: 'fitting',
		name,
		kind,
		count,
		coefficient: result.coefficient + 0,
		loss: result.coefficient * count * pv + 0,
		source: result.source,
		catalogue: entry && uses(fitting, entry, result),
		toBeConfirmed
	};
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
