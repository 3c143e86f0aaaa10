/** What the catalogue takes for figures that were not typed, and how to type others. */
import { fittingEntry } from '$lib/engine';
import { parameterWords } from './describe-part';
import type { PartFitting } from './parts';
import { isTransition, TRANSITIONS, type TransitionKind } from './phrases';

/** What a part of the catalogue is computed with where it was not typed; null where all of it was, or nothing is asked. */
export function assumedOf(part: PartFitting): string | null {
	if (isTransition(part.kind)) return transitionOf(part, part.kind);
	const sets = (KEYS_OF[part.kind] ?? [`round-${part.kind}`, `rectangular-${part.kind}`, part.kind]).flatMap((key) => {
		const words = untyped(part, key);
		return words ? [{ shape: /^(?:offset-)?(round|rectangular)(?!-to)/.exec(key)?.[1] ?? '', words }] : [];
	});
	const [first] = sets;
	const side = part.kind === 'cap' ? 'intake or exhaust by the side of the row' : null;
	if (!first) return side;
	if (part.word === 'damper' && OPEN.includes(first.words)) return 'fully open';
	const same = sets.every(({ words }) => words === first.words);
	const at = same
		? `at ${first.words}`
		: `at ${sets.map(({ shape, words }) => `${words} in ${shape} duct`).join(' or ')}`;
	return [side, at].filter((words) => words !== null).join(', ');
}

/** The entries that a kind may become, where its key does not say it. */
const KEYS_OF: Readonly<Record<string, readonly string[]>> = {
	damper: ['damper-butterfly'],
	offset: ['offset-round', 'offset-rectangular'],
	cap: ['exhaust-cap']
};

/** Figures of an entry that were not typed, as they stand in the catalogue; of choices those that name no plainer case. */
function untyped(part: PartFitting, key: string): string {
	const open = (fittingEntry(key)?.parameters ?? []).filter(
		({ name, options }) => (options === undefined || TOLD.includes(name)) && part.parameters[name] === undefined
	);
	return parameterWords(Object.fromEntries(open.map(({ name, default: value }) => [name, value]))).join(', ');
}
const OPEN: readonly string[] = ['0°', 'open 1'];
const TOLD: readonly string[] = ['curtain', 'form'];

function transitionOf(part: PartFitting, kind: TransitionKind): string {
	const words = untyped({ ...part, parameters: { areaRatio: 0, ...part.parameters } }, TRANSITIONS[kind].contraction);
	const ratio = part.parameters['areaRatio'] === undefined ? 'direction and area ratio' : 'direction';
	return [`${ratio} by the sizes of this row and the one it joins`, ...(words ? [`at ${words}`] : [])].join(', ');
}

/** What a person should know of how the coefficient of a part is known; null where nothing is to be said. */
export function cautionOf({ kind }: PartFitting): string | null {
	return fittingEntry(kind)?.known === 'from memory' ? 'its coefficient is from memory' : null;
}

/** How to type other figures of a part of the catalogue. */
export function exampleOf(part: PartFitting): string {
	const name = part.name.toLowerCase();
	if (part.word === 'elbow') return `${name} ${elbowFigures(part.kind)} or ${name} C0.23`;
	if (part.kind === 'damper-fire-curtain') return `${name} 8 Pa or ${name} C0.2`;
	if (part.kind === 'damper-gate') return `${name} open 0.7 or ${name} C0.5`;
	if (part.kind === 'damper-blades-open') return `${name} a0.8 or ${name} C0.5`;
	if (part.word === 'damper') return `${name} 20° or ${name} C0.2`;
	if (part.kind.includes('-to-')) return `${name} l1.5 or ${name} C0.1`;
	if (isTransition(part.kind) && !part.kind.startsWith('sudden')) return `${name} 20° or ${name} C0.1`;
	return `${name} C0.3`;
}

const elbowFigures = (kind: string) =>
	kind.endsWith('mitred') ? '45°' : kind.endsWith('splitter') ? 'r0.5' : 'r1.5 45°';
