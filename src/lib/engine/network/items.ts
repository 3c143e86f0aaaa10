import type {
	CatalogueUse,
	DesignDocument,
	DesignRow,
	Equipment,
	Fitting,
	Item,
	Junction,
	Outlet,
	ReferenceLeg
} from '../document/types';
import {
	coefficientOf,
	filterLoss,
	fittingEntry,
	junctionCoefficientOf,
	lossFromPoints,
	ratedLoss,
	type CatalogueEntry,
	type CoefficientResult,
	type LossPoint
} from '../fitting';
import { COLEBROOK_ROUGHNESS, flexibleStretchFactor, regime } from '../friction';
import { parametersInWords } from './parameters-in-words';
import type { Hydraulics } from './hydraulics';
import type { JunctionView } from './junction-views';

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
	{ length, factor, compression }: NonNullable<DesignRow['flexible']>,
	{ frictionRate, hydraulicDiameter }: Hydraulics,
	notes: RangeNote[]
): Item {
	if (compression !== undefined && factor === undefined) {
		const stretch = flexibleStretchFactor(hydraulicDiameter, compression);
		if (stretch.note !== null) notes.push({ name: 'Flexible duct', inRange: false, note: stretch.note });
		const source = 'Abushakra, Walker & Sherman (2004), by its compression, from memory; on the rigid friction rate';
		return item('flexible', 'Flexible duct', stretch.factor * frictionRate * length, { source });
	}
	const source =
		factor === undefined ? `${FLEXIBLE_FACTOR} times the rigid rate: the program’s default, illustrative` : BY_HAND;
	return item('flexible', 'Flexible duct', (factor ?? FLEXIBLE_FACTOR) * frictionRate * length, { source });
}

/**
 * What a junction costs the stream of its row. A coefficient of the catalogue is on the velocity pressure of the common
 * leg; the item gives it on the row's own, and the other beside it.
 */
export function junctionItem(
	junction: Junction,
	{ velocityPressure }: Hydraulics,
	view: JunctionView | undefined,
	methods: DesignDocument['methods'],
	notes: RangeNote[]
): Item {
	const { coefficient: given = 0, kind, toBeConfirmed } = junction;
	const entry = kind === 'fixed' || !view ? null : fittingEntry(kind);
	if (!entry || !view) {
		// Where a row meets the fan there is no node: a flag says so.
		const coefficient = kind === 'fixed' ? given : 0;
		const { name = 'Junction' } = junction;
		return item('junction', name, coefficient * velocityPressure, {
			...{ kind, coefficient, source: BY_HAND, toBeConfirmed }
		});
	}
	const { context, tag } = view;
	const name = junction.name ?? `${entry.name}, ${context.leg}`;
	const result = junctionCoefficientOf(kind, withMethod(junction, methods), context);
	noteRange(name, result, notes);
	const loss = result.coefficient * view.velocityPressure;
	return item('junction', name, loss, {
		...{ kind, coefficient: loss / velocityPressure, source: result.source, toBeConfirmed },
		catalogue: useOf(entry, result),
		reference: {
			leg: 'common',
			row: tag,
			coefficient: result.coefficient,
			velocityPressure: view.velocityPressure,
			flowRatio: context.flowRatio,
			areaRatio: context.areaRatio
		}
	});
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

export function fittingItem(
	fitting: Fitting,
	row: DesignRow,
	hydraulics: Hydraulics,
	methods: DesignDocument['methods'],
	notes: RangeNote[]
): Item {
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
	const result = coefficientOf(kind, withMethod(fitting, methods), context);
	const { coefficient, source } = result;
	noteRange(name, result, notes);
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

function useOf(entry: CatalogueEntry, result: CoefficientResult): CatalogueUse {
	const { parameters, methodKey, method, known, uncertainty, rangeNote } = result;
	return {
		parameters,
		words: parametersInWords(entry, parameters),
		...(methodKey !== null && { methodKey }),
		...{ method, known, uncertainty, rangeNote, caution: entry.caution }
	};
}

const STATE = { clean: 'clean', mean: 'mean of clean and final', dirty: 'final, as it is changed' } as const;

/** Without the flow it was given at, a loss is that at the design flow. */
export function equipmentItem(equipment: Equipment, flow: number, notes: RangeNote[]): Item {
	const { name, loss = 0, atFlow = flow, exponent = 2, points, filter, toBeConfirmed } = equipment;
	if (points) {
		const found = lossFromPoints(points as readonly LossPoint[], flow);
		if (found.note !== null) notes.push({ name, inRange: false, note: found.note });
		return item('equipment', name, found.loss, {
			source: 'points of the maker, a power law between them',
			toBeConfirmed
		});
	}
	if (filter) {
		const found = filterLoss({ ...filter, atFlow, exponent: equipment.exponent ?? 1 }, flow);
		return item('equipment', name, found, { source: `filter, ${STATE[filter.state]}`, toBeConfirmed });
	}
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
} & { readonly reference?: ReferenceLeg };

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
	const { reference } = more;
	return {
		...{ part, name, kind, count, coefficient: figure, loss: loss + 0, source },
		...(reference && { reference }),
		...{ catalogue, toBeConfirmed }
	};
}
