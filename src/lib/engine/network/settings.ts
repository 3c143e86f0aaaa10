import { airState, type AirSpec, type AirState } from '../air';
import type { DesignAir, DesignDocument, DesignRow } from '../document/types';
import { DEFAULT_MATERIAL, findMaterial } from '../friction';
import { catalogueUses, type CatalogueUses } from './catalogue-uses';
import { STANDARD_DENSITY } from './flows';

/** What holds for all rows of a design. */
export interface Settings {
	readonly air: AirState;
	/** Density of the air around the duct [kg/m3], for thermal gravity. */
	readonly surroundings: number;
	readonly roughnessOf: (row: DesignRow) => number;
	readonly methods: DesignDocument['methods'];
	readonly uses: CatalogueUses;
	/** Density of standard flows [kg/m3]; null where flows are actual ones. */
	readonly standard: number | null;
}

/** @throws {OutOfRangeError} when the air leaves the range of a formula of its state */
export function settingsOf(document: DesignDocument): Settings {
	const air = airState(specOf(document.air));
	const surroundings = document.surroundings === undefined ? air : airState(specOf(document.surroundings));
	const general = roughnessIn(document) ?? findMaterial(DEFAULT_MATERIAL)?.roughness ?? 0;
	const roughnessOf = (row: DesignRow) => roughnessIn(row) ?? general;
	const standard = document.flowBasis === 'standard' ? (document.standardDensity ?? STANDARD_DENSITY) : null;
	return {
		air,
		surroundings: surroundings.density,
		roughnessOf,
		methods: document.methods,
		uses: catalogueUses(),
		standard
	};
}

/** A given density goes before a temperature that stands beside it. */
function specOf(air: DesignAir): AirSpec {
	if (!('density' in air)) return air;
	return air.viscosity === undefined ? { density: air.density } : { density: air.density, viscosity: air.viscosity };
}

/** A figure goes before a material that stands beside it. */
function roughnessIn(holder: { readonly roughness?: number; readonly material?: string }): number | null {
	if (holder.roughness !== undefined) return holder.roughness;
	return holder.material === undefined ? null : (findMaterial(holder.material)?.roughness ?? null);
}
