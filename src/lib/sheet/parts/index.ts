import type { Reader, Size } from '$lib/engine';
import type { DocumentParts, PartEquipment, PartFitting, Parts } from './parts';

export type * from './parts';

/** What a Parts cell says, such as `2x elbow r1.0 C0.23, silencer 25 Pa`. An empty text is no parts. */
export declare const readParts: Reader<Parts>;
/** The parts as the design document holds them; shapes chosen by the row's own size. */
export declare function fittingsFor(parts: Parts, size: Size): DocumentParts;
/** A part in words with the key of its symbol. */
export declare function describePart(part: PartFitting | PartEquipment): {
	readonly words: string;
	readonly picture: PartFitting['picture'];
};
