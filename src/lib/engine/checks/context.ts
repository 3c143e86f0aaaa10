import type { DesignDocument, DesignRow, FlagRule, Solution } from '../document/types';
import { partHints, type PartHints } from '../network/part-hints';
import { marginLedger } from './margin-ledger';
import type { CheckContext } from './types';

/** All that the checks look into, found once for all of them. */
export function contextOf(
	document: DesignDocument,
	solution: Solution,
	thresholds: CheckContext['thresholds']
): CheckContext {
	const byRule = new Map<FlagRule, Solution['flags'][number][]>();
	for (const flag of solution.flags) {
		const list = byRule.get(flag.rule);
		if (list) list.push(flag);
		else byRule.set(flag.rule, [flag]);
	}
	const joined = new Map<string, number>();
	for (const { joins } of document.rows) if (joins !== null) joined.set(joins, (joined.get(joins) ?? 0) + 1);
	const byTag = new Map(document.rows.map((row) => [row.tag, row]));
	const read = partHints();
	const hints = new Map<DesignRow, PartHints>();
	return {
		document,
		solution,
		rows: document.rows.flatMap((row) => {
			const solved = solution.rows[row.tag];
			return solved ? [[row, solved] as const] : [];
		}),
		flags: (...rules) => rules.flatMap((rule) => byRule.get(rule) ?? []),
		isJoined: (tag) => joined.has(tag),
		joinedBy: (tag) => joined.get(tag) ?? 0,
		rowOf: (tag) => byTag.get(tag),
		hintsOf: (row) => {
			let hint = hints.get(row);
			if (hint === undefined) hints.set(row, (hint = read(row)));
			return hint;
		},
		ledger: marginLedger(document, solution),
		thresholds
	};
}
