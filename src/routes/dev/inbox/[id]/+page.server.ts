import { error } from '@sveltejs/kit';
import { findMessage, inboxUrl } from '$lib/server/mail/inbox';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ params }) => {
	const message = inboxUrl() ? await findMessage(params.id) : null;
	if (!message) error(404, 'Not found');
	return { message };
};
