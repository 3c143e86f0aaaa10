import type { Size } from '../shape';
import { COLUMNS, type QuantityName } from './columns';
import { Decimal } from './decimal';
import { fixedDigits, NOTHING, quickDigits, shortDigits } from './digits';
import type { UnitSystem } from './reading';
import { fromSI, nearSI } from './units';

/** An SI value, or nothing. */
export type Shown = number | null | undefined;
export type FigureName = Exclude<QuantityName, 'size'>;

const absent = (value: Shown): value is null | undefined =>
	value === null || value === undefined || !Number.isFinite(value);

/**
 * An SI value as the screens and the pages show it: the column's own unit, a fixed number of decimals, thin spaces
 * (SI) or commas (IP) between thousands, a true minus, an en rule for nothing. The unit stands in the head.
 */
export function formatQuantity(name: FigureName, value: Shown, units: UnitSystem): string {
	if (absent(value)) return NOTHING;
	const { unit, decimals } = COLUMNS[name][units];
	return quickDigits(nearSI(value, unit), decimals, units) ?? fixedDigits(fromSI(value, unit), decimals, units);
}

const formatter = (name: FigureName) => (value: Shown, units: UnitSystem) => formatQuantity(name, value, units);

export const formatVelocity = formatter('velocity');
export const formatPressure = formatter('pressure');
export const formatRate = formatter('rate');
export const formatLength = formatter('length');
export const formatElevation = formatter('elevation');
export const formatRoughness = formatter('roughness');
export const formatDensity = formatter('density');
export const formatViscosity = formatter('viscosity');
export const formatHumidity = formatter('humidity');
export const formatArea = formatter('area');
export const formatMass = formatter('mass');
export const formatPower = formatter('power');
export const formatAngle = formatter('angle');

/** A loss coefficient, two decimals in both systems. */
export function formatCoefficient(value: Shown): string {
	return formatQuantity('coefficient', value, 'SI');
}

/** Whole; one decimal only for a small flow that is not whole in its unit. */
export function formatFlow(value: Shown, units: UnitSystem): string {
	if (absent(value)) return NOTHING;
	const { unit } = COLUMNS.flow[units];
	const near = nearSI(value, unit);
	const quick = Math.abs(near) > 11 ? quickDigits(near, 0, units) : null;
	if (quick !== null) return quick;
	const shown = fromSI(value, unit);
	const tenths = shown.abs().lt(10) && !shown.toDecimalPlaces(1).isInteger();
	return fixedDigits(shown, tenths ? 1 : 0, units);
}

/** Whole degrees without a decimal, others with one; it never stands in a column. */
export function formatTemperature(value: Shown, units: UnitSystem): string {
	if (absent(value)) return NOTHING;
	const { unit, decimals } = COLUMNS.temperature[units];
	return shortTo(fromSI(value, unit), decimals, units);
}

/** `600×350` or `Ø200`: whole mm, or inches with a decimal where one is needed. What is stored stays. */
export function formatSize(size: Size | null | undefined, units: UnitSystem): string {
	if (!size) return NOTHING;
	const { unit, decimals } = COLUMNS.size[units];
	const side = (metres: number) => (Number.isFinite(metres) ? shortTo(fromSI(metres, unit), decimals, units) : NOTHING);
	if (size.shape === 'round') return `Ø${side(size.diameter)}`;
	const sides = `${side(size.width)}×${side(size.height)}`;
	return size.shape === 'oval' ? `oval ${sides}` : sides;
}

function shortTo(value: Decimal, decimals: number, units: UnitSystem): string {
	// A size is written closed up, as the trade does: 1200×600.
	return shortDigits(value.toDecimalPlaces(decimals), 15, units).replace(/[\u2009,](?=\d{3})/g, '');
}
