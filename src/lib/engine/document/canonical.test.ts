import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalText } from './canonical';

describe('canonical text', () => {
	it('sorts keys by code units and has no white space', () =>
		expect(canonicalText({ b: [1, 'é', null], a: { Z: true, a: 0.1, É: -0 } })).toBe(
			'{"a":{"Z":true,"a":0.1,"É":0},"b":[1,"é",null]}'
		));

	it('is JSON of the same value, and the same for any order of keys', () => {
		fc.assert(
			fc.property(fc.dictionary(fc.string(), fc.jsonValue()), (value) => {
				const text = canonicalText(value);
				const reversed = Object.fromEntries(Object.entries(value).reverse());
				expect(JSON.parse(text)).toEqual(JSON.parse(JSON.stringify(value)));
				expect(canonicalText(reversed)).toBe(text);
				expect(canonicalText(JSON.parse(text))).toBe(text);
			})
		);
	});

	it('leaves out what is undefined', () => expect(canonicalText({ a: undefined, b: 1 })).toBe('{"b":1}'));

	it.each([NaN, Infinity, () => 1, Symbol('a'), 1n, undefined])('refuses %o', (value) =>
		expect(() => canonicalText({ value: [value] })).toThrow(TypeError)
	);

	it('refuses an object that holds itself', () => {
		const ring: Record<string, unknown> = {};
		ring.ring = ring;
		expect(() => canonicalText(ring)).toThrow(TypeError);
	});
});
