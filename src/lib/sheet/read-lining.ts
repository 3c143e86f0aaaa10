import { editSize, plainSigns, readLength, refusal, type Reader, type UnitSystem } from '$lib/engine';
import type { Lining } from './sheet';

/** Liners are some 13 to 100 mm thick, common practice [m]. */
const MOST = 0.3;
const expected = (units: UnitSystem) =>
	units === 'SI' ? 'a thickness, such as 25 or 25 metal' : 'a thickness, such as 1 or 1 metal';

/** Thickness [m], in mm or inches where no unit is typed; `metal` behind it where the size of the row is that of the metal. */
export const readLining: Reader<Lining> = (text, units) => {
	const typed = plainSigns(text).toLowerCase();
	const sizeIs = /\bmetal\b/.test(typed) ? 'metal' : 'clear';
	const figure = typed.replace(/\b(?:metal|clear)\b/g, ' ').trim();
	const reading = readLength(/^[\d.,]+$/.test(figure) ? `${figure} ${units === 'SI' ? 'mm' : 'in'}` : figure, units);
	if (!reading.ok)
		return { ok: false, message: refusal(text, 'is not understood as a thickness'), expected: expected(units) };
	const thickness = reading.value;
	const refuse = (why: string) => ({ ok: false, message: refusal(text, why), expected: expected(units) }) as const;
	if (thickness === 0) return refuse('a duct without a lining has a blank here');
	if (thickness > MOST) return refuse(`too thick for a lining (most ${units === 'SI' ? '300 mm' : '12 in.'})`);
	const shown = `${thicknessText(thickness, units)} ${units === 'SI' ? 'mm' : 'in.'}`;
	const [words, why] =
		sizeIs === 'metal'
			? [`${shown}, inside the size`, 'The size of the row is that of the metal: the air has less.']
			: [
					`${shown}, around the size`,
					'The size of the row is the free one; type metal behind it where it is the metal’s.'
				];
	return { ok: true, value: { thickness, sizeIs }, words, why, other: null };
};

/** As the sheet shows it: mm or inches. */
export function thicknessText(thickness: number, units: UnitSystem): string {
	return String(units === 'SI' ? Number((thickness * 1000).toFixed(1)) : Number((thickness / 0.0254).toFixed(2)));
}

/** With all its digits, to be read back. */
export function liningToEdit({ thickness, sizeIs }: Lining, units: UnitSystem): string {
	const figure = editSize({ shape: 'round', diameter: thickness }, units).slice(1);
	return sizeIs === 'metal' ? `${figure} metal` : figure;
}
