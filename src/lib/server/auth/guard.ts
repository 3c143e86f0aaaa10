import { error, json, redirect, type RequestEvent } from '@sveltejs/kit';
import { isId } from '../http/is-id';
import { log } from '../http/log';
import { problem } from '../http/problem';
import { verdict } from './access';

/** Path of the page that says that there is nothing here. */
const ABSENT = '/absent';

/** The same answer to an unknown, a forbidden and a forgotten address, in the form that the asker reads. */
async function absent(event: RequestEvent): Promise<Response> {
	if (event.url.pathname.startsWith('/api/')) return problem('not-found', 'There is nothing here.');
	if (event.isDataRequest) error(404, 'Not found');
	if (event.request.headers.get('x-sveltekit-action') === 'true')
		return json({ type: 'error', status: 404, error: { message: 'Not found' } }, { status: 404 });
	// An error thrown in the hooks would show the bare page; this one has the look and the person's appearance.
	const page = await event.fetch(ABSENT, { headers: { accept: 'text/html' } });
	return new Response(page.body, { status: 404, headers: page.headers });
}

function mustSignIn({ url, request }: RequestEvent): Response {
	if (url.pathname.startsWith('/api/')) return problem('unauthenticated', 'Sign in first.');
	const back = request.method === 'GET' ? url.pathname + url.search : url.pathname;
	redirect(303, `/sign-in?to=${encodeURIComponent(back)}`);
}

/** Whether a place for an id holds what cannot be one. */
const namesNoId = ({ params }: RequestEvent): boolean =>
	Object.entries(params).some(([name, text]) => name.endsWith('Id') && !isId(text ?? ''));

/** Null when the visitor may use the route, else the reply that they get instead. */
export async function refusal(event: RequestEvent): Promise<Response | null> {
	const judged = verdict(event.route.id, event.locals);
	if (judged === 'open') return namesNoId(event) ? absent(event) : null;
	if (judged === 'sign-in') return mustSignIn(event);
	if (judged === 'unlisted') log.error({ route: event.route.id }, 'a route that names no audience is closed');
	return absent(event);
}
