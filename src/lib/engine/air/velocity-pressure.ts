/**
 * Velocity pressure.
 *
 *   pv = rho V^2/2
 *
 * @param rho density [kg/m3]
 * @param V mean velocity [m/s]
 * @returns pv velocity pressure [Pa]
 * @source Bernoulli's equation
 * @check fixtures/published/air.json
 */
export function velocityPressure(rho: number, V: number): number {
	return (rho * V * V) / 2;
}
