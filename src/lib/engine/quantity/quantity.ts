declare const unit: unique symbol;

/** A number in one SI unit. The brand is for the compiler only; at run time it is a number. */
export type Quantity<U extends string> = number & { readonly [unit]: U };
export type Metre = Quantity<'m'>;
export type Pascal = Quantity<'Pa'>;
export type PascalPerMetre = Quantity<'Pa/m'>;
export type MetrePerSecond = Quantity<'m/s'>;
export type CubicMetrePerSecond = Quantity<'m3/s'>;
export type KilogramPerCubicMetre = Quantity<'kg/m3'>;
/** A temperature on the Celsius scale, never a difference. */
export type DegreeCelsius = Quantity<'degC'>;
/** An angle. */
export type Degree = Quantity<'deg'>;
/** A ratio, 1 for 100 %. */
export type Ratio = Quantity<'1'>;

/** The only cast to a quantity. NaN and Infinity stop here. */
function make<U extends string>(name: U) {
	return (value: number): Quantity<U> => {
		if (!Number.isFinite(value)) throw new TypeError(`${name}: ${value} is not finite`);
		return value as Quantity<U>;
	};
}
export const metre = make('m');
export const pascal = make('Pa');
export const pascalPerMetre = make('Pa/m');
export const metrePerSecond = make('m/s');
export const cubicMetrePerSecond = make('m3/s');
export const kilogramPerCubicMetre = make('kg/m3');
export const degreeCelsius = make('degC');
export const degree = make('deg');
export const ratio = make('1');
