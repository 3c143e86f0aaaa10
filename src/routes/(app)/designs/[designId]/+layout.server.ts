import { error } from '@sveltejs/kit';
import { mayEdit } from '$lib/server/auth/scope';
import { requirePerson, requireScope } from '$lib/server/auth/require';
import { openDesign } from '$lib/server/designs/find-design';
import { listVersions } from '$lib/server/versions/versions';
import type { LayoutServerLoad } from './$types';

/** What every sheet of a design shows: its names, the working sheet as the log has it, and its last revision. */
export const load: LayoutServerLoad = async ({ locals, params, depends }) => {
	depends('design:sheet');
	const scope = requireScope(locals);
	const opened = await openDesign(scope, params.designId);
	if (!opened) error(404, 'No such design');
	const versions = await listVersions(scope, params.designId);
	const person = requirePerson(locals);
	return {
		...opened,
		versions,
		person: person.name || person.email,
		mayEdit: mayEdit(scope) && !opened.heading.archivedAt
	};
};
