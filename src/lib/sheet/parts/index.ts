export type * from './parts';
export { readParts } from './read-parts';
export { fittingsFor } from './fittings-for';
export { asksForPlace } from './by-place';
export { describePart } from './describe-part';
