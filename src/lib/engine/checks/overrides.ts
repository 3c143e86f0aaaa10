import type { DesignDocument } from '../document/types';
import type { Answered } from './types';

/**
 * What answers a finding of a check at a row. An override counts with a reason and a name only; one without a row answers
 * all that its check finds. Of several, the first counts, one for the row before one for all.
 */
export function overridesOf({ overrides = [] }: DesignDocument) {
	const byCheck = new Map<string, Map<string | null, Answered>>();
	for (const { check, row, by, at, reason } of overrides) {
		if (reason.trim() === '' || by.trim() === '') continue;
		let rows = byCheck.get(check);
		if (rows === undefined) byCheck.set(check, (rows = new Map()));
		if (!rows.has(row)) rows.set(row, { row, by, at, reason });
	}
	return (check: string, row: string | null): Answered | undefined => {
		const rows = byCheck.get(check);
		return rows?.get(row) ?? rows?.get(null);
	};
}
