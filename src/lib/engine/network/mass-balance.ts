import type { MassBalance, Solution } from '../document/types';
import type { Network } from './network';
import type { RowAir } from './row-airs';

/**
 * Mass of air on each side of the fan: what passes it is what passes the outlets, and what leaks on the way.
 *
 *   m_fan = sum of m_outlets + sum of m_leakage
 *
 * @param masses at the fan end of each row, and at its far end [kg/s]
 * @param leaks of each row [m3/s]; null without leakage
 * @returns masses of both sides [kg/s]
 * @source Conservation of mass
 * @check none: the balance is a law under test
 */
export function massBalanceOf(
	{ rows, parents, order, joined }: Network,
	masses: { readonly leg: Float64Array; readonly common: Float64Array },
	leaks: Float64Array | null,
	airs: readonly RowAir[]
): Solution['massBalance'] {
	const sums = { supply: { fan: 0, outlets: 0, leakage: 0 }, return: { fan: 0, outlets: 0, leakage: 0 } };
	for (let i = 0; i < order.length; i += 1) {
		const place = order[i] ?? 0;
		const sum = sums[rows[place]?.side === 'supply' ? 'supply' : 'return'];
		if ((parents[place] ?? -1) < 0) sum.fan += masses.leg[place] ?? 0;
		if (joined[place] !== 1) sum.outlets += masses.common[place] ?? 0;
		if (leaks) sum.leakage += (leaks[place] ?? 0) * (airs[place]?.density ?? 0);
	}
	return sums satisfies { supply: MassBalance; return: MassBalance };
}
