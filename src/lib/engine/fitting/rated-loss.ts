import { pow } from '../arithmetic';

/**
 * Loss of a terminal or an apparatus at another flow.
 *
 *   dp = dpr (Q/Qr)^n
 *
 * @param rated dpr loss at the rated flow [Pa]
 * @param ratedFlow Qr [m3/s], positive
 * @param flow Q [m3/s], not negative
 * @param exponent n [-]: 2 grilles and louvres, 1.7 to 2 coils, 1.0 to 1.4 flat filters (from memory)
 * @returns dp loss of total pressure [Pa]
 * @source Common practice
 * @check fixtures/published/terminals.json
 */
export function ratedLoss(rated: number, ratedFlow: number, flow: number, exponent: number): number {
	const ratio = flow / ratedFlow;
	return rated * (exponent === 2 ? ratio * ratio : pow(ratio, exponent));
}

/**
 * Loss at another density and the same volume flow, for a loss that goes with the square of the flow.
 *
 *   dp = dpr rho/rhor
 *
 * @param rated dpr loss at the rated density [Pa]
 * @param ratedDensity rhor, often 1.2 [kg/m3]
 * @param density rho [kg/m3]
 * @returns dp loss of total pressure [Pa]
 * @source Common practice
 * @check fixtures/published/terminals.json
 */
export function lossAtDensity(rated: number, ratedDensity: number, density: number): number {
	return (rated * density) / ratedDensity;
}

/**
 * Design loss of a filter, half-way through its life.
 *
 *   dp = (clean + final)/2
 *
 * @param clean loss of the clean filter [Pa]
 * @param final loss at which it is changed [Pa]
 * @returns dp design loss [Pa]
 * @source Common practice
 * @check fixtures/published/terminals.json
 */
export function meanFilterLoss(clean: number, final: number): number {
	return (clean + final) / 2;
}
