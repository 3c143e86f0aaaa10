import { readFileSync } from 'node:fs';
import { inflateSync } from 'node:zlib';

/** What a font file can print, read from its own tables: enough to choose a face for each run and to fit a text. */
export interface FontFile {
	has(codePoint: number): boolean;
	/** Width of a text at a size [pt], without kerning. */
	widthOf(text: string, size: number): number;
}

/**
 * Reads a TrueType or OpenType font (TTF, OTF) or its WOFF wrapping.
 * @throws {Error} when the file is neither, or has no Unicode map of characters
 * @source OpenType specification: tables cmap (formats 4 and 12), head, hhea, hmtx; W3C WOFF 1.0
 */
export function readFontFile(path: string): FontFile {
	const table = tablesOf(readFileSync(path), path);
	const glyphs = glyphsOf(table('cmap'), path);
	const unitsPerEm = table('head').readUInt16BE(18);
	const long = table('hhea').readUInt16BE(34);
	const metrics = table('hmtx');
	const advance = (glyph: number) => metrics.readUInt16BE(4 * Math.min(glyph, long - 1)) / unitsPerEm;
	return {
		has: (codePoint) => glyphs.has(codePoint),
		widthOf: (text, size) => {
			let ems = 0;
			for (const character of text) ems += advance(glyphs.get(character.codePointAt(0) ?? 0) ?? 0);
			return ems * size;
		}
	};
}

function tablesOf(file: Buffer, path: string): (tag: string) => Buffer {
	const signature = file.toString('latin1', 0, 4);
	const woff = signature === 'wOFF';
	if (!woff && signature !== '\0\x01\0\0' && signature !== 'OTTO') throw new Error(`${path}: no TrueType or WOFF font`);
	const count = file.readUInt16BE(woff ? 12 : 4);
	const entrySize = woff ? 20 : 16;
	const found = new Map<string, Buffer>();
	for (let i = 0; i < count; i += 1) {
		const at = (woff ? 44 : 12) + i * entrySize;
		const tag = file.toString('latin1', at, at + 4);
		if (!['cmap', 'head', 'hhea', 'hmtx'].includes(tag)) continue;
		const offset = file.readUInt32BE(at + (woff ? 4 : 8));
		const packed = file.readUInt32BE(at + (woff ? 8 : 12));
		const length = file.readUInt32BE(at + 12);
		const bytes = file.subarray(offset, offset + packed);
		found.set(tag, woff && packed < length ? inflateSync(bytes) : bytes);
	}
	return (tag) => {
		const bytes = found.get(tag);
		if (bytes === undefined) throw new Error(`${path}: table ${tag} is missing`);
		return bytes;
	};
}

/** Glyph of each code point; the widest map of the font is read. */
function glyphsOf(cmap: Buffer, path: string): ReadonlyMap<number, number> {
	const offsets = new Map<number, number>();
	for (let i = 0; i < cmap.readUInt16BE(2); i += 1) {
		const offset = cmap.readUInt32BE(4 + 8 * i + 4);
		offsets.set(cmap.readUInt16BE(offset), offset);
	}
	const segmented = offsets.get(12);
	if (segmented !== undefined) return groupsOf(cmap.subarray(segmented));
	const basic = offsets.get(4);
	if (basic !== undefined) return segmentsOf(cmap.subarray(basic));
	throw new Error(`${path}: no Unicode map of characters`);
}

function groupsOf(map: Buffer): ReadonlyMap<number, number> {
	const glyphs = new Map<number, number>();
	for (let i = 0; i < map.readUInt32BE(12); i += 1) {
		const [first, last, glyph] = [0, 4, 8].map((step) => map.readUInt32BE(16 + 12 * i + step)) as [
			number,
			number,
			number
		];
		for (let code = first; code <= last; code += 1) glyphs.set(code, glyph + code - first);
	}
	return glyphs;
}

function segmentsOf(map: Buffer): ReadonlyMap<number, number> {
	const glyphs = new Map<number, number>();
	const twice = map.readUInt16BE(6);
	for (let i = 0; i < twice; i += 2) {
		const last = map.readUInt16BE(14 + i);
		const first = map.readUInt16BE(16 + twice + i);
		const delta = map.readUInt16BE(16 + 2 * twice + i);
		const at = 16 + 3 * twice + i;
		const range = map.readUInt16BE(at);
		for (let code = first; code <= last && code !== 0xffff; code += 1) {
			const raw = range === 0 ? code : map.readUInt16BE(at + range + 2 * (code - first));
			const glyph = raw === 0 ? 0 : (raw + delta) & 0xffff;
			if (glyph !== 0) glyphs.set(code, glyph);
		}
	}
	return glyphs;
}
