/** What a part takes, with an example: the answer to a word that stands without its figures. */
import { fittingEntry, type UnitSystem } from '$lib/engine';
import { parameterWords } from './describe-part';
import type { PartFitting, PartWord } from './parts';

/** A Parts cell as people fill it, for one who has nothing to go by yet. */
export const EXAMPLES = {
	SI: ['elbow r/D 1.5; damper', 'tee branch; 2 elbow 45°', '2 FD 8 Pa; silencer 25 Pa; transition C0.1'],
	IP: ['elbow r/D 1.5; damper', 'tee branch; 2 elbow 45°', '2 FD 0.03 in wg; silencer 0.1 in wg; transition C0.1']
} as const satisfies Record<UnitSystem, readonly string[]>;

interface Takes {
	readonly message: string;
	readonly expected: string;
}

/**
 * What a part without a coefficient or a pressure lacks.
 *
 * @param typed the part as it was typed, without its count
 */
export function takesOf(word: PartWord, typed: string, units: UnitSystem): Takes {
	switch (word) {
		case 'junction': {
			return {
				message: 'a junction needs to know which stream this row is, or its coefficient C',
				expected: `${typed} branch, ${typed} straight, or ${typed} C0.8`
			};
		}
		case 'transition':
			return {
				message: 'a transition needs its coefficient C; or its kind, with the smaller area over the larger',
				expected: `C, such as ${typed} C0.1; or gradual contraction a0.5 20°, or sudden expansion a0.5`
			};
		case 'entry':
			return {
				message: 'an entry needs its coefficient C, or its kind',
				expected: `C, such as ${typed} C0.5; or flush entry, plain end entry, or bellmouth r0.2`
			};
		default:
			return {
				message: 'its coefficient or its pressure is missing: what the maker states at the design flow, or C',
				expected: `${typed} ${pressureLike(typed, units)}, or ${typed} C0.6`
			};
	}
}

/** A pressure such as a part of this name may have; invented, as an example only. */
function pressureLike(typed: string, units: UnitSystem): string {
	const [pa, inches] = /\bf?s?d\b|damper/i.test(typed)
		? [8, 0.03]
		: /filter|coil/i.test(typed)
			? [60, 0.25]
			: [25, 0.1];
	return units === 'SI' ? `${pa} Pa` : `${inches} in wg`;
}

/** What a part of the catalogue is computed with where it was not typed; null where all of it was, or nothing is asked. */
export function assumedOf(part: PartFitting): string | null {
	const kinds =
		part.kind === 'damper' ? ['damper-butterfly'] : [`round-${part.kind}`, `rectangular-${part.kind}`, part.kind];
	const sets = kinds.flatMap((key) => {
		const untyped = (fittingEntry(key)?.parameters ?? []).filter(
			({ name, options }) => options === undefined && part.parameters[name] === undefined
		);
		const words = parameterWords(Object.fromEntries(untyped.map(({ name, default: value }) => [name, value]))).join(
			', '
		);
		return words ? [{ shape: /^(round|rectangular)-/.exec(key)?.[1] ?? '', words }] : [];
	});
	const [first] = sets;
	if (!first) return null;
	if (part.word === 'damper') return 'fully open';
	if (sets.every(({ words }) => words === first.words)) return `at ${first.words}`;
	return `at ${sets.map(({ shape, words }) => `${words} in ${shape} duct`).join(' or ')}`;
}

/** How to type other figures of a part of the catalogue. */
export function exampleOf(part: PartFitting): string {
	const name = part.name.toLowerCase();
	if (part.word === 'elbow') return `${name} r1.5 45° or ${name} C0.23`;
	if (part.word === 'damper') return `${name} 20° or ${name} C0.2`;
	return `${name} C0.3`;
}
