import type { z } from 'zod';
import type {
	airSchema,
	criteriaSchema,
	designSchema,
	equipmentSchema,
	fittingSchema,
	flexibleSchema,
	junctionSchema,
	outletSchema,
	rowSchema,
	sizeSchema
} from './schema';

type Frozen<T> = T extends readonly (infer E)[]
	? readonly Frozen<E>[]
	: T extends object
		? { readonly [K in keyof T]: Frozen<T[K]> }
		: T;

/** What was designed: plain JSON in SI units. The types follow the schema. */
export type DesignDocument = Frozen<z.infer<typeof designSchema>>;
export type DesignRow = Frozen<z.infer<typeof rowSchema>>;
export type RowSize = Frozen<z.infer<typeof sizeSchema>>;
export type DesignAir = Frozen<z.infer<typeof airSchema>>;
export type Junction = Frozen<z.infer<typeof junctionSchema>>;
export type Equipment = Frozen<z.infer<typeof equipmentSchema>>;
export type Outlet = Frozen<z.infer<typeof outletSchema>>;
export type Flexible = Frozen<z.infer<typeof flexibleSchema>>;
export type Criteria = Frozen<z.infer<typeof criteriaSchema>>;
export type Side = DesignRow['side'];
export type Service = NonNullable<DesignDocument['service']>;

/** A fitting as written. The parameters of its kind stand beside these keys: read them with `parametersOf`. */
export type Fitting = Frozen<z.infer<typeof fittingSchema>>;
/** A fitting with parameters of its kind, for whoever writes one: `{ kind: 'round-elbow-smooth', angle: 45 } satisfies FittingEntry`. */
export type FittingEntry = Fitting & { readonly [parameter: string]: string | number | boolean | undefined };

export type ProblemCode =
	| 'format'
	| 'type'
	| 'missing'
	| 'not-finite'
	| 'negative'
	| 'zero-size'
	| 'out-of-range'
	| 'text-length'
	| 'unknown-key-value'
	| 'no-rows'
	| 'too-many-rows'
	| 'too-many-parts'
	| 'too-large'
	| 'too-deep'
	| 'duplicate-tag'
	| 'duplicate-id'
	| 'joins-itself'
	| 'ring'
	| 'joins-unknown'
	| 'side-differs'
	| 'outlet-missing'
	| 'outlet-in-middle'
	| 'flow-zero'
	| 'fan-curve'
	| 'unknown-material'
	| 'unknown-fitting'
	| 'unknown-method'
	| 'temperature-unknown'
	| 'unknown-leakage-class'
	| 'loss-missing'
	| 'lining-fills'
	| 'two-straight'
	| 'parameter-missing'
	| 'parameter-unknown'
	| 'parameter-range'
	| 'outside-formula'
	| 'unreadable'
	| 'too-great';

/** Why a document cannot be solved, and where. */
export interface Problem {
	readonly code: ProblemCode;
	/** JSON path, like `rows[3].size.width`; `$` is the document itself. */
	readonly path: string;
	/** Tag of the row, when it has one. */
	readonly row: string | null;
	/** Id of the row, when it has one. */
	readonly id: string | null;
	/** Key of the row that holds the fault. */
	readonly field: string | null;
	/** What is wrong. */
	readonly message: string;
	/** What was expected. */
	readonly expected: string;
}

export type ValidateResult =
	| { readonly ok: true; readonly document: DesignDocument }
	| { readonly ok: false; readonly problems: readonly Problem[] };

/** One loss, or gain, that a row is made of [Pa]. */
export interface Item {
	readonly part: 'duct' | 'flexible' | 'junction' | 'fitting' | 'equipment' | 'outlet' | 'gravity';
	readonly name: string;
	readonly kind: string | null;
	readonly count: number | null;
	/** Of one piece, on the row's own velocity pressure. */
	readonly coefficient: number | null;
	/** Of all pieces [Pa]; a gain by thermal gravity is negative. */
	readonly loss: number;
	readonly source: string | null;
	/** For a coefficient that its source gives on another velocity pressure than the row's own. */
	readonly reference?: ReferenceLeg;
	/** What the catalogue says of it, for a fitting that comes from there. */
	readonly catalogue: CatalogueUse | null;
	readonly toBeConfirmed: boolean;
}

/** The leg of a junction to whose velocity pressure its source refers. */
export interface ReferenceLeg {
	readonly leg: 'common';
	/** Tag of the row that is the leg. */
	readonly row: string;
	readonly coefficient: number;
	readonly velocityPressure: number; // Pa
	/** Flow and area of this leg over those of the common one. */
	readonly flowRatio: number;
	readonly areaRatio: number;
}

/** A fitting of the catalogue as it was used: enough to compute its coefficient again. */
export interface CatalogueUse {
	/** All parameters of the entry, defaults included. */
	readonly parameters: { readonly [name: string]: number | string };
	/** The parameters in words, as 'r/D 1, 90°'. */
	readonly words: string;
	/** Key of the method, where the entry has several. */
	readonly methodKey?: string;
	readonly method: string;
	readonly known: string;
	/** Fraction of the coefficient. */
	readonly uncertainty: number;
	/** What lies outside the range of its source. */
	readonly rangeNote: string | null;
	readonly caution: string | null;
}

/** A row solved. Pressures are gauge, at [fan end, far end]. */
export interface SolvedRow {
	readonly side: Side;
	readonly flow: number; // m3/s, actual, of the air in the row
	readonly massFlow: number; // kg/s
	/** Where air leaks: what escapes or is drawn in [m3/s], and the flow at [fan end, far end]; the flow is their mean. */
	readonly leakage?: number;
	readonly flowEnds?: readonly [number, number];
	/** Where air leaks: mean static pressure inside the duct, behind its junction and before its outlet [Pa]. */
	readonly leakagePressure?: number;
	readonly density: number; // kg/m3
	/** Where it differs from that of the design [degC]. */
	readonly temperature?: number;
	readonly area: number; // m2
	readonly hydraulicDiameter: number; // m
	readonly velocity: number; // m/s
	readonly velocityPressure: number; // Pa
	readonly reynolds: number;
	readonly frictionFactor: number;
	readonly frictionRate: number; // Pa/m of the rigid duct
	readonly frictionLoss: number; // Pa, rigid duct alone
	readonly flexibleLoss: number; // Pa
	readonly fittingLoss: number; // Pa
	readonly junctionLoss: number; // Pa
	readonly equipmentLoss: number; // Pa
	readonly outletLoss: number; // Pa
	readonly thermalGravity: number; // Pa, gain in the direction of flow
	readonly loss: number; // Pa, of total pressure
	readonly totalPressure: readonly [number, number]; // Pa
	readonly staticPressure: readonly [number, number]; // Pa
	/** Least spare of all paths through the row [Pa]. */
	readonly spare: number;
	readonly items: readonly Item[];
}

/** From the fan to an outlet, or from an inlet to the fan. */
export interface Path {
	/** Tag of the row with the outlet. */
	readonly outlet: string;
	readonly side: Side;
	/** Tags from the fan outward. */
	readonly rows: readonly string[];
	readonly loss: number; // Pa
	readonly roomPressure: number; // Pa, gauge
	readonly spare: number; // Pa
}

export type FlagRule =
	| 'reynolds-transition'
	| 'no-junction-loss'
	| 'junction-at-fan'
	| 'velocity-main'
	| 'velocity-run-out'
	| 'friction-rate'
	| 'velocity-plausible'
	| 'friction-rate-plausible'
	| 'flexible-length'
	| 'aspect-ratio'
	| 'damper-missing'
	| 'coefficient-range'
	| 'to-be-confirmed'
	| 'fan-flows-differ'
	| 'temperature-mix'
	| 'leakage-not-settled'
	| 'leakage-reversed'
	| 'condensation'
	| 'service-caution'
	| 'fire-damper-caution'
	| 'negative-loss'
	| 'rise-exceeds-length'
	| 'static-loss-at-inlet'
	| 'end-counted-twice'
	| 'flexible-default'
	| 'negative-duty'
	| 'losses-as-entered'
	| 'damper-open-assumed'
	| 'key-not-read';

/** Something an engineer should look at. `row` is null when it concerns the whole design. */
export interface Flag {
	readonly rule: FlagRule;
	readonly row: string | null;
	readonly severity: 'note' | 'caution' | 'fault';
	readonly message: string;
	readonly value?: number;
	readonly threshold?: number;
	/** Where the threshold, or the rule, comes from. */
	readonly basis: string;
}

/** What was found: plain data, finite numbers. Equal after JSON and structuredClone. */
export interface Solution {
	readonly format: 'evendraft/solution@1';
	readonly engineVersion: string;
	readonly mode: 'design';
	readonly air: { readonly density: number; readonly viscosity: number };
	readonly rows: { readonly [tag: string]: SolvedRow };
	readonly paths: readonly Path[];
	/** Outlet of the index path on each side; `return` covers return, exhaust and outdoor. */
	readonly index: { readonly supply: string | null; readonly return: string | null };
	readonly fan: {
		readonly flow: number; // m3/s
		readonly totalPressure: number; // Pa
		readonly supplyPressure: number; // Pa, requirement of the supply side
		readonly returnPressure: number; // Pa, requirement of the other side
		readonly staticPressure: number | null; // Pa; null without a supply row
	};
	readonly totals: { readonly supplyFlow: number; readonly returnFlow: number };
	/**
	 * Mass of air on each side [kg/s]: what passes the fan is what passes the outlets, and the leakage. Absent, as the
	 * leakage is, in solutions that engine 1.0.0 has stored.
	 */
	readonly massBalance?: { readonly supply: MassBalance; readonly return: MassBalance };
	/** Null without a leakage class. */
	readonly leakage?: LeakageSum | null;
	readonly flags: readonly Flag[];
}

export interface MassBalance {
	readonly fan: number; // kg/s
	readonly outlets: number; // kg/s
	readonly leakage: number; // kg/s
}

export interface LeakageSum {
	readonly flow: number; // m3/s, of all rows
	/** Of the fan's flow. */
	readonly share: number;
	readonly surface: number; // m2, of the rows with a class
	/** What a test at this pressure may show [m3/s]; null where no test pressure is named. */
	readonly allowable: number | null;
	readonly testPressure: number | null; // Pa
	/** How often flows and pressures were worked in turn. */
	readonly rounds: number;
}

export type SolveResult =
	{ readonly ok: true; readonly solution: Solution } | { readonly ok: false; readonly problems: readonly Problem[] };
