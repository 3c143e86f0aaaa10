import { error, redirect } from '@sveltejs/kit';
import { requireEditor } from '$lib/server/auth/require';
import { putBack } from '$lib/server/versions/restore-version';
import type { Actions, PageServerLoad } from './$types';

const editOf = (text: string) => (/^\d{1,9}$/.test(text) ? Number(text) : null);

/** After a version was restored the address says what was put in and what stood there before. */
export const load: PageServerLoad = ({ url }) => {
	const from = url.searchParams.get('restored') ?? '';
	const before = editOf(url.searchParams.get('before') ?? '');
	return { restored: /^P\d{2,9}$/.test(from) && before !== null ? { from, before } : null };
};

export const actions: Actions = {
	'put-back': async ({ locals, params, request }) => {
		const scope = requireEditor(locals);
		const seq = editOf(String((await request.formData()).get('before') ?? ''));
		if (seq === null || !(await putBack(scope, params.designId, seq))) error(404, 'No such edit');
		redirect(303, `/designs/${params.designId}/sheet`);
	}
};
