/** Where a person lands after signing in. */
export const FIRST_PAGE = '/register';

/**
 * The path to return to after sign-in, when it is one of our own; else the first page. Browsers read `\` as `/` and
 * drop tabs and line ends, so a path with any of them is not trusted.
 */
export function returnPath(asked: string | null | undefined): string {
	if (!asked || !/^\/(?![/\\])[^\\\s]*$/.test(asked)) return FIRST_PAGE;
	const url = new URL(asked, 'http://own.invalid');
	// Dots are worked out on the way: `/.//elsewhere` becomes the address of another site.
	const isOwn = url.origin === 'http://own.invalid' && !url.pathname.startsWith('//');
	return isOwn ? url.pathname + url.search : FIRST_PAGE;
}
