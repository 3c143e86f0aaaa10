import { requireScope } from '$lib/server/auth/require';
import { openDesign } from '$lib/server/designs/find-design';
import { download } from '$lib/server/http/download';
import { problem } from '$lib/server/http/problem';
import { documentOf } from '$lib/sheet/design-document';
import type { RequestHandler } from './$types';

/** The design document of the working sheet: what the engine and its command line read. */
export const GET: RequestHandler = async ({ locals, params }) => {
	const opened = await openDesign(requireScope(locals), params.designId);
	if (!opened) return problem('not-found', 'No such design');
	const { document, problems, uncounted } = documentOf(opened.sheet);
	if (!document || problems.length || uncounted.size)
		return problem('invalid', 'Mend the rows that do not count first.');
	const { projectNumber, name } = opened.heading;
	return download(`${JSON.stringify(document, null, '\t')}\n`, 'application/json', `${projectNumber} ${name}.json`);
};
