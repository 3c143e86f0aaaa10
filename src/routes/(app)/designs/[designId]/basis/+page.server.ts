import { randomUUID } from 'node:crypto';
import { error, fail } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { BASIS_FIELDS, basisSchema } from '$lib/schemas/basis';
import { requireEditor } from '$lib/server/auth/require';
import { appendEdits } from '$lib/server/designs/append-edits';
import { changeDesign } from '$lib/server/designs/change-design';
import { openDesign } from '$lib/server/designs/find-design';
import { methodEdits, settingEdits, settingsToEdit, together } from '$lib/sheet/settings';
import type { Actions, PageServerLoad } from './$types';

/** The methods stand beside the form’s own schema: one field for each entry of the catalogue that has several. */
const methodsOf = (sent: FormData): Record<string, string> =>
	Object.fromEntries([...sent].flatMap(([key, text]) => (typeof text === 'string' ? [[key, text]] : [])));

export const load: PageServerLoad = async ({ parent }) => {
	const { sheet, heading } = await parent();
	const names = { name: heading.name, serves: heading.service };
	return { form: await superValidate({ ...names, ...settingsToEdit(sheet, BASIS_FIELDS) }, zod4(basisSchema)) };
};

export const actions: Actions = {
	save: async ({ locals, params, request }) => {
		const scope = requireEditor(locals);
		const sent = await request.formData();
		const form = await superValidate(sent, zod4(basisSchema));
		if (!form.valid) return fail(400, { form });
		const opened = await openDesign(scope, params.designId);
		if (!opened || opened.heading.archivedAt) error(404, 'No such design');
		const { name, serves, typedIn } = form.data;
		const renamed = name !== opened.heading.name || serves !== opened.heading.service;
		if (renamed && (await changeDesign(scope, params.designId, { name, service: serves })) === 'taken')
			return setError(form, 'name', `This project has a system ${name} already.`);
		const edit = together(
			settingEdits(opened.sheet, form.data, typedIn, BASIS_FIELDS),
			methodEdits(opened.sheet, methodsOf(sent), typedIn)
		);
		if (edit && !(await appendEdits(scope, params.designId, opened.seq, [{ id: randomUUID(), edit }])))
			error(404, 'No such design');
		return message(form, edit || renamed ? 'Saved' : 'Nothing was changed');
	}
};
