import { error, redirect } from '@sveltejs/kit';
import { requireEditor, requireScope } from '$lib/server/auth/require';
import { restoreVersion } from '$lib/server/versions/restore-version';
import { reportOfVersion } from '$lib/server/versions/report-of';
import { openVersion } from '$lib/server/versions/versions';
import type { Actions, PageServerLoad } from './$types';

const numberOf = (text: string) => (/^\d{1,9}$/.test(text) ? Number(text) : error(404, 'No such version'));

const SHOWN = ['sheet', 'ledger', 'basis'] as const;

export const load: PageServerLoad = async ({ locals, params, url }) => {
	const scope = requireScope(locals);
	const number = numberOf(params.number);
	const version = await openVersion(scope, params.designId, number);
	if (!version) error(404, 'No such version');
	const show = SHOWN.find((one) => one === url.searchParams.get('show')) ?? 'sheet';
	const report = show === 'sheet' ? null : await reportOfVersion(scope, params.designId, number, { paper: 'A4' });
	return { version, show, report: report && { ledger: report.ledger, basis: report.basis, criteria: report.criteria } };
};

export const actions: Actions = {
	restore: async ({ locals, params }) => {
		const done = await restoreVersion(requireEditor(locals), params.designId, numberOf(params.number));
		if (!done) error(404, 'No such version');
		redirect(303, `/designs/${params.designId}/sheet?restored=${done.from}&before=${done.before}`);
	}
};
