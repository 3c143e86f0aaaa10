import type { Side, UnitSystem } from '$lib/engine';

/** A project as the register shows it. */
export interface RegisterProject {
	readonly projectId: string;
	readonly number: string;
	readonly name: string;
	readonly client: string;
	readonly place: string;
	readonly elevation_m: number;
	readonly units: UnitSystem;
	readonly archivedAt: Date | null;
	readonly designs: readonly RegisterDesign[];
}

export interface RegisterDesign {
	readonly designId: string;
	readonly name: string;
	readonly service: string;
	/** The last edit of the working sheet. */
	readonly headSeq: number;
	readonly figures: {
		readonly rows: number;
		readonly side: Side | null;
		readonly flow: number | null;
		readonly totalPressure: number | null;
		readonly index: string | null;
		readonly problems: number;
		readonly checks: number;
	} | null;
	readonly revisions: readonly {
		readonly revision: string;
		readonly status: 'work-in-progress' | 'issued-for-review';
		readonly savedAt: Date;
		/** The last edit at which the sheet stood as it. */
		readonly standsAt: number;
	}[];
}
