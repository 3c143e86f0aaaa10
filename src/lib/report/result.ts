import { formatFlow, formatPressure, unitOf, type Side } from '$lib/engine';
import { isExhaustOnly } from './discharge';
import type { ReportInput } from './input';
import type { Result, ResultCell } from './model';
import { requirementOf } from './network-order';
import { NOTHING } from './wording';

/** Spare pressure that a damper takes without being heard [Pa]: common practice. */
const LOUD = 50;

/** The figures that a reader looks for first, each with its basis. */
export function resultOf({ document, solution, units }: ReportInput): Result {
	const { fan, index, paths } = solution;
	const unit = unitOf('pressure', units);
	const pressure = (label: string, value: number | null, before = ''): ResultCell => ({
		label,
		value: before + formatPressure(value, units),
		unit: value === null ? '' : unit,
		aside: null
	});
	const indexCell = (label: string, outlet: string | null): ResultCell[] => {
		const path = paths.find((one) => one.outlet === outlet);
		if (path === undefined) return [];
		return [{ label, value: path.outlet, unit: '', aside: `${formatPressure(requirementOf(path), units)} ${unit}` }];
	};
	const spread = paths.reduce((most, { spare }) => Math.max(most, spare), 0);
	const outletPressure = fan.staticPressure === null ? null : fan.totalPressure - fan.staticPressure;
	const inlets = new Set(paths.map(({ side }) => side));
	const cells = [
		pressure('Fan duty, total pressure', fan.totalPressure),
		{ label: 'at flow, actual', value: formatFlow(fan.flow, units), unit: unitOf('flow', units), aside: null },
		...indexCell(
			index.return === null ? 'Index outlet' : isExhaustOnly(document) ? 'Index, discharge' : 'Index, supply',
			index.supply
		),
		...indexCell(index.supply === null ? 'Index inlet' : `Index, ${suctionName(inlets)}`, index.return),
		spread > 0 ? pressure('Dampers must take', spread, 'up to ') : pressure('Dampers must take', null)
	];
	if (outletPressure !== null) cells.push(pressure('Velocity pressure, first section', outletPressure));
	const notes = notesOf(
		fan.staticPressure,
		Boolean(solution.leakage),
		(value) => `${formatPressure(value, units)} ${unit}`
	);
	if (spread > LOUD)
		notes.push(
			`More than ${formatPressure(LOUD, units)} ${unit} at one damper asks for a low-noise device (common practice).`
		);
	return { cells, notes };
}

function notesOf(staticPressure: number | null, leaks: boolean, shown: (value: number) => string): string[] {
	const inside = 'Losses inside the unit are only those entered.';
	const margin = leaks ? 'Leakage is included by class, and no margin.' : 'No margin and no leakage are included.';
	if (staticPressure === null) return [`${inside} ${margin}`];
	return [
		`${inside} ${margin} Fan static pressure, total less the velocity pressure in the first section, which may differ from that at the fan’s own outlet: ${shown(staticPressure)}.`
	];
}

/** One word for the side on which the fan draws. */
export function suctionName(sides: ReadonlySet<Side>): string {
	const drawing = (['return', 'exhaust', 'outdoor'] as const).filter((side) => sides.has(side));
	if (drawing.length === 1) return drawing[0] === 'outdoor' ? 'outdoor air' : (drawing[0] ?? NOTHING);
	return 'suction';
}
