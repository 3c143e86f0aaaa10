// The first that fits: most browsers also name the ones that they descend from.
const BROWSERS: readonly (readonly [RegExp, string])[] = [
	[/Edg\//, 'Edge'],
	[/OPR\//, 'Opera'],
	[/Firefox\//, 'Firefox'],
	[/Chrom(e|ium)\//, 'Chrome'],
	[/Safari\//, 'Safari']
];
const SYSTEMS: readonly (readonly [RegExp, string])[] = [
	[/iPhone|iPad/, 'iOS'],
	[/Android/, 'Android'],
	[/Windows/, 'Windows'],
	[/Mac OS X/, 'macOS'],
	[/Linux/, 'Linux']
];

const first = (table: typeof BROWSERS, text: string): string | undefined =>
	table.find(([pattern]) => pattern.test(text))?.[1];

/** What a person would call the browser that sent this User-Agent. */
export function browserName(userAgent: string): string {
	const [browser, system] = [first(BROWSERS, userAgent), first(SYSTEMS, userAgent)];
	if (!browser && !system) return 'Some browser';
	return browser && system ? `${browser} on ${system}` : (browser ?? `A browser on ${system}`);
}
