// Entries and exits.
import { describe, expect, it } from 'vitest';
import entries from '../../../../fixtures/published/entries.json';
import exits from '../../../../fixtures/published/exits.json';
import { describePublished } from '../../../../fixtures/published/published-checks';
import {
	freeBellmouthIdelchik,
	projectingEntryIdelchik,
	roundedEntryIdelchik,
	roundedEntryRennels2012
} from './entry-formulas';
import { coefficientOf } from './coefficient-of';
import { plainExit } from './exits';
import { flatCapSmacna, taperedHoodAcgih } from './hood-tables';
import type { FittingContext } from './types';
import { entryChecks, exitChecks } from '../published/ends';

describePublished('entries against published values', entries, entryChecks);

describePublished('exits against published values', exits, exitChecks);

describe('the rounded entry of Rennels & Hudson', () => {
	// fluids package, entrance_rounded: a point of their diagram 9.2
	it('is 0.098395 at r/D 0.235', () => {
		expect(roundedEntryRennels2012(0.235)).toBeCloseTo(0.09839534618360923, 12);
	});

	it('settles at 0.03 from r/D 1 on', () => {
		expect(roundedEntryRennels2012(1)).toBeCloseTo(0.03, 4);
		expect(roundedEntryRennels2012(2)).toBe(roundedEntryRennels2012(1));
	});
});

describe('entries', () => {
	it('lose less the rounder the edge', () => {
		for (let r = 0; r < 0.2; r += 0.005) {
			expect(freeBellmouthIdelchik(r + 0.005)).toBeLessThan(freeBellmouthIdelchik(r));
			expect(roundedEntryIdelchik(r + 0.005)).toBeLessThan(roundedEntryIdelchik(r));
			expect(roundedEntryRennels2012(r + 0.005)).toBeLessThan(roundedEntryRennels2012(r));
		}
	});

	it('are worse with a longer projection and better with a thicker edge', () => {
		for (const L of [0.001, 0.005, 0.03, 0.1, 0.4]) {
			expect(projectingEntryIdelchik(0.01, L * 1.1)).toBeGreaterThan(projectingEntryIdelchik(0.01, L));
			expect(projectingEntryIdelchik(0.03, L)).toBeLessThan(projectingEntryIdelchik(0.01, L));
		}
	});
});

describe('hoods and caps', () => {
	it('taper best at 45°, and worse with a rectangular face until they are a flange', () => {
		for (let d = 15; d < 180; d += 1) {
			const [here, next] = [taperedHoodAcgih(d, 'round'), taperedHoodAcgih(d + 1, 'round')];
			if (d < 45) expect(next).toBeLessThan(here);
			else expect(next).toBeGreaterThan(here);
			expect(taperedHoodAcgih(d, 'rectangular')).toBeGreaterThan(here);
		}
		expect(taperedHoodAcgih(180, 'rectangular')).toBe(taperedHoodAcgih(180, 'round'));
	});

	it('lose less the farther the cap, at last as the open end does (Idelchik 3-1 within 10 %; energy)', () => {
		for (const way of ['intake', 'exhaust'] as const)
			for (let x = 0.1; x < 0.95; x += 0.05)
				expect(flatCapSmacna(x + 0.05, way)).toBeLessThanOrEqual(flatCapSmacna(x, way));
		expect(flatCapSmacna(1, 'exhaust')).toBe(plainExit(1));
		expect(Math.abs(flatCapSmacna(1, 'intake') / projectingEntryIdelchik(0, 1) - 1)).toBeLessThanOrEqual(0.1 + 1e-12);
	});

	it('take the coefficient of the maker as it is, and say when there is none', () => {
		for (const kind of ['intake-hood', 'intake-louvre', 'exhaust-hood', 'exhaust-louvre', 'discharge-against-wall']) {
			expect(coefficientOf(kind, { coefficient: 2.4 }, ROW)).toMatchObject({ coefficient: 2.4, rangeNote: null });
			expect(coefficientOf(kind, {}, ROW)).toMatchObject({ coefficient: 0, inRange: false });
		}
	});
});

const ROW: FittingContext = {
	size: { shape: 'round', diameter: 0.3 },
	...{ reynolds: 3e5, velocity: 8, relativeRoughness: 0.0003, frictionFactor: 0.017 }
};
