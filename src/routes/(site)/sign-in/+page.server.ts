import { fail, redirect } from '@sveltejs/kit';
import { message, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { passwordSignInSchema } from '$lib/schemas/sign-in';
import { returnPath } from '$lib/server/auth/return-path';
import { signInWithPassword } from '$lib/server/auth/sign-in';
import { sendVerificationAgain } from '$lib/server/auth/verify-address';
import type { Actions, PageServerLoad } from './$types';

/** One answer for all: whoever signs up with an address must not learn here whether it was known before. */
const REFUSED = {
	text: 'No confirmed account has this address with this password. A new one works once the letter to its address was opened.',
	again: true
};

export const load: PageServerLoad = async ({ locals, url }) => {
	const to = url.searchParams.get('to') ?? '';
	if (locals.person) redirect(303, returnPath(to));
	return { form: await superValidate({ to }, zod4(passwordSignInSchema), { errors: false }) };
};

export const actions: Actions = {
	enter: async (event) => {
		const form = await superValidate(event.request.clone(), zod4(passwordSignInSchema));
		const { email, password, to } = form.data;
		form.data.password = '';
		if (!form.valid) return fail(400, { form });
		await signInWithPassword(event, { email, password, to: returnPath(to) });
		return message(form, REFUSED, { status: 400 });
	},
	again: async ({ request }) => {
		const form = await superValidate(request, zod4(passwordSignInSchema));
		form.data.password = '';
		if (form.errors.email) return fail(400, { form });
		sendVerificationAgain(form.data.email);
		redirect(303, '/sign-in/sent');
	}
};
