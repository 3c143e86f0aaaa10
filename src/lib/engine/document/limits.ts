/**
 * Bounds of a design document: wide enough for any building, narrow enough that every result is a finite number.
 * Common practice, not a source: a value beyond them is a slip of the unit or of the hand.
 */
export const LIMITS = {
	rows: 20_000,
	parts: 500, // fittings or equipment of one row
	values: 3_000_000, // of the whole document
	pathRows: 4_000_000, // rows of all paths together
	depth: 40, // of nesting
	text: 500, // characters
	tag: 100, // characters
	size: { min: 0.001, max: 100 }, // m
	length: 100_000, // m
	rise: 10_000, // m
	roughness: 0.1, // m
	flow: { min: 1e-9, max: 100_000 }, // m3/s
	loss: 1_000_000, // Pa
	coefficient: 1_000_000,
	count: 1_000,
	exponent: 4,
	temperature: { min: -100, max: 1_000 }, // degC
	elevation: { min: -1_000, max: 11_000 }, // m
	pressure: { min: 1_000, max: 1_000_000 }, // Pa, absolute
	density: { min: 0.01, max: 100 }, // kg/m3
	viscosity: { min: 1e-7, max: 1e-3 } // Pa s
} as const;
