import type { FittingDefinition } from './definition';

export const entries: readonly FittingDefinition[] = [];
