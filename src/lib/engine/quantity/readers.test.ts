import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import * as quantity from './index';
import type { Reader, UnitSystem } from './index';

const readers = {
	flow: quantity.readFlow as Reader<number>,
	length: quantity.readLength as Reader<number>,
	rise: quantity.readRise as Reader<number>,
	elevation: quantity.readElevation as Reader<number>,
	roughness: quantity.readRoughness as Reader<number>,
	pressure: quantity.readPressure as Reader<number>,
	room: quantity.readRoomPressure as Reader<number>,
	rate: quantity.readRate as Reader<number>,
	velocity: quantity.readVelocity as Reader<number>,
	temperature: quantity.readTemperature as Reader<number>,
	density: quantity.readDensity as Reader<number>,
	humidity: quantity.readHumidity as Reader<number>,
	compression: quantity.readCompression as Reader<number>,
	angle: quantity.readAngle as Reader<number>,
	number: quantity.readNumber
};
type Kind = keyof typeof readers;

function understood(kind: Kind, text: string, units: UnitSystem) {
	const reading = readers[kind](text, units);
	if (!reading.ok) throw new Error(`${text}: ${reading.message}`);
	return reading;
}

// Values follow from the exact factors of NIST SP 811: 1 cfm = 0.3048³/60 m³/s, 1 in. w.g. = 249.08891 Pa.
const typed: [Kind, string, UnitSystem, number][] = [
	['flow', '1200', 'SI', 1.2],
	['flow', '1200', 'IP', 0.56633693184],
	['flow', '1,200 cfm', 'IP', 0.56633693184],
	['flow', '1200cfm', 'SI', 0.56633693184],
	['flow', '1.2k', 'SI', 1.2],
	['flow', '1.2k cfm', 'SI', 0.56633693184],
	['flow', '570 l/s', 'IP', 0.57],
	['flow', '570L/s', 'SI', 0.57],
	['flow', '200 l/s', 'SI', 0.2],
	['flow', '0.57 m3/s', 'SI', 0.57],
	['flow', '2050 m³/h', 'SI', 2050 / 3600],
	['flow', '2050 cmh', 'IP', 2050 / 3600],
	['flow', '30 CMM', 'SI', 0.5],
	['flow', '1200 SCFM', 'IP', 0.56633693184],
	['flow', '1200 ACFM', 'IP', 0.56633693184],
	['flow', '=1200-460', 'SI', 0.74],
	['flow', '=1200-460 cfm', 'SI', 0.349241107968],
	['flow', '=(1200-460)/2*3', 'SI', 1.11],
	['flow', '1,200', 'IP', 0.56633693184],
	['flow', '1,200', 'SI', 1.2],
	['flow', '1.200,5', 'SI', 1.2005],
	['flow', '1,200.5', 'SI', 1.2005],
	['flow', '1\u00a0200', 'SI', 1.2],
	['flow', '1\u2009200', 'SI', 1.2],
	['flow', '0', 'SI', 0],
	['length', '12\'-6"', 'IP', 3.81],
	['length', "12'6", 'IP', 3.81],
	['length', '12’–6”', 'IP', 3.81],
	['length', "12.5'", 'IP', 3.81],
	['length', '150"', 'IP', 3.81],
	['length', '12 ft 6 in', 'SI', 3.81],
	['length', '12\'-6 1/2"', 'IP', 3.8227],
	['length', '12\' 6½"', 'IP', 3.8227],
	['length', '=12\'-6"+3\'-0"', 'IP', 4.7244],
	['length', "=12'-6'", 'IP', 1.8288],
	['length', '12 in', 'SI', 0.3048],
	['length', '3.8 m', 'IP', 3.8],
	['length', '3800', 'SI', 3.8],
	['length', '3 800', 'SI', 3.8],
	['length', '4,0', 'SI', 4],
	['length', '5.6', 'SI', 5.6],
	['length', '21', 'IP', 6.4008],
	['rise', '−3,2', 'SI', -3.2],
	['elevation', '1,600', 'SI', 1600],
	['elevation', '5,280', 'IP', 1609.344],
	['pressure', '0.08"', 'IP', 19.9271128],
	['pressure', '0.08 in wg', 'SI', 19.9271128],
	['pressure', '0.08 in. w.g.', 'SI', 19.9271128],
	['pressure', '0.08 iwg', 'IP', 19.9271128],
	['pressure', '.08"WC', 'IP', 19.9271128],
	['pressure', '.08 wc', 'IP', 19.9271128],
	['pressure', '.08', 'IP', 19.9271128],
	['pressure', '20 Pa', 'IP', 20],
	['pressure', '25', 'SI', 25],
	['pressure', '2 mm wg', 'SI', 19.6133],
	['room', '–10', 'SI', -10],
	['rate', '.08/100', 'IP', 19.9271128 / 30.48],
	['rate', '0.66 Pa/m', 'IP', 0.66],
	['velocity', '1200 fpm', 'SI', 6.096],
	['velocity', '1200', 'IP', 6.096],
	['velocity', '6 m/s', 'IP', 6],
	['temperature', '68', 'IP', 20],
	['temperature', '20 °C', 'IP', 20],
	['temperature', '−5', 'SI', -5],
	['temperature', '68°', 'IP', 20],
	['temperature', '20°', 'SI', 20],
	['rate', '.08 in. w.g. per 100 ft', 'SI', 19.9271128 / 30.48],
	['flow', '0.57 m^3/s', 'IP', 0.57],
	['density', '1.2', 'SI', 1.2],
	['density', '1 lb/ft³', 'SI', 16.018463373960138],
	['humidity', '50', 'SI', 0.5],
	['compression', '15 %', 'SI', 0.15],
	['compression', '0.15', 'IP', 0.15],
	['humidity', '50 %', 'IP', 0.5],
	['humidity', '0.5', 'SI', 0.5],
	['roughness', '0.09', 'SI', 0.00009],
	['roughness', '0.0003', 'IP', 0.00009144],
	['roughness', '90 µm', 'IP', 0.00009],
	['angle', '45°', 'SI', 45],
	['number', '0,23', 'SI', 0.23],
	['number', '-1.5', 'IP', -1.5]
];

describe('figures as people type them', () => {
	it.each(typed)('%s %s in %s is %d', (kind, text, units, value) => {
		expect(understood(kind, text, units).value).toBe(value);
	});

	it.each([
		['flow', '1200', 'SI', '1\u2009200 L/s (1.2 m³/s)'],
		['flow', '1200', 'IP', '1,200 cfm (566.3 L/s)'],
		['flow', '1200 cfm', 'SI', '1\u2009200 cfm (566.3 L/s)'],
		['length', "12'6", 'IP', '12 ft 6 in (12.5 ft)'],
		['pressure', '20 Pa', 'IP', '20 Pa (0.08029 in. wg)'],
		['temperature', '-40', 'IP', '−40 °F (−40 °C)'],
		['humidity', '50', 'SI', '50 %']
	] as const)('%s %s in %s is said in full', (kind, text, units, words) => {
		expect(understood(kind, text, units).words).toBe(words);
	});
});

describe('a figure that can be read two ways', () => {
	it.each([
		['flow', '1,200', 'SI', 0.0012],
		['flow', '1,200 cfm', 'SI', 0.00056633693184],
		['flow', '1.200', 'SI', 1.2],
		['flow', '0.57', 'SI', 0.57],
		['length', '3800', 'SI', 3800],
		['length', '500', 'SI', 0.5],
		['pressure', '25', 'IP', 25],
		['pressure', '0.08', 'SI', 19.9271128],
		['length', '1e3', 'SI', 1000],
		['humidity', '0.5', 'SI', 0.005]
	] as const)('%s %s in %s says why and gives the other as a text that reads so', (kind, text, units, value) => {
		const reading = understood(kind, text, units);
		expect(reading.why).not.toBeNull();
		expect(understood(kind, reading.other ?? '', units).value).toBe(value);
	});

	it.each([
		['=1000+500', 1.5],
		['=2*1900', 3.8],
		['=3000/2', 1.5],
		['=1000.0+500', 1500]
	])('length %s in SI is read as the whole figure that it comes to', (text, metres) => {
		expect(understood('length', text, 'SI').value).toBe(metres);
	});

	it.each([
		['flow', '1,200', 'IP'],
		['flow', '1200', 'SI'],
		['length', '6.5', 'SI'],
		['length', '6,5', 'SI'],
		['pressure', '25', 'SI']
	] as const)('%s %s in %s leaves no doubt', (kind, text, units) => {
		expect(understood(kind, text, units)).toMatchObject({ why: null, other: null });
	});

	it('says that standard cfm is not corrected', () => {
		expect(understood('flow', '100 scfm', 'IP').why).toContain('density');
	});
});

describe('what is no figure', () => {
	const bad: [Kind, string][] = [
		...['-5', '−5', 'abc', 'NaN', 'Infinity', '1e9', '1e400', '20 Pa', '1,20,0', '5..6', '1200-460', '=1/0', '='].map(
			(text): [Kind, string] => ['flow', text]
		),
		...['=(1200', '=1200+', '=2 cfm*3 cfm', '12 furlongs', '--', '200 L/s L/s', '= 5 5'].map((text): [Kind, string] => [
			'flow',
			text
		]),
		...['-2', '12\'15"', '=12\'6"+3', '12-6', '1e6 m', '45°'].map((text): [Kind, string] => ['length', text]),
		['pressure', '-20'],
		['pressure', '5 m'],
		['temperature', '=68 °F + 5 °F'],
		['temperature', '-300'],
		['flow', '10²'],
		['flow', '²00'],
		['flow', '10^2'],
		['humidity', '120'],
		['compression', '61 %'],
		['compression', '-4 %'],
		['density', '0'],
		['number', '5 m']
	];
	it.each(bad)('%s: %s is refused by its name, with an example', (kind, text) => {
		const reading = readers[kind](text, 'SI');
		expect(reading.ok).toBe(false);
		if (!reading.ok) {
			expect(reading.message).toContain(`“${text}”`);
			expect(reading.expected).toContain('such as');
		}
	});

	it('names the unit that belongs elsewhere', () => {
		expect(readers.flow('20 Pa', 'SI')).toMatchObject({ message: '“20 Pa”: Pa is not a unit of a flow.' });
	});

	it('is never a throw, and never a value that is not finite', () => {
		const signs = '0123456789.,eEkK =+-*/()\'"lsmhftincpaPgw%°CF/³²½\u00a0\u2009−'.split('');
		const text = fc.oneof(
			fc.string({ unit: 'binary', maxLength: 60 }),
			fc.string({ unit: fc.constantFrom(...signs), maxLength: 40 })
		);
		const kinds = Object.keys(readers) as Kind[];
		fc.assert(
			fc.property(text, fc.constantFrom(...kinds), fc.constantFrom<UnitSystem>('SI', 'IP'), (typed, kind, units) => {
				const reading = readers[kind](typed, units);
				if (reading.ok) expect(Number.isFinite(reading.value) && !Object.is(reading.value, -0)).toBe(true);
				else expect(reading.message.length * reading.expected.length).toBeGreaterThan(0);
			}),
			{ numRuns: 1000 }
		);
	}, 30_000);
});

describe('sums', () => {
	const whole = fc.integer({ min: 0, max: 9999 });
	it('agree with the arithmetic they write down', () => {
		fc.assert(
			fc.property(whole, whole, whole, fc.integer({ min: 1, max: 64 }), (a, b, c, d) => {
				const text = `=(${a}+${b})*${d}-${c}/${d}`;
				const { value } = understood('number', text, 'SI');
				expect(value).toBeCloseTo((a + b) * d - c / d, 6);
			})
		);
	});

	it('add feet and inches without losing anything', () => {
		const inch = fc.integer({ min: 0, max: 11 });
		fc.assert(
			fc.property(fc.integer({ min: 0, max: 99 }), inch, fc.integer({ min: 0, max: 99 }), inch, (f1, i1, f2, i2) => {
				const text = `=${f1}'-${i1}"+${f2}'-${i2}"`;
				const tenThousandths = ((f1 + f2) * 12 + i1 + i2) * 254;
				expect(understood('length', text, 'IP').value).toBe(tenThousandths / 10_000);
			})
		);
	});
});
