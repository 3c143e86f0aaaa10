/** Standard acceleration of free fall [m/s2], CGPM 1901. */
const G = 9.80665;

/**
 * Gain of total pressure by the weight of the surroundings, gauge pressures taken at each level.
 *
 *   dp = g (rho_surroundings - rho) dz
 *
 * @param surroundings density of the air around the duct [kg/m3]
 * @param rho density of the air in the duct [kg/m3]
 * @param dz rise in the direction of flow [m]
 * @returns dp gain [Pa]; negative where warm air is driven down
 * @source Hydrostatics
 * @check fixtures/networks/warm-riser.json
 */
export function thermalGravity(surroundings: number, rho: number, dz: number): number {
	return G * (surroundings - rho) * dz + 0;
}
