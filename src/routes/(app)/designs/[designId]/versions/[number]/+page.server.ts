import { error, redirect } from '@sveltejs/kit';
import { requireEditor, requireScope } from '$lib/server/auth/require';
import { restoreVersion } from '$lib/server/versions/restore-version';
import { openVersion } from '$lib/server/versions/versions';
import type { Actions, PageServerLoad } from './$types';

const numberOf = (text: string) => (/^\d{1,9}$/.test(text) ? Number(text) : error(404, 'No such version'));

export const load: PageServerLoad = async ({ locals, params }) => {
	const version = await openVersion(requireScope(locals), params.designId, numberOf(params.number));
	if (!version) error(404, 'No such version');
	return { version };
};

export const actions: Actions = {
	restore: async ({ locals, params }) => {
		const done = await restoreVersion(requireEditor(locals), params.designId, numberOf(params.number));
		if (!done) error(404, 'No such version');
		redirect(303, `/designs/${params.designId}/sheet?restored=${done.from}&before=${done.before}`);
	}
};
