import { exp } from '../arithmetic';
import { requireInRange, type Range } from '../errors';

/** Compression for which the factor was measured, with some care at the upper end [%]. */
export const COMPRESSION: Range = { min: 0, max: 45 };
/** Diameters of the measurements [m]. */
export const FLEXIBLE_DIAMETER: Range = { min: 0.15, max: 0.4 };

/**
 * Loss of a compressed flexible duct over that of the same duct fully extended.
 *
 *   PDCF = 1 + 0.58 K e^(-0.00496 D), K = 100 (1 - L/Lfe), D in mm
 *
 * @param compression K, what is missing of the full length [%], 0 to 45
 * @param diameter D [m], 0.15 to 0.4
 * @returns factor on the loss of the installed length [-]
 * @throws {OutOfRangeError} when a value leaves its range
 * @source Abushakra, Walker & Sherman (2004) and Culp: handbook form, from memory; the abstract's magnitudes agree
 * @check fixtures/published/friction.json
 */
export function flexibleCompressionFactor(compression: number, diameter: number): number {
	requireInRange('flexibleCompressionFactor', 'compression', compression, COMPRESSION);
	requireInRange('flexibleCompressionFactor', 'diameter', diameter, FLEXIBLE_DIAMETER);
	return 1 + 0.58 * compression * exp(-0.00496 * 1000 * diameter);
}
