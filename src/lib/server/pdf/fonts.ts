import { createRequire } from 'node:module';
import { readFontFile, type FontFile } from './font-file';

/** Names under which the faces are known in a document. */
export const SANS = 'Sofia Sans';
export const STRONG = 'Sofia Sans Strong';
export const NARROW = 'Sofia Sans Condensed';
export type Family = typeof SANS | typeof STRONG | typeof NARROW;
export type Weight = 'normal' | 'bold';

// The packages stay outside the bundle, so their files are found from wherever the server's code lies in the project.
const { resolve } = createRequire(import.meta.url);
const sans = (weight: number, name: string) =>
	resolve(`@expo-google-fonts/sofia-sans/${weight}${name}/SofiaSans_${weight}${name}.ttf`);
const narrow = (weight: number) =>
	resolve(`@fontsource/sofia-sans-condensed/files/sofia-sans-condensed-latin-${weight}-normal.woff`);

/** Files of each family: the full TrueType faces, and the condensed face, which is a Latin subset. */
export function fontPaths(): Record<Family, Record<Weight, string>> {
	return {
		[SANS]: { normal: sans(400, 'Regular'), bold: sans(600, 'SemiBold') },
		[STRONG]: { normal: sans(500, 'Medium'), bold: sans(700, 'Bold') },
		[NARROW]: { normal: narrow(500), bold: narrow(600) }
	};
}

const open = new Map<string, FontFile>();

/** A face as read from its file, once for the life of the process. */
export function face(family: Family, weight: Weight): FontFile {
	const key = `${family} ${weight}`;
	const known = open.get(key) ?? readFontFile(fontPaths()[family][weight]);
	open.set(key, known);
	return known;
}
