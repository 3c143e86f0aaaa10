import fc from 'fast-check';
import type { UnitSystem } from '$lib/engine';
import { applyEntry } from '$lib/sheet/apply';
import type { Edit, SingleEdit, TypedCell } from '$lib/sheet/edit';
import { entryOf } from '$lib/sheet/entry';
import { ROW_FIELDS, SETTING_FIELDS } from '$lib/sheet/fields';
import { EMPTY_SHEET, type RowField, type SettingField, type Sheet } from '$lib/sheet/sheet';

export type TypedRow = Readonly<Partial<Record<RowField, string>>>;
export type TypedSettings = Readonly<Partial<Record<SettingField, string>>>;

/** The n-th of ids that every run makes alike. */
export const rowId = (n: number) => `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`;

export const typedCells = (cells: Readonly<Record<string, string>>, units: UnitSystem): Record<string, TypedCell> =>
	Object.fromEntries(Object.entries(cells).map(([field, typed]) => [field, { typed, units }]));

/** Does an edit as a person's hand does: read, then applied. */
export function done(sheet: Sheet, edit: Edit): Sheet {
	const entry = entryOf(edit);
	if (!entry) throw new Error(`an edit that names an absent column: ${JSON.stringify(edit).slice(0, 200)}`);
	return applyEntry(sheet, entry);
}

/** A sheet typed from blank; the rows have the ids `rowId(0)` and on. */
export function sheetOf(rows: readonly TypedRow[], settings: TypedSettings = {}, units: UnitSystem = 'SI'): Sheet {
	const edits: SingleEdit[] = Object.entries<string>(settings as Record<string, string>).map(([field, typed]) => ({
		...{ kind: 'set', row: null, field, typed, units }
	}));
	if (rows.length)
		edits.push({
			kind: 'insert',
			rows: rows.map((row, n) => ({ id: rowId(n), cells: typedCells(row, units) })),
			before: null
		});
	return edits.length ? done(EMPTY_SHEET, { kind: 'batch', edits }) : EMPTY_SHEET;
}

/** Any text, with those that a column could take among them, and the odd signs that a clipboard may bring. */
export const anyText = fc.oneof(
	{ weight: 3, arbitrary: fc.constantFrom('', '12', '600x350', 'Ø200', '0', '3.5 m', 'S1', 'S2', 'supply', 'exhaust') },
	{
		weight: 2,
		arbitrary: fc.constantFrom('elbow', 'tee C0.8', 'elbow C', '25 Pa', '1e9', 'NaN', '-3', 'open?', '=1+')
	},
	fc.string({ maxLength: 30 }),
	fc.string({ unit: 'binary', maxLength: 12 }),
	fc.constantFrom('\0', 'a\0b', '\ud800', 'x\udc00y', '\t', '\n', '__proto__', '12"', '"', '1"\t2"')
);

/** A hand's move, told without a sheet: numbers choose among the rows that are there when it is made. */
export type Move = fc.Arbitrary<(sheet: Sheet, next: () => number) => SingleEdit>;

const units = fc.constantFrom<UnitSystem>('SI', 'IP');
const places = fc.array(fc.nat(), { minLength: 1, maxLength: 4 });
const idAt = (sheet: Sheet, n: number) => sheet.rows[n % Math.max(1, sheet.rows.length)]?.id ?? rowId(n % 50);
const beforeAt = (sheet: Sheet, n: number) => (n % 5 === 0 ? null : idAt(sheet, n));

const anySet: Move = fc.record({ n: fc.nat(), field: fc.constantFrom(...ROW_FIELDS), typed: anyText, units }).map(
	({ n, ...rest }) =>
		(sheet) =>
			({ kind: 'set', row: idAt(sheet, n), ...rest }) as const
);
const anySetting: Move = fc
	.record({ field: fc.constantFrom(...SETTING_FIELDS), typed: anyText, units })
	.map((rest) => () => ({ kind: 'set', row: null, ...rest }) as const);
const anyInsert: Move = fc
	.record({
		rows: fc.array(fc.dictionary(fc.constantFrom<string>(...ROW_FIELDS), fc.record({ typed: anyText, units })), {
			minLength: 1,
			maxLength: 3
		}),
		n: fc.nat()
	})
	.map(
		({ rows, n }) =>
			(sheet, next) =>
				({
					kind: 'insert',
					rows: rows.map((cells) => ({ id: rowId(next()), cells })),
					before: beforeAt(sheet, n)
				}) as const
	);
const anyDelete: Move = places.map(
	(at) => (sheet) => ({ kind: 'delete', rows: at.map((n) => idAt(sheet, n)) }) as const
);
const anyMove: Move = fc.record({ at: places, n: fc.nat() }).map(
	({ at, n }) =>
		(sheet) =>
			({ kind: 'move', rows: at.map((one) => idAt(sheet, one)), before: beforeAt(sheet, n) }) as const
);

export const anyMoveOfHand: Move = fc.oneof(
	{ weight: 4, arbitrary: anySet },
	anySetting,
	{ weight: 2, arbitrary: anyInsert },
	anyDelete,
	anyMove
);

/** Steps of a hand: each one move, or several that are one step for undo. */
export const anySteps = fc.array(fc.array(anyMoveOfHand, { minLength: 1, maxLength: 5 }), { maxLength: 15 });

/** A tree of rows that all count, typed outward from the fan. */
export const anyTree: fc.Arbitrary<TypedRow[]> = fc
	.array(
		fc.record({
			parent: fc.nat(),
			size: fc.constantFrom('600x350', 'Ø200', '160', '400x200 FO', '315mm', '12"'),
			length: fc.constantFrom('0', '3.5', '2400', `12'-6"`, '=3+4.2'),
			flex: fc.constantFrom('', '1.2', '0.8 m'),
			flow: fc.constantFrom('80', '120 L/s', '300 cfm', '720 m3/h', '33.3'),
			outlet: fc.constantFrom('', '16', 'open', '0.06"', '12 static', '20?'),
			parts: fc.constantFrom('', 'elbow', 'tee branch C0.8, damper C0.2', '2x elbow r1.0 C0.23, silencer 25 Pa'),
			rise: fc.constantFrom('', '3', '-2.4')
		}),
		{ minLength: 1, maxLength: 20 }
	)
	.map((seeds) => {
		const parents = seeds.map(({ parent }, n) => (n === 0 ? null : parent % (n + 1) === n ? null : parent % n));
		return seeds.map(({ parent: _parent, flow, outlet, ...row }, n) => {
			const joins = parents[n];
			return {
				...row,
				tag: `R${n}`,
				...(joins !== null && joins !== undefined && { joins: `R${joins}` }),
				...(!parents.includes(n) && { flow, outlet })
			};
		});
	});
