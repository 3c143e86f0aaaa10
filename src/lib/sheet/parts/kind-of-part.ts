/** What the words of a part tell together: what it is, its kind in the catalogue, its name and its picture. */
import type { Picture } from '$lib/engine';
import type { Amounts } from './amounts';
import type { Role, Word } from './lexicon';
import type { PartWord } from './parts';

/** Blades of a damper whose area is told: it is open, and smaller than its duct. */
export function bladesOf(kind: string, { areaRatio, angle }: Amounts['parameters']): string | null {
	if (areaRatio === undefined || angle !== undefined) return null;
	return /^damper-(opposed|parallel)-blades$/.exec(kind)?.[1] ?? null;
}

const JUNCTIONS: readonly Role[] = ['junction', 'shoe', 'take-off', 'wye', 'cross', 'bullhead'];
const BESIDE_A_LEG: readonly Role[] = ['leg', 'straight', 'plain', 'transition', 'chamber'];

/** A junction takes what is named beside it; `branch` and `straight` alone are one, `branch damper` is a damper. */
export function wordOf(roles: ReadonlySet<Role>): PartWord | null {
	if (JUNCTIONS.some((role) => roles.has(role))) return 'junction';
	const legAlone = [...roles].every((role) => BESIDE_A_LEG.includes(role));
	if ((roles.has('leg') || roles.has('straight') || roles.has('chamber')) && legAlone) return 'junction';
	if (roles.has('special-damper')) return 'device';
	if (roles.has('damper') || roles.has('butterfly')) return 'damper';
	if (roles.has('elbow')) return 'elbow';
	if (roles.has('transition') || roles.has('expansion') || roles.has('contraction')) return 'transition';
	if (roles.has('entry') || roles.has('bellmouth')) return 'entry';
	if (roles.has('exit')) return 'exit';
	if (roles.has('device')) return 'device';
	return roles.has('mitred') || roles.has('vaned') ? 'elbow' : null;
}

/** Key of the junction in the catalogue: a tee at another angle than 90° is a wye. */
export function junctionKind(roles: ReadonlySet<Role>, angle: number | string | undefined): string {
	if (roles.has('bullhead')) return 'bullhead-tee';
	if (roles.has('cross')) return 'cross';
	if (roles.has('gradual') && (roles.has('take-off') || roles.has('junction'))) return 'conical-take-off';
	if (roles.has('shoe')) return 'shoe-take-off';
	if (roles.has('chamber')) return 'plenum';
	return roles.has('wye') || (angle !== undefined && angle !== 90) ? 'wye' : 'tee';
}

/** What only ever is the branch: a take-off, a leg of a bullhead tee, a duct that leaves a plenum. */
export const isTakeOff = (roles: ReadonlySet<Role>) =>
	(['shoe', 'take-off', 'bullhead', 'chamber'] as const).some((role) => roles.has(role));

/** Kind of the catalogue without its shape, or null where only a coefficient or a pressure can tell. */
export function kindOf(word: PartWord, roles: ReadonlySet<Role>): string | null {
	if (word === 'elbow') {
		// Splitter vanes are no turning vanes.
		if (roles.has('splitter')) return 'elbow-splitter';
		if (roles.has('vaned')) return 'elbow-vaned';
		if (roles.has('mitred')) return 'elbow-mitred';
		return roles.has('segmented') ? 'elbow-segmented' : 'elbow-smooth';
	}
	if (word === 'damper') {
		if (roles.has('opposed')) return 'damper-opposed-blades';
		if (roles.has('parallel')) return 'damper-parallel-blades';
		return roles.has('butterfly') ? 'damper-butterfly' : 'damper';
	}
	if (word === 'entry') {
		if (roles.has('bellmouth')) return roles.has('in-wall') ? 'entry-bellmouth-in-wall' : 'entry-bellmouth';
		if (roles.has('projecting')) return 'entry-projecting';
		if (roles.has('flush')) return 'entry-flush';
		return roles.has('plain-end') ? 'entry-plain-end' : null;
	}
	if (word === 'exit') return roles.has('device') ? 'exit-diffuser' : 'exit-plain';
	if (word === 'transition') {
		const change = roles.has('expansion') ? 'expansion' : roles.has('contraction') ? 'contraction' : null;
		if (change !== null && roles.has('sudden')) return `sudden-${change}`;
		return change !== null && roles.has('gradual') ? `gradual-${change}` : null;
	}
	return null;
}

export function nameOf(
	known: readonly Word[],
	tags: readonly string[],
	roles: ReadonlySet<Role>,
	note: string | null
): string {
	const printed = known.map((word) => word.print).filter((print) => print !== '');
	if (printed.length === 0 && roles.has('elbow')) printed.push('elbow');
	const name = [...printed, ...tags].join(' ');
	const capital = name.startsWith('ahu') ? `AHU${name.slice(3)}` : name.charAt(0).toUpperCase() + name.slice(1);
	return note === null ? capital : `${capital} (${note})`;
}

/** The picture of the word that names the part: the last of its kind, a fire damper before a damper. */
export function pictureOf(known: readonly Word[], roles: ReadonlySet<Role>): Picture {
	const word = wordOf(roles);
	const own = known.filter(
		(entry) =>
			entry.picture !== null &&
			(word === 'device' ||
				entry.role === word ||
				(word === 'junction' && (JUNCTIONS.includes(entry.role) || entry.role === 'leg' || entry.role === 'straight')))
	);
	const special = known.find((entry) => entry.role === 'special-damper');
	const shaped = own.find((entry) => entry.picture === 'shoe' || entry.picture === 'wye');
	const device = word === 'device' ? own.find((entry) => entry.role === 'device') : undefined;
	const fallback: Picture = word === 'elbow' ? 'elbow' : word === 'damper' ? 'damper' : 'transition';
	return (special ?? shaped ?? device ?? own[0])?.picture ?? fallback;
}
