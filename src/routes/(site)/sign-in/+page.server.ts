import { fail, redirect } from '@sveltejs/kit';
import { message, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { passwordSignInSchema } from '$lib/schemas/sign-in';
import { returnPath } from '$lib/server/auth/return-path';
import { signInWithPassword } from '$lib/server/auth/sign-in';
import { sendVerificationAgain } from '$lib/server/auth/verify-address';
import type { Actions, PageServerLoad } from './$types';

const REFUSED = {
	wrong: { text: 'No account has this address with this password.', again: false },
	'address-not-verified': {
		text: 'The password fits, but this address is not confirmed yet. Open the letter that was sent to it.',
		again: true
	}
} as const;

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
		const refused = await signInWithPassword(event, { email, password, to: returnPath(to) });
		return message(form, REFUSED[refused], { status: 400 });
	},
	again: async ({ request }) => {
		const form = await superValidate(request, zod4(passwordSignInSchema));
		form.data.password = '';
		if (form.errors.email) return fail(400, { form });
		sendVerificationAgain(form.data.email);
		redirect(303, '/sign-in/sent');
	}
};
