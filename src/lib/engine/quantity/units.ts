import { Decimal } from './decimal';

/**
 * The one table of units. SI value = (value − zero) × times ÷ over; every figure here is exact.
 *
 * @source NIST Special Publication 811 (2008), Guide for the Use of the International System of Units, Appendix B:
 *   foot 0.3048 m, inch 0.0254 m, pound 0.453 592 37 kg, degree Fahrenheit (t − 32)/1.8 °C, all exact by definition.
 *   Inch and millimetre of water are the conventional ones, inH2O 249.0889 Pa and mmH2O 9.806 65 Pa there: water of
 *   1000 kg/m³ under 9.806 65 m/s², so 0.0254 × 9806.65 = 249.088 91 Pa. Not the column at 60 °F (248.84 Pa).
 */
export interface Unit {
	/** As printed. */
	readonly label: string;
	/** As typed, without capitals, blanks and points. */
	readonly names: readonly string[];
	readonly times: string;
	readonly over: string;
	/** Reading of this unit where the SI scale has its zero. */
	readonly zero: string;
}

/** Blanks, points and capitals do not count in the name of a unit. */
const unit = (label: string, names: string, times: string, over = '1', zero = '0'): Unit => ({
	label,
	names: names.split(' '),
	times,
	over,
	zero
});

const CUBIC_FOOT = '0.028316846592'; // 0.3048³ m³
const INCH_OF_WATER = '249.08891'; // 0.0254 × 9806.65 Pa
const POUND = '0.45359237'; // kg

export const UNITS = {
	metre: unit('m', 'm metre metres meter meters', '1'),
	centimetre: unit('cm', 'cm', '0.01'),
	millimetre: unit('mm', 'mm millimetre millimetres', '0.001'),
	micrometre: unit('µm', 'µm um micron microns', '0.000001'),
	inch: unit('in', 'in inch inches "', '0.0254'),
	foot: unit('ft', "ft foot feet '", '0.3048'),

	litrePerSecond: unit('L/s', 'l/s l/sec lps ls litre/s litres/s liter/s liters/s dm3/s', '0.001'),
	litrePerMinute: unit('L/min', 'l/min lpm litre/min litres/min', '0.001', '60'),
	cubicMetrePerSecond: unit('m³/s', 'm3/s m3/sec cumecs', '1'),
	cubicMetrePerHour: unit('m³/h', 'm3/h m3/hr m3h cmh', '1', '3600'),
	cubicMetrePerMinute: unit('m³/min', 'm3/min cmm', '1', '60'),
	cfm: unit('cfm', 'cfm acfm ft3/min cuft/min cuftmin', CUBIC_FOOT, '60'),
	standardCfm: unit('cfm, standard', 'scfm', CUBIC_FOOT, '60'),

	pascal: unit('Pa', 'pa pascal pascals', '1'),
	kilopascal: unit('kPa', 'kpa', '1000'),
	hectopascal: unit('mbar', 'mbar hpa', '100'),
	inchOfWater: unit('in. wg', 'inwg inswg iwg "wg inwc iwc "wc "h2o inh2o inchwg inchwc wg wc " in', INCH_OF_WATER),
	millimetreOfWater: unit('mm wg', 'mmwg mmwc mmh2o', '9.80665'),

	pascalPerMetre: unit('Pa/m', 'pa/m', '1'),
	inchPerHundredFeet: unit(
		'in./100 ft',
		`in/100ft inwg/100ft iwg/100ft inwc/100ft "/100ft "wg/100ft "wc/100ft inh2o/100ft "/100' in/100' inwg/100' "wg/100' "/100 in/100 inwg/100 /100 /100ft /100' " in inwg iwg`,
		INCH_OF_WATER,
		'30.48'
	),

	metrePerSecond: unit('m/s', 'm/s m/sec mps', '1'),
	fpm: unit('fpm', "fpm ft/min '/min", '0.3048', '60'),
	footPerSecond: unit('ft/s', 'ft/s fps ft/sec', '0.3048'),

	kilogramPerCubicMetre: unit('kg/m³', 'kg/m3', '1'),
	micropascalSecond: unit('µPa s', 'µpas upas', '0.000001'),
	// 0.45359237 kg over 0.3048 m × 3600 s
	poundPerFootHour: unit('lb/ft h', 'lb/fth lbm/fth', POUND, '1097.28'),
	poundPerCubicFoot: unit('lb/ft³', 'lb/ft3 lbm/ft3 lb/cuft lbs/ft3 pcf', POUND, CUBIC_FOOT),

	celsius: unit('°C', '°c c degc', '1'),
	fahrenheit: unit('°F', '°f f degf', '5', '9', '32'),
	kelvin: unit('K', 'k', '1', '1', '273.15'),

	percent: unit('%', '% percent pc %rh rh', '1', '100'),
	one: unit('', '1', '1'),
	degree: unit('°', '° deg degree degrees', '1'),

	squareMetre: unit('m²', 'm2', '1'),
	squareFoot: unit('ft²', 'ft2 sqft', '0.09290304'),
	kilogram: unit('kg', 'kg', '1'),
	pound: unit('lb', 'lb lbs', POUND),
	kilowatt: unit('kW', 'kw', '1000'),
	// 550 foot pounds-force a second: 550 × 0.3048 × 0.45359237 × 9.80665 W, exactly
	horsepower: unit('hp', 'hp', '745.69987158227022')
} as const satisfies Record<string, Unit>;

/** A figure in this unit as a figure in the SI unit of its quantity. */
export function toSI(value: Decimal, of: Unit): Decimal {
	return value.minus(of.zero).times(of.times).div(of.over);
}

/** An SI figure as a figure in this unit. */
export function fromSI(value: Decimal | number, of: Unit): Decimal {
	return new Decimal(value).times(of.over).div(of.times).plus(of.zero);
}

/** Of each unit, how many of it are one of the SI unit, as a double. */
const perSI = new Map<Unit, number>();

/** An SI figure in this unit to a few units of the last place of a double: for showing, not for keeping. */
export function nearSI(value: number, of: Unit): number {
	let factor = perSI.get(of);
	if (factor === undefined) perSI.set(of, (factor = Number(of.over) / Number(of.times)));
	return value * factor + Number(of.zero);
}
