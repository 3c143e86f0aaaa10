import { getToken } from '@auth/core/jwt';
import type { RequestEvent } from '@sveltejs/kit';
import { findMembership } from '../firms/find-membership';
import { origin } from '../http/origin';
import { findSession } from './sessions';

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/** The session named by the signed cookie; it counts only while its row in the database does. */
async function sessionIdOf(request: Request): Promise<string | null> {
	if (!request.headers.get('cookie')?.includes('authjs.session-token')) return null;
	const secureCookie = origin().startsWith('https:');
	const token = await getToken({ req: request, secret: process.env.AUTH_SECRET ?? '', secureCookie });
	return typeof token?.sessionId === 'string' && UUID.test(token.sessionId) ? token.sessionId : null;
}

/** Finds out who asks, and for which firm, and writes it into `locals`. Nothing but this and the guard decides. */
export async function identify({ locals, request }: RequestEvent): Promise<void> {
	Object.assign(locals, { person: null, scope: null, firm: null, sessionId: null });
	const sessionId = await sessionIdOf(request);
	const found = sessionId === null ? null : await findSession(sessionId);
	if (!found) return;
	locals.sessionId = sessionId;
	locals.person = { id: found.userId, email: found.email, name: found.name ?? found.email };
	const current = await findMembership(found.userId, found.firmId);
	if (!current) return;
	locals.scope = current.scope;
	locals.firm = current.firm;
}
