import { fail, redirect } from '@sveltejs/kit';
import { setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { elevationOf, projectSchema } from '$lib/schemas/project';
import { requireEditor, requirePerson } from '$lib/server/auth/require';
import { createProject } from '$lib/server/projects/projects';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals }) => {
	requireEditor(locals);
	const person = requirePerson(locals);
	return {
		form: await superValidate(zod4(projectSchema)),
		firm: locals.firm?.name ?? '',
		person: person.name || person.email
	};
};

export const actions: Actions = {
	default: async ({ locals, request }) => {
		const scope = requireEditor(locals);
		const form = await superValidate(request, zod4(projectSchema));
		if (!form.valid) return fail(400, { form });
		const { elevation: _typed, ...fields } = form.data;
		const made = await createProject(scope, { ...fields, elevation_m: elevationOf(form.data) });
		if (made === 'taken') return setError(form, 'number', `The firm has a project ${fields.number} already.`);
		redirect(303, `/projects/${made.projectId}`);
	}
};
