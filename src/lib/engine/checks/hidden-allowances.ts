import type { DesignDocument, Solution } from '../document/types';
import type { Finding } from './finding';

const ALLOWANCE = /\b(allowances?|margins?|contingenc(y|ies)|safety factor|reserves?|unforeseen)\b/i;

/** What a margin may be named for, and whether the design counts it where it arises. */
const COUNTED: readonly (readonly [RegExp, string, (document: DesignDocument, solution: Solution) => boolean])[] = [
	[/\bleak/i, 'leakage is counted by class', (_document, { leakage }) => leakage !== null && leakage !== undefined],
	[
		/\bfilters?\b|\bdirty\b/i,
		'a filter is counted dirty',
		({ rows }) => rows.some(({ equipment }) => equipment?.some(({ filter }) => filter?.state === 'dirty'))
	],
	[
		/\bsystem effect\b/i,
		'a system effect is entered at the fan',
		({ rows }) =>
			rows.some(({ fittings }) =>
				fittings?.some((one) => /^fan-(inlet|outlet)-effect$/.test(one.kind) && (one.coefficient ?? 0) !== 0)
			)
	],
	[
		/\bflex/i,
		'flexible duct is counted as installed',
		({ rows }) => rows.some(({ flexible }) => (flexible?.length ?? 0) > 0)
	]
];

/**
 * Allowances that stand in a second place: among the losses of a row, for what the design counts where it arises, or on
 * top of another margin on the same pressure. One inside a coefficient that was typed by hand cannot be seen.
 */
export function hiddenAllowances(document: DesignDocument, solution: Solution): readonly Finding[] {
	const { margins = [], rows } = document;
	const hidden: Finding[] = [];
	for (const { name } of margins)
		for (const [pattern, counted, isCounted] of COUNTED)
			if (pattern.test(name) && isCounted(document, solution))
				hidden.push({ row: null, message: `“${name}” stands beside what it is for: ${counted}.` });

	const stacked = margins
		.filter(({ of, fraction = 0 }) => of === 'pressure' && fraction > 0)
		.map(({ name }) => `“${name}”`);
	if (stacked.length > 1)
		hidden.push({
			row: null,
			value: stacked.length,
			unit: '',
			message: `Margins on pressure are stacked, and multiply: ${stacked.join(', ')}.`
		});

	const known = new Map<string, boolean>();
	const isAllowance = (name: string) => {
		let is = known.get(name);
		if (is === undefined) known.set(name, (is = ALLOWANCE.test(name)));
		return is;
	};
	for (const { tag, fittings = [], equipment = [] } of rows)
		for (const { name } of [...fittings, ...equipment])
			if (name !== undefined && isAllowance(name))
				hidden.push({
					row: tag,
					message: `“${name}” is an allowance among the losses: it belongs in the margin ledger.`
				});
	return hidden;
}
