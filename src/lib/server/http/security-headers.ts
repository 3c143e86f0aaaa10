const YEAR_s = 31_536_000;

/**
 * Puts the headers on a reply that hold for every page; the content security policy is written by SvelteKit.
 * `same-origin` keeps the tokens of letters, which stand in addresses, from other sites, and lets forms send their origin.
 */
export function withSecurityHeaders(url: URL, response: Response, isSignedIn: boolean): Response {
	// A copy: the headers of a redirect cannot be written.
	const guarded = new Response(response.body, response);
	const { headers } = guarded;
	headers.set('x-content-type-options', 'nosniff');
	// What a firm sees is kept by no cache between, nor shown by the way back after sign-out.
	if (isSignedIn && !headers.has('cache-control')) headers.set('cache-control', 'private, no-store');
	headers.set('x-frame-options', 'DENY');
	headers.set('referrer-policy', 'same-origin');
	headers.set('permissions-policy', 'camera=(), geolocation=(), microphone=(), payment=(), usb=()');
	headers.set('cross-origin-opener-policy', 'same-origin');
	if (url.protocol === 'https:') headers.set('strict-transport-security', `max-age=${YEAR_s}; includeSubDomains`);
	return guarded;
}
