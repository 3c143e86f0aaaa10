import { Decimal } from './decimal';
import type { UnitSystem } from './reading';

const THIN_SPACE = '\u2009';
const MINUS = '\u2212';
/** What stands where there is nothing. */
export const NOTHING = '\u2013';

function grouped(digits: string, units: UnitSystem): string {
	if (digits.length < 4) return digits;
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

/** Of the last digit shown: nearer than this to a tie, a double cannot say which way to round. */
const NEAR_A_TIE = 1e-6;
/** Last digits up to here are whole numbers that a double holds, with room for its error. */
const MOST_UNITS = 1e9;
/** Last digits in one, by the number of decimals. */
const SCALES: readonly number[] = [1, 10, 100, 1e3, 1e4, 1e5, 1e6];

/**
 * As `fixedDigits` of a figure that a double comes close to, without decimal arithmetic; null where that could round
 * another way. A sheet shows some hundred figures with each edit.
 */
export function quickDigits(near: number, decimals: number, units: UnitSystem): string | null {
	const scale = SCALES[decimals] ?? Infinity;
	const last = Math.abs(near) * scale;
	if (!(last < MOST_UNITS) || Math.abs(last - Math.floor(last) - 0.5) < NEAR_A_TIE) return null;
	const plain = (Math.floor(last + 0.5) / scale).toFixed(decimals);
	return lettered(near < 0 ? `-${plain}` : plain, units);
}

/** With as many decimals as it has, up to so many significant digits. */
export function shortDigits(value: Decimal | number, significant: number, units: UnitSystem): string {
	return lettered(new Decimal(value).toSignificantDigits(significant).toFixed(), units);
}
