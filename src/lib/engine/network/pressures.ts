import type { Network } from './network';
import type { Required } from './paths';
import type { RowLoss } from './row-loss';

/**
 * Pressure line with the duty just met: supply falls from its requirement, the other side rises from minus its own.
 * A row starts from the far end of the one it joins; the loss of the junction is the joining row's.
 *
 *   ps = pt - pv
 *
 * @param along sum of the losses from the fan to the far end of each row [Pa]
 * @param required requirement of each side [Pa]
 * @param spares least spare of all paths through each row [Pa]
 * @param solved rows of this solve, which take their pressures and their spare
 * @source Total and static pressure along one stream: common practice
 * @check fixtures/networks/static-regain.json
 */
export function placePressures(
	{ rows, parents }: Network,
	along: Float64Array,
	required: Required,
	spares: Float64Array,
	solved: readonly RowLoss[]
): void {
	solved.forEach((row, place) => {
		const parent = parents[place] ?? -1;
		const before = parent < 0 ? 0 : (along[parent] ?? 0);
		const after = along[place] ?? 0;
		const supply = rows[place]?.side === 'supply';
		const duty = (supply ? required.supply : required.return) ?? 0;
		const fanEnd = supply ? duty - before : before - duty;
		const farEnd = supply ? duty - after : after - duty;
		row.totalPressure = [fanEnd, farEnd];
		row.staticPressure = [fanEnd - row.velocityPressure, farEnd - row.velocityPressure];
		row.spare = spares[place] ?? 0;
	});
}
