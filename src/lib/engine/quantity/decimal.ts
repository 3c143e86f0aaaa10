import DecimalBase from 'decimal.js';

/** Decimal arithmetic with 40 digits: enough that one rounding to a double is the only one. */
export const Decimal = DecimalBase.clone({ precision: 40, rounding: DecimalBase.ROUND_HALF_UP, defaults: true });
export type Decimal = DecimalBase;
