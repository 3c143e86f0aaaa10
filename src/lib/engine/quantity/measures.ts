import type { Measure } from './measure';
import type { Sum } from './sum';
import type { UnitSystem } from './reading';
import { UNITS as U } from './units';

const METRIC_LENGTHS = [U.millimetre, U.centimetre, U.metre, U.inch, U.foot];
const PRESSURES = [U.pascal, U.kilopascal, U.hectopascal, U.inchOfWater, U.millimetreOfWater];

/** A figure without a unit in SI that could well be millimetres. */
function lengthRule(sum: Sum, units: UnitSystem) {
	if (units !== 'SI' || !sum.bareInteger) return null;
	if (sum.value.gte(1000)) {
		return { unit: U.millimetre, why: 'a whole number from 1000 up is read as millimetres', other: U.metre };
	}
	if (sum.value.lt(100)) return null;
	return { unit: U.metre, why: 'a figure without a unit is in metres', other: U.millimetre };
}

export const FLOW: Measure = {
	noun: 'a flow',
	units: [
		U.litrePerSecond,
		U.litrePerMinute,
		U.cubicMetrePerSecond,
		U.cubicMetrePerHour,
		U.cubicMetrePerMinute,
		U.cfm,
		U.standardCfm
	],
	bare: { SI: U.litrePerSecond, IP: U.cfm },
	aside: { SI: U.cubicMetrePerSecond, IP: U.litrePerSecond },
	thousands: true,
	min: 0,
	max: 10_000,
	example: { SI: '200, 200 L/s or 720 m³/h', IP: '400, 400 cfm or 1.2k' },
	bareRule: (sum, units) =>
		units === 'SI' && !sum.value.isInteger() && sum.value.lt(5)
			? { unit: U.litrePerSecond, why: 'a figure without a unit is in L/s', other: U.cubicMetrePerSecond }
			: null,
	caution: (unit) =>
		unit === U.standardCfm ? 'standard cfm is taken as the actual flow: no correction for density' : null
};

export const LENGTH: Measure = {
	noun: 'a length',
	units: METRIC_LENGTHS,
	bare: { SI: U.metre, IP: U.foot },
	aside: { SI: null, IP: U.metre },
	feetInches: true,
	min: 0,
	max: 10_000,
	example: { SI: '6.5, 6.5 m or 6500 mm', IP: `21.5, 12'-6" or 150"` },
	bareRule: lengthRule
};

export const RISE: Measure = {
	...LENGTH,
	noun: 'a rise',
	min: -1_000,
	max: 1_000,
	example: { SI: '3.2 or -3.2', IP: `10.5, 10'-6" or -10.5` }
};

export const ELEVATION: Measure = {
	noun: 'an elevation',
	units: METRIC_LENGTHS,
	bare: { SI: U.metre, IP: U.foot },
	aside: { SI: null, IP: U.metre },
	feetInches: true,
	min: -500,
	max: 9_000,
	example: { SI: '1600 or 1600 m', IP: '5280 or 5280 ft' }
};

export const ROUGHNESS: Measure = {
	noun: 'a roughness',
	units: [U.micrometre, U.millimetre, U.metre, U.inch, U.foot],
	bare: { SI: U.millimetre, IP: U.foot },
	aside: { SI: null, IP: U.millimetre },
	min: 0,
	max: 0.02,
	example: { SI: '0.09 or 0.09 mm', IP: '0.0003 or 0.0003 ft' }
};

export const PRESSURE: Measure = {
	noun: 'a pressure',
	units: PRESSURES,
	bare: { SI: U.pascal, IP: U.inchOfWater },
	aside: { SI: null, IP: U.pascal },
	min: 0,
	max: 100_000,
	example: { SI: '25, 25 Pa or 0.1 in wg', IP: '0.08, 0.08 in wg or 20 Pa' },
	bareRule: (sum, units) => {
		if (units === 'IP' && sum.value.gt(10)) {
			return { unit: U.inchOfWater, why: 'a figure without a unit is in inches of water', other: U.pascal };
		}
		return units === 'SI' && sum.value.gt(0) && sum.value.lt(1)
			? { unit: U.pascal, why: 'a figure without a unit is in Pa', other: U.inchOfWater }
			: null;
	}
};

/** Gauge, of a room against the outside: either sign. */
export const ROOM_PRESSURE: Measure = {
	...PRESSURE,
	noun: 'a room pressure',
	min: -10_000,
	max: 10_000,
	example: { SI: '10 or -10', IP: '0.04 or -0.04' }
};

export const RATE: Measure = {
	noun: 'a friction rate',
	units: [U.pascalPerMetre, U.inchPerHundredFeet],
	bare: { SI: U.pascalPerMetre, IP: U.inchPerHundredFeet },
	aside: { SI: null, IP: U.pascalPerMetre },
	min: 0,
	max: 10_000,
	example: { SI: '0.8 or 0.8 Pa/m', IP: '0.08 or .08/100' }
};

export const VELOCITY: Measure = {
	noun: 'a velocity',
	units: [U.metrePerSecond, U.fpm, U.footPerSecond],
	bare: { SI: U.metrePerSecond, IP: U.fpm },
	aside: { SI: null, IP: U.metrePerSecond },
	min: 0,
	max: 300,
	example: { SI: '6 or 6 m/s', IP: '1200 or 1200 fpm' }
};

export const TEMPERATURE: Measure = {
	noun: 'a temperature',
	units: [U.celsius, U.fahrenheit, U.kelvin],
	bare: { SI: U.celsius, IP: U.fahrenheit },
	aside: { SI: null, IP: U.celsius },
	min: -100,
	max: 1_000,
	example: { SI: '20 or 20 °C', IP: '70 or 70 °F' },
	idle: / ?(?:°|deg(?:rees?)?)$/
};

export const DENSITY: Measure = {
	noun: 'a density',
	units: [U.kilogramPerCubicMetre, U.poundPerCubicFoot],
	bare: { SI: U.kilogramPerCubicMetre, IP: U.poundPerCubicFoot },
	aside: { SI: null, IP: U.kilogramPerCubicMetre },
	min: 0.01,
	max: 100,
	example: { SI: '1.2 or 1.2 kg/m³', IP: '0.075 or 0.075 lb/ft³' }
};

export const HUMIDITY: Measure = {
	noun: 'a relative humidity',
	units: [U.percent],
	bare: { SI: U.percent, IP: U.percent },
	min: 0,
	max: 1,
	example: { SI: '50 or 50 %', IP: '50 or 50 %' },
	bareRule: (sum) =>
		sum.value.gt(0) && sum.value.lt(1)
			? { unit: U.one, why: 'a figure below 1 is read as a part of one', other: U.percent }
			: null
};

/** What flexible duct lacks of its stretched length. */
export const COMPRESSION: Measure = {
	...HUMIDITY,
	noun: 'a compression',
	max: 0.6, // where the law of compressed duct ends
	example: { SI: '15 or 15 %', IP: '15 or 15 %' }
};

export const ANGLE: Measure = {
	noun: 'an angle',
	units: [U.degree],
	bare: { SI: U.degree, IP: U.degree },
	min: 0,
	max: 180,
	example: { SI: '45 or 45°', IP: '45 or 45°' }
};

export const NUMBER: Measure = {
	noun: 'a number',
	units: [],
	bare: { SI: U.one, IP: U.one },
	thousands: true,
	min: -1e12,
	max: 1e12,
	example: { SI: '0.23', IP: '0.23' }
};
