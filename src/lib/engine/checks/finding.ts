/** What was found at a row; `row` is null where it concerns the whole design. */
export interface Finding {
	readonly row: string | null;
	readonly message: string;
	readonly value?: number;
	/** SI unit of the value; '' for a pure number */
	readonly unit?: string;
	/** What the value was held against, where it is the design's own and not the threshold of the check. */
	readonly limit?: number;
}
