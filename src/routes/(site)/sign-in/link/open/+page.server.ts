import { redirect } from '@sveltejs/kit';
import { returnPath } from '$lib/server/auth/return-path';
import type { PageServerLoad } from './$types';

/** Shows a button and uses nothing up: programs that read letters open their links, people press buttons. */
export const load: PageServerLoad = ({ url }) => {
	const [token, email] = [url.searchParams.get('token'), url.searchParams.get('email')];
	if (!token || !email) redirect(303, '/sign-in/link');
	return { token, email, to: returnPath(url.searchParams.get('to')) };
};
