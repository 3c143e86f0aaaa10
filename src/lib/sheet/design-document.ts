/** The design document of a sheet: which rows count, what keeps the others from counting, and at which cell. */
import {
	fittingEntry,
	type Criteria,
	type DesignAir,
	type DesignDocument,
	type DesignRow,
	type FittingEntry,
	type RowSize,
	type Side
} from '$lib/engine';
import { freeSizeOf } from './free-size';
import { methodsOfSheet } from './methods';
import { asksForPlace, fittingsFor } from './parts';
import { leakageOf } from './read-leakage';
import { settingOf, valueOf, type OutletLoss, type RowField, type Sheet, type SheetRow } from './sheet';
import type { SheetProblem } from './sheet-problem';
import { readingOf } from './reading-of';
import { linksOf, type Links } from './links';
import { settingProblems } from './setting-problems';

export interface SheetDocument {
	/** Null while no row counts. */
	readonly document: DesignDocument | null;
	readonly problems: readonly SheetProblem[];
	/** Ids of rows that the document leaves out. */
	readonly uncounted: ReadonlySet<string>;
}

/**
 * Builds the design document from the rows that can be counted. A row counts when its own cells are understood, the
 * row that it joins counts, and air leaves or enters somewhere beyond it. Nothing is guessed for the others.
 */
export function documentOf(sheet: Sheet): SheetDocument {
	const problems: SheetProblem[] = settingProblems(sheet);
	const links = linksOf(sheet.rows, problems);
	const sides = new Map<string, FoundSide>();
	const counted = new Map<string, DesignRow>();
	for (const row of links.fromFan) {
		sides.set(row.id, sideOf(row, links, sides));
		const draft = keptDraft(sheet, row, links, sides, problems);
		const parent = links.parent.get(row.id);
		if (draft && (parent === null || (parent && counted.has(parent.id)))) counted.set(row.id, draft);
	}
	prune(links, counted, problems);
	const rows = sheet.rows.flatMap((row) => counted.get(row.id) ?? []);
	const uncounted = new Set(sheet.rows.map(({ id }) => id).filter((id) => !counted.has(id)));
	return { document: rows.length ? { ...frameOf(sheet), rows } : null, problems, uncounted };
}

/** The document without its rows. */
function frameOf(sheet: Sheet): Omit<DesignDocument, 'rows'> {
	const density = settingOf(sheet, 'density');
	const air: DesignAir =
		density !== null
			? { density }
			: {
					temperature: settingOf(sheet, 'temperature') ?? 20,
					relativeHumidity: settingOf(sheet, 'humidity') ?? 0,
					elevation: settingOf(sheet, 'elevation') ?? 0
				};
	const surroundings = settingOf(sheet, 'surroundings');
	// Left out until a person names it: the engine then asks where a room's name hints at a special service.
	const service = settingOf(sheet, 'service');
	const [leakage, testPressure] = [settingOf(sheet, 'leakage'), settingOf(sheet, 'testPressure')];
	const [flowBasis, standardDensity] = [settingOf(sheet, 'flowBasis'), settingOf(sheet, 'standardDensity')];
	const methods = methodsOfSheet(sheet);
	const criteria = criteriaOf(sheet);
	return {
		format: 'evendraft/design@1',
		title: settingOf(sheet, 'title') ?? '',
		air,
		...(surroundings !== null && {
			surroundings: {
				temperature: surroundings,
				relativeHumidity: settingOf(sheet, 'humidity') ?? 0,
				elevation: settingOf(sheet, 'elevation') ?? 0
			}
		}),
		material: settingOf(sheet, 'material') ?? 'galvanized-steel',
		...(leakage !== null && { leakage: { ...leakageOf(leakage), ...(testPressure !== null && { testPressure }) } }),
		...(flowBasis !== null && { flowBasis }),
		...(flowBasis === 'standard' && standardDensity !== null && { standardDensity }),
		...(methods && { methods }),
		...(service !== null && { service }),
		...(criteria && { criteria })
	};
}

function criteriaOf(sheet: Sheet): Criteria | null {
	const fields = [
		'mainVelocity',
		'runOutVelocity',
		'frictionRate',
		'flexibleLength',
		'aspectRatio',
		'damperAtOutlet'
	] as const;
	const given = fields.flatMap((field) => {
		const value = settingOf(sheet, field);
		return value === null ? [] : [[field, value] as const];
	});
	return given.length ? (Object.fromEntries(given) as Criteria) : null;
}

/** Rows as the document held them the last time, and what they depended on beside their own cells. */
const drafts = new WeakMap<SheetRow, { readonly on: string; readonly draft: DesignRow }>();

/** A row never changes, so that after an edit of one row the others need not be read anew. */
function keptDraft(
	sheet: Sheet,
	row: SheetRow,
	links: Links,
	sides: ReadonlyMap<string, FoundSide>,
	problems: SheetProblem[]
): DesignRow | null {
	const isEnd = (links.children.get(row.id)?.length ?? 0) === 0;
	const meetsFan = !links.parent.get(row.id);
	const twoStraight = goesStraight(row) && earlierStraight(row, links);
	const on = `${twoStraight} ${sides.get(row.id)} ${isEnd} ${meetsFan} ${links.faulty.has(row.id)} ${settingOf(sheet, 'flexFactor')} ${settingOf(sheet, 'flexCompression')} ${onOthers(sheet, row, links)}`;
	const kept = drafts.get(row);
	if (kept?.on === on) return kept.draft;
	const draft = draftRow(sheet, row, links, sides, problems);
	if (draft) drafts.set(row, { on, draft });
	return draft;
}

/** What the few rows depend on whose parts ask for the size that they join, or which name a temperature. */
function onOthers(sheet: Sheet, row: SheetRow, links: Links): string {
	const joined = asksForPlace(valueOf(row, 'parts')) ? JSON.stringify(joinedSize(row, links)) : '';
	return row.cells.temperature ? `${joined} ${settingOf(sheet, 'density') !== null}` : joined;
}

function joinedSize(row: SheetRow, links: Links): RowSize | null {
	const parent = links.parent.get(row.id);
	return parent ? freeSizeOf(parent) : null;
}

/** How flexible duct lies: compressed by so much, which goes before a factor on the rigid rate. */
function flexibleOf(sheet: Sheet): { readonly compression?: number; readonly factor?: number } {
	const compression = settingOf(sheet, 'flexCompression');
	if (compression !== null) return { compression };
	const factor = settingOf(sheet, 'flexFactor');
	return factor === null ? {} : { factor };
}

/** One row as the document holds it; null, with problems, when its own cells do not suffice. */
function draftRow(
	sheet: Sheet,
	row: SheetRow,
	links: Links,
	sides: ReadonlyMap<string, FoundSide>,
	problems: SheetProblem[]
): DesignRow | null {
	const before = problems.length;
	const fault = (field: RowField, message: string, expected: string) =>
		problems.push({ row: row.id, field, message, expected });
	const cells = Object.entries(row.cells);
	if (cells.length === 0) {
		fault('tag', 'Nothing is entered in this row yet.', 'its tag first, as S01; or delete the row');
		return null;
	}
	for (const [field, cell] of cells)
		if (cell && cell.value === null) {
			const { message, expected } = readingOf('row', field, cell);
			fault(field as RowField, message, expected);
		}
	const tag = valueOf(row, 'tag');
	const size = valueOf(row, 'size');
	const length = valueOf(row, 'length');
	if (!row.cells.tag) fault('tag', 'This row has no tag.', 'a tag of its own, as S01');
	if (!row.cells.size) fault('size', 'This row has no size.', 'a size, as 600x300 or Ø250');
	if (!row.cells.length) fault('length', 'This row has no length.', 'the length on the centre line; 0 for none');
	const side = sides.get(row.id) ?? null;
	if (side === 'differs')
		fault('side', 'Air cannot run toward the fan and away from it in one run.', sideExpected(row, links, sides));
	const parts = valueOf(row, 'parts');
	const free = freeSizeOf(row);
	if (size && !free)
		fault('lining', 'This lining leaves no free space in the duct.', 'less than half of the least side');
	const place =
		asksForPlace(parts) && side !== null && side !== 'differs'
			? { joined: joinedSize(row, links), towardFan: towardFan(side) }
			: null;
	const fitted = parts && free ? fittingsFor(parts, free, place) : null;
	for (const { message, expected } of fitted?.problems ?? []) fault('parts', message, expected);
	if (fitted?.junction && goesStraight(row) && earlierStraight(row, links))
		fault(
			'parts',
			'Another row goes straight on at this junction already.',
			'one straight way at a junction; the others are branches'
		);
	const temperature = valueOf(row, 'temperature');
	if (temperature !== null && settingOf(sheet, 'density') !== null)
		fault(
			'temperature',
			'The air of the design is given by its density, so that a row cannot have a temperature of its own.',
			'a blank here; or temperature and humidity in the basis of design, and no density'
		);
	const [lining, leakage] = [valueOf(row, 'lining'), valueOf(row, 'leakage')];
	const flow = valueOf(row, 'flow');
	const isEnd = (links.children.get(row.id)?.length ?? 0) === 0;
	if (!isEnd)
		for (const field of END_FIELDS)
			if (row.cells[field])
				fault(field, `Rows join ${tag ?? 'this row'}, so ${IN_THE_MIDDLE[field]}`, AT_AN_END[field]);
	if (links.faulty.has(row.id) || problems.length > before || tag === null || !size || length === null) return null;
	if (side === null || side === 'differs') return null;
	const flex = valueOf(row, 'flex');
	const outlet = valueOf(row, 'outlet');
	const name = outlet?.description ?? valueOf(row, 'serves');
	// An entry or exit among the parts is the end of the run: a blank outlet then loses nothing more.
	const endsInPart = outlet === null && fitted?.fittings.some(({ kind }) => isEndPart(kind));
	// An outlet's coefficient is computed with as a fitting's: both are on the velocity pressure of the row.
	const terminal = isEnd && outlet ? terminalOf(outlet) : null;
	return {
		id: row.id,
		tag,
		joins: links.parent.get(row.id) ? valueOf(row, 'joins') : null,
		side,
		size,
		length,
		serves: valueOf(row, 'serves') ?? '',
		rise: valueOf(row, 'rise') ?? 0,
		...(valueOf(row, 'material') && { material: valueOf(row, 'material') ?? '' }),
		...(temperature !== null && { temperature }),
		...(lining && { lining }),
		...(leakage !== null && { leakage: leakageOf(leakage) }),
		...(flex && { flexible: { length: flex, ...flexibleOf(sheet) } }),
		...(fitted?.junction && { junction: fitted.junction }),
		fittings: [...(fitted?.fittings ?? []), ...(terminal ? [terminal] : [])],
		equipment: fitted?.equipment ?? [],
		...(isEnd &&
			flow !== null && {
				outlet: {
					...(name !== null && { name }),
					flow,
					...(outlet?.loss !== null &&
						outlet && { loss: outlet.loss, lossIs: outlet.lossIs, toBeConfirmed: outlet.toBeConfirmed }),
					...((endsInPart || terminal) && { loss: 0 }),
					pressure: valueOf(row, 'pressure') ?? 0
				}
			})
	};
}

/** Whether a row is the straight leg of a junction of the catalogue. */
const goesStraight = (row: SheetRow) => {
	const junction = valueOf(row, 'parts')?.junction;
	return (
		junction !== undefined && junction !== null && junction.kind !== 'fixed' && junction.parameters.leg === 'straight'
	);
};

/** Whether a row above it at the same node goes straight on too. */
function earlierStraight(row: SheetRow, links: Links): boolean {
	const parent = links.parent.get(row.id);
	const siblings = (parent && links.children.get(parent.id)) || [];
	return siblings.slice(0, siblings.indexOf(row)).some(goesStraight);
}

function terminalOf({ coefficient, description, toBeConfirmed }: OutletLoss): FittingEntry | null {
	if (coefficient === undefined) return null;
	return { kind: 'fixed', coefficient, name: description ?? 'Outlet', ...(toBeConfirmed && { toBeConfirmed }) };
}

/** Whether a fitting of the catalogue is where a run begins or ends in the open. */
const isEndPart = (kind: string) => ['entries', 'exits'].includes(fittingEntry(kind)?.family ?? '');

/** Cells that speak of the end of a run, and have no place where other rows join. */
export const END_FIELDS = ['flow', 'outlet', 'pressure'] as const;
const IN_THE_MIDDLE = {
	flow: 'its flow is their sum.',
	outlet: 'no outlet stands at its end.',
	pressure: 'no room is at its end.'
} as const;
const AT_AN_END = {
	flow: 'a blank; type flows at the outlets only',
	outlet: 'a blank; an outlet stands where no row joins',
	pressure: 'a blank; the pressure of a room stands at its outlet'
} as const;

/** `differs`: cannot stand in one run with the row it joins. Null: cannot be told, for a fault that is named elsewhere. */
type FoundSide = Side | 'differs' | null;

const towardFan = (side: Side) => side !== 'supply';

/** The side as typed, or that of the row it joins. */
function sideOf(row: SheetRow, links: Links, sides: ReadonlyMap<string, FoundSide>): FoundSide {
	const own = valueOf(row, 'side');
	if (own === null && row.cells.side) return null;
	const parent = links.parent.get(row.id);
	if (parent === null) return own ?? 'supply';
	const inherited = parent ? (sides.get(parent.id) ?? null) : null;
	if (inherited === null || inherited === 'differs') return own;
	return own === null || towardFan(own) === towardFan(inherited) ? (own ?? inherited) : 'differs';
}

function sideExpected(row: SheetRow, links: Links, sides: ReadonlyMap<string, FoundSide>): string {
	const parent = links.parent.get(row.id);
	const inherited = parent && sides.get(parent.id);
	return inherited && inherited !== 'differs' && towardFan(inherited)
		? 'return, exhaust or outdoor, as the row it joins'
		: 'supply, as the row it joins';
}

/** Takes out ends without a flow, and then the rows that nothing counted joins any more, from the ends inward. */
function prune(links: Links, drafts: Map<string, DesignRow>, problems: SheetProblem[]): void {
	for (const row of [...links.fromFan].reverse()) {
		const draft = drafts.get(row.id);
		if (!draft) continue;
		const children = links.children.get(row.id) ?? [];
		if (children.some(({ id }) => drafts.has(id)) || draft.outlet) continue;
		drafts.delete(row.id);
		if (children.length === 0)
			problems.push({
				row: row.id,
				field: 'flow',
				message: `Nothing joins ${draft.tag}, so it needs an outlet.`,
				expected: 'the flow of its outlet, or a row that joins it'
			});
	}
}
