import { mixedTemperature, type MixingStream } from '../air';
import { pressureOf } from '../air/moist-air';
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
	const uniting = new Map<number, MixingStream[]>();
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
		const stream: MixingStream = {
			temperature: air?.temperature ?? general,
			relativeHumidity: air?.relativeHumidity ?? 0,
			massFlow: losses[place]?.massFlow ?? 0
		};
		const others = uniting.get(parent);
		if (others) others.push(stream);
		else uniting.set(parent, [stream]);
	});
	const pressure = pressureOf(document.air);
	for (const [parent, streams] of uniting) {
		const there = airs[parent]?.temperature ?? general;
		const { temperature: mixed } = mixedTemperature(streams, pressure);
		if (!(Math.abs(mixed - there) > MIX_DIFFERS)) continue;
		flags.push({
			rule: 'temperature-mix',
			row: rows[parent]?.tag ?? null,
			severity: 'caution',
			message: 'The streams that unite here mix to another temperature than the one this section is computed with.',
			value: mixed,
			threshold: there,
			basis: 'balance of dry air, vapour and enthalpy; heat through the walls is not counted'
		});
	}
}
