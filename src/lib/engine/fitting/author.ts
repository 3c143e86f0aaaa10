/** How the author of a method is printed, by the key that a design names: `idelchik-table` as `Idelchik, table`. */
export function authorOf(key: string): string {
	if (key === 'smacna') return 'SMACNA';
	const [name = '', ...more] = key.split('-');
	return [name.charAt(0).toUpperCase() + name.slice(1), ...more].join(', ');
}
