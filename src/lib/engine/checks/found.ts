import type { DesignRow, FlagRule, SolvedRow } from '../document/types';
import type { CheckBasis, CheckContext, Finding, Found, Mark } from './types';

export const PASS: Found = { outcome: 'pass' };
export const notApplicable = (reason: string): Found => ({ outcome: 'not-applicable', reason });
export const foundOf = (findings: readonly Finding[]): Found =>
	findings.length === 0 ? PASS : { outcome: 'flag', findings };

export const basis = (mark: Mark, source: string): CheckBasis => ({ mark, source });
export const PRACTICE = (source = 'common practice') => basis('common practice', source);

/** Each row of which a figure is above a limit. */
export function above(
	{ rows }: CheckContext,
	limit: number,
	message: string,
	figure: (row: DesignRow, solved: SolvedRow) => number | null
): Found {
	const known = rows.flatMap(([row, solved]) => {
		const value = figure(row, solved);
		return value === null ? [] : [{ row: row.tag, value, message }];
	});
	return known.length === 0
		? notApplicable('No row is of this kind.')
		: foundOf(known.filter(({ value }) => value > limit));
}

/** What the engine has flagged already, so that no threshold stands twice. */
export function flagged({ flags }: CheckContext, ...rules: readonly FlagRule[]): Found {
	return foundOf(
		flags(...rules).map(({ row, message, value }) => ({ row, message, ...(value !== undefined && { value }) }))
	);
}

/** Names of fittings and equipment of a row. */
export const namesOf = (row: DesignRow): readonly string[] => [
	...(row.fittings ?? []).flatMap(({ name, kind }) => [name ?? '', kind]),
	...(row.equipment ?? []).map(({ name }) => name)
];
export const hasNamed = (row: DesignRow, pattern: RegExp): boolean => namesOf(row).some((name) => pattern.test(name));
