import { velocityPressure } from '../air';
import type { DesignRow } from '../document/types';
import { darcyWeisbach, frictionFactor, reynoldsNumber } from '../friction';
import type { FittingContext } from '../fitting';
import { sectionOf, type Size } from '../shape';
import type { RowAir } from './row-airs';
import type { Settings } from './settings';

/** Flow in the section of a row: what its fittings are asked with. */
export interface Hydraulics extends FittingContext {
	readonly flow: number;
	readonly air: RowAir;
	readonly area: number;
	readonly hydraulicDiameter: number;
	readonly velocityPressure: number;
	readonly frictionRate: number;
}

/** To be filled for one row after another: thousands of rows would else leave as many behind. */
export type HydraulicsOfRow = { -readonly [Name in keyof Hydraulics]: Hydraulics[Name] };

export function blankHydraulics(air: RowAir): HydraulicsOfRow {
	return {
		...{ size: NO_SIZE, flow: NaN, air, area: NaN, hydraulicDiameter: NaN, velocity: NaN, velocityPressure: NaN },
		...{ reynolds: NaN, relativeRoughness: NaN, frictionFactor: NaN, frictionRate: NaN }
	};
}

const NO_SIZE: Size = { shape: 'round', diameter: NaN };

/**
 * Friction of a straight duct on its hydraulic diameter.
 *
 *   Dh = 4 A / P,  V = Q / A,  pv = rho V^2 / 2,  Re = rho V Dh / mu,  dp/L = f pv / Dh
 *
 * @param into takes area [m2], Dh [m], V [m/s], pv [Pa], Re [-], roughness to Dh [-], f [-], dp/L [Pa/m]
 * @param row size and roughness [m]
 * @param flow Q design flow [m3/s], above 0
 * @param air of the row: rho [kg/m3], mu [Pa s]
 * @param settings roughness [m]
 * @throws {OutOfRangeError} when the friction factor is asked outside its range
 * @source Darcy-Weisbach; f by Colebrook (1939) and White above Re 4000
 * @check fixtures/networks/straight-duct-ip.json
 */
export function findHydraulics(
	into: HydraulicsOfRow,
	row: DesignRow,
	flow: number,
	air: RowAir,
	settings: Settings
): Hydraulics {
	const { density, viscosity } = air;
	const { area, hydraulicDiameter, laminar } = sectionOf(row.size);
	const velocity = flow / area;
	const reynolds = reynoldsNumber(density, velocity, hydraulicDiameter, viscosity);
	const relativeRoughness = settings.roughnessOf(row) / hydraulicDiameter;
	into.size = row.size;
	into.flow = flow;
	into.air = air;
	into.area = area;
	into.hydraulicDiameter = hydraulicDiameter;
	into.velocity = velocity;
	into.velocityPressure = velocityPressure(density, velocity);
	into.reynolds = reynolds;
	into.relativeRoughness = relativeRoughness;
	into.frictionFactor = frictionFactor({ reynolds, relativeRoughness, laminar });
	into.frictionRate = darcyWeisbach(into.frictionFactor, 1, hydraulicDiameter, density, velocity);
	return into;
}
