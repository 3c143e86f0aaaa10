import { requirePerson, requireScope } from '$lib/server/auth/require';
import { download } from '$lib/server/http/download';
import { problem } from '$lib/server/http/problem';
import { printReport } from '$lib/server/pdf/print-report';
import { printSchema, reportOfSheet } from '$lib/server/versions/report-of';
import type { RequestHandler } from './$types';

/** The working sheet as a calculation report. */
export const GET: RequestHandler = async ({ locals, params, request, url }) => {
	const print = printSchema.parse(Object.fromEntries(url.searchParams));
	const person = requirePerson(locals);
	const scope = requireScope(locals);
	const report = await reportOfSheet(scope, params.designId, print, person.name || person.email);
	if (report === null) return problem('not-found', 'No such design');
	if (report === 'no-answer') return problem('invalid', 'Mend the rows that do not count, then print.');
	const bytes = await printReport(report, { firmId: scope.firmId, signal: request.signal });
	if (bytes instanceof Response) return bytes;
	const { project, system } = report.titleBlock;
	return download(new Uint8Array(bytes), 'application/pdf', `${project} ${system} working sheet.pdf`);
};
