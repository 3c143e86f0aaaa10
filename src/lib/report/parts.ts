import {
	formatCoefficient,
	formatPressure,
	formatSize,
	unitOf,
	type Item,
	type SolvedRow,
	type UnitSystem
} from '$lib/engine';
import type { ReportInput } from './input';
import type { CellKind, PartsOfRow, Remark, SourceUsed } from './model';
import { indexRows, rowsFromFan, servesOf } from './network-order';
import { sourceText } from './sources';
import { NOTHING, PART } from './wording';

/** What the loss of each section is made of, part by part, with all that its coefficient was computed from. */
export function partsOf(
	{ document, solution, units }: ReportInput,
	sources: readonly SourceUsed[],
	remarks: readonly Remark[]
): PartsOfRow[] {
	const numbers = new Map(sources.map(({ text, number }) => [text, number]));
	const remarkNumbers = new Map(remarks.map(({ text, number }) => [text, number]));
	const onIndex = indexRows(solution);
	return rowsFromFan(document).flatMap((row): PartsOfRow[] => {
		const solved = solution.rows[row.tag];
		if (solved === undefined) return [];
		const atFlow = new Set(row.equipment?.flatMap(({ name, atFlow: flow }) => (flow === undefined ? [] : [name])));
		return [
			{
				tag: row.tag,
				serves: servesOf(row),
				index: onIndex.has(row.tag),
				velocityPressure: formatPressure(solved.velocityPressure, units),
				loss: formatPressure(solved.loss, units),
				lines: solved.items.map((item) => ({
					part: PART[item.part],
					name: nameOf(item, solved, units),
					count: item.count === null ? NOTHING : String(item.count),
					coefficient: formatCoefficient(item.coefficient),
					coefficientKind: item.catalogue === null && item.coefficient !== null ? 'entered' : 'computed',
					loss: formatPressure(item.loss, units),
					lossKind: lossKind(item, atFlow, row.outlet?.lossIs === 'static'),
					remarks: remarksOn(item).flatMap((text) => remarkNumbers.get(text) ?? []),
					source: numbers.get(sourceText(item)) ?? null,
					toBeConfirmed: item.toBeConfirmed
				}))
			}
		];
	});
}

/** What every caution and every note on a range says, once, in the order of first use from the fan. */
export function remarksOf({ document, solution }: ReportInput): Remark[] {
	const items = rowsFromFan(document).flatMap(({ tag }) => solution.rows[tag]?.items ?? []);
	return [...new Set(items.flatMap(remarksOn))].map((text, place) => ({ number: place + 1, text }));
}

function remarksOn({ catalogue }: Item): string[] {
	if (catalogue === null) return [];
	return [catalogue.rangeNote && `Outside the range of its source: ${catalogue.rangeNote}.`, catalogue.caution].filter(
		(text): text is string => Boolean(text)
	);
}

function nameOf(item: Item, solved: SolvedRow, units: UnitSystem): string {
	if (item.part === 'duct') return hydraulics(solved, units);
	const name = item.name.trim() === PART[item.part] ? '' : item.name;
	return [name, item.catalogue?.words ?? ''].filter(Boolean).join(', ');
}

/** Hydraulic diameter, Reynolds number to three figures, and friction factor. */
function hydraulics({ hydraulicDiameter, reynolds, frictionFactor }: SolvedRow, units: UnitSystem): string {
	const diameter = formatSize({ shape: 'round', diameter: hydraulicDiameter }, units).slice(1);
	return `Dh ${diameter} ${unitOf('size', units)}, Re ${grouped(Number(reynolds.toPrecision(3)))}, f ${frictionFactor.toFixed(4)}`;
}

const grouped = (value: number) => String(value).replace(/\B(?=(\d{3})+(?!\d))/g, '\u2009');

function lossKind({ part, name, coefficient }: Item, atFlow: ReadonlySet<string>, staticLoss: boolean): CellKind {
	if (part === 'equipment') return atFlow.has(name) ? 'computed' : 'entered';
	return part === 'outlet' && coefficient === null && !staticLoss ? 'entered' : 'computed';
}
