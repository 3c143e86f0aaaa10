import { exp, log } from '../arithmetic';
import { requireInRange, type Range } from '../errors';
import { ratedLoss } from './rated-loss';

/** A point of a maker's curve: flow [m3/s] and loss of total pressure [Pa]. */
export type LossPoint = readonly [flow: number, loss: number];

export interface CurveLoss {
	/** Loss at the flow asked [Pa] */
	readonly loss: number;
	/** Exponent of the flow there [-] */
	readonly exponent: number;
	/** What the curve does not cover, or null */
	readonly note: string | null;
}

const POSITIVE: Range = { min: Number.MIN_VALUE, max: Number.MAX_VALUE };
const NOT_NEGATIVE: Range = { min: 0, max: Number.MAX_VALUE };
/** Exponent of a curve of one point: the square law. */
const SQUARE = 2;

/** Points by rising flow, each with a loss that is positive and does not fall. */
function checked(formula: string, points: readonly LossPoint[]): readonly LossPoint[] {
	requireInRange(formula, 'number of points', points.length, { min: 1, max: Infinity });
	const rising = [...points].sort(([a], [b]) => a - b);
	rising.forEach(([flow, loss], i) => {
		const before = rising[i - 1];
		requireInRange(formula, 'flow', flow, before ? { min: before[0] * (1 + 1e-9), max: POSITIVE.max } : POSITIVE);
		requireInRange(formula, 'loss', loss, before ? { min: before[1], max: POSITIVE.max } : POSITIVE);
	});
	return rising;
}

/**
 * Loss of an apparatus by the points of its maker, in any order.
 *
 *   between two points ln dp is straight against ln Q: dp = dp1 (Q/Q1)^n, n = ln(dp2/dp1)/ln(Q2/Q1);
 *   beyond the first and the last point the exponent of the nearest two goes on; one point alone: n = 2
 *
 * @param points flow [m3/s], positive, no two alike, and loss [Pa], positive, not falling as the flow rises
 * @param flow Q [m3/s], from 0
 * @returns loss dp [Pa], exponent n [-] at that flow, and a note where the points do not reach it
 * @throws {OutOfRangeError} when there is no point, a point is not positive or the loss falls, or Q is negative
 * @source Common practice: a power law between measured points
 * @check none: in a test a power law comes back through its own points
 */
export function lossFromPoints(points: readonly LossPoint[], flow: number): CurveLoss {
	const rising = checked('lossFromPoints', points);
	requireInRange('lossFromPoints', 'Q', flow, NOT_NEGATIVE);
	const after = rising.findIndex(([at]) => at >= flow);
	const last = rising.length - 1;
	const i = Math.max(0, Math.min(after === -1 ? last : after, last) - 1);
	const [Q1, dp1] = rising[i] ?? [NaN, NaN];
	const [Q2, dp2] = rising[i + 1] ?? [NaN, NaN];
	const exponent = last === 0 ? SQUARE : log(dp2 / dp1) / log(Q2 / Q1);
	const loss = flow === 0 ? 0 : flow === Q2 ? dp2 : ratedLoss(dp1, Q1, flow, exponent);
	return { loss, exponent, note: noteOf(rising, flow) };
}

function noteOf(rising: readonly LossPoint[], flow: number): string | null {
	const first = rising[0]?.[0] ?? NaN;
	const last = rising.at(-1)?.[0] ?? NaN;
	if (rising.length === 1)
		return flow === first ? null : 'one point of the maker: the loss goes with the square of the flow';
	if (flow < first) return 'below the points of the maker: the power law of the first two goes on';
	if (flow > last) return 'beyond the points of the maker: the power law of the last two goes on';
	return null;
}

export interface PowerLaw {
	/** A flow in the midst of the points [m3/s] and the loss of the law there [Pa] */
	readonly flow: number;
	readonly loss: number;
	readonly exponent: number;
	/** Largest departure of a point from the law, as a fraction of the law [-] */
	readonly departure: number;
}

/**
 * The power law nearest to the points of a maker, by least squares of ln dp against ln Q.
 *
 *   dp = dpm (Q/Qm)^n, Qm and dpm the geometric means; n = sum(x y)/sum(x^2) of the departures x, y of the logarithms
 *
 * @param points flow [m3/s], positive, no two alike, and loss [Pa], positive, not falling; one point alone: n = 2
 * @returns flow Qm [m3/s], loss dpm [Pa], exponent n [-], departure [-]: ratedLoss takes the first three
 * @throws {OutOfRangeError} when there is no point, a point is not positive or the loss falls
 * @source Method of least squares
 * @check none: in a test a power law comes back, and noise is averaged
 */
export function powerLawFit(points: readonly LossPoint[]): PowerLaw {
	const rising = checked('powerLawFit', points);
	const logarithms = rising.map(([flow, loss]) => [log(flow), log(loss)] as const);
	const mean = (k: 0 | 1) => logarithms.reduce((sum, one) => sum + one[k], 0) / logarithms.length;
	const x0 = mean(0);
	const y0 = mean(1);
	const xx = logarithms.reduce((sum, [x]) => sum + (x - x0) * (x - x0), 0);
	const xy = logarithms.reduce((sum, [x, y]) => sum + (x - x0) * (y - y0), 0);
	const exponent = rising.length === 1 ? SQUARE : xy / xx;
	const departures = logarithms.map(([x, y]) => Math.abs(exp(y - y0 - exponent * (x - x0)) - 1));
	return { flow: exp(x0), loss: exp(y0), exponent, departure: Math.max(...departures) };
}
