import { describe, expect, it } from 'vitest';
import { solveSheet } from './solve-sheet';
import { sheetOf, type TypedRow } from '../../../tests/sheet/any-sheet';
import { impliedText, shownText, textToEdit } from './cell-text';
import { readOutlet } from './read-outlet';

const valueOf = (text: string, units: 'SI' | 'IP' = 'SI') => {
	const reading = readOutlet(text, units);
	if (!reading.ok) throw new Error(reading.message);
	return reading.value;
};
const total = { lossIs: 'total', toBeConfirmed: false } as const;

describe('the outlet cell', () => {
	it.each([
		['16', { ...total, loss: 16 }],
		['grille 25 Pa', { ...total, loss: 25, description: 'Grille' }],
		['diffuser 30', { ...total, loss: 30, description: 'Diffuser' }],
		['Exhaust valve E1 20 Pa', { ...total, loss: 20, description: 'Exhaust valve E1' }],
		[
			'linear slot diffuser 18 static?',
			{ loss: 18, lossIs: 'static', toBeConfirmed: true, description: 'Linear slot diffuser' }
		],
		['louvre C 1.2', { ...total, loss: null, coefficient: 1.2, description: 'Louvre' }],
		['C1,2', { ...total, loss: null, coefficient: 1.2 }],
		['open', { ...total, loss: null }]
	])('reads “%s”', (text, value) => expect(valueOf(text)).toEqual(value));

	it('says the word, the figure and what it counts', () => {
		const wordsOf = (text: string) => readOutlet(text, 'SI');
		expect(wordsOf('grille 25 Pa')).toMatchObject({ words: 'Grille, 25 Pa, total pressure' });
		expect(wordsOf('louvre C 1.2?')).toMatchObject({
			words: 'Louvre, C 1.2 on the velocity pressure of the duct, to be confirmed'
		});
		expect(wordsOf('grille 0.5')).toMatchObject({ other: 'grille 0.5 in. wg' });
	});

	it.each([
		['grille', '“grille” lacks its loss', 'grille 25 Pa, or grille C 1.2'],
		['valve E1', '“valve E1” lacks its loss', 'valve E1 25 Pa'],
		['Pa 25', '“Pa 25”', 'grille 25 Pa'],
		['grille -5', '“-5”', 'a pressure'],
		['louvre C -1', 'cannot be negative', 'C 1.2'],
		['louvre C 1 static', 'not static', 'C 1.2'],
		['louvre C 2000000', 'too great', 'C 1.2']
	])('does not take “%s”, and says what it takes', (text, message, expected) => {
		const reading = readOutlet(text, 'SI');
		if (reading.ok) throw new Error('taken');
		expect(reading.message).toContain(message);
		expect(reading.expected).toContain(expected);
	});

	const row: TypedRow = { tag: 'S1', size: 'Ø200', length: '0', flow: '150', serves: 'Store' };

	it('counts C on the velocity pressure of the duct, and an outlet by its name', () => {
		// pv = 0.6 V², V = 0.15/(π 0.1²) m/s, by hand.
		const pv = 0.6 * (0.15 / (Math.PI * 0.01)) ** 2;
		const byC = solveSheet(sheetOf([{ ...row, outlet: 'louvre C 1.2' }], { density: '1.2 kg/m³' }));
		expect(byC.problems).toEqual([]);
		expect(byC.solution?.rows['S1']?.loss).toBeCloseTo(1.2 * pv, 6);
		const item = { name: 'Louvre', coefficient: 1.2 };
		expect(byC.solution?.rows['S1']?.items).toContainEqual(expect.objectContaining(item));
		const byPressure = solveSheet(sheetOf([{ ...row, outlet: 'grille 25 Pa' }]));
		expect(byPressure.solution?.rows['S1']?.items).toContainEqual(
			expect.objectContaining({ name: 'Grille', loss: 25 })
		);
	});

	it('shows the figure, and opens in other units with the same value', () => {
		const [shown] = sheetOf([{ ...row, outlet: 'grille 25 Pa?' }]).rows;
		const [coefficient] = sheetOf([{ ...row, outlet: 'louvre C 1.2' }]).rows;
		if (!shown || !coefficient) throw new Error('no row');
		expect([shownText(shown, 'outlet', 'SI'), shownText(coefficient, 'outlet', 'SI')]).toEqual(['25.0', 'C 1.2']);
		expect(valueOf(textToEdit(shown, 'outlet', 'IP'), 'IP')).toEqual(shown.cells.outlet?.value);
		expect(valueOf(textToEdit(coefficient, 'outlet', 'IP'), 'IP')).toEqual(coefficient.cells.outlet?.value);
	});

	it.each([
		['open', {}, true],
		['', {}, false],
		['', { outlet: '20' }, true],
		['', { parts: 'plain exit' }, true],
		['', { flow: '' }, true]
	] as [string, TypedRow, boolean][])('is shown as “%s” where %o', (text, cells, isEnd) => {
		const [one] = sheetOf([{ ...row, ...cells }]).rows;
		expect(one && impliedText(one, 'outlet', isEnd)).toBe(text);
	});
});
