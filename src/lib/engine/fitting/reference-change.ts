/**
 * A coefficient on the velocity pressure of another leg: the loss stays the same.
 *
 *   C2 = C1 (V1/V2)^2
 *
 * @param C1 coefficient on the velocity pressure of the first leg [-]
 * @param V1 velocity in the first leg [m/s]
 * @param V2 velocity in the second leg [m/s], not 0
 * @returns C2 coefficient on the velocity pressure of the second leg [-]
 * @source Definition of the loss coefficient
 * @check fixtures/published/area-changes.json
 */
export function coefficientOnLeg(C1: number, V1: number, V2: number): number {
	const ratio = V1 / V2;
	return C1 * ratio * ratio;
}

/**
 * The same for the two legs of an area change, by continuity.
 *
 *   C_larger = C_smaller/a^2, a = smaller/larger area
 *
 * @param coefficient C_smaller [-]
 * @param areaRatio a [-], above 0 to 1
 * @param leg the leg that the row is
 * @returns coefficient on the velocity pressure of that leg [-]
 * @source Definition of the loss coefficient
 * @check fixtures/published/area-changes.json
 */
export function coefficientOfLeg(coefficient: number, areaRatio: number, leg: string): number {
	return leg === 'larger' ? coefficient / (areaRatio * areaRatio) : coefficient;
}
