import type { Shape, Size } from '../shape';

/** A parameter of a fitting: a number within hard limits, or one of several options. */
export interface FittingParameter {
	readonly name: string;
	readonly label: string;
	/** SI unit or '°'; '' when dimensionless */
	readonly unit: string;
	readonly default: number | string;
	/** Hard limits of a number; both 0 for a choice of words */
	readonly min: number;
	readonly max: number;
	readonly options?: readonly (number | string)[];
}

/** What a coefficient is known from. */
export type Known =
	'published formula' | 'published table, interpolated' | "maker's data" | 'entered by hand' | 'from memory';

export type Picture =
	| 'elbow'
	| 'tee'
	| 'shoe'
	| 'wye'
	| 'transition'
	| 'damper'
	| 'firedamper'
	| 'flexible'
	| 'silencer'
	| 'coil'
	| 'filter'
	| 'fan'
	| 'louvre'
	| 'diffuser'
	| 'grille';

export type Family =
	'elbows-round' | 'elbows-rectangular' | 'area-changes' | 'entries' | 'exits' | 'dampers' | 'screens';

/** A fitting of the catalogue, as plain data. */
export interface CatalogueEntry {
	readonly key: string;
	readonly name: string;
	readonly family: Family;
	readonly shapes: readonly Shape[];
	readonly parameters: readonly FittingParameter[];
	/** The leg on whose velocity pressure the source gives C */
	readonly reference: 'row' | 'smaller leg';
	readonly range: string;
	readonly method: string;
	readonly source: string;
	readonly known: Known;
	/** Fraction of the coefficient */
	readonly uncertainty: number;
	readonly picture: Picture;
	readonly caution: string | null;
}

/** The row in which a fitting sits. */
export interface FittingContext {
	readonly size: Size;
	readonly reynolds: number;
	readonly velocity: number;
	readonly relativeRoughness: number;
	readonly frictionFactor: number;
}

export interface CoefficientResult {
	/** On the row's own velocity pressure [-] */
	readonly coefficient: number;
	readonly method: string;
	readonly source: string;
	/** All parameters of the entry as used, defaults included */
	readonly parameters: Readonly<Record<string, number | string>>;
	readonly inRange: boolean;
	readonly rangeNote: string | null;
}

/** Parameters as they stand in a document; other keys are ignored. */
export type FittingParameters = Readonly<Record<string, unknown>>;
