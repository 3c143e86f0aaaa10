import { formatDensity, formatFlow, formatPressure, formatVelocity, unitOf } from '$lib/engine';
import { isExhaustOnly } from './discharge';
import type { ReportInput } from './input';
import type { FanDuty, FanLine } from './model';
import { suctionName } from './result';

/** The duty of the fan on every basis, so that no pressure is quoted without one. */
export function fanDutyOf({ document, solution, units }: ReportInput): FanDuty {
	const { fan, totals, index, air, paths } = solution;
	const drawing = suctionName(new Set(paths.map(({ side }) => side)));
	const pressure = (label: string, value: number | null, note: string, strong = false): FanLine => ({
		label,
		value: formatPressure(value, units),
		unit: value === null ? '' : unitOf('pressure', units),
		note,
		strong
	});
	const flow = (label: string, value: number, note: string, strong = false): FanLine => ({
		label,
		value: formatFlow(value, units),
		unit: unitOf('flow', units),
		note,
		strong
	});
	const outletPressure = fan.staticPressure === null ? null : fan.totalPressure - fan.staticPressure;
	const atFan = document.rows.filter(({ joins, side }) => joins === null && side === 'supply');
	const [outlet] = atFan;
	const only = outlet && atFan.length === 1 ? solution.rows[outlet.tag] : undefined;
	const lines: FanLine[] = [
		flow('Flow, actual', fan.flow, 'at the density below; the greater of the two sides of the fan', true),
		...(totals.supplyFlow > 0 && totals.returnFlow > 0
			? [
					flow(isExhaustOnly(document) ? 'Discharge side' : 'Supply side', totals.supplyFlow, ''),
					flow(`Other side, ${drawing}`, totals.returnFlow, '')
				]
			: []),
		pressure('Fan total pressure', fan.totalPressure, 'both parts together', true)
	];
	if (index.supply !== null)
		lines.push(
			pressure(
				isExhaustOnly(document) ? 'Discharge part' : 'Supply part',
				fan.supplyPressure,
				`asked by the index path to ${index.supply}`
			)
		);
	if (index.return !== null)
		lines.push(
			pressure('Suction part', fan.returnPressure, `asked by the index path from ${index.return}, ${drawing}`)
		);
	if (outletPressure !== null)
		lines.push(
			pressure('Velocity pressure at the fan outlet', outletPressure, outletNote(outlet?.tag, atFan.length)),
			...(only
				? [
						{
							label: 'Velocity at the fan outlet',
							value: formatVelocity(only.velocity, units),
							unit: unitOf('velocity', units),
							note: `mean, in ${outlet?.tag ?? ''}`,
							strong: false
						}
					]
				: []),
			pressure('Fan static pressure', fan.staticPressure, 'total less the velocity pressure at the fan outlet', true)
		);
	lines.push({
		label: 'Density of the air',
		value: formatDensity(air.density, units),
		unit: unitOf('density', units),
		note: 'of the design; a duty at another density is another duty',
		strong: false
	});
	return {
		lines,
		notes: [
			'Losses inside the unit are only those entered. The pressures are those of the duct system as drawn up here, also called external to the unit where its inner parts are not entered.',
			`No margin, ${solution.leakage ? '' : 'no leakage, '}no system effect at the fan’s inlet or outlet beyond what the rows hold, and no drive are included.`,
			...(fan.staticPressure === null
				? ['No supply section leaves the fan, so its outlet velocity pressure and static pressure are not stated.']
				: [])
		]
	};
}

function outletNote(tag: string | undefined, count: number): string {
	return count === 1
		? `in ${tag ?? ''}, the first section; the fan’s own outlet may differ`
		: `mean of ${count} supply sections, weighted by flow`;
}
