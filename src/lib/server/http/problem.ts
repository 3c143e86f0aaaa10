/** Every way in which a request of the API is refused, with its status. */
export const STATUS = {
	malformed: 400,
	unauthenticated: 401,
	'foreign-origin': 403,
	'not-found': 404,
	'method-not-allowed': 405,
	conflict: 409,
	gone: 410,
	'too-large': 413,
	'unsupported-type': 415,
	invalid: 422,
	'too-many-requests': 429,
	unavailable: 503
} as const;

export type ProblemCode = keyof typeof STATUS;

/**
 * A refusal as `application/problem+json`.
 *
 * @param code   what kind of refusal; fixes the status
 * @param title  one sentence for a person
 * @param extras members beside the standard ones, as `problems: [...]`
 * @source RFC 9457, sections 3 and 3.2
 */
export function problem(code: ProblemCode, title: string, extras: Readonly<Record<string, unknown>> = {}): Response {
	const status = STATUS[code];
	return new Response(JSON.stringify({ ...extras, type: `urn:evendraft:problem:${code}`, code, title, status }), {
		status,
		headers: { 'content-type': 'application/problem+json', 'cache-control': 'no-store' }
	});
}
