import type { DesignRow, Flag, FlagRule, SolvedRow } from '../document/types';
import type { Finding } from './finding';
import type { CheckBasis, CheckContext, Found, Mark, Pair } from './types';

export const PASS: Found = { outcome: 'pass' };
export const notApplicable = (reason: string): Found => ({ outcome: 'not-applicable', reason });
export const foundOf = (findings: readonly Finding[]): Found =>
	findings.length === 0 ? PASS : { outcome: 'flag', findings };
/** One finding on the whole design, or none. */
export const whole = (isFound: boolean, message: string, figure?: Pick<Finding, 'value' | 'unit'>): Found =>
	isFound ? foundOf([{ row: null, message, ...figure }]) : PASS;

export const basis = (mark: Mark, source: string, text: string): CheckBasis => ({ mark, source, text });
export const practice = (text: string): CheckBasis => basis('common practice', 'common practice', text);

type Figure = (row: DesignRow, solved: SolvedRow) => number | null;
interface Limit {
	readonly most?: number;
	readonly least?: number;
	readonly unit: string;
	readonly message: string;
	/** Why it does not apply, where no row has the figure. */
	readonly none: string;
}

/** Each row of which a figure is above, or below, a limit. */
export function beyond(pairs: readonly Pair[], { most, least, unit, message, none }: Limit, figure: Figure): Found {
	const findings: Finding[] = [];
	let known = false;
	for (const [row, solved] of pairs) {
		const value = figure(row, solved);
		if (value === null) continue;
		known = true;
		if (value > (most ?? Infinity) || value < (least ?? -Infinity))
			findings.push({ row: row.tag, value, unit, message });
	}
	return known ? foundOf(findings) : notApplicable(none);
}

/** SI units of the values of flags; a flag that is not here gives a pure number. */
const UNITS: Partial<Readonly<Record<FlagRule, string>>> = {
	'velocity-main': 'm/s',
	'velocity-run-out': 'm/s',
	'velocity-plausible': 'm/s',
	'friction-rate': 'Pa/m',
	'friction-rate-plausible': 'Pa/m',
	'flexible-length': 'm',
	'rise-exceeds-length': 'm',
	'temperature-mix': 'degC',
	condensation: 'degC',
	'leakage-reversed': 'Pa',
	'negative-loss': 'Pa',
	'negative-duty': 'Pa',
	'losses-as-entered': 'kg/m3'
};

/** What the engine has flagged already, so that no threshold stands twice. */
export function flagged({ flags }: CheckContext, ...rules: readonly FlagRule[]): Found {
	return foundOf(flags(...rules).map(findingOf));
}

function findingOf({ rule, row, message, value, threshold }: Flag): Finding {
	if (value === undefined) return { row, message };
	return { row, message, value, unit: UNITS[rule] ?? '', ...(threshold !== undefined && { limit: threshold }) };
}

/** Rows of which something stands in their fittings or equipment, by its name or its kind. */
export const hasNamed = ({ fittings = [], equipment = [] }: DesignRow, pattern: RegExp): boolean =>
	fittings.some(({ name, kind }) => pattern.test(kind) || (name !== undefined && pattern.test(name))) ||
	equipment.some(({ name }) => pattern.test(name));
