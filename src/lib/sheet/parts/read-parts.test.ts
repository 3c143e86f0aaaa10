import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { UnitSystem } from '$lib/engine';
import { fittingsFor, readParts, type Parts } from './index';
import { EXAMPLES } from './takes';

function understood(text: string, units: UnitSystem = 'SI') {
	const reading = readParts(text, units);
	if (!reading.ok) throw new Error(`${text}: ${reading.message}`);
	return reading;
}

/** A cell in short: junction, then fittings, then equipment. */
function short({ junction, fittings, equipment }: Parts): string[] {
	const amount = (value: number | undefined) => (value === undefined ? '' : ` C${value}`);
	return [
		...[junction ?? []].flat().map((part) => `J ${part.name}${amount(part.coefficient)}`),
		...fittings.map((part) => `${part.count} ${part.kind} ${part.name}${amount(part.coefficient)}`),
		...equipment.map((part) => `${part.name} ${part.loss} Pa`)
	];
}

// Cells of an invented library system: C on the row's own velocity pressure, losses in Pa.
const cells: [string, string[]][] = [
	[
		'AHU discharge transition (C 0.10); 2× 90° radius bend r/W 1.0 (C 0.23); silencer 25 Pa; fire damper FD-01 8 Pa',
		['1 fixed AHU discharge transition C0.1', '2 fixed Radius bend C0.23', 'Silencer 25 Pa', 'Fire damper FD-01 8 Pa']
	],
	['split, straight way (C 0.10)', ['J Split straight way C0.1']],
	[
		'45° shoe take-off, branch (C 0.60); VCD open (C 0.20); fire damper FD-02 6 Pa',
		['J Shoe take-off branch C0.6', '1 fixed Volume damper open C0.2', 'Fire damper FD-02 6 Pa']
	],
	[
		'tee straight way (C 0.15); 90° bend r/D 1.0 (C 0.23); VCD open (C 0.20); diffuser T9 18 Pa',
		['J Tee straight way C0.15', '1 fixed Bend C0.23', '1 fixed Volume damper open C0.2', 'Diffuser T9 18 Pa']
	],
	['tee branch (C 0.80); 2× 90° bend r/D 1.0 (C 0.23)', ['J Tee branch C0.8', '2 fixed Bend C0.23']],
	['straight way past take-off (C 0.05)', ['J Straight way past take-off C0.05']],
	['reducer + straight way (C 0.08)', ['J Reducer + straight way C0.08']],
	['rect-to-round + straight way (C 0.12)', ['J Rect-to-round + straight way C0.12']],
	['split, branch (C 0.45); 90° radius bend r/W 1.0 (C 0.23)', ['J Split branch C0.45', '1 fixed Radius bend C0.23']],
	[
		'plenum entry (C 0.50); 90° mitred bend with single-thickness vanes (entered by hand) (C 0.15); weather louvre + screen 25 Pa',
		[
			'1 fixed Plenum entry C0.5',
			'1 fixed Mitred bend with single-thickness vanes (entered by hand) C0.15',
			'Weather louvre + screen 25 Pa'
		]
	],
	[
		'2× 90° bend r/D 1.0 (C 0.23); converging tee, branch (C 0.60); VCD open (C 0.20); exhaust valve E1 20 Pa',
		['J Converging tee branch C0.6', '2 fixed Bend C0.23', '1 fixed Volume damper open C0.2', 'Exhaust valve E1 20 Pa']
	],
	['fan inlet connection (C 0.15); silencer 15 Pa', ['1 fixed Fan inlet connection C0.15', 'Silencer 15 Pa']],
	['backdraught damper (C 0.60); roof cowl 22 Pa', ['1 fixed Backdraught damper C0.6', 'Roof cowl 22 Pa']],
	[
		'2x elbow r1.0 C0.23, silencer 25 Pa, fire damper FD-01 8 Pa',
		['2 fixed Elbow C0.23', 'Silencer 25 Pa', 'Fire damper FD-01 8 Pa']
	],
	['tee branch C0.8, VCD C0.2, damper', ['J Tee branch C0.8', '1 fixed Volume damper C0.2', '1 damper Damper']],
	['tee, branch C0.8', ['J Tee branch C0.8']],
	['tee(b) C0.8', ['J Tee branch C0.8']],
	['2 x 90 R1.0, 1 FD 8Pa', ['2 elbow-smooth Elbow', 'Fire damper 8 Pa']],
	['3E', ['3 elbow-smooth Elbow']],
	['2E 1D', ['2 elbow-smooth Elbow', '1 damper Damper']],
	['transition C0.10, plenum entry C0.5', ['1 fixed Transition C0.1', '1 fixed Plenum entry C0.5']],
	['louvre 25 Pa; cowl 22 Pa', ['Louvre 25 Pa', 'Cowl 22 Pa']],
	['elbow C0,23, damper', ['1 fixed Elbow C0.23', '1 damper Damper']],
	['elbow C0,23,damper', ['1 fixed Elbow C0.23', '1 damper Damper']],
	['C0.23 elbow x2', ['2 fixed Elbow C0.23']],
	['2 FD 8 Pa', ['Fire damper 8 Pa', 'Fire damper 8 Pa']],
	['coil 1 kPa', ['Coil 1000 Pa']],
	['coil 0.2 in wg', ['Coil 49.817782 Pa']],
	['coil 0.2"', ['Coil 49.817782 Pa']],
	['straight way C-0.05', ['J Straight way C-0.05']],
	['branch damper C0.2', ['1 fixed Branch damper C0.2']],
	['', []]
];

describe('the Parts cell', () => {
	it.each(cells)('%s', (text, parts) => expect(short(understood(text).value)).toEqual(parts));

	it.each([
		['elbow r1.5 45°', 'elbow-smooth', { radiusRatio: 1.5, angle: 45 }],
		['45 elbow', 'elbow-smooth', { angle: 45 }],
		['2 45° elbows', 'elbow-smooth', { angle: 45 }],
		['mitred elbow 60°', 'elbow-mitred', { angle: 60 }],
		['square bend with vanes', 'elbow-vaned', {}],
		['3-piece elbow r1,0', 'elbow-segmented', { pieces: 3, radiusRatio: 1 }],
		['splitter elbow', 'elbow-splitter', {}],
		['elbow plane height', 'elbow-smooth', { plane: 'height' }],
		['damper 20°', 'damper', { angle: 20 }],
		['opposed blade damper 30°', 'damper-opposed-blades', { angle: 30 }],
		['flush entry', 'entry-flush', {}],
		['plain end entry', 'entry-plain-end', {}],
		['projecting entry t0.02 l0.5', 'entry-projecting', { thicknessRatio: 0.02, lengthRatio: 0.5 }],
		['bellmouth r0.2', 'entry-bellmouth', { radiusRatio: 0.2 }],
		['bellmouth in wall r0.2', 'entry-bellmouth-in-wall', { radiusRatio: 0.2 }],
		['exit', 'exit-plain', {}],
		['sudden expansion a0.5', 'sudden-expansion', { areaRatio: 0.5 }],
		['gradual contraction a0.5 20° larger', 'gradual-contraction', { areaRatio: 0.5, angle: 20, leg: 'larger' }]
	])('%s comes from the catalogue', (text, kind, parameters) => {
		const { value, why } = understood(text);
		expect(value.fittings).toHaveLength(1);
		expect(value.fittings[0]).toMatchObject({ kind, parameters });
		expect(value.fittings[0]?.coefficient).toBeUndefined();
		expect(why).toContain('catalogue');
	});

	it('takes a question mark as to be confirmed, on any kind of part', () => {
		const { value } = understood('mitred elbow vaned C0.15?, silencer 25 Pa ?, tee branch C0.8?, damper C0.2');
		expect(value.fittings.map((part) => part.toBeConfirmed)).toEqual([true, false]);
		expect(value.equipment[0]?.toBeConfirmed).toBe(true);
		expect(value.junction?.toBeConfirmed).toBe(true);
	});

	it.each([
		['elbow', 'elbow'],
		['VCD', 'damper'],
		['transition C0.1', 'transition'],
		['backdraught damper C0.6', 'damper'],
		['fire damper C0.1', 'firedamper'],
		['flexible connection C0.3', 'flexible']
	])('draws %s as %s', (text, picture) => expect(understood(text).value.fittings[0]?.picture).toBe(picture));

	it.each([
		['tee C1', 'tee'],
		['wye C1', 'wye'],
		['45° shoe take-off branch C1', 'shoe'],
		['straight way C1', 'tee']
	])('draws the junction %s as %s', (text, picture) => expect(understood(text).value.junction?.picture).toBe(picture));

	it.each([
		['silencer 25 Pa', 'silencer'],
		['FD 8 Pa', 'firedamper'],
		['heating coil 50 Pa', 'coil'],
		['bag filter 100 Pa', 'filter'],
		['louvre 25 Pa', 'louvre'],
		['diffuser 18 Pa', 'diffuser'],
		['exhaust grille E5 18 Pa', 'grille']
	])('draws %s as %s', (text, picture) => expect(understood(text).value.equipment[0]?.picture).toBe(picture));

	it('gives equipment the square of flow unless another exponent is typed', () => {
		expect(understood('coil 50 Pa, filter 100 Pa n1.5').value.equipment.map((part) => part.exponent)).toEqual([2, 1.5]);
	});

	it('says all that it understood, in the units of the design', () => {
		const text = '2x elbow r1.0 C0.23?, silencer 25 Pa, damper';
		expect(understood(text).words).toBe(
			'2 × Elbow, r 1, C 0.23, to be confirmed; Damper, from the catalogue; Silencer, 25.0 Pa'
		);
		expect(understood('silencer 0.1 in wg', 'IP').words).toBe('Silencer, 0.100 in. wg');
		expect(understood('').words).toBe('no parts');
	});
});

describe('a junction without a coefficient', () => {
	it.each([
		['tee branch', 'tee', { leg: 'branch' }],
		['tee(b)', 'tee', { leg: 'branch' }],
		['1 tee straight', 'tee', { leg: 'straight' }],
		['90° tee, straight way', 'tee', { leg: 'straight' }],
		['straight way', 'tee', { leg: 'straight' }],
		['tee 45° branch', 'wye', { angle: 45, leg: 'branch' }],
		['wye branch', 'wye', { leg: 'branch' }],
		['30° wye straight', 'wye', { angle: 30, leg: 'straight' }],
		['shoe', 'shoe-take-off', { leg: 'branch' }],
		['45° shoe take-off', 'shoe-take-off', { angle: 45, leg: 'branch' }],
		['conical take-off', 'conical-take-off', { leg: 'branch' }],
		['conical tee straight', 'conical-take-off', { leg: 'straight' }],
		['tap', 'tee', { leg: 'branch' }],
		['bullhead tee', 'bullhead-tee', { leg: 'branch' }],
		['cross branch', 'cross', { leg: 'branch' }],
		['plenum', 'plenum', { leg: 'branch' }]
	] as const)('%s is %s of the catalogue', (text, kind, parameters) => {
		const { value, why } = understood(text);
		expect(value.junction).toMatchObject({ kind, parameters });
		expect(value.junction?.coefficient).toBeUndefined();
		expect(why).toContain('with the flows and sizes of the rows that meet');
	});

	it('stands in the document with its leg, and no coefficient', () => {
		const { junction, problems } = fittingsFor(understood('30° wye straight?').value, {
			shape: 'round',
			diameter: 0.2
		});
		expect(problems).toEqual([]);
		expect(junction).toEqual({
			...{ kind: 'wye', name: 'Wye straight', toBeConfirmed: true, angle: 30 },
			leg: 'straight'
		});
	});

	it('is named where its figure does not suit', () => {
		const { junction, problems } = fittingsFor(understood('5° wye branch').value, { shape: 'round', diameter: 0.2 });
		expect(junction).toBeNull();
		expect(problems).toHaveLength(1);
	});
});

describe('what a Parts cell says of what it read', () => {
	it('takes a pressure behind a count for that of each, and says both', () => {
		const { value, words, why } = understood('2 FD 8 Pa');
		expect(value.equipment.map(({ loss }) => loss)).toEqual([8, 8]);
		expect(words).toBe('2 × Fire damper, 8.0 Pa each, 16.0 Pa together');
		expect(why).toBe('A pressure behind a count is that of each.');
		expect(understood('FD 8 Pa; FD 8 Pa').words).toBe('Fire damper, 8.0 Pa; Fire damper, 8.0 Pa');
	});

	it.each([
		[
			'elbow',
			'Elbow: from the catalogue, at r 1.5, 90° in round duct or r 1, 90° in rectangular duct; for others type elbow r1.5 45° or elbow C0.23.'
		],
		['elbow r2', 'Elbow: from the catalogue, at 90°; for others type elbow r1.5 45° or elbow C0.23.'],
		['damper', 'Damper: from the catalogue, fully open; for others type damper 20° or damper C0.2.'],
		['elbow r1.5 45°', 'Elbow: without a coefficient, from the catalogue.']
	])('says what “%s” is computed with, and how to type another figure', (text, why) =>
		expect(understood(text).why).toBe(why)
	);

	it.each(['SI', 'IP'] as const)('has examples in %s that it reads itself', (units) => {
		for (const example of EXAMPLES[units]) expect(readParts(example, units)).toMatchObject({ ok: true });
	});

	it.each([
		['tee', 'SI'],
		['entry', 'IP'],
		['expansion', 'SI'],
		['grille', 'SI'],
		['silencer', 'IP'],
		['1 SD', 'IP']
	] as const)('answers “%s” with examples that it reads itself', (text, units) => {
		const reading = readParts(text, units);
		if (reading.ok) throw new Error('read');
		const examples = reading.expected.replace(/^C, such as /, '').split(/[;,] (?:or )?/);
		expect(examples.length).toBeGreaterThan(0);
		for (const example of examples) expect([example, readParts(example, units).ok]).toEqual([example, true]);
	});
});

describe('a figure or a part more than one part has', () => {
	it.each([
		...['elbow C1.5E-1', 'elbow C1E-03', 'elbow C1e3', 'elbow C0x10', 'elbow C1 damper C2', 'elbow C0.2 C3'],
		...['elbow C0.2 d2 C3', 'elbow r1.5 r2', 'elbow K3', '2 elbow r1.5 silencer 25 Pa', 'elbow r1.5 damper C0.2'],
		...['elbow damper', 'bend VCD C0.2', 'elbow fire damper 8 Pa', 'coil n1']
	])('is never left out: “%s” is refused', (text) => {
		const reading = readParts(text, 'SI');
		expect(reading.ok ? reading.words : reading.expected).toMatch(/comma|one coefficient|digits and a point|Pa|C/);
		expect(reading.ok).toBe(false);
	});

	it.each([
		['elbow C0.2 (C3)', ['1 fixed Elbow (c3) C0.2']],
		['branch damper C0.2', ['1 fixed Branch damper C0.2']],
		['diffuser with damper T9 18 Pa', ['Diffuser with damper T9 18 Pa']],
		['elbow r1.5, silencer 25 Pa', ['1 elbow-smooth Elbow', 'Silencer 25 Pa']]
	])('is kept where it stands for itself: “%s”', (text, parts) => expect(short(understood(text).value)).toEqual(parts));

	it('tells the exponent of a loss, whole ones too', () => {
		expect(understood('coil 50 Pa n1').value.equipment[0]?.exponent).toBe(1);
		expect(understood('coil 50 Pa n1.8').value.equipment[0]?.exponent).toBe(1.8);
	});

	it('is told where it is another figure elsewhere', () => {
		expect(understood('silencer 1.250 Pa').why).toContain('is read as the decimal point');
		expect(understood('silencer 1,250 Pa').why).toContain('is read as thousands');
		expect(understood('elbow C1,200').why).toContain('is read as the decimal point');
		expect(understood('silencer 125 Pa').why).toBeNull();
	});
});

describe('what is not understood in a Parts cell', () => {
	it.each([
		['tee', '“tee”: a junction needs to know which stream this row is', 'tee branch, tee straight, or tee C0.8'],
		['2E 1T 1D', '“1T”', 'C0.8'],
		['silencer', '“silencer”', 'silencer 25 Pa, or silencer C0.6'],
		['grille', 'the maker states', 'grille 25 Pa, or grille C0.6'],
		['1 SD', '“1 SD”', 'sd 8 Pa, or sd C0.6'],
		['backdraught damper', '“backdraught damper”', 'C0.6'],
		['expansion', '“expansion”', 'sudden expansion'],
		['intake louvre', 'what the maker states', 'intake louvre C1.2, or intake louvre 25 Pa'],
		['fan outlet effect', 'K of the charts', 'fan outlet effect C0.3'],
		['exhaust hood', 'take the air in or let it out', 'exhaust cowl C1.2'],
		['elbow by smith', 'no method by smith', 'Rennels'],
		['elbow C0.2 by rennels', 'a figure of its own beside a method', 'one of the two'],
		['gate damper xyz', '“xyz”', 'nearest'],
		['gate damper 25', '“25”', '25 Pa'],
		['plenum entry', '“plenum entry”', 'flush entry'],
		['elbo', '“elbo”', 'elbow'],
		['silencr 25 Pa', '“silencr”', 'silencer'],
		['elbow, foo 25 Pa', '“foo”', 'nearest'],
		['tee C0.8, wye C0.5', '“wye C0.5”', 'in the row that starts there'],
		['2 tee C0.8', '“2 tee C0.8”', 'without a count'],
		['silencer 25 Pa C0.2', '“silencer 25 Pa C0.2”', 'one of the two'],
		['C0.5', '“C0.5”', 'a word'],
		['25 Pa', '“25 Pa”', 'a word'],
		['0x elbow', '“0x elbow”', 'such as'],
		['-3 elbow', '“-3”', 'such as'],
		['12" damper', '“12"”', 'such as'],
		['coil 900 kPa', '“coil 900 kPa”', 'a pressure'],
		['tee branch 12 Pa', '“tee branch 12 Pa”', 'C0.8']
	])('%s', (text, named, hint) => {
		const reading = readParts(text, 'SI');
		expect(reading.ok).toBe(false);
		if (!reading.ok) {
			expect(reading.message).toContain(named);
			expect(reading.expected).toContain(hint);
		}
	});

	it('is never a throw, and never a figure that is not finite', () => {
		const words = [
			'elbow',
			'tee',
			'branch',
			'damper',
			'FD',
			'C0.2',
			'C',
			'25 Pa',
			'r1',
			'45°',
			'2x',
			'?',
			',',
			';',
			', ',
			'(',
			')',
			'+',
			'90',
			'1e9',
			'"'
		];
		const typed = fc.oneof(
			fc.string({ unit: 'binary', maxLength: 80 }),
			fc.array(fc.constantFrom(...words), { maxLength: 12 }).map((list) => list.join(' ')),
			fc.array(fc.constantFrom(...words), { maxLength: 12 }).map((list) => list.join(''))
		);
		fc.assert(
			fc.property(typed, fc.constantFrom<UnitSystem>('SI', 'IP'), (text, units) => {
				const reading = readParts(text, units);
				const figures = reading.ok
					? [
							...reading.value.fittings.flatMap((part) => [part.count, part.coefficient ?? 0]),
							...reading.value.equipment.map((part) => part.loss)
						]
					: [];
				expect(figures.every(Number.isFinite)).toBe(true);
				expect(reading.ok || reading.message.length * reading.expected.length > 0).toBe(true);
			}),
			{ numRuns: 1000 }
		);
	}, 30_000);
});
