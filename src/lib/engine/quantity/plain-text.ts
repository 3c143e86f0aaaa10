/** What a keyboard, a drawing or a spreadsheet may give for one and the same sign. */
const SIGNS: readonly (readonly [RegExp, string])[] = [
	[/[\u200b-\u200f\u2060\ufeff\u00ad]/g, ''],
	[/[\s\u2000-\u200a]+/g, ' '],
	[/[\u2010-\u2015\u2212\u207b\ufe63\uff0d]/g, '-'],
	[/[\u2018-\u201b\u2032\u00b4\u0060\u02b9]/g, "'"],
	[/[\u201c-\u201f\u2033\u02ba\u3003]|''/g, '"'],
	[/[ØøΦφϕ⌀∅]/g, 'ø'],
	[/[×✕✖⨯хХ]/g, 'x'],
	// Behind a unit; behind a figure they are a power, which is not read.
	[/(?<=[a-z])\^(?=[23])/gi, ''],
	[/[∗⋅·]/g, '*'],
	[/÷/g, '/'],
	[/(?<=[a-z])[²₂]/gi, '2'],
	[/(?<=[a-z])³/gi, '3'],
	[/μ/g, 'µ'],
	[/[º˚]/g, '°'],
	[/℃/g, '°c'],
	[/℉/g, '°f'],
	[/½/g, ' 1/2'],
	[/¼/g, ' 1/4'],
	[/¾/g, ' 3/4'],
	[/⅛/g, ' 1/8'],
	[/⅜/g, ' 3/8'],
	[/⅝/g, ' 5/8'],
	[/⅞/g, ' 7/8']
];

/** A typed text with one sign for each thing: plain blanks, quotes, hyphens, `ø`, `x`. */
export function plainSigns(text: string): string {
	let plain = text;
	for (const [from, to] of SIGNS) plain = plain.replace(from, to);
	return plain.trim();
}

/** The same in small letters. */
export function plainText(text: string): string {
	return plainSigns(text).toLowerCase().trim();
}

/** A message as a sentence: it ends with one full stop. */
export function sentence(text: string): string {
	const plain = text.trim();
	const said = /^(?:a |[a-z]{2})/.test(plain) ? plain.charAt(0).toUpperCase() + plain.slice(1) : plain;
	return /[.!?…]$/.test(said) ? said : `${said}.`;
}

/** Why a typed text is not taken, as a sentence that names it once. */
export function refusal(typed: string, why: string): string {
	const name = quoted(typed);
	const isNamed = why.toLowerCase().startsWith(name.toLowerCase());
	return sentence(isNamed ? name + why.slice(name.length) : `${name}: ${why}`);
}

/** What was typed, as quoted back in a message; long texts are cut. */
export function quoted(text: string): string {
	const typed = text.replace(/\s+/g, ' ').trim();
	return `“${typed.length > 40 ? `${typed.slice(0, 39)}…` : typed}”`;
}
