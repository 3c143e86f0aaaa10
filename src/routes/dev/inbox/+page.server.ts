import { error } from '@sveltejs/kit';
import { listMessages, mayReadInbox } from '$lib/server/mail/inbox';
import type { PageServerLoad } from './$types';

/** The letters that the fake mail server holds; there is no such page where none is configured. */
export const load: PageServerLoad = async ({ request }) => {
	if (!mayReadInbox(request)) error(404, 'Not found');
	const messages = await listMessages();
	return { messages: messages.map(({ id, to, subject, received }) => ({ id, to, subject, received })) };
};
