import { fail, redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { emailSchema } from '$lib/schemas/sign-in';
import { askForReset } from '$lib/server/auth/reset-password';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async () => ({ form: await superValidate(zod4(emailSchema)) });

export const actions: Actions = {
	default: async ({ request }) => {
		const form = await superValidate(request, zod4(emailSchema));
		if (!form.valid) return fail(400, { form });
		askForReset(form.data.email);
		redirect(303, '/sign-in/sent');
	}
};
