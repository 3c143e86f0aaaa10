import { readPressure, type Reader } from '$lib/engine';
import type { OutletLoss } from './sheet';

const OPEN = /^(open|open end|o)$/i;
const BASIS = /\b(total|static|tp|sp)\b/gi;

/**
 * The loss of an outlet at its design flow: `16`, `16 Pa total`, `12 static`, `0.06"`, `open`; a `?` at the end
 * marks it as to be confirmed. A figure with no basis is a total pressure, as the head of the column says.
 */
export const readOutlet: Reader<OutletLoss> = (text, units) => {
	const toBeConfirmed = text.trim().endsWith('?');
	const rest = text.replace(/\?\s*$/, '').trim();
	const mark = toBeConfirmed ? ', to be confirmed' : '';
	if (OPEN.test(rest)) {
		const value: OutletLoss = { loss: null, lossIs: 'total', toBeConfirmed };
		return { ok: true, value, words: `open end, one velocity pressure${mark}`, why: null, other: null };
	}
	const named = [...rest.matchAll(BASIS)].map(([word]) => word.toLowerCase()[0]);
	const lossIs = named.includes('s') ? 'static' : 'total';
	const pressure = readPressure(rest.replace(BASIS, '').trim(), units);
	if (!pressure.ok) return { ...pressure, expected: `${pressure.expected}, or “open”` };
	return {
		...pressure,
		value: { loss: pressure.value, lossIs, toBeConfirmed },
		words: `${pressure.words}, ${lossIs} pressure${lossIs === 'static' ? ' and the velocity pressure of the duct' : ''}${mark}`
	};
};
