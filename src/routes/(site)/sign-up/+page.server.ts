import { fail, redirect } from '@sveltejs/kit';
import { setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { signUpSchema } from '$lib/schemas/sign-in';
import { passwordObjection } from '$lib/server/auth/password';
import { FIRST_PAGE } from '$lib/server/auth/return-path';
import { signUp } from '$lib/server/auth/sign-up';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals }) => {
	if (locals.scope) redirect(303, FIRST_PAGE);
	return { form: await superValidate(zod4(signUpSchema)) };
};

export const actions: Actions = {
	default: async ({ request }) => {
		const form = await superValidate(request, zod4(signUpSchema));
		const typed = { ...form.data };
		form.data.password = '';
		if (!form.valid) return fail(400, { form });
		const objection = passwordObjection(typed.password, typed.email);
		if (objection) return setError(form, 'password', objection);
		await signUp(typed);
		redirect(303, '/sign-in/sent');
	}
};
