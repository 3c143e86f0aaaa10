export { canonicalText } from './canonical';
export { LIMITS } from './limits';
export { DESIGN_FORMAT, designJsonSchema } from './schema';
export { validateDocument } from './validate';
export type * from './types';
