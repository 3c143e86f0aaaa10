const SAFE: readonly string[] = ['GET', 'HEAD', 'OPTIONS'];

/**
 * Whether a request that may change something was sent by a page of another site. SvelteKit refuses such forms;
 * this holds for JSON bodies too. Programs send no Origin header and pass.
 */
export function fromForeignOrigin(request: Request, url: URL): boolean {
	const sender = request.headers.get('origin');
	return sender !== null && sender !== url.origin && !SAFE.includes(request.method);
}
