import { CredentialsSignin } from '@auth/sveltekit';
import { isRedirect, redirect, type RequestEvent } from '@sveltejs/kit';
import { origin } from '../http/origin';
import { findUserByEmail } from './users';
import { postBeside } from '../mail/post';
import { authJs } from './auth-js';
import { revokeSession } from './sessions';

/** The event with a form of our making, and with headers from which no address of another host can be built. */
function withForm(event: RequestEvent, fields: Readonly<Record<string, string>>): RequestEvent {
	const headers = new Headers();
	for (const name of ['cookie', 'user-agent']) headers.set(name, event.request.headers.get(name) ?? '');
	const { host, protocol } = new URL(origin());
	headers.set('host', host);
	headers.set('x-forwarded-host', host);
	headers.set('x-forwarded-proto', protocol.slice(0, -1));
	const request = new Request(event.url, { method: 'POST', headers, body: new URLSearchParams(fields) });
	return { ...event, request };
}

/** Signs in with a password and goes to `to`, a path of ours; returns where that is refused. */
export async function signInWithPassword(
	event: RequestEvent,
	{ email, password, to }: { readonly email: string; readonly password: string; readonly to: string }
): Promise<void> {
	try {
		await authJs.signIn(withForm(event, { providerId: 'credentials', email, password, redirectTo: to }));
	} catch (cause) {
		if (isRedirect(cause)) redirect(303, to);
		if (!(cause instanceof CredentialsSignin)) throw cause;
	}
}

/** Sends a link to a known address; whoever asks sees no difference. */
export function sendLink(event: RequestEvent, email: string, to: string): void {
	postBeside(async () => {
		if (!(await findUserByEmail(email))) return;
		try {
			// The cookie that it sets comes too late for the reply; the letter carries the path itself.
			const cookies = { ...event.cookies, set: () => undefined };
			await authJs.signIn({ ...withForm(event, { providerId: 'email', email, redirectTo: to }), cookies });
		} catch (cause) {
			if (!isRedirect(cause)) throw cause;
		}
	});
}

/** Signs this browser out: ends its session and takes the cookie away. */
export async function signOut(event: RequestEvent): Promise<never> {
	const { person, sessionId } = event.locals;
	if (person && sessionId) await revokeSession(person.id, sessionId);
	try {
		await authJs.signOut(withForm(event, { redirectTo: '/' }));
	} catch (cause) {
		if (!isRedirect(cause)) throw cause;
	}
	redirect(303, '/');
}
