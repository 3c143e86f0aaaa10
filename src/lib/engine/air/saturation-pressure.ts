import { exp, log } from '../arithmetic';
import { requireInRange, type Range } from '../errors';

/** Temperature of the saturation formula [°C]. */
export const SATURATION_TEMPERATURE: Range = { min: -100, max: 200 };

const ABSOLUTE_ZERO = 273.15;
/** Ice below, water above [°C]. */
const TRIPLE_POINT = 0.01;

/**
 * Saturation pressure of water vapour, over ice below the triple point.
 *
 *   ln p = c1/T + c2 + c3 T + c4 T^2 + c5 T^3 + c6 T^4 + c7 ln T
 *
 * @param t temperature [°C], -100 to 200
 * @returns p saturation pressure [Pa]
 * @throws {OutOfRangeError} when t leaves the range
 * @source Hyland & Wexler, Formulations for the thermodynamic properties of the saturated phases of H2O (1983)
 * @check fixtures/published/air.json
 */
export function saturationPressure(t: number): number {
	requireInRange('saturationPressure', 't', t, SATURATION_TEMPERATURE);
	const T = t + ABSOLUTE_ZERO;
	if (t <= TRIPLE_POINT) {
		const cubic = 6.2215701e-7 + T * (2.0747825e-9 - T * 9.484024e-13);
		return exp(-5674.5359 / T + 6.3925247 + T * (-9.677843e-3 + T * cubic) + 4.1635019 * log(T));
	}
	const quadratic = 4.1764768e-5 - T * 1.4452093e-8;
	return exp(-5800.2206 / T + 1.3914993 + T * (-4.8640239e-2 + T * quadratic) + 6.5459673 * log(T));
}
