import type { DesignRow } from '../document/types';
import { catalogue, type CatalogueEntry } from '../fitting';

/** What the fittings and the equipment of a row are, as far as a check asks. */
export interface PartHints {
	/** A fire or smoke damper is among them. */
	readonly fireDamper: boolean;
	/** A damper that balances is among them: not one that closes, or opens, by itself. */
	readonly balances: boolean;
	/** The value of a fitting or a piece of equipment is not settled. */
	readonly toBeConfirmed: boolean;
	/** A damper whose setting is not given, so that it counts as open. */
	readonly openAssumed: boolean;
	/** The first entry or exit of the catalogue: the end of a run. */
	readonly end: CatalogueEntry | null;
}

interface NameHint {
	readonly fireDamper: boolean;
	readonly balances: boolean;
}

interface KindHint extends NameHint {
	readonly isEnd: boolean;
	/** Parameter that tells how far it is open; null where there is none. */
	readonly setting: string | null;
	readonly entry: CatalogueEntry;
}

/** `FD-01` and `FSD2` are tags of fire and fire and smoke dampers. */
const DAMPER = /damper|\bvcd\b|\bfs?d(?![a-z])/i;
const FIRE = /\b(fire|smoke)\b|\bfs?d(?![a-z])/i;
const BY_ITSELF = /\bfs?d(?![a-z])|\b(fire|smoke|back-?\s?dra(?:ugh|f)t|non-?return|check)\b/i;
const NOTHING: NameHint = { fireDamper: false, balances: false };
const NONE: PartHints = { fireDamper: false, balances: false, toBeConfirmed: false, openAssumed: false, end: null };

const ofKind: ReadonlyMap<string, KindHint> = new Map(catalogue.map((entry) => [entry.key, kindHint(entry)]));

function kindHint(entry: CatalogueEntry): KindHint {
	const isDamper = entry.family === 'dampers';
	const fireDamper = entry.picture === 'firedamper';
	const setting = entry.parameters.find(({ name }) => name === 'angle' || name === 'opening')?.name ?? null;
	return {
		entry,
		fireDamper,
		balances: isDamper && !fireDamper,
		isEnd: entry.family === 'entries' || entry.family === 'exits',
		setting: isDamper ? setting : null
	};
}

/** A reader of rows that looks at each distinct name once: a design has many rows and few names. */
export function partHints(): (row: DesignRow) => PartHints {
	const known = new Map<string, NameHint>();
	const ofName = (name: string): NameHint => {
		let hint = known.get(name);
		if (hint === undefined) known.set(name, (hint = nameHint(name)));
		return hint;
	};
	return ({ fittings, equipment }) => {
		if (fittings === undefined && equipment === undefined) return NONE;
		let fireDamper = false;
		let balances = false;
		let toBeConfirmed = false;
		let openAssumed = false;
		let end: CatalogueEntry | null = null;
		if (fittings)
			for (const one of fittings) {
				toBeConfirmed ||= one.toBeConfirmed === true;
				if (one.name !== undefined) {
					const hint = ofName(one.name);
					fireDamper ||= hint.fireDamper;
					balances ||= hint.balances;
				}
				const kind = ofKind.get(one.kind);
				if (kind === undefined) continue;
				fireDamper ||= kind.fireDamper;
				balances ||= kind.balances;
				openAssumed ||= kind.setting !== null && !(kind.setting in one);
				if (kind.isEnd) end ??= kind.entry;
			}
		if (equipment)
			for (const one of equipment) {
				toBeConfirmed ||= one.toBeConfirmed === true;
				const hint = ofName(one.name);
				fireDamper ||= hint.fireDamper;
				balances ||= hint.balances;
			}
		return { fireDamper, balances, toBeConfirmed, openAssumed, end };
	};
}

function nameHint(name: string): NameHint {
	if (!DAMPER.test(name)) return NOTHING;
	return { fireDamper: FIRE.test(name), balances: !BY_ITSELF.test(name) };
}
