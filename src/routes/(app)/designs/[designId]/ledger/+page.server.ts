import { requirePerson, requireScope } from '$lib/server/auth/require';
import { reportOfSheet } from '$lib/server/versions/report-of';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const person = requirePerson(locals);
	const report = await reportOfSheet(requireScope(locals), params.designId, { paper: 'A4' }, person.email);
	return { ledger: report && report !== 'no-answer' ? report.ledger : null };
};
