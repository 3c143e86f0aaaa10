import { fail, redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { linkSchema } from '$lib/schemas/sign-in';
import { returnPath } from '$lib/server/auth/return-path';
import { sendLink } from '$lib/server/auth/sign-in';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ url }) => {
	const to = url.searchParams.get('to') ?? '';
	return {
		form: await superValidate({ to }, zod4(linkSchema), { errors: false }),
		// Auth.js leads here when a link is unknown, used or too old.
		failed: url.searchParams.has('error')
	};
};

export const actions: Actions = {
	default: async (event) => {
		const form = await superValidate(event.request.clone(), zod4(linkSchema));
		if (!form.valid) return fail(400, { form });
		sendLink(event, form.data.email, returnPath(form.data.to));
		redirect(303, '/sign-in/sent');
	}
};
