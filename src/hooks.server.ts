import { randomUUID } from 'node:crypto';
import type { Handle, HandleServerError, RequestEvent } from '@sveltejs/kit';
import { authJs } from '$lib/server/auth/auth-js';
import { refusal } from '$lib/server/auth/guard';
import { identify } from '$lib/server/auth/identify';
import { appearanceAttribute, appearanceOf } from '$lib/server/http/appearance';
import { fromForeignOrigin } from '$lib/server/http/foreign-origin';
import { log } from '$lib/server/http/log';
import { problem } from '$lib/server/http/problem';
import { withSecurityHeaders } from '$lib/server/http/security-headers';

/** The one address of Auth.js that is open: where the form of a sign-in link leads. */
const LINK_CALLBACK = '/auth/callback/email';

/** Of anything but the edits of a sheet, which may paste a whole building [bytes]. */
const LARGEST_FORM = 1_000_000;
const EDITS = '/api/v1/designs/[designId]/edits';

const isTooLarge = ({ request, route }: RequestEvent): boolean =>
	route.id !== EDITS && Number(request.headers.get('content-length') ?? 0) > LARGEST_FORM;

/** A page of another site may not sign a visitor in as somebody else; our own form asks first, and sends itself. */
const isOwnForm = ({ headers }: Request): boolean => ['same-origin', null].includes(headers.get('sec-fetch-site'));

async function answer(event: RequestEvent, resolve: Parameters<Handle>[0]['resolve']): Promise<Response> {
	if (fromForeignOrigin(event.request, event.url))
		return problem('foreign-origin', 'This was sent by a page of another site and was not done.');
	if (isTooLarge(event)) return problem('too-large', 'This is more than one form may hold.');
	if (event.url.pathname === LINK_CALLBACK && event.request.method === 'GET') {
		if (isOwnForm(event.request)) return authJs.handle({ event, resolve });
		return new Response(null, { status: 303, headers: { location: `/sign-in/link/open${event.url.search}` } });
	}
	await identify(event);
	const refused = await refusal(event);
	if (refused) return refused;
	const attribute = appearanceAttribute(event.locals.appearance);
	return resolve(event, { transformPageChunk: ({ html }) => html.replace('%appearance%', attribute) });
}

/** Every request passes here: who asks, whether they may, the reply, its headers. */
export const handle: Handle = async ({ event, resolve }) => {
	event.locals.appearance = appearanceOf(event.cookies);
	const reply = await answer(event, resolve);
	return withSecurityHeaders(event.url, reply, Boolean(event.locals.person));
};

/** What went wrong stays in the log, under an id that the person can quote. */
export const handleError: HandleServerError = ({ error, event, status }) => {
	if (status === 404) return { message: 'Not found' };
	const id = randomUUID().slice(0, 8);
	log.error({ id, err: error, method: event.request.method, route: event.route.id, status }, 'a request failed');
	return { message: 'This did not work', id };
};
