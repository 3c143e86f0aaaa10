import { error, fail } from '@sveltejs/kit';
import { message, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { saveVersionSchema } from '$lib/schemas/version';
import { requireEditor } from '$lib/server/auth/require';
import { saveVersion } from '$lib/server/versions/save-version';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async () => ({ form: await superValidate(zod4(saveVersionSchema)) });

export const actions: Actions = {
	save: async ({ locals, params, request }) => {
		const scope = requireEditor(locals);
		const form = await superValidate(request, zod4(saveVersionSchema));
		if (!form.valid) return fail(400, { form });
		const saved = await saveVersion(scope, params.designId, form.data);
		if (saved.ok) return message(form, `Saved as ${saved.revision}`);
		if (saved.reason === 'absent') error(404, 'No such design');
		const { problems, uncounted } = saved.solved;
		const first =
			problems[0]?.message ??
			(uncounted.length
				? `${uncounted.length === 1 ? '1 row does' : `${uncounted.length} rows do`} not count yet.`
				: 'The sheet has no rows.');
		return message(form, `Not saved: a version stands for the whole sheet. ${first}`, { status: 409 });
	}
};
