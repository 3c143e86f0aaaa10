import type { Size } from '../shape';
import type {
	CubicMetrePerSecond,
	Degree,
	DegreeCelsius,
	KilogramPerCubicMetre,
	Metre,
	MetrePerSecond,
	Pascal,
	PascalPerMetre,
	Ratio
} from './quantity';
import type { Reader, UnitSystem } from './reading';

export * from './quantity';
export type { Reader, Reading, UnitSystem } from './reading';

export type QuantityName =
	| 'flow'
	| 'velocity'
	| 'pressure'
	| 'rate'
	| 'size'
	| 'length'
	| 'elevation'
	| 'roughness'
	| 'density'
	| 'temperature'
	| 'humidity'
	| 'area'
	| 'mass'
	| 'power'
	| 'angle'
	| 'coefficient';

export declare const readSize: Reader<Size>;
export declare const readFlow: Reader<CubicMetrePerSecond>;
export declare const readLength: Reader<Metre>;
/** Signed: the far end less the fan end. */
export declare const readRise: Reader<Metre>;
/** A loss: zero or more. */
export declare const readPressure: Reader<Pascal>;
/** A gauge pressure of a room: may be negative. */
export declare const readRoomPressure: Reader<Pascal>;
export declare const readRate: Reader<PascalPerMetre>;
export declare const readVelocity: Reader<MetrePerSecond>;
export declare const readTemperature: Reader<DegreeCelsius>;
export declare const readNumber: Reader<number>;
export declare const readElevation: Reader<Metre>;
export declare const readDensity: Reader<KilogramPerCubicMetre>;
export declare const readHumidity: Reader<Ratio>;
export declare const readRoughness: Reader<Metre>;
export declare const readAngle: Reader<Degree>;

type Shown = number | null | undefined;
export declare function formatFlow(value: Shown, units: UnitSystem): string;
export declare function formatVelocity(value: Shown, units: UnitSystem): string;
export declare function formatPressure(value: Shown, units: UnitSystem): string;
export declare function formatRate(value: Shown, units: UnitSystem): string;
export declare function formatLength(value: Shown, units: UnitSystem): string;
export declare function formatElevation(value: Shown, units: UnitSystem): string;
export declare function formatRoughness(value: Shown, units: UnitSystem): string;
export declare function formatDensity(value: Shown, units: UnitSystem): string;
export declare function formatTemperature(value: Shown, units: UnitSystem): string;
export declare function formatHumidity(value: Shown, units: UnitSystem): string;
export declare function formatArea(value: Shown, units: UnitSystem): string;
export declare function formatMass(value: Shown, units: UnitSystem): string;
export declare function formatPower(value: Shown, units: UnitSystem): string;
export declare function formatAngle(value: Shown, units: UnitSystem): string;
export declare function formatCoefficient(value: Shown): string;
export declare function formatSize(size: Size | null | undefined, units: UnitSystem): string;
/** Any of the above by name. */
export declare function formatQuantity(name: Exclude<QuantityName, 'size'>, value: Shown, units: UnitSystem): string;
/** Text to put in a cell for editing where nothing was typed (an import): all its digits, no grouping; reads back to the same value. */
export declare function editText(name: Exclude<QuantityName, 'size'>, value: number, units: UnitSystem): string;
export declare function editSize(size: Size, units: UnitSystem): string;
/** Label of the unit in a column's head. */
export declare function unitOf(name: QuantityName, units: UnitSystem): string;
