import type { FittingDefinition } from './definition';

export const elbowsRectangular: readonly FittingDefinition[] = [];
