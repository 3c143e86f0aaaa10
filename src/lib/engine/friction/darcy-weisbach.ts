/**
 * Friction loss of a straight duct.
 *
 *   dp = f (L/Dh) rho V^2/2
 *
 * @param f Darcy friction factor [-]
 * @param L length [m]
 * @param Dh hydraulic diameter [m]
 * @param rho density [kg/m3]
 * @param V mean velocity [m/s]
 * @returns dp loss of total pressure [Pa]
 * @source Darcy–Weisbach equation
 * @check fixtures/published/friction.json
 */
export function darcyWeisbach(f: number, L: number, Dh: number, rho: number, V: number): number {
	return ((f * L) / Dh) * ((rho * V * V) / 2);
}

/**
 * Reynolds number.
 *
 *   Re = rho V Dh/mu
 *
 * @param rho density [kg/m3]
 * @param V mean velocity [m/s]
 * @param Dh hydraulic diameter [m]
 * @param mu dynamic viscosity [Pa s]
 * @returns Re [-]
 * @source Definition
 * @check fixtures/published/friction.json
 */
export function reynoldsNumber(rho: number, V: number, Dh: number, mu: number): number {
	return (rho * V * Dh) / mu;
}
