export type * from './parts';
export { readParts } from './read-parts';
export { fittingsFor } from './fittings-for';
export { describePart } from './describe-part';
