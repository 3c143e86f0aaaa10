import type { JunctionDefinition } from './definition';

/** Places where a row joins another. */
export const junctions: readonly JunctionDefinition[] = [];
