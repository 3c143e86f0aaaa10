import { error } from '@sveltejs/kit';
import { mayEdit, type FirmScope } from './scope';

type Person = NonNullable<App.Locals['person']>;

/** The signed-in person. The guard has let nobody else in; a route that it lets anyone into answers 404. */
export function requirePerson(locals: App.Locals): Person {
	if (!locals.person) error(404, 'Not found');
	return locals.person;
}

/** The scope of the current firm, first argument of every query. */
export function requireScope(locals: App.Locals): FirmScope {
	if (!locals.scope) error(404, 'Not found');
	return locals.scope;
}

/** The scope of one who may edit; for actions and replies that write. Forbidden looks like absent. */
export function requireEditor(locals: App.Locals): FirmScope {
	const scope = requireScope(locals);
	if (!mayEdit(scope)) error(404, 'Not found');
	return scope;
}
