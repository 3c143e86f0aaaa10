import { describe, expect, it } from 'vitest';
import { coefficientOf } from './fitting/coefficient-of';
import { OutOfRangeError } from './errors';
import { shortFigure } from './short-figure';

describe('a computed figure in a message', () => {
	it.each([
		[123456.789, '123500'],
		[0.000123456, '0.0001235'],
		[5000, '5000'],
		[-12.34567, '-12.35'],
		[Infinity, 'Infinity']
	])('%d is said as %s', (value, text) => expect(shortFigure(value)).toBe(text));

	it('keeps the digits that show it outside its range', () => {
		expect(shortFigure(10.00001234, { min: 0.5, max: 10 })).toBe('10.00001');
		expect(shortFigure(12.345678, { min: 0.5, max: 10 })).toBe('12.35');
		expect(shortFigure(NaN, { min: 0, max: 1 })).toBe('NaN');
	});

	it('is rounded in the error of a formula', () =>
		expect(new OutOfRangeError('Law', 'Re', 123456.789, { min: 0, max: 4000 }).message).toBe(
			'Law: Re = 123500 is outside 0 to 4000'
		));

	it('is told once where two notes speak of it', () => {
		const row = { size: { shape: 'round', diameter: 0.1 }, reynolds: 2530.4321, velocity: 0.4 } as const;
		const context = { ...row, relativeRoughness: 0.001, frictionFactor: 0.05 };
		const { rangeNote } = coefficientOf('round-elbow-smooth', {}, context);
		expect(rangeNote?.match(/2530/g)).toHaveLength(1);
		expect(rangeNote).toContain('turbulent');
		expect(coefficientOf('damper-butterfly', {}, context).rangeNote).toContain('Re is 2530');
	});
});
