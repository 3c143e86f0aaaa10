import type { FlagRule, Side, UnitSystem } from '$lib/engine';

/** The report of one design as plain data: text is ready to print, figures of the accounts stand beside it unrounded. */
export interface Report {
	readonly paper: Paper;
	/** ISO. */
	readonly printedAt: string;
	readonly units: UnitSystem;
	readonly heading: HeadingBlock;
	readonly titleBlock: TitleBlock;
	readonly basis: readonly Labelled[];
	readonly result: Result;
	readonly criteria: readonly Criterion[];
	readonly toBeConfirmed: readonly OpenItem[];
	readonly checks: readonly Check[];
	readonly schedule: Schedule;
	readonly ledger: Ledger;
	readonly parts: readonly PartsOfRow[];
	readonly remarks: readonly Remark[];
	readonly fan: FanDuty;
	readonly cautions: readonly Caution[];
	readonly sources: readonly SourceUsed[];
	readonly revisions: readonly RevisionLine[];
	readonly verification: Verification;
}

export type Paper = 'A4' | 'A3' | 'Letter' | 'Tabloid';
export type ReportStatus = 'work-in-progress' | 'issued-for-review';

export interface Labelled {
	readonly label: string;
	readonly value: string;
}

export interface HeadingBlock {
	readonly kind: string;
	readonly title: string;
	readonly place: string;
	readonly identity: readonly Labelled[];
	readonly stamp: { readonly lines: readonly [string, string]; readonly caution: string };
}

/** What stands at the foot of every page, but for the page's own name and number. */
export interface TitleBlock {
	readonly firm: string;
	readonly project: string;
	readonly system: string;
	readonly units: string;
	readonly revision: string;
	readonly status: string;
	readonly date: string;
	readonly caution: string;
}

export interface Result {
	readonly cells: readonly ResultCell[];
	readonly notes: readonly string[];
}
export interface ResultCell {
	readonly label: string;
	readonly value: string;
	readonly unit: string;
	/** Smaller, after the value. */
	readonly aside: string | null;
}

/** One limit of the design's criteria and the worst that was found. */
export interface Criterion {
	readonly rule: FlagRule;
	readonly label: string;
	readonly found: string;
	readonly verdict: 'met' | 'not met' | 'not applicable';
}

export interface OpenItem {
	readonly row: string | null;
	readonly text: string;
}

/** All findings of one rule. */
export interface Check {
	readonly rule: FlagRule;
	readonly title: string;
	readonly severity: 'note' | 'caution' | 'fault';
	readonly threshold: string;
	readonly basis: string;
	readonly findings: readonly { readonly row: string | null; readonly found: string; readonly message: string }[];
}

/** White is a person's, tint is the engine's. */
export type CellKind = 'entered' | 'computed';
export interface Column {
	readonly key: string;
	readonly head: string;
	readonly unit: string;
	readonly kind: CellKind;
	readonly align: 'left' | 'right';
}
export interface Cell {
	readonly text: string;
	readonly kind: CellKind;
}
export interface ScheduleRow {
	readonly tag: string;
	/** On the index path of its side. */
	readonly index: boolean;
	readonly cells: readonly Cell[];
}
export interface Schedule {
	readonly title: string;
	readonly columns: readonly Column[];
	readonly rows: readonly ScheduleRow[];
	readonly notes: readonly string[];
}

/** One step of an account. */
export interface AccountLine {
	/** `forward`: sections already told in an earlier account, together. */
	readonly kind: 'start' | 'forward' | 'row' | 'spare' | 'end';
	readonly name: string;
	readonly cells: readonly string[];
	/** Taken from the total pressure, unrounded [Pa]; null for start and end. */
	readonly loss: number | null;
	/** Total pressure after the step, gauge, unrounded [Pa]. */
	readonly total: number;
	readonly lossText: string;
	readonly totalText: string;
}
/** One stream as an account of total pressure in the direction of flow. */
export interface Account {
	readonly rank: number;
	readonly outlet: string;
	readonly serves: string;
	readonly side: Side;
	readonly index: boolean;
	readonly requirement: number;
	readonly requirementText: string;
	readonly spare: number;
	readonly spareText: string;
	readonly lines: readonly AccountLine[];
}
export interface Ledger {
	readonly columns: readonly Column[];
	readonly accounts: readonly Account[];
	readonly notes: readonly string[];
}

export interface PartLine {
	readonly part: string;
	readonly name: string;
	readonly count: string;
	readonly coefficient: string;
	/** A person's own coefficient, not one of the catalogue. */
	readonly coefficientKind: CellKind;
	readonly loss: string;
	/** A person's own figure, counted as it was entered. */
	readonly lossKind: CellKind;
	/** Numbers of remarks under the table. */
	readonly remarks: readonly number[];
	/** Number in the list of sources. */
	readonly source: number | null;
	readonly toBeConfirmed: boolean;
}
/** A caution of the catalogue, or what lies outside the range of a source. */
export interface Remark {
	readonly number: number;
	readonly text: string;
}
export interface PartsOfRow {
	readonly tag: string;
	readonly serves: string;
	readonly index: boolean;
	readonly velocityPressure: string;
	readonly loss: string;
	readonly lines: readonly PartLine[];
}

export interface FanLine {
	readonly label: string;
	readonly value: string;
	readonly unit: string;
	readonly note: string;
	readonly strong: boolean;
}
export interface FanDuty {
	readonly lines: readonly FanLine[];
	readonly notes: readonly string[];
}

export interface Caution {
	readonly title: string;
	readonly text: string;
}

export interface SourceUsed {
	readonly number: number;
	readonly text: string;
	/** What it was used for. */
	readonly uses: string;
}

export interface RevisionLine {
	readonly revision: string;
	readonly date: string;
	readonly status: string;
	readonly note: string;
	readonly by: string;
	readonly current: boolean;
}

export interface Verification {
	readonly title: string;
	readonly text: string;
	/** First digits of the hash in groups of four; null for a working sheet. */
	readonly code: string | null;
	readonly line: string;
}
