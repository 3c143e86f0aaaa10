import { exp } from '../arithmetic';
import { requireInRange, type Range } from '../errors';
import { FLEXIBLE_DIAMETER } from './flexible';

/** Compression that the formula can be asked for [-]; measured to 0.3, used with care to 0.45. */
export const STRETCH: Range = { min: 0, max: 0.6 };
const MEASURED = 0.3;
const WITH_CARE = 0.45;
const DIAMETER: Range = { min: 0.05, max: 1.5 };

export interface FlexibleStretch {
	/** Loss of a metre of the duct as installed over that of a metre fully extended [-] */
	readonly factor: number;
	/** What lies outside the measurements; null when nothing */
	readonly note: string | null;
}

/** What the length of a flexible duct means, for whoever enters it. */
export const INSTALLED_LENGTH =
	'Length as installed, along the curve of the duct with its sag. Compression is what is missing of the fully ' +
	'stretched length: 1 - installed/stretched. The factor knows no sag beyond the length it adds: slack between ' +
	'supports gathers the inner skin, and loses more (common practice).';

function notesOf(diameter: number, compression: number): string | null {
	const notes: string[] = [];
	if (diameter < FLEXIBLE_DIAMETER.min || diameter > FLEXIBLE_DIAMETER.max)
		notes.push('measured for diameters of 150 to 400 mm, carried on beyond');
	if (compression > WITH_CARE) notes.push('compressed by more than 45 %, beyond all measurements');
	else if (compression > MEASURED) notes.push('compressed by more than 30 %, where measurements are few');
	return notes.length === 0 ? null : notes.join('; ');
}

/**
 * Loss of a compressed flexible duct over that of the same duct fully extended, by length as installed.
 *
 *   PDCF = 1 + 0.58 K e^(-0.00496 D), K = 100 (1 - L/Lfe), D in mm
 *
 * @param diameter D [m], 0.05 to 1.5; measured 0.15 to 0.4
 * @param compression 1 - L/Lfe, what is missing of the full length [-], 0 to 0.6; measured to 0.3, with care to 0.45
 * @returns factor on the friction of the installed length [-], and a note where it was not measured
 * @throws {OutOfRangeError} when a value leaves its range
 * @source Abushakra, Walker & Sherman (2004) and Culp: handbook form, from memory; the abstract's magnitudes agree
 * @check fixtures/published/friction.json
 */
export function flexibleStretchFactor(diameter: number, compression: number): FlexibleStretch {
	requireInRange('flexibleStretchFactor', 'diameter', diameter, DIAMETER);
	requireInRange('flexibleStretchFactor', 'compression', compression, STRETCH);
	const factor = 1 + 0.58 * 100 * compression * exp(-0.00496 * 1000 * diameter);
	return { factor, note: notesOf(diameter, compression) };
}
