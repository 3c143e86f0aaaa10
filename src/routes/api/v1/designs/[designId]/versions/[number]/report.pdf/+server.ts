import { requireScope } from '$lib/server/auth/require';
import { download } from '$lib/server/http/download';
import { problem } from '$lib/server/http/problem';
import { printReport } from '$lib/server/pdf/print-report';
import { printSchema, reportOfVersion } from '$lib/server/versions/report-of';
import type { RequestHandler } from './$types';

/** A saved version as a calculation report, from its stored figures. */
export const GET: RequestHandler = async ({ locals, params, request, url }) => {
	const print = printSchema.parse(Object.fromEntries(url.searchParams));
	const scope = requireScope(locals);
	const report = /^\d{1,9}$/.test(params.number)
		? await reportOfVersion(scope, params.designId, Number(params.number), print)
		: null;
	if (!report) return problem('not-found', 'No such version');
	const bytes = await printReport(report, { firmId: scope.firmId, signal: request.signal });
	if (bytes instanceof Response) return bytes;
	const { project, system, revision } = report.titleBlock;
	return download(new Uint8Array(bytes), 'application/pdf', `${project} ${system} ${revision}.pdf`);
};
