import { airAtTemperature, type AirState } from '../air';
import type { DesignDocument } from '../document/types';
import type { Network } from './network';

/** Air of one row. */
export interface RowAir extends AirState {
	/** Where it differs from that of the design [degC]. */
	readonly temperature: number | null;
	/** 0 to 1; null where the air is given by its density. */
	readonly relativeHumidity: number | null;
	/** Colder than the dew point of the design's air. */
	readonly condenses: boolean;
}

/**
 * Air in each row: the design's, or that air at the temperature which the row, or one that it joins, names.
 *
 * @param network rows as trees
 * @param document air of the design, by its condition where a row names a temperature
 * @param air of the design: density [kg/m3], viscosity [Pa s]
 * @returns air of each row: density [kg/m3], viscosity [Pa s]
 * @throws {OutOfRangeError} when a temperature leaves the range of a formula
 * @source That of the air's state; moisture and pressure are the design's
 * @check fixtures/published/air.json
 */
export function rowAirs({ rows, parents, order }: Network, document: DesignDocument, air: AirState): readonly RowAir[] {
	const condition = document.air;
	const relativeHumidity = 'density' in condition ? null : (condition.relativeHumidity ?? 0);
	const { density, viscosity } = air;
	const own: RowAir = { density, viscosity, temperature: null, relativeHumidity, condenses: false };
	const airs = new Array<RowAir>(rows.length).fill(own);
	if ('density' in condition) return airs;
	const known = new Map<number, RowAir>();
	for (let i = 0; i < order.length; i += 1) {
		const place = order[i] ?? 0;
		const named = rows[place]?.temperature;
		if (named === undefined) {
			const parent = parents[place] ?? -1;
			if (parent >= 0) airs[place] = airs[parent] ?? own;
			continue;
		}
		let there = known.get(named);
		if (!there) {
			const { note: _note, ...state } = airAtTemperature(condition, named);
			known.set(named, (there = { ...state, temperature: named }));
		}
		airs[place] = there;
	}
	return airs;
}

/** Whether all rows hold one and the same air. */
export const isUniform = (airs: readonly RowAir[]): boolean => airs.every((one) => one === airs[0]);
