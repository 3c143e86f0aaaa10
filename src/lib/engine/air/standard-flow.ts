/** Density of standard air in SI practice: dry, 20 °C, 101 325 Pa [kg/m3]. */
export const STANDARD_DENSITY = 1.204;
/** Density of standard air in inch-pound practice: 0.075 lb/ft3 [kg/m3]. */
export const STANDARD_DENSITY_IP = (0.075 * 0.45359237) / (0.3048 * 0.3048 * 0.3048);

/**
 * Volume flow in the duct of a flow that is stated for standard air: the mass is the same.
 *
 *   Q = Qs rho_s/rho
 *
 * @param standard Qs flow of standard air [m3/s]
 * @param density rho of the air in the duct [kg/m3], positive
 * @param standardDensity rho_s of standard air [kg/m3]; 1.204 unless given, 1.2014 (0.075 lb/ft3) in inch-pound practice
 * @returns Q actual flow [m3/s]
 * @source Conservation of mass; densities of standard air: common practice
 * @check none: one division; laws in standard-flow.test.ts
 */
export function actualFlow(standard: number, density: number, standardDensity = STANDARD_DENSITY): number {
	return (standard * standardDensity) / density;
}

/**
 * Flow of standard air with the mass of a flow in the duct.
 *
 *   Qs = Q rho/rho_s
 *
 * @param actual Q flow in the duct [m3/s]
 * @param density rho of the air in the duct [kg/m3]
 * @param standardDensity rho_s of standard air [kg/m3], positive; 1.204 unless given
 * @returns Qs flow of standard air [m3/s]
 * @source Conservation of mass; densities of standard air: common practice
 * @check none: one division; laws in standard-flow.test.ts
 */
export function standardFlow(actual: number, density: number, standardDensity = STANDARD_DENSITY): number {
	return (actual * density) / standardDensity;
}
