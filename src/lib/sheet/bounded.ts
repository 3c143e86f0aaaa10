/** Quantities that a sheet takes within narrower bounds than their reader. */
import { LIMITS, readFlow, readNumber, readTemperature, refusal, type Reader, type UnitSystem } from '$lib/engine';

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
