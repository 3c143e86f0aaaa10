import { fail } from '@sveltejs/kit';
import { setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { resetSchema } from '$lib/schemas/sign-in';
import { passwordObjection } from '$lib/server/auth/password';
import { mayReset, resetPassword } from '$lib/server/auth/reset-password';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ url }) => {
	const token = url.searchParams.get('token') ?? '';
	const form = await superValidate({ token }, zod4(resetSchema), { errors: false });
	return { form, live: await mayReset(token) };
};

export const actions: Actions = {
	default: async ({ request }) => {
		const form = await superValidate(request, zod4(resetSchema));
		const { token, password } = form.data;
		form.data.password = '';
		if (!form.valid) return fail(400, { form });
		const objection = passwordObjection(password, '');
		if (objection) return setError(form, 'password', objection);
		return { form, outcome: (await resetPassword(token, password)) ? ('changed' as const) : ('expired' as const) };
	}
};
