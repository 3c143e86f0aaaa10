import { error } from '@sveltejs/kit';
import { findMessage, mayReadInbox } from '$lib/server/mail/inbox';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ params, request }) => {
	const message = mayReadInbox(request) ? await findMessage(params.id) : null;
	if (!message) error(404, 'Not found');
	return { message };
};
