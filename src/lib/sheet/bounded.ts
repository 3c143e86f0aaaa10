/** Quantities that a sheet takes within narrower bounds than their reader. */
import {
	LIMITS,
	readDensity,
	readFlow,
	readNumber,
	readPressure,
	readTemperature,
	refusal,
	type Reader,
	type UnitSystem
} from '$lib/engine';

interface Bounds {
	readonly min: number;
	readonly max: number;
	readonly why: (units: UnitSystem) => string;
	readonly expected: (units: UnitSystem) => string;
}

const bounded =
	<T extends number>(read: Reader<T>, { min, max, why, expected }: Bounds): Reader<T> =>
	(text, units) => {
		const reading = read(text, units);
		if (!reading.ok || (reading.value >= min && reading.value <= max)) return reading;
		return { ok: false, message: refusal(text, why(units)), expected: expected(units) };
	};

/** Of an outlet [m3/s]: nothing can be computed for one without a flow. */
export const outletFlow = bounded(readFlow, {
	...LIMITS.flow,
	why: () => 'an outlet without a flow moves no air',
	expected: (units) => `a flow above zero, such as ${units === 'SI' ? '200 L/s' : '400 cfm'}`
});

/** Where the engine's formulas of air hold [degC]. */
const AIR = { min: -50, max: 80 };
const airRange = (units: UnitSystem) => (units === 'SI' ? '−50 to 80 °C' : '−58 to 176 °F');
const outsideAir = (units: UnitSystem) => `outside ${airRange(units)}, for which the density of air is computed`;

export const temperatureOfAir = bounded(readTemperature, {
	...{ ...AIR, why: outsideAir },
	expected: (units) => `${airRange(units)}; for other air, leave it blank and give the density`
});
export const temperatureAround = bounded(readTemperature, { ...AIR, why: outsideAir, expected: airRange });

export const flexFactor = bounded(readNumber, {
	...{ min: 1, max: 100 },
	why: () => 'flexible duct loses 1 to 100 times what rigid duct does',
	expected: () => 'a number from 1 to 100, such as 4'
});

export const aspectRatio = bounded(readNumber, {
	...{ min: 1, max: 1_000 },
	why: () => 'the longer side over the shorter is 1 or more',
	expected: () => 'a number from 1 to 1000, such as 4'
});

/** Ductwork is tested at some 100 to 2000 Pa, common practice; the engine takes up to 10 000 [Pa]. */
export const testPressure = bounded(readPressure, {
	...{ min: 1, max: 10_000 },
	why: () => 'ductwork is tested at 1 to 10\u2009000 Pa',
	expected: (units) => `a pressure, such as ${units === 'SI' ? '400 or 400 Pa' : '1.5 or 1.5 in wg'}`
});

/** Standard air is near 1.2 kg/m3 in every convention [kg/m3]. */
export const standardDensity = bounded(readDensity, {
	...{ min: 1, max: 1.5 },
	why: () => 'no convention of standard air has such a density',
	expected: (units) => `a density near ${units === 'SI' ? '1.2 kg/m³, such as 1.204' : '0.075 lb/ft³, such as 0.075'}`
});
