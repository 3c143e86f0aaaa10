import { velocityPressure } from '../air';
import type { DesignRow } from '../document/types';
import { darcyWeisbach, frictionFactor, reynoldsNumber } from '../friction';
import { sectionOf } from '../shape';
import type { RowAir } from './row-airs';
import type { Settings } from './settings';

/** Flow in the section of a row. */
export interface Hydraulics {
	readonly flow: number;
	readonly air: RowAir;
	readonly area: number;
	readonly hydraulicDiameter: number;
	readonly velocity: number;
	readonly velocityPressure: number;
	readonly reynolds: number;
	readonly relativeRoughness: number;
	readonly frictionFactor: number;
	readonly frictionRate: number;
}

/**
 * Friction of a straight duct on its hydraulic diameter.
 *
 *   Dh = 4 A / P,  V = Q / A,  pv = rho V^2 / 2,  Re = rho V Dh / mu,  dp/L = f pv / Dh
 *
 * @param row size and roughness [m]
 * @param flow Q design flow [m3/s], above 0
 * @param air of the row: rho [kg/m3], mu [Pa s]
 * @param settings roughness [m]
 * @returns area [m2], Dh [m], V [m/s], pv [Pa], Re [-], roughness to Dh [-], f [-], dp/L [Pa/m]
 * @throws {OutOfRangeError} when the friction factor is asked outside its range
 * @source Darcy-Weisbach; f by Colebrook (1939) and White above Re 4000
 * @check fixtures/networks/straight-duct-ip.json
 */
export function hydraulicsOf(row: DesignRow, flow: number, air: RowAir, settings: Settings): Hydraulics {
	const { density, viscosity } = air;
	const { area, hydraulicDiameter, laminar } = sectionOf(row.size);
	const velocity = flow / area;
	const reynolds = reynoldsNumber(density, velocity, hydraulicDiameter, viscosity);
	const relativeRoughness = settings.roughnessOf(row) / hydraulicDiameter;
	const factor = frictionFactor({ reynolds, relativeRoughness, laminar });
	return {
		flow,
		air,
		area,
		hydraulicDiameter,
		velocity,
		velocityPressure: velocityPressure(density, velocity),
		reynolds,
		relativeRoughness,
		frictionFactor: factor,
		frictionRate: darcyWeisbach(factor, 1, hydraulicDiameter, density, velocity)
	};
}
