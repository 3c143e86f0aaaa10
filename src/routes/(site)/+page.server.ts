import { redirect } from '@sveltejs/kit';
import { FIRST_PAGE } from '$lib/server/auth/return-path';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = ({ locals }) => {
	if (locals.scope) redirect(303, FIRST_PAGE);
	if (locals.person) redirect(303, '/account');
	return { appearance: locals.appearance };
};
