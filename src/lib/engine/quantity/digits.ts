import { Decimal } from './decimal';
import type { UnitSystem } from './reading';

const THIN_SPACE = '\u2009';
const MINUS = '\u2212';
/** What stands where there is nothing. */
export const NOTHING = '\u2013';

function grouped(digits: string, units: UnitSystem): string {
	return digits.replace(/\B(?=(\d{3})+$)/g, units === 'SI' ? THIN_SPACE : ',');
}

function lettered(plain: string, units: UnitSystem): string {
	const [whole = '', part] = plain.replace('-', '').split('.');
	const sign = plain.startsWith('-') && /[1-9]/.test(plain) ? MINUS : '';
	return `${sign}${grouped(whole, units)}${part === undefined ? '' : `.${part}`}`;
}

/** With a fixed number of decimals, grouped as the system does, with a true minus and never minus zero. */
export function fixedDigits(value: Decimal | number, decimals: number, units: UnitSystem): string {
	return lettered(new Decimal(value).toFixed(decimals), units);
}

/** With as many decimals as it has, up to so many significant digits. */
export function shortDigits(value: Decimal | number, significant: number, units: UnitSystem): string {
	return lettered(new Decimal(value).toSignificantDigits(significant).toFixed(), units);
}
