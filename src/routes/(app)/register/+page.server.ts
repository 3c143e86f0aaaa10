import { mayEdit } from '$lib/server/auth/scope';
import { requirePerson, requireScope } from '$lib/server/auth/require';
import { listRegister } from '$lib/server/projects/projects';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	const scope = requireScope(locals);
	const person = requirePerson(locals);
	const show = url.searchParams.get('show') === 'archived' ? 'archived' : 'current';
	return {
		show: show as 'current' | 'archived',
		projects: await listRegister(scope, show),
		firm: locals.firm?.name ?? '',
		person: person.name || person.email,
		role: scope.role,
		mayEdit: mayEdit(scope)
	};
};
