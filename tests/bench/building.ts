import type { DesignDocument, DesignRow } from '$lib/engine';

const FLOORS = 10;
const PIECES = 8; // of a floor's main, one after another
const RUN_OUTS = 3; // from each piece
const NOMINAL = [0.125, 0.16, 0.2, 0.25, 0.315, 0.4, 0.5, 0.63, 0.8, 1, 1.25]; // m

/**
 * A made-up building of exactly so many rows: risers from the fan, floor mains in pieces, run-outs with an outlet.
 * Paths are as long as in a real building whatever the number of rows, so that the time per row can be compared.
 */
export function building(rowCount: number): DesignDocument {
	const rows: DesignRow[] = [];
	for (let riser = 0; rows.length < rowCount; riser += 1) addRiser(rows, `R${riser}`, rowCount);
	return {
		format: 'evendraft/design@1',
		title: `Building of ${rowCount} rows`,
		air: { temperature: 20, relativeHumidity: 0.5, elevation: 0 },
		criteria: { mainVelocity: 6, runOutVelocity: 4, frictionRate: 1.5, flexibleLength: 1.5, damperAtOutlet: true },
		rows: withOutlets(rows)
	};
}

function addRiser(rows: DesignRow[], riser: string, most: number): void {
	let below: string | null = null;
	for (let floor = 0; floor < FLOORS && rows.length < most; floor += 1) {
		const piece = `${riser}-${floor}`;
		rows.push(duct(piece, below, rows.length, 9 - Math.floor(floor / 4)));
		below = piece;
		let before = piece;
		for (let i = 0; i < PIECES && rows.length < most; i += 1) {
			const main: string = `${piece}-M${i}`;
			rows.push(duct(main, before, rows.length, 6 - Math.floor(i / 3)));
			before = main;
			for (let k = 0; k < RUN_OUTS && rows.length < most; k += 1) rows.push(runOut(`${main}-${k}`, main, rows.length));
		}
	}
}

function duct(tag: string, joins: string | null, turn: number, nominal: number): DesignRow {
	const side = NOMINAL[nominal] ?? 0.4;
	const round = turn % 3 === 0;
	return {
		tag,
		joins,
		side: 'supply',
		size: round
			? { shape: 'round', diameter: side }
			: { shape: 'rectangular', width: side, height: (NOMINAL[nominal - 1] ?? 0.4) * 0.8 },
		length: 3 + (turn % 7),
		...(joins === null ? {} : { junction: { kind: 'fixed', coefficient: 0.05 + (turn % 5) / 100 } }),
		fittings: [
			round ? { kind: 'round-elbow-smooth' } : { kind: 'rectangular-elbow-smooth' },
			{ kind: 'fixed', coefficient: 0.12, name: 'offset' }
		]
	};
}

function runOut(tag: string, joins: string, turn: number): DesignRow {
	const size = { shape: 'round', diameter: NOMINAL[turn % 3] ?? 0.125 } as const;
	return {
		tag,
		joins,
		side: 'supply',
		size,
		length: 2 + (turn % 4),
		flexible: { length: 1.2 },
		junction: { kind: 'fixed', coefficient: 0.6 },
		fittings: [{ kind: 'round-elbow-smooth' }, { kind: 'damper-butterfly', name: 'damper' }],
		outlet: { name: `Room ${turn}`, flow: 0.02 + (turn % 11) / 500, loss: 20 + (turn % 5) }
	};
}

/** Wherever the count cut the building short, an outlet closes the end. */
function withOutlets(rows: readonly DesignRow[]): DesignRow[] {
	const joined = new Set(rows.map((row) => row.joins));
	return rows.map((row) =>
		joined.has(row.tag) || row.outlet !== undefined ? row : { ...row, outlet: { flow: 0.05, loss: 20 } }
	);
}
