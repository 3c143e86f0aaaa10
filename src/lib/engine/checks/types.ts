import type { DesignDocument, DesignRow, Flag, FlagRule, Solution, SolvedRow } from '../document/types';

/** How firm the ground of a check is. */
export type Mark = 'standard' | 'handbook' | 'common practice' | 'from memory';

export interface CheckBasis {
	readonly mark: Mark;
	/** Where the test, or its threshold, comes from. */
	readonly source: string;
}

export interface CheckThreshold {
	readonly default: number;
	/** SI; '' for a pure number */
	readonly unit: string;
	readonly label: string;
}

/** What was found at a row; `row` is null where it concerns the whole design. */
export interface Finding {
	readonly row: string | null;
	readonly message: string;
	readonly value?: number;
}

export type Found =
	| { readonly outcome: 'pass' }
	| { readonly outcome: 'flag'; readonly findings: readonly Finding[] }
	| { readonly outcome: 'not-applicable'; readonly reason: string };

/** All that a check looks into. */
export interface CheckContext {
	readonly document: DesignDocument;
	readonly solution: Solution;
	/** Rows with what they came to, in the order of the document. */
	readonly rows: readonly (readonly [DesignRow, SolvedRow])[];
	readonly flags: (...rules: readonly FlagRule[]) => readonly Flag[];
	/** Whether another row joins this one. */
	readonly isJoined: (tag: string) => boolean;
}

export interface CheckDefinition {
	readonly key: string;
	readonly title: string;
	readonly looksAt: string;
	readonly severity: 'note' | 'caution' | 'fault';
	readonly threshold: CheckThreshold | null;
	readonly basis: CheckBasis;
	readonly test: (context: CheckContext, threshold: number) => Found;
}

/** A finding that a person has answered. */
export interface Answered {
	readonly row: string | null;
	readonly by: string;
	readonly at: string;
	readonly reason: string;
}

export interface CheckResult {
	readonly key: string;
	readonly title: string;
	readonly severity: 'note' | 'caution' | 'fault';
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
