import { pow } from '../arithmetic';
import { requireInRange, type Range } from '../errors';
import type { LeakageClass } from './leakage-class';

/** A class of the list, or an inch-pound class of any number: its flow at 1 in. wg in cfm by 100 ft2. */
export type Tightness = Pick<LeakageClass, 'coefficient'> | { readonly CL: number };

/** Static pressures of ducts, by magnitude [Pa]. */
export const LEAKAGE_PRESSURE: Range = { min: 0, max: 10_000 };
const SURFACE: Range = { min: 0, max: Number.MAX_VALUE };
/** CL 3 is the tightest that is specified, 48 unsealed; 0 is no leakage [cfm/(100 ft2 in. wg^0.65)]. */
const CL_RANGE: Range = { min: 0, max: 1_000 };

const FOOT = 0.3048; // m
const INCH_OF_WATER = 249.089; // Pa, water of 4 °C
/** m/s of one cfm by 100 ft2 */
const CFM_BY_100_FT2 = FOOT / 60 / 100;

/**
 * Leakage coefficient of an inch-pound leakage class.
 *
 *   F = CL p^0.65, F in cfm by 100 ft2, p in inches of water; thus c = CL (0.3048/6000)/249.089^0.65 in SI
 *
 * @param CL leakage class, 0 to 1000 [cfm/(100 ft2 in. wg^0.65)]
 * @returns c [m3/(s m2 Pa^0.65)], about 1.407e-6 CL
 * @throws {OutOfRangeError} when CL leaves its range
 * @source HVAC Air Duct Leakage Test Manual, CL = F/p^0.65, as quoted in a maker's manual of a leakage tester
 * @check fixtures/published/leakage.json
 */
export function coefficientOfClass(CL: number): number {
	requireInRange('coefficientOfClass', 'CL', CL, CL_RANGE);
	return (CL * CFM_BY_100_FT2) / pow(INCH_OF_WATER, 0.65);
}

/**
 * Air that leaks through the seams and joints of ducts.
 *
 *   Q = c A |p|^0.65
 *
 * @param tightness class, with its coefficient c [m3/(s m2 Pa^0.65)], or CL [cfm/(100 ft2 in. wg^0.65)]
 * @param surface A of the ducts, their perimeter by their length [m2]
 * @param pressure p mean static pressure inside above that outside [Pa], -10 000 to 10 000; below 0 air leaks in
 * @returns Q leakage [m3/s], by magnitude
 * @throws {OutOfRangeError} when a value leaves its range
 * @source EN 1507 and EN 12237 for the form; p^0.65 is the law of the test, not of each leak
 * @check fixtures/published/leakage.json
 */
export function leakageFlow(tightness: Tightness, surface: number, pressure: number): number {
	const p = Math.abs(pressure);
	requireInRange('leakageFlow', 'surface', surface, SURFACE);
	requireInRange('leakageFlow', 'pressure', p, LEAKAGE_PRESSURE);
	const c = 'CL' in tightness ? coefficientOfClass(tightness.CL) : tightness.coefficient;
	return c * surface * pow(p, 0.65);
}

/**
 * The most that ducts of a class may leak in a test.
 *
 *   Qmax = c A |pt|^0.65
 *
 * @param tightness class, with its coefficient c [m3/(s m2 Pa^0.65)], or CL [cfm/(100 ft2 in. wg^0.65)]
 * @param surface A of the ducts under test [m2]
 * @param testPressure pt static pressure of the test [Pa]
 * @returns Qmax [m3/s]
 * @throws {OutOfRangeError} when a value leaves its range
 * @source EN 1507 and EN 12237; inch-pound: HVAC Air Duct Leakage Test Manual
 * @check fixtures/published/leakage.json
 */
export function allowableLeakage(tightness: Tightness, surface: number, testPressure: number): number {
	return leakageFlow(tightness, surface, testPressure);
}

/**
 * The inch-pound leakage class that a test found.
 *
 *   CL = F/p^0.65
 *
 * @param flow Q leakage measured [m3/s]
 * @param surface A of the ducts under test [m2], positive
 * @param testPressure pt static pressure of the test [Pa], not 0
 * @returns CL [cfm/(100 ft2 in. wg^0.65)]
 * @throws {OutOfRangeError} when a value leaves its range
 * @source HVAC Air Duct Leakage Test Manual, as quoted in a maker's manual of a leakage tester
 * @check fixtures/published/leakage.json
 */
export function measuredClass(flow: number, surface: number, testPressure: number): number {
	requireInRange('measuredClass', 'surface', surface, { min: Number.MIN_VALUE, max: SURFACE.max });
	requireInRange('measuredClass', 'testPressure', Math.abs(testPressure), { min: 1, max: LEAKAGE_PRESSURE.max });
	return flow / leakageFlow({ CL: 1 }, surface, testPressure);
}
