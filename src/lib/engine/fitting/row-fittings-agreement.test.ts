// Methods that know nothing of one another, where they should agree.
import { describe, expect, it } from 'vitest';
import { frictionFactor } from '../friction';
import { conicalContractionIdelchik, coneFriction } from './area-change-idelchik';
import { conicalContractionRennels2012, conicalExpansionRennels2012 } from './area-change-rennels';
import {
	conicalExpansionTableIdelchik,
	gradualContractionSmacna,
	pyramidalExpansionIdelchik,
	pyramidalExpansionSmacna
} from './area-change-tables';
import { bendAspectFactorIdelchik, bendIdelchik } from './bend-idelchik';
import { bendMiller } from './bend-miller';
import { bendIto1960, mitreRennels2012 } from './bend-rivals';
import { gateDamper } from './damper-tables';
import { projectingEntryIdelchik } from './entry-formulas';
import { equivalentAngle } from './equivalent-angle';
import { taperedHoodAcgih } from './hood-tables';
import { mitreIdelchik } from './mitre-idelchik';
import { coefficientOf } from './coefficient-of';
import { thinPlateBlevins, thinPlateIdelchik, wireScreenBlevins, wireScreenIdelchik } from './screen-formulas';
import { splitterSmacna, splitterVanes } from './splitter-vanes';

const ratio = (a: number, b: number): number => Math.max(a / b, b / a);

describe('bends against the worked values of the fluids package', () => {
	it.each([
		[45, 1, 0.1493],
		[45, 2, 0.1243],
		[180, 1, 0.5903],
		[180, 2, 0.2128],
		[135, 1, 0.4175]
	])('Ito, %d°, r/D %d at Re 2e5: %d', (angle, R, K) => {
		expect(ratio(bendIto1960(R, 2e5, angle), K)).toBeLessThan(1.01);
	});

	// Between the points of the chart as it is carried here
	it.each([
		[1.2, 65, 7e4, 0.19791],
		[1.7, 110, 3e5, 0.2472],
		[2.5, 80, 1.5e6, 0.15725],
		[3.5, 40, 2e4, 0.15382]
	])('Miller, r/D %d, %d° at Re %d, roughness 0.0003: %d within 4 %%', (R, angle, Re, K) => {
		// The package takes the friction factors at 1e6 at most.
		const factor = (relativeRoughness: number) => frictionFactor({ reynolds: Math.min(Re, 1e6), relativeRoughness });
		expect(ratio(bendMiller(R, angle, Re, factor(0.0003), factor(0)), K)).toBeLessThan(1.04);
	});
});

describe('elbows by independent methods', () => {
	it('mitred, 30 to 90°: Idelchik and Rennels within 13 %', () => {
		for (const d of [30, 45, 60, 75, 90])
			expect(ratio(mitreIdelchik(d), mitreRennels2012(d)), `${d}°`).toBeLessThan(1.13);
	});

	// Miller, Internal Flow Systems, chart of mitred bends, as the fluids package fitted it, Re 1e6
	it.each([
		[60, 0.508],
		[75, 0.788],
		[90, 1.125]
	])('mitred, %d°: Idelchik within 10 %% of Miller, %d', (d, K) => {
		expect(ratio(mitreIdelchik(d), K)).toBeLessThan(1.1);
	});

	// Idelchik, 3rd ed., diagram 6-1: C1 = 0.85 + 0.125/(H/W) to 4, 1.115 - 0.84/(H/W) above, at second hand
	it('rectangular: the remembered factor C1 lies within 8 % of the closed form of its diagram', () => {
		for (const h of [0.25, 0.5, 0.75, 1, 1.5, 2, 3, 4, 5, 6, 8]) {
			const form = h <= 4 ? 0.85 + 0.125 / h : 1.115 - 0.84 / h;
			expect(ratio(bendAspectFactorIdelchik(h), form), `H/W ${h}`).toBeLessThan(1.08);
		}
	});

	// Each passage between the vanes is a bend of its own, r/w = (1 + CR)/(2 (1 - CR))
	it.each([
		[1, 0.05],
		[1, 0.1],
		[2, 0.05]
	])('with %d splitter vanes, throat %d W: within 10 %% of the bends between them by Idelchik', (vanes, throat) => {
		const CR = splitterVanes(vanes, throat, 1).curveRatio;
		const between = bendIdelchik(90, (1 + CR) / (2 * (1 - CR)));
		expect(ratio(splitterSmacna(vanes, CR, 1), between)).toBeLessThan(1.1);
	});
});

describe('area changes by independent methods', () => {
	const f = 0.018;

	it('pyramidal expansion, 45 to 180°: the tables of SMACNA and Idelchik within 25 %, to 90° within 9 %', () => {
		for (const d of [45, 60, 90, 120, 180])
			for (const a of [0.25, 0.5]) {
				const idelchik = pyramidalExpansionIdelchik(d, a, 3e5) + coneFriction(d, a, f);
				expect(ratio(pyramidalExpansionSmacna(d, a), idelchik), `${d}°, ${a}`).toBeLessThan(d <= 90 ? 1.09 : 1.25);
			}
	});

	it('conical expansion, 60 to 180°: the table of Idelchik and Rennels within 13 %', () => {
		for (const d of [60, 90, 180])
			for (const a of [0.1, 0.2, 0.3, 0.5])
				expect(
					ratio(conicalExpansionTableIdelchik(d, a), conicalExpansionRennels2012(d, a, 0)),
					`${d}°, ${a}`
				).toBeLessThan(1.13);
	});

	it('cones and pyramids, 15 to 60°: the two tables of Idelchik within 35 %, the pyramid mostly the worse', () => {
		for (const d of [15, 20, 30, 40, 60])
			for (const a of [0.25, 0.5])
				expect(
					ratio(pyramidalExpansionIdelchik(d, a, 3e5), conicalExpansionTableIdelchik(d, a)),
					`${d}°, ${a}`
				).toBeLessThan(1.35);
	});

	it('contraction, 20 to 90°: Idelchik and Rennels within 15 %', () => {
		for (const d of [20, 30, 60, 90])
			for (const a of [0.25, 0.5])
				expect(
					ratio(conicalContractionIdelchik(d, a) + coneFriction(d, a, f), conicalContractionRennels2012(d, a, f)),
					`${d}°, ${a}`
				).toBeLessThan(1.15);
	});

	it('contraction, 90 to 180°: Idelchik and the table of SMACNA within 22 %', () => {
		for (const d of [90, 120, 150, 180])
			for (const a of [0.25, 0.5])
				expect(ratio(conicalContractionIdelchik(d, a), gradualContractionSmacna(d, a)), `${d}°, ${a}`).toBeLessThan(
					1.22
				);
	});

	it('the cone of the same areas and length is the cone drawn out', () => {
		const [narrow, wide, length] = [0.2, 0.35, 0.4];
		const side = Math.sqrt((Math.PI / 4) * narrow * narrow);
		const angle = (2 * Math.atan((wide - narrow) / 2 / length) * 180) / Math.PI;
		expect(equivalentAngle((narrow / wide) ** 2, length / side)).toBeCloseTo(angle, 10);
	});
});

describe('entries by independent methods', () => {
	it('hoods of the exhaust trade within 10 % of the entries of Idelchik', () => {
		const row = { ...ROW, size: { shape: 'round', diameter: 0.3 } } as const;
		expect(ratio(coefficientOf('hood-plain', {}, row).coefficient, projectingEntryIdelchik(0, 1))).toBeLessThan(1.1);
		expect(ratio(coefficientOf('hood-flanged', {}, row).coefficient, projectingEntryIdelchik(0, 0))).toBeLessThan(1.1);
		expect(taperedHoodAcgih(180, 'round')).toBe(projectingEntryIdelchik(0, 0));
	});
});

const ROW = { reynolds: 3e5, velocity: 8, relativeRoughness: 0.0003, frictionFactor: 0.017 };

describe('screens, plates and gates by independent methods', () => {
	it('thin plate, free area 0.2 to 0.8: Idelchik and Blevins within 16 %', () => {
		for (const f of [0.2, 0.25, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8])
			expect(ratio(thinPlateIdelchik(f), thinPlateBlevins(f)), `${f}`).toBeLessThan(1.16);
	});

	it('wire screen, free area 0.3 to 0.8: Idelchik and Blevins within 22 %', () => {
		for (const f of [0.3, 0.4, 0.5, 0.6, 0.7, 0.8])
			expect(ratio(wireScreenIdelchik(f), wireScreenBlevins(f, 1e3)), `${f}`).toBeLessThan(1.22);
	});

	// Weisbach, contraction of a jet, 0.63 + 0.37 o^3 (from memory), and Borda and Carnot behind it
	it('rectangular gate, opening 0.2 to 0.6: within 17 % of the jet that contracts and widens again', () => {
		for (const o of [0.2, 0.3, 0.4, 0.5, 0.6]) {
			const jet = 1 / ((0.63 + 0.37 * o * o * o) * o) - 1;
			expect(ratio(gateDamper(o, 'rectangular'), jet * jet), `${o}`).toBeLessThan(1.17);
		}
	});
});
