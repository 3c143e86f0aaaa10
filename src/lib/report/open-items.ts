import { formatCoefficient, formatPressure, unitOf, type Item, type UnitSystem } from '$lib/engine';
import type { ReportInput } from './input';
import type { OpenItem } from './model';
import { rowsFromFan } from './network-order';
import { PART } from './wording';

/** Every value that the design marks as not settled, in the order of the tree. */
export function openItemsOf({ document, solution, units }: ReportInput): OpenItem[] {
	const items = rowsFromFan(document).flatMap(({ tag }) =>
		(solution.rows[tag]?.items ?? [])
			.filter(({ toBeConfirmed }) => toBeConfirmed)
			.map((item): OpenItem => ({
				row: tag,
				text: `${figureOf(item, units)} of ${nameOf(item)} in ${tag}${sourceOf(item)}.`
			}))
	);
	const told = new Set(items.map(({ row }) => row));
	const others = solution.flags
		.filter(({ rule, row }) => rule === 'to-be-confirmed' && !told.has(row))
		.map(({ row, message }): OpenItem => ({ row, text: row === null ? message : `${row}: ${message}` }));
	return [...items, ...others];
}

function figureOf({ coefficient, count, loss }: Item, units: UnitSystem): string {
	if (coefficient === null) return `Loss ${formatPressure(loss, units)} ${unitOf('pressure', units)}`;
	const each = count !== null && count > 1 ? ', each,' : '';
	return `Coefficient ${formatCoefficient(coefficient)}${each}`;
}

function nameOf({ part, name }: Item): string {
	const kind = PART[part].toLowerCase();
	return name.trim() === '' ? `the ${kind}` : name;
}

function sourceOf({ source }: Item): string {
	return source === null ? '' : `: ${source}`;
}
