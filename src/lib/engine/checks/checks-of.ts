import type { DesignDocument, Solution } from '../document/types';
import { definitions } from './check-list';
import { contextOf } from './context';
import { overridesOf } from './overrides';
import type { Finding } from './finding';
import type { Answered, CheckContext, CheckDefinition, CheckResult, Found } from './types';

const thresholds: CheckContext['thresholds'] = new Map(definitions.map(({ key, threshold }) => [key, threshold]));

/**
 * What a reviewer looks for, each with its outcome: pass, flag, not applicable or overridden. A pass says that a test was
 * met, and nothing of a code.
 *
 * @param document thresholds [SI, as the check names it], checks that are left out and overrides
 * @param solution what `solveDesign` gave for it
 * @returns a result for each check, in the order of `checkList`
 */
export function checksOf(document: DesignDocument, solution: Solution): readonly CheckResult[] {
	const context = contextOf(document, solution, thresholds);
	const answerTo = overridesOf(document);
	return definitions.map((check) => resultOf(check, context, answerTo));
}

function resultOf(
	check: CheckDefinition,
	context: CheckContext,
	answerTo: (check: string, row: string | null) => Answered | undefined
): CheckResult {
	const { key, title, severity, basis, threshold: standard } = check;
	const own = context.document.checks?.[key];
	const value = own?.threshold ?? standard?.default ?? NaN;
	const threshold = standard && { ...standard, value, isEdited: own?.threshold !== undefined };
	const result = { key, title, severity, threshold, basis };
	const off = own?.off?.reason.trim();
	const found: Found = off ? { outcome: 'not-applicable', reason: `Left out: ${off}` } : check.test(context, value);
	if (found.outcome !== 'flag') {
		const reason = found.outcome === 'pass' ? null : found.reason;
		return { ...result, outcome: found.outcome, findings: [], answered: [], reason };
	}
	const findings: Finding[] = [];
	const answered: (Finding & { readonly override: Answered })[] = [];
	for (const finding of found.findings) {
		const override = answerTo(key, finding.row);
		if (override) answered.push({ ...finding, override });
		else findings.push(finding);
	}
	return { ...result, outcome: findings.length > 0 ? 'flag' : 'overridden', findings, answered, reason: null };
}
