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

/** A drawing of the part itself, larger and closer than the symbol of the sheet. */
export type Drawing =
	| 'elbow'
	| 'elbow-rectangular'
	| 'segmented'
	| 'mitre'
	| 'vaned'
	| 'splitter'
	| 'offset'
	| 'step'
	| 'transition'
	| 'pyramid'
	| 'square-to-round'
	| 'one-sided'
	| 'entry'
	| 'bellmouth'
	| 'hood'
	| 'cap'
	| 'louvre'
	| 'exit'
	| 'exit-diffuser'
	| 'damper'
	| 'blades'
	| 'gate'
	| 'firedamper'
	| 'screen'
	| 'plate'
	| 'obstruction'
	| 'fan-inlet'
	| 'fan-outlet'
	| 'tee'
	| 'wye'
	| 'shoe'
	| 'conical'
	| 'cross'
	| 'bullhead'
	| 'plenum';

export type Family =
	| 'elbows-round'
	| 'elbows-rectangular'
	| 'elbows-oval'
	| 'offsets'
	| 'area-changes'
	| 'entries'
	| 'exits'
	| 'dampers'
	| 'screens'
	| 'equipment'
	| 'system-effect'
	| 'junctions-diverging'
	| 'junctions-converging';

/** One author's way to a coefficient: some fittings have several, which differ. */
export interface Method {
	/** As a design names it: the author in small letters, as `idelchik`. */
	readonly key: string;
	readonly range: string;
	readonly method: string;
	readonly source: string;
	readonly known: Known;
	/** Fraction of the coefficient */
	readonly uncertainty: number;
}

/** A fitting of the catalogue, as plain data. */
export interface CatalogueEntry {
	readonly key: string;
	readonly name: string;
	readonly family: Family;
	readonly shapes: readonly Shape[];
	readonly parameters: readonly FittingParameter[];
	/** Where it stands: along a row if absent, or where the row joins another. */
	readonly place?: 'junction';
	/** The leg on whose velocity pressure the source gives C */
	readonly reference: 'row' | 'smaller leg' | 'common leg';
	/** Key of the method that the keys below describe, where there are rivals */
	readonly standardMethod?: string;
	/** Other authors' methods, which a design may choose instead */
	readonly rivals?: readonly Method[];
	/** The parameter along which the coefficient is drawn, and values of the others where they are not the defaults */
	readonly plot?: { readonly along: string; readonly at?: Readonly<Record<string, number | string>> };
	readonly range: string;
	readonly method: string;
	readonly source: string;
	readonly known: Known;
	/** Fraction of the coefficient */
	readonly uncertainty: number;
	readonly picture: Picture;
	/** The close drawing, where there is one */
	readonly drawing?: Drawing;
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

/** Which stream of a junction a row is. */
export type Leg = 'straight' | 'branch';

/** A junction as one of its streams sees it. Ratios are taken from the sheet, never typed. */
export interface JunctionContext {
	/** Away from the fan the common stream divides; toward it the streams unite. */
	readonly direction: 'diverging' | 'converging';
	readonly leg: Leg;
	/** Flow of this leg over that of the common leg [-], by mass */
	readonly flowRatio: number;
	/** Flow of all branches together over that of the common leg [-]; of this one where this is a branch */
	readonly branchFlowRatio: number;
	/** Area of this leg over that of the common leg [-] */
	readonly areaRatio: number;
	/** Area of the branch over that of the common leg [-]; for the straight leg that of the branch with the greatest flow */
	readonly branchAreaRatio: number;
	/** Area of the straight leg over that of the common leg [-]; null where nothing goes straight on */
	readonly straightAreaRatio: number | null;
	/** How many branches stand at the node */
	readonly branches: number;
	/** Inside size of the common leg and of this one [m] */
	readonly commonSize: Size;
	readonly size: Size;
}

export interface CoefficientResult {
	/** On the velocity pressure of the row, for a junction on that of the common leg [-] */
	readonly coefficient: number;
	/** Key of the method, where the entry has several */
	readonly methodKey: string | null;
	readonly known: Known;
	/** Fraction of the coefficient */
	readonly uncertainty: number;
	readonly method: string;
	readonly source: string;
	/** All parameters of the entry as used, defaults included */
	readonly parameters: Readonly<Record<string, number | string>>;
	readonly inRange: boolean;
	readonly rangeNote: string | null;
}

/** Parameters as they stand in a document; other keys are ignored. */
export type FittingParameters = Readonly<Record<string, unknown>>;
