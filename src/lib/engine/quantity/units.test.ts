import { describe, expect, it } from 'vitest';
import { Decimal } from './decimal';
import { fromSI, toSI, UNITS, type Unit } from './units';

/** Printed value, which the exact factor must round to at the digits printed. */
const printed: [string, Unit, string][] = [
	['foot', UNITS.foot, '0.3048'],
	['inch', UNITS.inch, '0.0254'],
	['micron', UNITS.micrometre, '0.000001'],
	['square foot', UNITS.squareFoot, '0.09290304'],
	['cubic foot per minute', UNITS.cfm, '0.0004719474'],
	['foot per minute', UNITS.fpm, '0.00508'],
	['foot per second', UNITS.footPerSecond, '0.3048'],
	['inch of water, conventional', UNITS.inchOfWater, '249.0889'],
	['millimetre of water, conventional', UNITS.millimetreOfWater, '9.80665'],
	['millibar', UNITS.hectopascal, '100'],
	['pound', UNITS.pound, '0.4535924'],
	['pound per cubic foot', UNITS.poundPerCubicFoot, '16.01846'],
	['pound per foot hour', UNITS.poundPerFootHour, '0.0004133789'],
	['horsepower (550 foot pounds-force per second)', UNITS.horsepower, '745.6999']
];

describe('units against NIST Special Publication 811 (2008), Appendix B.8', () => {
	it.each(printed)('one %s is %# as printed', (_name, unit, value) => {
		const digits = new Decimal(value).precision();
		expect(toSI(new Decimal(1), unit).toSignificantDigits(digits).toFixed()).toBe(value);
	});

	it('takes water of 1000 kg/m³ under 9.80665 m/s², and no other inch of water', () => {
		expect(UNITS.inchOfWater.times).toBe(new Decimal('0.0254').times('9806.65').toFixed());
	});

	it('has degree Fahrenheit as (t − 32)/1.8 and kelvin as t + 273.15', () => {
		expect(toSI(new Decimal(212), UNITS.fahrenheit).toNumber()).toBe(100);
		expect(toSI(new Decimal(-40), UNITS.fahrenheit).toNumber()).toBe(-40);
		expect(toSI(new Decimal('293.15'), UNITS.kelvin).toNumber()).toBe(20);
		expect(fromSI(20, UNITS.fahrenheit).toNumber()).toBe(68);
	});
});

describe('the table of units', () => {
	it('has no name twice within one quantity', () => {
		const quantities: Unit[][] = [
			[UNITS.millimetre, UNITS.centimetre, UNITS.metre, UNITS.micrometre, UNITS.inch, UNITS.foot],
			[
				UNITS.litrePerSecond,
				UNITS.cubicMetrePerSecond,
				UNITS.cubicMetrePerHour,
				UNITS.cubicMetrePerMinute,
				UNITS.cfm,
				UNITS.standardCfm
			],
			[UNITS.pascal, UNITS.kilopascal, UNITS.hectopascal, UNITS.inchOfWater, UNITS.millimetreOfWater],
			[UNITS.pascalPerMetre, UNITS.inchPerHundredFeet],
			[UNITS.metrePerSecond, UNITS.fpm, UNITS.footPerSecond],
			[UNITS.celsius, UNITS.fahrenheit, UNITS.kelvin],
			[UNITS.kilogramPerCubicMetre, UNITS.poundPerCubicFoot]
		];
		for (const units of quantities) {
			const names = units.flatMap((unit) => unit.names);
			expect(new Set(names).size).toBe(names.length);
		}
	});
});
