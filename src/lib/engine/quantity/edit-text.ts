import type { Size } from '../shape';
import { COLUMNS } from './columns';
import type { FigureName } from './format';
import type { UnitSystem } from './reading';
import { fromSI, toSI, type Unit } from './units';

/**
 * Text for a cell whose value was not typed (it was imported, or sized): the fewest digits that read back to the
 * same SI value, without grouping.
 */
export function editText(name: FigureName, value: number, units: UnitSystem): string {
	const digits = exactDigits(value, COLUMNS[name][units].unit);
	// A whole number of metres could be read as millimetres, a part of a per cent as a part of one.
	if (name === 'length' && units === 'SI' && /^-?\d+$/.test(digits)) return `${digits}.0`;
	return name === 'humidity' ? `${digits} %` : digits;
}

/** A size as a person would type it; reads back to the same SI values. */
export function editSize(size: Size, units: UnitSystem): string {
	const side = (metres: number) => exactDigits(metres, COLUMNS.size[units].unit);
	if (size.shape === 'round') return `ø${side(size.diameter)}`;
	const sides = `${side(size.width)}x${side(size.height)}`;
	return size.shape === 'oval' ? `oval ${sides}` : sides;
}

function exactDigits(value: number, unit: Unit): string {
	if (!Number.isFinite(value)) return '';
	const shown = fromSI(value, unit);
	for (let digits = 1; digits <= 25; digits += 1) {
		const short = shown.toSignificantDigits(digits);
		if (toSI(short, unit).toNumber() === value) return short.toFixed();
	}
	return shown.toFixed();
}
