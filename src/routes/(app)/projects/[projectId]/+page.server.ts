import { error, fail, redirect } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { designSchema, elevationOf, projectSchema } from '$lib/schemas/project';
import { requireEditor, requirePerson, requireScope } from '$lib/server/auth/require';
import { mayEdit } from '$lib/server/auth/scope';
import { changeDesign } from '$lib/server/designs/change-design';
import { createDesign } from '$lib/server/designs/create-design';
import { isId } from '$lib/server/http/is-id';
import { changeProject, findProject, listDesigns } from '$lib/server/projects/projects';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const scope = requireScope(locals);
	const project = await findProject(scope, params.projectId);
	if (!project) error(404, 'No such project');
	const { elevation_m, ...fields } = project;
	const person = requirePerson(locals);
	return {
		project: fields,
		designs: await listDesigns(scope, params.projectId),
		form: await superValidate({ ...fields, elevation: `${elevation_m} m` }, zod4(projectSchema), { id: 'project' }),
		designForm: await superValidate(zod4(designSchema), { id: 'design' }),
		firm: locals.firm?.name ?? '',
		person: person.name || person.email,
		mayEdit: mayEdit(scope)
	};
};

const gone = (outcome: 'done' | 'absent' | 'taken') => {
	if (outcome === 'absent') error(404, 'No such project');
};

export const actions: Actions = {
	change: async ({ locals, params, request }) => {
		const scope = requireEditor(locals);
		const form = await superValidate(request, zod4(projectSchema), { id: 'project' });
		if (!form.valid) return fail(400, { form });
		const { elevation: _typed, ...fields } = form.data;
		const outcome = await changeProject(scope, params.projectId, { ...fields, elevation_m: elevationOf(form.data) });
		gone(outcome);
		if (outcome === 'taken') return setError(form, 'number', `The firm has a project ${fields.number} already.`);
		return message(form, 'Saved');
	},
	archive: async ({ locals, params, request }) => {
		const archived = (await request.formData()).get('archived') === 'yes';
		gone(await changeProject(requireEditor(locals), params.projectId, { archived }));
		redirect(303, archived ? '/register' : `/projects/${params.projectId}`);
	},
	design: async ({ locals, params, request }) => {
		const scope = requireEditor(locals);
		const form = await superValidate(request, zod4(designSchema), { id: 'design' });
		if (!form.valid) return fail(400, { form });
		const made = await createDesign(scope, { projectId: params.projectId, ...form.data });
		if (made === 'absent') error(404, 'No such project');
		if (made === 'taken') return setError(form, 'name', `This project has a system ${form.data.name} already.`);
		redirect(303, `/designs/${made.designId}/sheet`);
	},
	archiveDesign: async ({ locals, request }) => {
		const typed = await request.formData();
		const archived = typed.get('archived') === 'yes';
		const designId = String(typed.get('designId') ?? '');
		gone(isId(designId) ? await changeDesign(requireEditor(locals), designId, { archived }) : 'absent');
		return {};
	}
};
