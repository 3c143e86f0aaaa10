import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Size } from '../shape';
import { editSize, formatSize, readSize, type UnitSystem } from './index';

const round = (diameter: number): Size => ({ shape: 'round', diameter });
const rect = (width: number, height: number): Size => ({ shape: 'rectangular', width, height });
const oval = (width: number, height: number): Size => ({ shape: 'oval', width, height });
const inches = (value: number) => Number((value * 0.0254).toFixed(6));

function understood(text: string, units: UnitSystem) {
	const reading = readSize(text, units);
	if (!reading.ok) throw new Error(`${text}: ${reading.message}`);
	return reading;
}

const shorthand: [string, UnitSystem, Size][] = [
	['24x12', 'IP', rect(0.6096, 0.3048)],
	['24X12', 'IP', rect(0.6096, 0.3048)],
	['24×12', 'IP', rect(0.6096, 0.3048)],
	['24 x 12', 'IP', rect(0.6096, 0.3048)],
	['24/12', 'IP', rect(0.6096, 0.3048)],
	['24*12', 'IP', rect(0.6096, 0.3048)],
	['24"x12"', 'IP', rect(0.6096, 0.3048)],
	['24” × 12”', 'IP', rect(0.6096, 0.3048)],
	['24"x12', 'SI', rect(0.6096, 0.3048)],
	['12x24', 'IP', rect(0.3048, 0.6096)],
	['500x300', 'SI', rect(0.5, 0.3)],
	['500/300', 'SI', rect(0.5, 0.3)],
	['500 × 300', 'SI', rect(0.5, 0.3)],
	['500x300mm', 'IP', rect(0.5, 0.3)],
	['0.6 m x 0.35 m', 'SI', rect(0.6, 0.35)],
	['1 200x600', 'SI', rect(1.2, 0.6)],
	['12"ø', 'IP', round(0.3048)],
	['12ø', 'IP', round(0.3048)],
	['ø12', 'IP', round(0.3048)],
	['12" dia', 'IP', round(0.3048)],
	['12 RD', 'IP', round(0.3048)],
	['12"Ø', 'IP', round(0.3048)],
	['12″⌀', 'SI', round(0.3048)],
	['12R', 'IP', round(0.3048)],
	['φ12', 'IP', round(0.3048)],
	['12 1/2"', 'IP', round(0.3175)],
	['1/2"', 'SI', round(0.0127)],
	['17 1/2"x9 3/8"', 'SI', rect(0.4445, 0.238125)],
	['17-1/2 x 9-3/8 in', 'SI', rect(0.4445, 0.238125)],
	['9-3/8 in', 'SI', round(0.238125)],
	['17½” × 9⅜”', 'SI', rect(0.4445, 0.238125)],
	['17 1/2 x 9 3/8', 'IP', rect(0.4445, 0.238125)],
	['oval 20 1/4"x10"', 'IP', oval(0.51435, 0.254)],
	['3 5/64"', 'IP', round(0.078184375)],
	['1\'-0 1/2"', 'IP', round(0.3175)],
	['24-1/2"', 'SI', round(0.6223)],
	['24/2', 'IP', rect(0.6096, 0.0508)],
	['=24-1/2', 'IP', round(0.5969)],
	['12', 'IP', round(0.3048)],
	['Ø315', 'SI', round(0.315)],
	['315', 'SI', round(0.315)],
	['DN315', 'SI', round(0.315)],
	['DN315', 'IP', round(0.315)],
	['D315', 'SI', round(0.315)],
	['d=315', 'SI', round(0.315)],
	['250dia', 'SI', round(0.25)],
	['ø200', 'SI', round(0.2)],
	['125', 'SI', round(0.125)],
	['Ø 160,5', 'SI', round(0.1605)],
	['=250+65', 'SI', round(0.315)],
	['20x10 FO', 'IP', oval(0.508, 0.254)],
	['20/10 OV', 'IP', oval(0.508, 0.254)],
	['510x255 oval', 'SI', oval(0.51, 0.255)],
	['oval 20x10', 'IP', oval(0.508, 0.254)],
	['(600×350)', 'SI', rect(0.6, 0.35)],
	['600х350', 'SI', rect(0.6, 0.35)],
	['24"W x 12"H', 'IP', rect(0.6096, 0.3048)],
	['12"H x 24"W', 'IP', rect(0.6096, 0.3048)],
	['600w x 350h', 'SI', rect(0.6, 0.35)],
	['12" sq', 'IP', rect(0.3048, 0.3048)],
	['2\'-0"x1\'-0"', 'IP', rect(0.6096, 0.3048)]
];

describe('a fraction of an inch', () => {
	it('is said as a decimal, without doubt of the point, and offered again as it was typed', () => {
		const reading = understood('9-3/8 in', 'SI');
		expect(reading.words).toContain('9.375 in');
		expect(reading.why).not.toContain('point');
		expect(reading.other).toBe('9-3/8 in x 9-3/8 in');
		expect(readSize(reading.other ?? '', 'SI')).toMatchObject({ value: rect(0.238125, 0.238125) });
	});

	it.each(['17 1/2', '12 1/2 x 8', '17-1/2'])('%s is asked for its sign in a metric design', (text) =>
		expect(readSize(text, 'SI')).toMatchObject({ ok: false, message: expect.stringContaining('needs its sign') })
	);
});

describe('trade shorthand of sizes', () => {
	it.each(shorthand)('%s in %s', (text, units, size) => {
		expect(understood(text, units).value).toEqual(size);
	});

	it.each([
		['10"FLEX', 'IP', round(0.254), 'flexible'],
		['Ø250 flexi', 'SI', round(0.25), 'flexible'],
		['24x12 L', 'IP', rect(0.6096, 0.3048), 'lined'],
		['24x12 (lined)', 'IP', rect(0.6096, 0.3048), 'lined'],
		['24x12 1"LINED', 'IP', rect(0.6096, 0.3048), 'lined 1 in'],
		['24x12 1"L', 'IP', rect(0.6096, 0.3048), 'lined 1 in'],
		['(E)24x12', 'IP', rect(0.6096, 0.3048), 'existing'],
		['24x12 EX.', 'IP', rect(0.6096, 0.3048), 'existing'],
		['8"NK', 'IP', round(0.2032), 'neck of a terminal'],
		['neck 200', 'SI', round(0.2), 'neck of a terminal']
	] as const)('%s keeps its note in the words', (text, units, size, note) => {
		const reading = understood(text, units);
		expect(reading.value).toEqual(size);
		expect(reading.words.endsWith(`, ${note}`)).toBe(true);
	});

	it.each([
		['600x350', 'SI', 'rectangular, 600 mm wide × 350 mm high'],
		['Ø160', 'SI', 'Ø160 round, 160 mm inside'],
		['12"', 'SI', 'Ø305 round, 12 in (304.8 mm) inside'],
		['8"ø', 'IP', 'Ø8 round, 8 in inside'],
		['oval 510x255', 'SI', 'flat oval, 510 mm wide × 255 mm high']
	] as const)('%s is said in full words', (text, units, words) => expect(understood(text, units).words).toBe(words));
});

describe('doubt about a size', () => {
	it('says why one figure is round and offers the square', () => {
		const reading = understood('160', 'SI');
		expect(reading.why).toContain('read from “160” as round because');
		expect(understood(reading.other ?? '', 'SI').value).toEqual(rect(0.16, 0.16));
	});

	it.each([
		['24x12', 'SI', rect(inches(24), inches(12))],
		['12', 'SI', round(inches(12))],
		['600x350', 'IP', rect(0.6, 0.35)],
		['ø315', 'IP', round(0.315)],
		['oval 510x255', 'IP', oval(0.51, 0.255)]
	] as const)('offers %s in the other unit where %s makes no duct of it', (text, units, size) => {
		const { why, other } = understood(text, units);
		expect(why).toContain(units);
		expect(understood(other ?? '', units).value).toEqual(size);
	});

	it('has no doubt about a marked size of a usual duct', () => {
		expect(understood('600x350', 'SI')).toMatchObject({ why: null, other: null });
		expect(understood('Ø200', 'SI')).toMatchObject({ why: null, other: null });
	});
});

describe('what is no size', () => {
	it.each([
		...['24xx12', 'x12', '24x', '0', '0x200', '600x0', '-200', '600x-350', 'abc', '30000', '25000x300', '5', '1x2x3'],
		...[
			'NaN',
			'Infinity',
			'-Infinity',
			'round',
			'oval',
			'160 oval',
			'24x12 furlongs',
			'1e300',
			'24 12',
			'(',
			'ø',
			'20 Pa'
		]
	])('%s is refused by its name', (text) => {
		const reading = readSize(text, 'SI');
		expect(reading.ok).toBe(false);
		if (!reading.ok) {
			expect(reading.message).toContain(`“${text}”`);
			expect(reading.expected).toContain('such as');
		}
	});

	it.each(['', '   ', '\u00a0'])('nothing typed is refused', (text) => {
		expect(readSize(text, 'IP')).toMatchObject({ ok: false, message: 'Nothing is typed.' });
	});
});

const mm = fc.integer({ min: 10, max: 20_000 });
const tenths = fc.integer({ min: 4, max: 7_870 });
const sizesFrom = (side: fc.Arbitrary<number>): fc.Arbitrary<Size> =>
	fc.oneof(
		side.map(round),
		fc.tuple(side, side).map(([w, h]) => rect(w, h)),
		fc.tuple(side, side).map(([w, h]) => oval(w, h))
	);
const anySide = fc.double({ min: 0.011, max: 19.9, noNaN: true });

describe('sizes shown and read again', () => {
	it('come back from whole millimetres', () => {
		fc.assert(
			fc.property(sizesFrom(mm.map((value) => value / 1000)), (size) => {
				expect(understood(formatSize(size, 'SI'), 'SI').value).toEqual(size);
			})
		);
	});

	it('come back from tenths of an inch', () => {
		const sides = tenths.map((value) => Number((value * 0.00254).toFixed(7)));
		fc.assert(
			fc.property(sizesFrom(sides), (size) => {
				expect(understood(formatSize(size, 'IP'), 'IP').value).toEqual(size);
			})
		);
	});

	it('come back to the last bit from the text for editing, in either system', () => {
		fc.assert(
			fc.property(sizesFrom(anySide), fc.constantFrom<UnitSystem>('SI', 'IP'), (size, units) => {
				expect(understood(editSize(size, units), units).value).toEqual(size);
			})
		);
	});

	it('are never a throw, whatever is typed', () => {
		const typed = fc.oneof(
			fc.string({ unit: 'binary', maxLength: 60 }),
			fc.string({ unit: fc.constantFrom(...'0123456789.,xX*/ ø"\'=()-+eEFOdovalflexin'.split('')), maxLength: 40 })
		);
		fc.assert(
			fc.property(typed, fc.constantFrom<UnitSystem>('SI', 'IP'), (text, units) => {
				const reading = readSize(text, units);
				const sides = reading.ok ? Object.values(reading.value).filter((side) => typeof side === 'number') : [];
				expect(sides.every((side) => side >= 0.01 && side <= 20)).toBe(true);
				expect(reading.ok || reading.message.length * reading.expected.length > 0).toBe(true);
			}),
			{ numRuns: 1000 }
		);
	}, 30_000);
});
