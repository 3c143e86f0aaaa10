import { json } from '@sveltejs/kit';
import { isReachable } from '$lib/server/db/is-reachable';
import { problem } from '$lib/server/http/problem';
import type { RequestHandler } from './$types';

/** Whether this server and its database answer; for load balancers and the start command. */
export const GET: RequestHandler = async () =>
	(await isReachable()) ? json({ ok: true }) : problem('unavailable', 'The database does not answer');
