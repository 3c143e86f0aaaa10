/** Texts that would be read as one part although they hold a figure, or a part, more than that: nothing is left out silently. */
import type { Role } from './lexicon';

/** `C1.5E-1`, `0x10`: figures of other programs, whose tail would pass for a tag or a count. */
const FOREIGN_FIGURE = /\de[-+]?\d|(?<![\d.,])0x[\da-f]/;
/** What looks like a coefficient, a radius or an exponent is no tag. */
const LIKE_A_FIGURE = /^[ckrn]-?\d/;

const BESIDE_AN_ELBOW: readonly Role[] = ['device', 'damper', 'special-damper', 'butterfly'];

/**
 * What keeps a text from being one part.
 *
 * @param plain the text in small letters
 * @param tags what is left of it and is no word
 * @param roles of its words
 * @returns what is wrong and what was expected, or null
 */
export function notOnePart(
	plain: string,
	tags: readonly string[],
	roles: ReadonlySet<Role>
): readonly [string, string] | null {
	if (FOREIGN_FIGURE.test(plain))
		return ['a figure here is not written out', 'figures with digits and a point, as 0.15'];
	const figure = tags.find((tag) => LIKE_A_FIGURE.test(tag.toLowerCase()));
	if (figure !== undefined)
		return [
			`${figure} could be a second figure`,
			`one coefficient C, one radius r, one exponent n with each part; a tag in brackets, as (${figure})`
		];
	if (roles.has('elbow') && BESIDE_AN_ELBOW.some((role) => roles.has(role)))
		return ['this looks like two parts', 'a comma between two parts, as elbow r1.5, silencer 25 Pa'];
	return null;
}
