/** What people write beside a size that is no part of it. */
const NOTES: readonly (readonly [RegExp, string])[] = [
	[/\(\s*e\s*\)|(?<![a-z])exist(?:ing)?\b\.?|(?<![a-z])ex\b\.?/, 'existing'],
	[/(\d+(?:[.,]\d+)?) ?("|in\b\.?|mm) ?\(?(?:lined|lining|liner|l)\b\)?/, 'lined $1 $2'],
	[/\(?(?<![a-z])(?:lined|lining|liner)\b\)?/, 'lined'],
	[/(?<=[\d"a-z]) l$|\(\s*l\s*\)/, 'lined'],
	[/(?<![a-z])flex(?:i|ible)?\b/, 'flexible'],
	[/(?<![a-z])(?:nk|neck)\b\.?/, 'neck of a terminal'],
	[/\(([a-z][a-z ]{0,30})\)/, '$1']
];

/** A size without its notes, and the notes in words. A size all in brackets is taken out of them. */
export function withoutNotes(plain: string): { size: string; notes: string[] } {
	let size = plain.replace(/^\(([^()]*\d[^()]*)\)$/, '$1');
	const notes: string[] = [];
	for (const [pattern, words] of NOTES) {
		const found = pattern.exec(size);
		// The whole cell is never a note: `1" lined` alone is a size with its lining missing.
		if (!found || found[0].trim() === size.trim()) continue;
		const note = words.replace('$1', found[1] ?? '').replace('$2', found[2] === '"' ? 'in' : (found[2] ?? ''));
		if (!notes.includes(note) && !(note === 'lined' && notes.some((n) => n.startsWith('lined')))) notes.push(note);
		size = `${size.slice(0, found.index)} ${size.slice(found.index + found[0].length)}`.replace(/ +/g, ' ').trim();
	}
	return { size, notes };
}
