import { describe, expect, it } from 'vitest';
import { solutionOf } from '../../../../tests/engine/any-design';

type Json = Record<string, unknown>;

function itemsOf(fittings: Json[], keys: Json = {}) {
	const row = {
		...{ tag: 'S', joins: null, side: 'supply', size: { shape: 'round', diameter: 0.2 }, length: 5 },
		...{ fittings, outlet: { flow: 0.15, loss: 0 }, ...keys }
	};
	return solutionOf({ format: 'evendraft/design@1', air: { density: 1.2 }, rows: [row] }).rows['S']?.items ?? [];
}

describe('an item of the catalogue', () => {
	it('carries every parameter with which it was computed, defaults included', () => {
		const [, elbow] = itemsOf([{ kind: 'round-elbow-smooth', radiusRatio: 0.7 }]);
		expect(elbow?.catalogue).toMatchObject({ parameters: { radiusRatio: 0.7, angle: 90 }, words: 'r/D 0.7, 90°' });
	});

	it('says which leg of an area change the row is', () => {
		const change = (leg?: string) =>
			itemsOf([{ kind: 'gradual-expansion', areaRatio: 0.5, angle: 20, ...(leg && { leg }) }])[1];
		const [smaller, larger] = [change('smaller'), change('larger')];
		expect(smaller?.catalogue?.words).toContain('the row is the smaller leg');
		expect(larger?.catalogue?.words).toContain('the row is the larger leg');
		// The same loss on the velocity pressure of the other leg: (1/0.5)^2.
		expect((larger?.coefficient ?? 0) / (smaller?.coefficient ?? 1)).toBeCloseTo(4, 6);
	});

	it('tells how well it is known and what lies outside the range of its source', () => {
		const [, elbow] = itemsOf([{ kind: 'round-elbow-mitred', angle: 15 }]);
		expect(elbow?.catalogue).toMatchObject({ known: 'from memory', uncertainty: 0.2 });
		expect(elbow?.catalogue?.rangeNote).toMatch(/angle/);
	});

	it('is noted where the flow is too slow for its source', () => {
		const [, damper] = itemsOf([{ kind: 'damper-butterfly', angle: 10 }], { outlet: { flow: 0.005, loss: 0 } });
		expect(damper?.catalogue?.rangeNote).toMatch(/turbulent/);
	});
});

describe('an item entered by hand', () => {
	it('has no catalogue behind it', () =>
		expect(itemsOf([{ kind: 'fixed', coefficient: 0.3 }])[1]?.catalogue).toBeNull());

	it('is not what the default factor of flexible duct is', () => {
		const flexible = (keys: Json) => itemsOf([], { flexible: { length: 1, ...keys } })[1]?.source;
		expect(flexible({})).toMatch(/default/);
		expect(flexible({ factor: 3 })).toBe('entered by hand');
	});
});

describe('the duct', () => {
	it.each([
		[0.15, 'Darcy–Weisbach, Colebrook–White'],
		[0.007, 'Darcy–Weisbach, blend between the laminar law and Colebrook–White'],
		[0.003, 'Darcy–Weisbach, laminar law']
	])('names the friction law of its regime at %d m3/s', (flow, source) =>
		expect(itemsOf([], { outlet: { flow, loss: 0 } })[0]?.source).toBe(source)
	);
});
