import type { DesignDocument, Solution, UnitSystem } from '$lib/engine';
import type { Paper, ReportStatus } from './model';

/** All that a report tells; it reads neither clock nor database. */
export interface ReportInput {
	readonly heading: {
		readonly firm: string;
		readonly client: string;
		readonly projectNumber: string;
		readonly projectName: string;
		readonly place: string;
		readonly system: string;
		readonly service: string;
	};
	readonly units: UnitSystem;
	readonly paper: Paper;
	/** Null: the working sheet, not saved. */
	readonly revision: string | null;
	readonly versionNumber: number | null;
	readonly status: ReportStatus;
	/** ISO; null for the working sheet. */
	readonly savedAt: string | null;
	readonly printedAt: string;
	/** A role or an address. */
	readonly preparedBy: string;
	/** Hexadecimal SHA-256 of the version's canonical form. */
	readonly sha256: string | null;
	readonly note: string | null;
	readonly revisions: readonly {
		readonly revision: string;
		readonly savedAt: string;
		readonly status: string;
		readonly note: string;
		readonly by: string;
	}[];
	readonly document: DesignDocument;
	readonly solution: Solution;
}
