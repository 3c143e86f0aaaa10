import { fail, redirect } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { appearanceSchema, nameSchema, passwordSchema, sessionSchema } from '$lib/schemas/account';
import { changePassword, hasPassword } from '$lib/server/auth/change-password';
import { passwordObjection } from '$lib/server/auth/password';
import { requirePerson } from '$lib/server/auth/require';
import { browserName } from '$lib/server/auth/browser-name';
import { listSessions, revokeSession, revokeSessions } from '$lib/server/auth/sessions';
import { changeUser } from '$lib/server/auth/users';
import { keepAppearance } from '$lib/server/http/appearance';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals }) => {
	const { id, email, name } = requirePerson(locals);
	const sessions = await listSessions(id);
	return {
		email,
		firmName: locals.firm?.name ?? null,
		appearance: locals.appearance,
		hasPassword: await hasPassword(id),
		sessions: sessions.map((session) => ({
			id: session.id,
			browser: browserName(session.browser),
			since: session.createdAt,
			lastSeen: session.lastSeenAt,
			here: session.id === locals.sessionId
		})),
		nameForm: await superValidate({ name }, zod4(nameSchema), { id: 'name' }),
		passwordForm: await superValidate(zod4(passwordSchema), { id: 'password' })
	};
};

export const actions: Actions = {
	name: async ({ locals, request }) => {
		const nameForm = await superValidate(request, zod4(nameSchema), { id: 'name' });
		if (!nameForm.valid) return fail(400, { form: nameForm });
		await changeUser(requirePerson(locals).id, { name: nameForm.data.name });
		return message(nameForm, 'Saved');
	},
	password: async ({ locals, request }) => {
		const form = await superValidate(request, zod4(passwordSchema), { id: 'password' });
		const { id, email } = requirePerson(locals);
		const typed = { ...form.data };
		Object.assign(form.data, { present: '', password: '' });
		if (!form.valid) return fail(400, { form });
		const objection = passwordObjection(typed.password, email);
		if (objection) return setError(form, 'password', objection);
		if (!(await changePassword(id, locals.sessionId ?? '', typed)))
			return setError(form, 'present', 'This is not the present password.');
		return message(form, 'Changed. Other browsers have been signed out.');
	},
	appearance: async ({ cookies, request }) => {
		const read = appearanceSchema.safeParse(Object.fromEntries(await request.formData()));
		if (!read.success) return fail(400);
		keepAppearance(cookies, read.data.appearance);
		redirect(303, '/account');
	},
	revoke: async ({ locals, request }) => {
		const read = sessionSchema.safeParse(Object.fromEntries(await request.formData()));
		if (!read.success) return fail(400);
		await revokeSession(requirePerson(locals).id, read.data.sessionId);
		redirect(303, '/account');
	},
	revokeOthers: async ({ locals }) => {
		await revokeSessions(requirePerson(locals).id, locals.sessionId);
		redirect(303, '/account');
	}
};
