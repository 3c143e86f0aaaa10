import {
	formatFlow,
	formatLength,
	formatPressure,
	formatRate,
	formatSize,
	formatVelocity,
	unitOf,
	type DesignRow,
	type SolvedRow,
	type UnitSystem
} from '$lib/engine';
import type { ReportInput } from './input';
import type { CellKind, Column, Schedule } from './model';
import { indexRows, rowsFromFan, servesOf } from './network-order';
import { isExhaustOnly, sideWords } from './discharge';
import { NOTHING, counted, orNothing } from './wording';

interface Shown extends Column {
	readonly text: (row: DesignRow, solved: SolvedRow) => string;
	/** Where some cells of the column are a person's and others the engine's. */
	readonly kindOf?: (row: DesignRow) => CellKind;
}

/** One line for each section, in the order of the tree from the fan. */
export function scheduleOf({ document, solution, units, heading }: ReportInput): Schedule {
	const onIndex = indexRows(solution);
	const rows = rowsFromFan(document);
	const sides = new Set(rows.map(({ side }) => side));
	const exhaustOnly = isExhaustOnly(document);
	const columns = columnsOf(units, onIndex, {
		sides: sides.size > 1,
		exhaustOnly,
		gravity: Object.values(solution.rows).some(({ thermalGravity }) => thermalGravity !== 0)
	});
	return {
		title: `${orNothing(heading.system)}, ${counted(rows.length, 'section')}`,
		columns: columns.map(({ key, head, unit, kind, align }) => ({ key, head, unit, kind, align })),
		rows: rows.flatMap((row) => {
			const solved = solution.rows[row.tag];
			if (solved === undefined) return [];
			const cells = columns.map(({ text, kind, kindOf }) => ({ text: text(row, solved), kind: kindOf?.(row) ?? kind }));
			return [{ tag: row.tag, index: onIndex.has(row.tag), cells }];
		}),
		notes: [
			'Sizes are inside; lengths are on centre lines. Calculated unrounded, shown rounded; sums are of unrounded values.',
			'Spare is that of the best path through the section, for a damper to take. A bar marks the index path.'
		]
	};
}

function columnsOf(
	units: UnitSystem,
	onIndex: ReadonlySet<string>,
	also: { readonly sides: boolean; readonly exhaustOnly: boolean; readonly gravity: boolean }
): Shown[] {
	const entered = (key: string, head: string, unit: string, text: Shown['text'], align: Column['align'] = 'left') =>
		({ key, head, unit, kind: 'entered', align, text }) satisfies Shown;
	const computed = (key: string, head: string, unit: string, text: Shown['text']) =>
		({ key, head, unit, kind: 'computed', align: 'right', text }) satisfies Shown;
	const pressure = unitOf('pressure', units);
	const loss = (key: string, head: string, there: (row: DesignRow) => boolean, of: (solved: SolvedRow) => number) =>
		computed(key, head, pressure, (row, solved) => (there(row) ? formatPressure(of(solved), units) : NOTHING));
	const always = () => true;

	return [
		entered('section', 'Section', '', (row) => row.tag),
		entered('joins', 'Joins', '', (row) => row.joins ?? 'fan'),
		...(also.sides ? [entered('side', 'Air', '', (row) => sideWords(row.side, also.exhaustOnly))] : []),
		entered('serves', 'Serves', '', (row) => servesOf(row)),
		{
			...computed('flow', 'Flow', unitOf('flow', units), (_row, solved) => formatFlow(solved.flow, units)),
			kind: 'entered',
			kindOf: (row) => (row.outlet ? 'entered' : 'computed')
		},
		entered('size', 'Size', unitOf('size', units), (row) => formatSize(row.size, units)),
		entered('length', 'Length', unitOf('length', units), (row) => formatLength(row.length, units), 'right'),
		entered(
			'flexible',
			'Flex.',
			unitOf('length', units),
			(row) => (row.flexible ? formatLength(row.flexible.length, units) : NOTHING),
			'right'
		),
		computed('velocity', 'Vel.', unitOf('velocity', units), (_row, { velocity }) => formatVelocity(velocity, units)),
		loss('velocityPressure', 'Vel. pr.', always, ({ velocityPressure }) => velocityPressure),
		computed('rate', 'Rate', unitOf('rate', units), (_row, { frictionRate }) => formatRate(frictionRate, units)),
		loss('duct', 'Duct', always, ({ frictionLoss }) => frictionLoss),
		loss(
			'flexibleLoss',
			'Flex.',
			(row) => row.flexible !== undefined,
			({ flexibleLoss }) => flexibleLoss
		),
		loss(
			'junction',
			'Junct.',
			(row) => row.junction !== undefined,
			({ junctionLoss }) => junctionLoss
		),
		loss(
			'fittings',
			'Fittings',
			(row) => Boolean(row.fittings?.length),
			({ fittingLoss }) => fittingLoss
		),
		{
			...loss(
				'equipment',
				'Equip.',
				(row) => Boolean(row.equipment?.length),
				({ equipmentLoss }) => equipmentLoss
			),
			kindOf: (row) => (isAsEntered(row) ? 'entered' : 'computed')
		},
		{
			...loss(
				'outlet',
				'Outlet',
				(row) => row.outlet !== undefined,
				({ outletLoss }) => outletLoss
			),
			kindOf: ({ outlet }) => (outlet?.loss !== undefined && outlet.lossIs !== 'static' ? 'entered' : 'computed')
		},
		...(also.gravity
			? [
					computed('gravity', 'Gravity', pressure, (_row, { thermalGravity }) =>
						thermalGravity === 0 ? NOTHING : formatPressure(-thermalGravity, units)
					)
				]
			: []),
		loss('total', 'Total', always, ({ loss: all }) => all),
		computed('spare', 'Spare', pressure, (row, { spare }) =>
			onIndex.has(row.tag) ? 'index' : formatPressure(spare, units)
		)
	];
}

/** Whether all that the row's equipment loses was entered as it stands, at the row's own flow. */
function isAsEntered({ equipment }: DesignRow): boolean {
	return equipment !== undefined && equipment.length > 0 && equipment.every(({ atFlow }) => atFlow === undefined);
}
