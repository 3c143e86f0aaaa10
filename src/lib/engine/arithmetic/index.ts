// Elementary functions built from + - * / and the square root alone. Those of the platform may differ in the last bits
// from one engine to the next; these give the same bits everywhere.
export { PI, radians } from './degrees';
export { exp } from './exponential';
export { asin, atan } from './inverse-trigonometry';
export { log10 } from './logarithm';
export { pow } from './power';
export { log, roughLog } from './table-logarithm';
export { cos, sin, tan } from './trigonometry';
