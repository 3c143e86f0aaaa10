import { describe, expect, it } from 'vitest';
import fixture from '../../../../fixtures/second-opinion/fluids.json';
import { TRANSITION, frictionColebrook1939, frictionFactor, regime } from '.';

const points = fixture.friction.rows.map(([reynolds = NaN, relativeRoughness = NaN, f = NaN]) => ({
	reynolds,
	relativeRoughness,
	f
}));
const of = (name: ReturnType<typeof regime>) => points.filter(({ reynolds }) => regime(reynolds) === name);

describe(`friction factors against a second opinion (${fixture.package})`, () => {
	it('covers Re 1 to 1e8 and roughness 0 to 0.05', () => {
		expect(points.length).toBeGreaterThanOrEqual(2_000);
		expect(Math.min(...points.map(({ reynolds }) => reynolds))).toBe(1);
		expect(Math.max(...points.map(({ reynolds }) => reynolds))).toBe(1e8);
		expect(Math.min(...points.map(({ relativeRoughness }) => relativeRoughness))).toBe(0);
		expect(Math.max(...points.map(({ relativeRoughness }) => relativeRoughness))).toBe(0.05);
	});

	it('is the same within 1e-14 in turbulent flow', () => {
		expect(of('turbulent').length).toBeGreaterThan(1_700);
		// The fixture has fifteen digits: up to 5e-15 of the value.
		for (const { f, ...spec } of of('turbulent'))
			expect(Math.abs(frictionFactor(spec) / f - 1), JSON.stringify(spec)).toBeLessThan(1e-14);
	});

	it('is the same in laminar flow', () => {
		expect(of('laminar').length).toBeGreaterThan(100);
		for (const { f, ...spec } of of('laminar')) expect(frictionFactor(spec) / f).toBeCloseTo(1, 14);
	});

	// The package goes on with Colebrook–White from 2040, and jumps there; ours rises from one law to the other.
	it('solves the same equation in the transition, and lies between both laws there', () => {
		expect(of('transition').length).toBeGreaterThan(100);
		for (const { f, reynolds, relativeRoughness } of of('transition')) {
			expect(Math.abs(frictionColebrook1939(reynolds, relativeRoughness) / f - 1)).toBeLessThan(1e-14);
			const ours = frictionFactor({ reynolds, relativeRoughness });
			expect(ours).toBeLessThanOrEqual(f * (1 + 1e-12));
			expect(ours).toBeGreaterThanOrEqual(64 / reynolds - 1e-15);
		}
		expect(TRANSITION).toEqual({ min: 2_000, max: 4_000 });
	});
});
