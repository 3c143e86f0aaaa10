import type { DesignDocument, DesignRow, Flag, FlagRule, Solution, SolvedRow } from '../document/types';
import type { PartHints } from '../network/part-hints';
import type { Finding } from './finding';
import type { MarginLedger } from './margin-ledger';

/** How firm the ground of a check is. */
export type Mark = 'standard' | 'handbook' | 'common practice' | 'from memory';

export interface CheckBasis {
	readonly mark: Mark;
	/** Where the test, or its threshold, comes from. */
	readonly source: string;
	/** What stands there, or why it is tested. */
	readonly text: string;
}

export interface CheckThreshold {
	readonly default: number;
	/** SI; '' for a pure number */
	readonly unit: string;
	readonly label: string;
}

export type Found =
	| { readonly outcome: 'pass' }
	| { readonly outcome: 'flag'; readonly findings: readonly Finding[] }
	| { readonly outcome: 'not-applicable'; readonly reason: string };

/** A row with what it came to. */
export type Pair = readonly [DesignRow, SolvedRow];

/** All that a check looks into. */
export interface CheckContext {
	readonly document: DesignDocument;
	readonly solution: Solution;
	/** In the order of the document. */
	readonly rows: readonly Pair[];
	/** What the engine has flagged, by rule. */
	readonly flags: (...rules: readonly FlagRule[]) => readonly Flag[];
	/** Whether another row joins this one. */
	readonly isJoined: (tag: string) => boolean;
	/** The row of a tag. */
	readonly rowOf: (tag: string) => DesignRow | undefined;
	/** How many rows join it. */
	readonly joinedBy: (tag: string) => number;
	/** What the fittings and the equipment of a row are. */
	readonly hintsOf: (row: DesignRow) => PartHints;
	readonly ledger: MarginLedger;
	/** Thresholds by the key of each check; null where it has none. */
	readonly thresholds: ReadonlyMap<string, CheckThreshold | null>;
}

export type Severity = 'note' | 'caution' | 'fault';

export interface CheckDefinition {
	readonly key: string;
	readonly title: string;
	readonly looksAt: string;
	readonly severity: Severity;
	readonly threshold: CheckThreshold | null;
	readonly basis: CheckBasis;
	readonly test: (context: CheckContext, threshold: number) => Found;
}

/** Who answered a finding, when and why. */
export interface Answered {
	/** Null where the whole check was answered. */
	readonly row: string | null;
	readonly by: string;
	readonly at: string;
	readonly reason: string;
}

export interface CheckResult {
	readonly key: string;
	readonly title: string;
	readonly severity: Severity;
	readonly outcome: 'pass' | 'flag' | 'not-applicable' | 'overridden';
	/** What was tested with; null without a threshold. */
	readonly threshold: (CheckThreshold & { readonly value: number; readonly isEdited: boolean }) | null;
	readonly basis: CheckBasis;
	/** What is still open. */
	readonly findings: readonly Finding[];
	/** What was found and answered, with who, when and why. */
	readonly answered: readonly (Finding & { readonly override: Answered })[];
	/** Why it does not apply. */
	readonly reason: string | null;
}
