import type { FittingDefinition } from './definition';

export const exits: readonly FittingDefinition[] = [];
