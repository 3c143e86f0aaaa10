const ABBREVIATIONS = ['smacna'];

/** The name of a method of the catalogue, as `Idelchik, table` of `idelchik-table`. */
export function methodName(key: string): string {
	const [author = '', ...rest] = key.split('-');
	const name = ABBREVIATIONS.includes(author) ? author.toUpperCase() : author.charAt(0).toUpperCase() + author.slice(1);
	return rest.length > 0 ? `${name}, ${rest.join(' ')}` : name;
}
