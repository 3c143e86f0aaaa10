/**
 * The working sheet of a design: rows of cells as a person typed them, each with what was understood.
 * Plain data; never changed in place.
 */
import type { Size, UnitSystem } from '$lib/engine';
import type { Parts } from './parts';

export const SHEET_FORMAT = 'evendraft/sheet@1';

/** Rows of one sheet, at most. */
export const MOST_ROWS = 5_000;

/** What the outlet at a row's far end loses. */
export interface OutletLoss {
	/** Total-pressure loss [Pa]; null: by its coefficient, or an open end, of one velocity pressure. */
	readonly loss: number | null;
	readonly lossIs: 'total' | 'static';
	/** On the velocity pressure of the duct. */
	readonly coefficient?: number;
	/** What it is, as 'Grille'. */
	readonly description?: string;
	readonly toBeConfirmed: boolean;
}

/** A liner inside the metal, and which of the two the size of the row is. */
export interface Lining {
	/** [m] */
	readonly thickness: number;
	readonly sizeIs: 'clear' | 'metal';
}

/** What a cell of each column holds once understood; SI units. */
export interface RowValues {
	tag: string;
	/** Tag of the row on the fan's side. */
	joins: string;
	side: 'supply' | 'return' | 'exhaust' | 'outdoor';
	serves: string;
	/** Design flow of the outlet [m3/s]. */
	flow: number;
	size: Size;
	/** On the centre line [m]. */
	length: number;
	/** Of the far end over the fan end [m]. */
	rise: number;
	/** Of flexible duct [m]. */
	flex: number;
	/** Key of the engine's catalogue of materials. */
	material: string;
	lining: Lining;
	/** A class as the setting has it. */
	leakage: string;
	/** Of the air in the row and those beyond it [degC]. */
	temperature: number;
	parts: Parts;
	outlet: OutletLoss;
	/** Of the room, gauge [Pa]. */
	pressure: number;
}

/** Setting of the method of an entry of the catalogue, by its key. */
export type MethodField = `method-${string}`;

/** What the settings of a design hold; SI units. */
export interface SettingValues {
	title: string;
	units: UnitSystem;
	service: 'general' | 'kitchen-grease' | 'laboratory' | 'hazardous' | 'smoke-control';
	/** Of the air in the ducts [degC]. */
	temperature: number;
	/** Relative, 0 to 1. */
	humidity: number;
	/** Above sea level [m]. */
	elevation: number;
	/** Given density [kg/m3]; overrides the three above. */
	density: number;
	/** Of the air around the ducts [degC]; for thermal gravity. */
	surroundings: number;
	material: string;
	/** Flexible duct loses this many times the rigid rate. */
	flexFactor: number;
	/** What flexible duct lacks of its stretched length, 0 to 0.6. */
	flexCompression: number;
	/** A class of the list by its key, or an inch-pound class as `CL24`. */
	leakage: string;
	/** At which the allowable leakage is told [Pa]. */
	testPressure: number;
	/** Of what air the flows of outlets are. */
	flowBasis: 'actual' | 'standard';
	/** Of the air of standard flows [kg/m3]. */
	standardDensity: number;
	/** Keys of methods, by their authors. */
	[method: MethodField]: string;
	mainVelocity: number;
	runOutVelocity: number;
	frictionRate: number;
	flexibleLength: number;
	aspectRatio: number;
	damperAtOutlet: boolean;
}

export type RowField = keyof RowValues;
export type SettingField = keyof SettingValues;

/** One cell: the text as typed, the units in force then, and the value; null where it was not understood. */
export interface Cell<T> {
	readonly typed: string;
	readonly units: UnitSystem;
	readonly value: T | null;
}

export type RowCells = { readonly [F in RowField]?: Cell<RowValues[F]> };
export type SettingCells = { readonly [F in SettingField]?: Cell<SettingValues[F]> };

export interface SheetRow {
	/** Made by whoever inserted the row; stays for its life. */
	readonly id: string;
	readonly cells: RowCells;
}

export interface Sheet {
	readonly format: typeof SHEET_FORMAT;
	readonly settings: SettingCells;
	readonly rows: readonly SheetRow[];
}

export const EMPTY_SHEET: Sheet = { format: SHEET_FORMAT, settings: {}, rows: [] };

/** What holds where a setting was not typed. */
export const DEFAULT_SETTINGS = {
	units: 'SI',
	temperature: 20,
	humidity: 0.5,
	elevation: 0,
	material: 'galvanized-steel'
} as const satisfies Partial<SettingValues>;

/** The value of a setting, or its default, or null where there is none. */
export function settingOf<F extends SettingField>(sheet: Sheet, field: F): SettingValues[F] | null {
	const value = sheet.settings[field]?.value;
	if (value !== undefined && value !== null) return value as SettingValues[F];
	return (DEFAULT_SETTINGS as Partial<SettingValues>)[field] ?? null;
}

/** The units in which the sheet is shown. */
export const unitsOf = (sheet: Sheet): UnitSystem => settingOf(sheet, 'units') ?? 'SI';

/** The understood value of a row's cell; null where it is blank or not understood. */
export function valueOf<F extends RowField>(row: SheetRow, field: F): RowValues[F] | null {
	return (row.cells[field]?.value as RowValues[F] | null | undefined) ?? null;
}
