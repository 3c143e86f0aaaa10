import type { FittingDefinition } from './definition';

export const areaChanges: readonly FittingDefinition[] = [];
