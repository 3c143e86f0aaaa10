import { areaChanges } from './area-changes';
import { dampers } from './dampers';
import type { FittingDefinition, JunctionDefinition } from './definition';
import { elbowsOval } from './elbows-oval';
import { elbowsRectangular } from './elbows-rectangular';
import { elbowsRound } from './elbows-round';
import { entries } from './entries';
import { exits } from './exits';
import { junctions } from './junctions';
import { offsets } from './offsets';
import { screens } from './screens';
import { systemEffects } from './system-effect';
import type { CatalogueEntry } from './types';

const definitions: readonly FittingDefinition[] = [
	...elbowsRound,
	...elbowsRectangular,
	...elbowsOval,
	...offsets,
	...areaChanges,
	...entries,
	...exits,
	...dampers,
	...screens,
	...systemEffects
];

const byKey: ReadonlyMap<string, FittingDefinition> = new Map(definitions.map((one) => [one.entry.key, one]));

const junctionByKey: ReadonlyMap<string, JunctionDefinition> = new Map(junctions.map((one) => [one.entry.key, one]));

/** Every fitting and junction, in the order of the families. */
export const catalogue: readonly CatalogueEntry[] = [...definitions, ...junctions].map((one) => one.entry);

/** The fitting or junction of a key, or null. */
export function fittingEntry(key: string): CatalogueEntry | null {
	return (findDefinition(key) ?? findJunction(key))?.entry ?? null;
}

/** The junction of a key with its coefficient function, or null. */
export function findJunction(key: string): JunctionDefinition | null {
	return junctionByKey.get(key) ?? null;
}

/** The fitting of a key with its coefficient function, or null. */
export function findDefinition(key: string): FittingDefinition | null {
	return byKey.get(key) ?? null;
}
