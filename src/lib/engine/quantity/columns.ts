import type { UnitSystem } from './reading';
import { UNITS as U, type Unit } from './units';

/** How one quantity is shown in one system: the unit and the decimals, the same down a whole column. */
export interface Column {
	readonly unit: Unit;
	readonly decimals: number;
	/** Of the column's head, where the unit's own is too long. */
	readonly label: string;
}

const column = (unit: Unit, decimals: number): Column => ({ unit, decimals, label: unit.label });

/** Every quantity that a screen or a page shows. */
export const COLUMNS = {
	flow: { SI: column(U.litrePerSecond, 0), IP: column(U.cfm, 0) },
	velocity: { SI: column(U.metrePerSecond, 2), IP: column(U.fpm, 0) },
	pressure: { SI: column(U.pascal, 1), IP: column(U.inchOfWater, 3) },
	rate: { SI: column(U.pascalPerMetre, 2), IP: column(U.inchPerHundredFeet, 3) },
	size: { SI: column(U.millimetre, 0), IP: column(U.inch, 1) },
	length: { SI: column(U.metre, 1), IP: column(U.foot, 1) },
	elevation: { SI: column(U.metre, 0), IP: column(U.foot, 0) },
	roughness: { SI: column(U.millimetre, 3), IP: column(U.foot, 5) },
	density: { SI: column(U.kilogramPerCubicMetre, 2), IP: column(U.poundPerCubicFoot, 4) },
	viscosity: { SI: column(U.micropascalSecond, 2), IP: column(U.poundPerFootHour, 4) },
	temperature: { SI: column(U.celsius, 1), IP: column(U.fahrenheit, 1) },
	humidity: { SI: column(U.percent, 0), IP: column(U.percent, 0) },
	area: { SI: column(U.squareMetre, 1), IP: column(U.squareFoot, 0) },
	mass: { SI: column(U.kilogram, 1), IP: column(U.pound, 0) },
	power: { SI: column(U.kilowatt, 2), IP: column(U.horsepower, 2) },
	angle: { SI: column(U.degree, 0), IP: column(U.degree, 0) },
	coefficient: { SI: column(U.one, 2), IP: column(U.one, 2) }
} as const satisfies Record<string, Record<UnitSystem, Column>>;

export type QuantityName = keyof typeof COLUMNS;

/** Label of the unit in the head of a column: the body carries figures alone. */
export function unitOf(name: QuantityName, units: UnitSystem): string {
	return COLUMNS[name][units].label;
}
