import type { FittingDefinition } from './definition';

export const dampers: readonly FittingDefinition[] = [];
