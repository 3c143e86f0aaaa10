import { describe, expect, it } from 'vitest';
import type { UnitSystem } from '$lib/engine';
import { flagWords } from '$lib/report';
import { sourceText } from '$lib/report/sources';
import larkmoor from '../../../fixtures/demo/larkmoor.json';
import { sheetOf, type TypedRow, type TypedSettings } from '../../../tests/sheet/any-sheet';
import { BAD_CELLS, BAD_SETTINGS, GOOD, MAIN, TRIED } from '../../../tests/sheet/bad-input-table';
import { readBlock } from './clipboard';
import { solveSheet, type SolvedSheet } from './solve-sheet';

/** The form of whatever a person is told, wherever it was made. */

interface Told {
	readonly text: string;
	/** Figures in it may have any digits: they are the person's own. */
	readonly typed: string;
}

const problemsOf = ({ problems }: SolvedSheet, typed: string): Told[] =>
	problems.flatMap(({ message, expected }) =>
		[message, `${message} Expected: ${expected}.`].map((text) => ({ text, typed }))
	);

const flagsOf = ({ solution }: SolvedSheet, units: UnitSystem, typed: string): Told[] =>
	(solution?.flags ?? []).flatMap((flag) => [flag.message, flagWords(flag, units)].map((text) => ({ text, typed })));

const UNITS = ['SI', 'IP'] as const;

/** Rows that raise flags and notes on the ranges of sources, with figures that are not round. */
const ODD: readonly TypedRow[] = [
	{ ...TRIED, size: '333.3x77.7', flow: '123.456', parts: 'elbow r0.5123 17°, mitred elbow 13°, damper' },
	{
		...TRIED,
		size: 'Ø152.4',
		flow: '7.89',
		flex: '1.234',
		rise: '12.345',
		parts: 'elbow r0.5123, 3-piece elbow r2.3456'
	},
	{ ...TRIED, size: '24x12', outlet: '12 static?' },
	{ ...TRIED, size: '1000x900', flow: '99.99', side: '' },
	{ ...TRIED, size: '333x222 FO', flow: '1.234', parts: 'damper, elbow, 2 FD 8 Pa?' },
	{ ...TRIED, parts: 'plain exit', outlet: 'grille 12.3456 Pa' },
	{}
];
const oddSolved = (units: UnitSystem) => [
	...ODD.map((row) => solveSheet(sheetOf([MAIN, GOOD, row]))),
	...ODD.map((row) =>
		solveSheet(sheetOf([{ ...row, joins: '' }], { density: '1.05', runOutVelocity: '1.2345' }, units))
	)
];
const typedOf = (row: TypedRow) => Object.values(row).join(' ');

const told: readonly Told[] = UNITS.flatMap((units): Told[] => [
	...BAD_CELLS.flatMap(([, field, typed]) =>
		problemsOf(solveSheet(sheetOf([MAIN, GOOD, { ...TRIED, [field]: typed }], {}, units)), typed)
	),
	...BAD_SETTINGS.flatMap(([field, typed]) =>
		problemsOf(solveSheet(sheetOf([MAIN, GOOD], { [field]: typed }, units)), typed)
	),
	...larkmoor.designs.flatMap(({ rows, settings }) =>
		flagsOf(solveSheet(sheetOf(rows as TypedRow[], settings as TypedSettings)), units, '')
	),
	...oddSolved(units).flatMap((solved) => {
		const typed = ODD.map(typedOf).join(' ');
		return [...problemsOf(solved, typed), ...flagsOf(solved, units, `${typed} 1.2345`)];
	})
]);

/** Digits that carry something: without zeros before, and without those at the end of a whole number. */
function significant(figure: string): number {
	const digits = figure.replace(/[\u2009,.]/g, '').replace(/^0+/, '');
	return (/\./.test(figure) ? digits : digits.replace(/0+$/, '')).length;
}

const faultsOf = ({ text, typed }: Told): string[] => {
	const own = typed.replace(/[^\d.]+/g, ' ').split(' ');
	const figures = [...text.matchAll(/\d(?:[\d\u2009]|[.,](?=\d))*/g)].map(([figure]) => figure);
	return [
		...(/[.?!]$/.test(text) && !/[.?!]{2}$|\.\.(?!\.)/.test(text) ? [] : ['does not end with one full stop']),
		...(/""|““|””/.test(text) ? ['has doubled quotation marks'] : []),
		...(/ {2}|^ | $| [,.;:]/.test(text) ? ['has stray blanks'] : []),
		...(/\b(?:undefined|null|\[object)\b/.test(text) ? ['lets the program show'] : []),
		...(/\b1 (?:rows|checks|parts|cells|values|characters|losses|edits)\b/.test(text) ? ['has one in the plural'] : []),
		...(/[.:;]: /.test(text) ? ['joins two pieces badly'] : []),
		...figures.filter((figure) => significant(figure) > 5 && !own.includes(figure)).map((figure) => `carries ${figure}`)
	];
};

describe('what a person is told', () => {
	it('is much, of problems and of checks', () => {
		expect(told.length).toBeGreaterThan(300);
		const texts = told.map(({ text }) => text).join('\n');
		for (const piece of ['Meanwhile', 'common practice', 'Reynolds number', 'nearer end', 'To be confirmed'])
			expect(texts).toContain(piece);
	});

	it('is one or more whole sentences, with rounded figures', () => {
		const faults = told.flatMap((one) => faultsOf(one).map((fault) => `${fault}: ${one.text}`));
		expect([...new Set(faults)]).toEqual([]);
	});

	it('does not say twice that a value is from memory', () => {
		const items = oddSolved('SI').flatMap(({ solution }) =>
			Object.values(solution?.rows ?? {}).flatMap((row) => row.items)
		);
		const texts = items.map(sourceText);
		expect(texts.some((text) => text.includes('from memory'))).toBe(true);
		expect(texts.filter((text) => /from memory \(from memory/.test(text))).toEqual([]);
	});

	it('is a whole sentence of a paste that is refused, also of one row', () => {
		for (const text of ['a\n', 'a\nb\n', `${'x'.repeat(2001)}`, '\t'.repeat(200_001)]) {
			const block = readBlock(text, text.length > 4 ? 5 : 0);
			expect(block.ok ? 'taken' : faultsOf({ text: block.message, typed: '200002' })).toEqual([]);
		}
	});

	it.each([
		['Says “x”', 'does not end with one full stop'],
		['Two stops..', 'does not end with one full stop'],
		['Reynolds number 123456.789.', 'carries 123456.789'],
		['The clipboard holds 1 rows.', 'has one in the plural'],
		['“““x””: no.', 'has doubled quotation marks']
	])('is found at fault in “%s”', (text, fault) => expect(faultsOf({ text, typed: '' })).toContain(fault));
});
