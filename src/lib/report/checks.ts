import type { Flag, FlagRule } from '$lib/engine';
import { shownBy } from './flag-figure';
import type { ReportInput } from './input';
import type { Check, Criterion } from './model';
import { NOTHING, RULE } from './wording';

const GRAVITY = { fault: 0, caution: 1, note: 2 } as const;

/** All that the engine flagged, gathered by rule, the gravest first. */
export function checksOf({ solution, units }: ReportInput): Check[] {
	const byRule = new Map<string, Flag[]>();
	for (const flag of solution.flags) {
		const key = [flag.rule, flag.severity, flag.threshold, flag.basis].join('\n');
		const same = byRule.get(key);
		if (same) same.push(flag);
		else byRule.set(key, [flag]);
	}
	return [...byRule.values()]
		.flatMap((flags): Check[] => {
			const [first] = flags;
			if (first === undefined) return [];
			const { rule, severity, basis, threshold } = first;
			const shown = shownBy(rule, units);
			const findings = flags.map(({ row, value, message }) => ({
				row,
				found: value === undefined || rule === 'to-be-confirmed' ? NOTHING : shown(value),
				message
			}));
			const limit = threshold === undefined ? NOTHING : shown(threshold);
			return [{ rule, title: RULE[rule], severity, threshold: limit, basis, findings }];
		})
		.sort((a, b) => GRAVITY[a.severity] - GRAVITY[b.severity]);
}

/** The limits of the design's own criteria, each with the worst that was found and whether the engine flagged it. */
export function criteriaOf({ document, solution, units }: ReportInput): Criterion[] {
	const { criteria = {} } = document;
	const joined = new Set(document.rows.map(({ joins }) => joins));
	const solved = document.rows.flatMap((row) => {
		const figures = solution.rows[row.tag];
		return figures ? [{ row, figures, main: joined.has(row.tag) }] : [];
	});
	const lines: Criterion[] = [];
	const most = (rule: FlagRule, label: string, limit: number | undefined, values: readonly number[]) => {
		if (limit === undefined) return;
		const shown = shownBy(rule, units);
		const found = values.length === 0 ? NOTHING : shown(Math.max(...values));
		lines.push({
			rule,
			label: `${label}, at most ${shown(limit)}`,
			found: figureAlone(found),
			verdict: values.length === 0 ? 'not applicable' : verdict(rule)
		});
	};
	const flagged = (rule: FlagRule) => solution.flags.filter((flag) => flag.rule === rule).length;
	const verdict = (rule: FlagRule) => (flagged(rule) === 0 ? 'met' : 'not met');
	const velocities = (main: boolean) => solved.filter((one) => one.main === main).map((one) => one.figures.velocity);

	most('velocity-main', 'Velocity in mains', criteria.mainVelocity, velocities(true));
	most('velocity-run-out', 'Velocity in run-outs', criteria.runOutVelocity, velocities(false));
	const rates = solved.map(({ figures }) => figures.frictionRate);
	most('friction-rate', 'Friction rate', criteria.frictionRate, rates);
	const lengths = solved.flatMap(({ row }) => (row.flexible ? [row.flexible.length] : []));
	most('flexible-length', 'Flexible duct', criteria.flexibleLength, lengths);
	const ratios = document.rows.flatMap(({ size }) =>
		size.shape === 'round' ? [] : [Math.max(size.width, size.height) / Math.min(size.width, size.height)]
	);
	most('aspect-ratio', 'Aspect ratio', criteria.aspectRatio, ratios);
	if (criteria.damperAtOutlet === true) {
		const needed = outletsToBalance(solution.paths);
		const found = needed === 0 ? NOTHING : `${needed - flagged('damper-missing')} of ${needed}`;
		const label = 'Damper in every outlet branch';
		lines.push({
			rule: 'damper-missing',
			label,
			found,
			verdict: needed === 0 ? 'not applicable' : verdict('damper-missing')
		});
	}
	return lines;
}

/** Outlets that have another on their side of the fan to be balanced against: the engine asks for dampers at these. */
function outletsToBalance(paths: ReportInput['solution']['paths']): number {
	const supply = paths.filter(({ side }) => side === 'supply').length;
	return [supply, paths.length - supply].reduce((sum, count) => sum + (count > 1 ? count : 0), 0);
}

/** The unit stands with the limit already. */
const figureAlone = (shown: string) => shown.split('\u00a0')[0] ?? shown;
