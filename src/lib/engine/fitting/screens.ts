import type { FittingDefinition } from './definition';

export const screens: readonly FittingDefinition[] = [];
