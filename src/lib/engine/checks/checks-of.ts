import type { DesignDocument, FlagRule, Solution } from '../document/types';
import { definitions } from './check-list';
import type { CheckContext, CheckDefinition, CheckResult, Finding, Found } from './types';

/**
 * What a reviewer looks for, each with its outcome: pass, flag, not applicable or overridden. A pass says that a test was
 * met, and nothing of a code.
 *
 * @param document thresholds, checks that are left out and overrides
 * @param solution what `solveDesign` gave for it
 */
export function checksOf(document: DesignDocument, solution: Solution): readonly CheckResult[] {
	const context = contextOf(document, solution);
	return definitions.map((check) => resultOf(check, context));
}

function contextOf(document: DesignDocument, solution: Solution): CheckContext {
	const byRule = new Map<FlagRule, Solution['flags'][number][]>();
	for (const flag of solution.flags) {
		const list = byRule.get(flag.rule);
		if (list) list.push(flag);
		else byRule.set(flag.rule, [flag]);
	}
	const joined = new Set(document.rows.map(({ joins }) => joins));
	return {
		document,
		solution,
		rows: document.rows.flatMap((row) => {
			const solved = solution.rows[row.tag];
			return solved ? [[row, solved] as const] : [];
		}),
		flags: (...rules) => rules.flatMap((rule) => byRule.get(rule) ?? []),
		isJoined: (tag) => joined.has(tag)
	};
}

function resultOf(check: CheckDefinition, context: CheckContext): CheckResult {
	const { key, title, severity, basis, threshold: standard } = check;
	const own = context.document.checks?.[key];
	const value = own?.threshold ?? standard?.default ?? NaN;
	const threshold = standard && { ...standard, value, isEdited: own?.threshold !== undefined };
	const common = { ...{ key, title, severity, threshold, basis } };
	const off = own?.off?.reason.trim();
	const found: Found = off ? { outcome: 'not-applicable', reason: `Left out: ${off}` } : check.test(context, value);
	if (found.outcome !== 'flag')
		return {
			...common,
			outcome: found.outcome,
			findings: [],
			answered: [],
			reason: found.outcome === 'pass' ? null : found.reason
		};
	const answers = found.findings.map((finding) => [finding, overrideOf(context.document, key, finding)] as const);
	const open = answers.flatMap(([finding, override]) => (override ? [] : [finding]));
	const answered = answers.flatMap(([finding, override]) => (override ? [{ ...finding, override }] : []));
	return { ...common, outcome: open.length > 0 ? 'flag' : 'overridden', findings: open, answered, reason: null };
}

/** An override counts with a reason and a name only; one without a row answers the whole check. */
function overrideOf({ overrides = [] }: DesignDocument, check: string, { row }: Finding) {
	const found = overrides.find(
		(one) =>
			one.check === check && (one.row === null || one.row === row) && one.reason.trim() !== '' && one.by.trim() !== ''
	);
	return found && { row: found.row, by: found.by, at: found.at, reason: found.reason };
}
