/** What a part takes, with an example: the answer to a word that stands without its figures. */
import type { UnitSystem } from '$lib/engine';
import type { PartWord } from './parts';

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
				message: 'a change of area needs its coefficient C; or whether it is gradual or sudden',
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
