import type { FittingDefinition } from './definition';

export const elbowsRound: readonly FittingDefinition[] = [];
