import { requireInRange, type Range } from '../errors';
import { meanFilterLoss, ratedLoss } from './rated-loss';

const POSITIVE: Range = { min: Number.MIN_VALUE, max: Number.MAX_VALUE };
const NOT_NEGATIVE: Range = { min: 0, max: Number.MAX_VALUE };

export type FilterState = 'clean' | 'mean' | 'dirty';

export interface Filter {
	/** Loss of the clean filter and that at which it is changed [Pa], both at the flow atFlow [m3/s] */
	readonly clean: number;
	readonly final: number;
	readonly state: FilterState;
	readonly atFlow: number;
	/** Exponent of the flow [-]: 1 for deep media, to 1.4 for flat ones (from memory) */
	readonly exponent: number;
}

/**
 * Loss of a filter in a state of its life at another flow.
 *
 *   dp = dpr (Q/Qr)^n; dpr: clean, (clean + final)/2, or final
 *
 * @param filter losses [Pa] at a flow [m3/s], state, exponent [-]
 * @param flow Q [m3/s], not negative
 * @returns dp loss of total pressure [Pa]
 * @throws {OutOfRangeError} when a loss or the flow is negative, final is below clean, or the rated flow is not positive
 * @source Common practice
 * @check fixtures/published/terminals.json
 */
export function filterLoss(filter: Filter, flow: number): number {
	const { clean, final, state, atFlow, exponent } = filter;
	requireInRange('filterLoss', 'clean', clean, NOT_NEGATIVE);
	requireInRange('filterLoss', 'final', final, { min: clean, max: NOT_NEGATIVE.max });
	requireInRange('filterLoss', 'Qr', atFlow, POSITIVE);
	requireInRange('filterLoss', 'Q', flow, NOT_NEGATIVE);
	const rated = state === 'clean' ? clean : state === 'dirty' ? final : meanFilterLoss(clean, final);
	return ratedLoss(rated, atFlow, flow, exponent);
}
