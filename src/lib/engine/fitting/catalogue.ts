import { areaChanges } from './area-changes';
import { dampers } from './dampers';
import type { FittingDefinition } from './definition';
import { elbowsRectangular } from './elbows-rectangular';
import { elbowsRound } from './elbows-round';
import { entries } from './entries';
import { exits } from './exits';
import { screens } from './screens';
import type { CatalogueEntry } from './types';

const definitions: readonly FittingDefinition[] = [
	...elbowsRound,
	...elbowsRectangular,
	...areaChanges,
	...entries,
	...exits,
	...dampers,
	...screens
];

const byKey: ReadonlyMap<string, FittingDefinition> = new Map(definitions.map((one) => [one.entry.key, one]));

/** Every fitting, in the order of the families. */
export const catalogue: readonly CatalogueEntry[] = definitions.map((one) => one.entry);

/** The fitting of a key, or null. */
export function fittingEntry(key: string): CatalogueEntry | null {
	return findDefinition(key)?.entry ?? null;
}

/** The fitting of a key with its coefficient function, or null. */
export function findDefinition(key: string): FittingDefinition | null {
	return byKey.get(key) ?? null;
}
