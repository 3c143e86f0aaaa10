import type { Pair } from './types';

/**
 * Static pressure inside a row's duct at its two ends: before its outlet, which is a part of the row.
 *
 *   supply: ps + outlet loss;  other sides: ps - outlet loss
 *
 * @returns gauge static pressure [Pa] at the fan end and at the far end
 */
export function staticInside([, { side, staticPressure, outletLoss }]: Pair): readonly [number, number] {
	const [near, far] = staticPressure;
	return [near, side === 'supply' ? far + outletLoss : far - outletLoss];
}

/** The one of the two that is farther from the pressure around the duct [Pa]. */
export function extremeStatic(pair: Pair): number {
	const [near, far] = staticInside(pair);
	return Math.abs(near) > Math.abs(far) ? near : far;
}
