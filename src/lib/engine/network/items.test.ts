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

describe('flexible duct', () => {
	// Haaland (1983) for the friction of stretched duct, 0.9 mm: within 2 % of Colebrook and White.
	it('loses by its compression what the stretched duct loses, times the factor of that compression', () => {
		const [, flexible] = itemsOf([], { flexible: { length: 2, compression: 0.15 } });
		const V = 0.15 / (0.01 * Math.PI);
		const f = (-1.8 * Math.log10((0.9e-3 / 0.2 / 3.7) ** 1.11 + 6.9 / ((1.2 * V * 0.2) / 1.8134e-5))) ** -2;
		const factor = 1 + 0.58 * 15 * Math.exp(-0.00496 * 200);
		const expected = factor * (f / 0.2) * 0.6 * V * V * 2;
		expect(Math.abs((flexible?.loss ?? NaN) / expected - 1)).toBeLessThan(0.02);
	});
});

describe('equipment by the data of its maker', () => {
	const lossOf = (keys: Json, flow = 0.15) =>
		itemsOf([], { equipment: [{ name: 'Unit', ...keys }], outlet: { flow, loss: 0 } })[1]?.loss;
	const points = [
		[0.1, 10],
		[0.2, 40],
		[0.4, 120]
	];

	it('goes through its points, and by a power law between and beyond them', () => {
		expect(lossOf({ points }, 0.2)).toBe(40);
		expect(lossOf({ points }, 0.1)).toBeCloseTo(10, 12);
		// The first two make the square law.
		expect(lossOf({ points }, 0.15)).toBeCloseTo(22.5, 10);
		expect(lossOf({ points }, 0.05)).toBeCloseTo(2.5, 10);
		expect(lossOf({ points }, 0.8)).toBeCloseTo(360, 8);
	});

	it('is noted where its points do not reach', () => {
		const rulesAt = (flow: number) =>
			solutionOf({
				...{ format: 'evendraft/design@1', air: { density: 1.2 } },
				rows: [
					{
						...{ tag: 'S', joins: null, side: 'supply', size: { shape: 'round', diameter: 0.3 }, length: 5 },
						...{ equipment: [{ name: 'Unit', points }], outlet: { flow, loss: 0 } }
					}
				]
			}).flags.map(({ rule }) => rule);
		expect(rulesAt(0.3)).not.toContain('coefficient-range');
		expect(rulesAt(0.5)).toContain('coefficient-range');
	});

	it.each([
		['clean', 60],
		['mean', 130],
		['dirty', 200]
	])('is a filter, %s', (state, loss) => {
		expect(lossOf({ filter: { clean: 60, final: 200, state } })).toBe(loss);
		expect(lossOf({ filter: { clean: 60, final: 200, state }, atFlow: 0.3 })).toBeCloseTo(loss / 2, 10);
		expect(lossOf({ filter: { clean: 60, final: 200, state }, atFlow: 0.3, exponent: 2 })).toBeCloseTo(loss / 4, 10);
	});
});

describe('a lined duct', () => {
	const lossesOf = (keys: Json) => itemsOf([{ kind: 'rectangular-elbow-smooth' }], keys).map(({ loss }) => loss);

	it('is computed with the free space inside its liner', () => {
		const clear = { size: { shape: 'rectangular', width: 0.3, height: 0.2 } };
		const metal = { size: { shape: 'rectangular', width: 0.4, height: 0.3 } };
		expect(lossesOf({ ...clear, lining: { thickness: 0.05, sizeIs: 'clear' } })).toEqual(lossesOf(clear));
		lossesOf({ ...metal, lining: { thickness: 0.05, sizeIs: 'metal' } }).forEach((loss, at) =>
			expect(loss).toBeCloseTo(lossesOf(clear)[at] ?? NaN, 9)
		);
	});
});
