import { json } from '@sveltejs/kit';
import { editsBodySchema } from '$lib/sheet/edit';
import { requireEditor, requireScope } from '$lib/server/auth/require';
import { appendEdits } from '$lib/server/designs/append-edits';
import { jsonBody } from '$lib/server/http/json-body';
import { problem } from '$lib/server/http/problem';
import type { RequestHandler } from './$types';

/** Takes edits of the working sheet; answers with the entries that the client lacks and the server's figures. */
export const POST: RequestHandler = async ({ locals, params, request }) => {
	const scope = requireScope(locals);
	const read = await jsonBody(request);
	if ('refusal' in read) return read.refusal;
	const body = editsBodySchema.safeParse(read.body);
	if (!body.success)
		return problem('invalid', 'These edits are not of the form that this address takes', {
			problems: body.error.issues.slice(0, 20).map(({ path, message }) => ({ path: path.join('.'), message }))
		});
	if (body.data.edits.length) requireEditor(locals);
	const appended = await appendEdits(scope, params.designId, body.data.base, body.data.edits);
	if (!appended) return problem('not-found', 'No such design');
	const { entries, seq, refused, solved } = appended;
	const { solution } = solved;
	return json({
		entries,
		seq,
		refused,
		figures: solution && { fan: solution.fan, index: solution.index, rows: Object.keys(solution.rows).length },
		problems: solved.problems.length
	});
};
