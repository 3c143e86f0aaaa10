import type { DesignDocument, Fitting, Item, Junction } from '../document/types';
import { coefficientOf, fittingEntry, junctionCoefficientOf, type CoefficientResult } from '../fitting';
import type { CatalogueUses } from './catalogue-uses';
import type { Hydraulics } from './hydraulics';
import { BY_HAND, type RangeNote } from './items';
import type { JunctionView } from './junction-views';

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
	const result = coefficientOf(kind, withMethod(fitting, methods), hydraulics);
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
