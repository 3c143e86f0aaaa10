import { formatCoefficient, formatPressure } from '$lib/engine';
import type { ReportInput } from './input';
import type { PartsOfRow, SourceUsed } from './model';
import { indexRows, rowsFromFan, servesOf } from './network-order';
import { sourceText } from './sources';
import { NOTHING, PART } from './wording';

/** What the loss of each section is made of, part by part. */
export function partsOf({ document, solution, units }: ReportInput, sources: readonly SourceUsed[]): PartsOfRow[] {
	const numbers = new Map(sources.map(({ text, number }) => [text, number]));
	const onIndex = indexRows(solution);
	return rowsFromFan(document).flatMap((row): PartsOfRow[] => {
		const solved = solution.rows[row.tag];
		if (solved === undefined) return [];
		return [
			{
				tag: row.tag,
				serves: servesOf(row),
				index: onIndex.has(row.tag),
				velocityPressure: formatPressure(solved.velocityPressure, units),
				loss: formatPressure(solved.loss, units),
				lines: solved.items.map((item) => ({
					part: PART[item.part],
					name: item.name.trim() === PART[item.part] ? '' : item.name,
					count: item.count === null ? NOTHING : String(item.count),
					coefficient: formatCoefficient(item.coefficient),
					coefficientKind: item.kind === 'fixed' ? 'entered' : 'computed',
					loss: formatPressure(item.loss, units),
					source: numbers.get(sourceText(item)) ?? null,
					toBeConfirmed: item.toBeConfirmed
				}))
			}
		];
	});
}
