import type { Equipment, FittingEntry, Junction, Picture, RowSize } from '$lib/engine';

export type { Picture } from '$lib/engine';

/** What family of part a word names. */
export type PartWord = 'elbow' | 'junction' | 'transition' | 'entry' | 'exit' | 'damper' | 'device';

/** A part whose loss goes with the row's own velocity pressure. */
export interface PartFitting {
	readonly word: PartWord;
	/**
	 * 'fixed' (has a coefficient); a kind of the catalogue, or one without its shape: 'elbow-smooth', 'entry-flush' …; or
	 * one that sizes and side of the row decide: 'transition', 'cap' …
	 */
	readonly kind: string;
	readonly count: number;
	/** As printed: 'Elbow', 'Tee branch', 'Fire damper FD-01'. */
	readonly name: string;
	readonly coefficient?: number;
	/** By the names of the catalogue: radiusRatio, angle, pieces, areaRatio, leg … */
	readonly parameters: Readonly<Record<string, number | string>>;
	/** Key of the method that was named, `elbow by rennels`. */
	readonly method?: string;
	readonly picture: Picture;
	/** Set by a question mark. */
	readonly toBeConfirmed: boolean;
}

/** A part whose loss is given as a pressure [Pa] at the row's design flow. */
export interface PartEquipment {
	readonly name: string;
	readonly loss: number;
	readonly exponent: number;
	readonly picture: Picture;
	readonly toBeConfirmed: boolean;
}

/** All that one Parts cell holds. */
export interface Parts {
	/** The junction at the row's fan end. */
	readonly junction: PartFitting | null;
	readonly fittings: readonly PartFitting[];
	readonly equipment: readonly PartEquipment[];
}

/** A fitting as the design document holds it. */
export type DocumentFitting = FittingEntry;
/** An equipment loss as the design document holds it. */
export type DocumentEquipment = Equipment;

/** What a row tells of its parts beside its size. */
export interface RowPlace {
	/** Free size of the row that it joins; null where it meets the fan, or where that size is not known. */
	readonly joined: RowSize | null;
	/** Whether its air runs toward the fan. */
	readonly towardFan: boolean;
}

/** A part that does not suit the row. */
export interface PartProblem {
	readonly part: string;
	readonly message: string;
	readonly expected: string;
}

/** The parts of a row, ready for its document. */
export interface DocumentParts {
	readonly junction: Junction | null;
	readonly fittings: readonly DocumentFitting[];
	readonly equipment: readonly DocumentEquipment[];
	readonly problems: readonly PartProblem[];
}
