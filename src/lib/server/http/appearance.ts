import type { Cookies } from '@sveltejs/kit';
import { appearanceSchema, type Appearance } from '$lib/schemas/account';

const COOKIE = 'appearance';
const YEAR_s = 31_536_000;

/** How this browser wants the pages; as the system does unless it was fixed. */
export function appearanceOf(cookies: Cookies): Appearance {
	const read = appearanceSchema.safeParse({ appearance: cookies.get(COOKIE) });
	return read.success ? read.data.appearance : 'system';
}

/** Keeps the choice in this browser. */
export function keepAppearance(cookies: Cookies, appearance: Appearance): void {
	cookies.set(COOKIE, appearance, { path: '/', maxAge: YEAR_s, sameSite: 'lax' });
}

/** The attribute of <html> that fixes it. */
export const appearanceAttribute = (appearance: Appearance): string =>
	appearance === 'system' ? '' : `data-theme="${appearance}"`;
