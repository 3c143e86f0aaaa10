/**
 * A browser without a screen: keeps cookies and sends requests through the real hooks to the real load functions,
 * actions and handlers, as SvelteKit would.
 */
import { isHttpError, isRedirect, type RequestEvent } from '@sveltejs/kit';
import { handle } from '../../../src/hooks.server';
import { log } from '../../../src/lib/server/http/log';

// Refusals are what these tests are about; they would fill the screen.
log.level = 'silent';

export const ORIGIN = 'http://evendraft.test';

export interface Answer {
	readonly status: number;
	readonly location: string | null;
	readonly headers: Headers;
	/** What the load function, the action or the handler gave. */
	readonly body: unknown;
}

type Run = (event: never) => unknown;

interface Asked {
	readonly routeId: string | null;
	readonly path: string;
	readonly run?: Run;
	/** Of the route, as SvelteKit reads them from the path. */
	readonly params?: Readonly<Record<string, string>>;
	readonly form?: Readonly<Record<string, string>>;
	/** Another body than a form. */
	readonly content?: string;
	readonly headers?: Readonly<Record<string, string>>;
	readonly method?: string;
}

/** What the page for absent addresses is made of here; the real one is looked at in the end-to-end tests. */
const absentPage = async () => new Response('absent', { status: 404 });

const asAnswer = (status: number, location: string | null, body: unknown, headers = new Headers()): Answer => ({
	status,
	location,
	body,
	headers
});

export function browser(userAgent = 'Mozilla/5.0 (X11; Linux x86_64) Firefox/140.0') {
	const jar = new Map<string, string>();

	const keep = (name: string, value: string, gone: boolean) => void (gone ? jar.delete(name) : jar.set(name, value));

	function keepAll(headers: Headers): void {
		for (const line of headers.getSetCookie()) {
			const [, name = '', value = ''] = /^([^=]+)=([^;]*)/.exec(line) ?? [];
			keep(name, decodeURIComponent(value), /max-age=0(;|$)/i.test(line) || value === '');
		}
	}

	function eventOf({ routeId, path, params = {}, form, content, headers, method }: Asked): RequestEvent {
		const url = new URL(path, ORIGIN);
		const cookie = [...jar].map(([name, value]) => `${name}=${encodeURIComponent(value)}`).join('; ');
		const request = new Request(url, {
			method: method ?? (form || content !== undefined ? 'POST' : 'GET'),
			headers: { 'user-agent': userAgent, ...(cookie && { cookie }), ...(form && { origin: ORIGIN }), ...headers },
			body: form ? new URLSearchParams(form) : content
		});
		const cookies = {
			get: (name: string) => jar.get(name),
			getAll: () => [...jar].map(([name, value]) => ({ name, value })),
			set: (name: string, value: string, options: { maxAge?: number }) => keep(name, value, options.maxAge === 0),
			delete: (name: string) => keep(name, '', true)
		};
		const rest = { params, route: { id: routeId }, fetch: absentPage, isDataRequest: false, isSubRequest: false };
		// Only what our hooks and routes use of an event; a member that is missing shows as a failing test.
		return { url, request, cookies, locals: {}, ...rest } as unknown as RequestEvent;
	}

	async function ask(asked: Asked): Promise<Answer> {
		const event = eventOf(asked);
		let body: unknown = null;
		try {
			const response = await handle({
				event,
				resolve: async () => {
					body = await asked.run?.(event as never);
					return body instanceof Response ? body : new Response(null, { status: asked.run ? 200 : 404 });
				}
			});
			keepAll(response.headers);
			return asAnswer(response.status, response.headers.get('location'), body, response.headers);
		} catch (cause) {
			if (isRedirect(cause)) return asAnswer(cause.status, cause.location, null);
			if (isHttpError(cause)) return asAnswer(cause.status, null, cause.body);
			throw cause;
		}
	}

	return { ask, jar };
}

export type Browser = ReturnType<typeof browser>;
