import type { DesignDocument, Flag } from '../document/types';
import type { Network } from './network';
import type { RowAir } from './row-airs';
import type { RowLoss } from './row-loss';

/** Difference between a row's temperature and that of the streams which mix in it that is worth a word [K]. */
const MIX_DIFFERS = 1;

/** What the temperatures of the rows bring with them: water that falls out, and streams that mix to another temperature. */
export function airFlags(
	document: DesignDocument,
	{ rows, parents }: Network,
	losses: readonly RowLoss[],
	airs: readonly RowAir[],
	flags: Flag[]
): void {
	if ('density' in document.air || airs.every(({ temperature }) => temperature === null)) return;
	const general = document.air.temperature;
	const sums = new Map<number, { mass: number; heat: number }>();
	rows.forEach((row, place) => {
		const air = airs[place];
		if (row.temperature !== undefined && air?.condenses)
			flags.push({
				rule: 'condensation',
				row: row.tag,
				severity: 'caution',
				message:
					'The air of the design is colder here than its dew point: it is taken as saturated, and water falls out.',
				value: row.temperature,
				basis: 'saturation pressure by Hyland and Wexler'
			});
		const parent = parents[place] ?? -1;
		if (row.side === 'supply' || parent < 0) return;
		const mass = losses[place]?.massFlow ?? 0;
		const sum = sums.get(parent) ?? { mass: 0, heat: 0 };
		sums.set(parent, { mass: sum.mass + mass, heat: sum.heat + mass * (air?.temperature ?? general) });
	});
	for (const [parent, { mass, heat }] of sums) {
		const there = airs[parent]?.temperature ?? general;
		const mixed = heat / mass;
		if (!(Math.abs(mixed - there) > MIX_DIFFERS)) continue;
		flags.push({
			rule: 'temperature-mix',
			row: rows[parent]?.tag ?? null,
			severity: 'caution',
			message: 'The streams that unite here mix to another temperature than the one this section is computed with.',
			value: mixed,
			threshold: there,
			basis: 'balance of heat by mass, one specific heat; heat through the walls is not counted'
		});
	}
}
