import type { SolvedRow, Solution } from '$lib/engine';

/** Columns of the table of rows; units stand in the header. */
const COLUMNS: readonly (readonly [string, (row: SolvedRow) => string | number])[] = [
	['side', (row) => row.side],
	['flow_m3/s', (row) => row.flow],
	['area_m2', (row) => row.area],
	['hydraulicDiameter_m', (row) => row.hydraulicDiameter],
	['velocity_m/s', (row) => row.velocity],
	['velocityPressure_Pa', (row) => row.velocityPressure],
	['reynolds', (row) => row.reynolds],
	['frictionFactor', (row) => row.frictionFactor],
	['frictionRate_Pa/m', (row) => row.frictionRate],
	['frictionLoss_Pa', (row) => row.frictionLoss],
	['flexibleLoss_Pa', (row) => row.flexibleLoss],
	['fittingLoss_Pa', (row) => row.fittingLoss],
	['junctionLoss_Pa', (row) => row.junctionLoss],
	['equipmentLoss_Pa', (row) => row.equipmentLoss],
	['outletLoss_Pa', (row) => row.outletLoss],
	['thermalGravity_Pa', (row) => row.thermalGravity],
	['loss_Pa', (row) => row.loss],
	['totalPressureFanEnd_Pa', (row) => row.totalPressure[0]],
	['totalPressureFarEnd_Pa', (row) => row.totalPressure[1]],
	['staticPressureFanEnd_Pa', (row) => row.staticPressure[0]],
	['staticPressureFarEnd_Pa', (row) => row.staticPressure[1]],
	['spare_Pa', (row) => row.spare]
];

/** One line for each row, after a header: comma-separated (RFC 4180), lines ended by CR LF. */
export function csvOf(solution: Solution): string {
	const header = ['tag', ...COLUMNS.map(([name]) => name)];
	const lines = Object.entries(solution.rows).map(([tag, row]) => [
		safe(tag),
		...COLUMNS.map(([, figure]) => String(figure(row)))
	]);
	return [header, ...lines].map((cells) => `${cells.map(quoted).join(',')}\r\n`).join('');
}

function quoted(cell: string): string {
	return /[",\r\n]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell;
}

/** A tag that a spreadsheet would run as a formula is led by an apostrophe. */
function safe(tag: string): string {
	return /^[=+\-@\t\r]/.test(tag) ? `'${tag}` : tag;
}
