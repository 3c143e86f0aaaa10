import {
	formatFlow,
	formatPressure,
	formatSize,
	unitOf,
	type DesignRow,
	type Path,
	type UnitSystem
} from '$lib/engine';
import { isExhaustOnly } from './discharge';
import type { ReportInput } from './input';
import type { Account, AccountLine, Column, Ledger } from './model';
import { requirementOf, servesOf } from './network-order';
import { NOTHING } from './wording';

/** Rows of all accounts together, above which sections already told are carried forward in one line. */
const LONG = 1200;

type Figures = ReportInput['solution']['rows'][string];

/** Every stream as an account of total pressure: the index path first, then by what each asks of the fan. */
export function ledgerOf({ document, solution, units }: ReportInput): Ledger {
	const rows = new Map(document.rows.map((row) => [row.tag, row]));
	const gravity = Object.values(solution.rows).some(({ thermalGravity }) => thermalGravity !== 0);
	const figures = figuresShown(gravity);
	const indexes = [solution.index.supply, solution.index.return];
	const ranked = [...solution.paths].sort(
		(a, b) =>
			Number(a.side !== 'supply') - Number(b.side !== 'supply') ||
			Number(indexes.includes(b.outlet)) - Number(indexes.includes(a.outlet)) ||
			a.spare - b.spare
	);
	const short = ranked.reduce((sum, path) => sum + path.rows.length, 0) > LONG;
	const told = new Map<string, string>();
	const exhaustOnly = isExhaustOnly(document);
	const accounts = ranked.map((path, place): Account => {
		const index = indexes.includes(path.outlet);
		const requirement = requirementOf(path);
		return {
			rank: place + 1,
			outlet: path.outlet,
			serves: servesOf(rows.get(path.outlet)),
			side: path.side,
			index,
			requirement,
			requirementText: formatPressure(requirement, units),
			spare: path.spare,
			spareText: index ? 'index' : formatPressure(path.spare, units),
			lines: linesOf(path, shared(path, place + 1, short, told), solution.rows, rows, figures, units, exhaustOnly)
		};
	});
	return {
		columns: columnsOf(units, figures),
		accounts,
		notes: [
			'Calculated unrounded, shown rounded; each total pressure is carried on unrounded.',
			'Each account runs in the direction of flow. Spare pressure is what a damper at the outlet must take for the flows to be as designed.',
			...(short
				? ['Sections told in an earlier account are carried forward in one line, which names that account.']
				: []),
			...(gravity ? ['A gain by thermal gravity is a negative loss.'] : [])
		]
	};
}

/** The sections next to the fan that an earlier account has told, and which; none while every account is told whole. */
interface Shared {
	readonly rows: readonly string[];
	readonly account: string;
}

function shared(path: Path, rank: number, short: boolean, told: Map<string, string>): Shared | null {
	const first = path.rows.findIndex((tag) => !told.has(tag));
	const rows = path.rows.slice(0, first === -1 ? path.rows.length : first);
	const account = told.get(rows.at(-1) ?? '');
	for (const tag of path.rows.slice(rows.length)) told.set(tag, String(rank));
	return short && rows.length > 1 && account !== undefined ? { rows, account } : null;
}

/** A figure of a row that makes up its loss [Pa]; null prints as nothing. */
interface Figure {
	readonly key: string;
	readonly head: string;
	readonly of: (solved: Figures, row: DesignRow | undefined) => number | null;
}

function figuresShown(gravity: boolean): readonly Figure[] {
	const figures: Figure[] = [
		{ key: 'duct', head: 'Duct', of: (solved) => solved.frictionLoss },
		{ key: 'flexible', head: 'Flex.', of: (solved, row) => (row?.flexible ? solved.flexibleLoss : null) },
		{
			key: 'fittings',
			head: 'Fittings',
			of: (solved, row) => (row?.fittings?.length || row?.junction ? solved.fittingLoss + solved.junctionLoss : null)
		},
		{ key: 'equipment', head: 'Equip.', of: (solved, row) => (row?.equipment?.length ? solved.equipmentLoss : null) },
		{ key: 'outlet', head: 'Outlet', of: (solved, row) => (row?.outlet ? solved.outletLoss : null) }
	];
	if (gravity)
		figures.push({
			key: 'gravity',
			head: 'Gravity',
			of: ({ thermalGravity }) => (thermalGravity === 0 ? null : -thermalGravity)
		});
	return figures;
}

function columnsOf(units: UnitSystem, figures: readonly Figure[]): Column[] {
	const pressure = unitOf('pressure', units);
	const computed = (key: string, head: string, unit = pressure): Column => ({
		key,
		head,
		unit,
		kind: 'computed',
		align: 'right'
	});
	return [
		{ key: 'step', head: 'Section', unit: '', kind: 'entered', align: 'left' },
		{ key: 'size', head: 'Size', unit: `${unitOf('size', units)}, inside`, kind: 'entered', align: 'left' },
		computed('flow', 'Flow', unitOf('flow', units)),
		...figures.map(({ key, head }) => computed(key, head)),
		computed('loss', 'Loss'),
		computed('total', 'Total pressure')
	];
}

function linesOf(
	path: Path,
	forward: Shared | null,
	solved: ReportInput['solution']['rows'],
	rows: ReadonlyMap<string, DesignRow>,
	figures: readonly Figure[],
	units: UnitSystem,
	exhaustOnly: boolean
): AccountLine[] {
	const blanks = ['', '', ...figures.map(() => '')];
	const supply = path.side === 'supply';
	let total = supply ? requirementOf(path) + path.spare : path.roomPressure;
	const lines: AccountLine[] = [];
	const line = (kind: AccountLine['kind'], name: string, loss: number | null, cells: readonly string[] = blanks) => {
		if (loss !== null) total -= loss;
		lines.push({
			kind,
			name,
			cells,
			loss,
			total,
			lossText: loss === null ? '' : formatPressure(loss, units),
			totalText: formatPressure(total + 0, units)
		});
	};
	const damper = () => {
		if (path.spare !== 0) line('spare', 'Spare, for a damper', path.spare);
	};

	line('start', supply ? 'At the fan' : roomName(path), null);
	if (!supply) damper();
	const carry = () => {
		if (forward === null) return;
		const loss = forward.rows.reduce((sum, tag) => sum + (solved[tag]?.loss ?? 0), 0);
		const last = forward.rows.at(-1) ?? '';
		line('forward', `As account ${forward.account}, ${supply ? `to ${last}` : `from ${last}`}`, loss);
	};
	const own = path.rows.slice(forward?.rows.length ?? 0);
	if (supply) carry();
	for (const tag of supply ? own : own.reverse()) {
		const row = rows.get(tag);
		const figuresOfRow = solved[tag];
		if (figuresOfRow === undefined) continue;
		const shown = figures.map(({ of }) => {
			const value = of(figuresOfRow, row);
			return value === null ? NOTHING : formatPressure(value, units);
		});
		const size = row === undefined ? NOTHING : formatSize(row.size, units);
		line('row', tag, figuresOfRow.loss, [size, formatFlow(figuresOfRow.flow, units), ...shown]);
	}
	if (!supply) carry();
	if (supply) damper();
	line('end', supply ? roomName(path, exhaustOnly) : 'At the fan', null);
	return lines;
}

function roomName({ side, roomPressure }: Path, exhaustOnly = false): string {
	if (side === 'outdoor' || exhaustOnly) return roomPressure === 0 ? 'Outdoors' : 'Outdoors, at pressure';
	return roomPressure === 0 ? 'In the room' : 'In the room, at pressure';
}
