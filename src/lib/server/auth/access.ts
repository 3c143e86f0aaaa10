import { mayEdit } from './scope';

/**
 * Who may use a route: anyone; a person who is signed in; a member of the current firm in any role; a member whose
 * role may edit.
 */
export type Audience = 'anyone' | 'signed-in' | 'member' | 'editor';

/**
 * The one table of who may use what. It holds for pages, form actions and replies of the API alike. A route that is
 * not in it is closed.
 */
export const ACCESS: Readonly<Record<string, Audience>> = {
	'/(site)': 'anyone',
	'/(site)/methods': 'anyone',
	'/(site)/sign-in': 'anyone',
	'/(site)/sign-in/link': 'anyone',
	'/(site)/sign-in/link/open': 'anyone',
	'/(site)/sign-in/sent': 'anyone',
	'/(site)/sign-up': 'anyone',
	'/(site)/sign-out': 'anyone',
	'/(site)/verify': 'anyone',
	'/(site)/forgotten': 'anyone',
	'/(site)/reset': 'anyone',
	'/(site)/absent': 'anyone',
	// Answers only where a fake mail server is configured.
	'/dev/inbox': 'anyone',
	'/dev/inbox/[id]': 'anyone',
	'/(app)/account': 'signed-in',
	'/(app)/register': 'member',
	'/(app)/projects/new': 'member',
	'/(app)/projects/[projectId]': 'member',
	'/(app)/designs/[designId]': 'member',
	'/(app)/designs/[designId]/sheet': 'member',
	'/(app)/designs/[designId]/ledger': 'member',
	'/(app)/designs/[designId]/basis': 'member',
	'/(app)/designs/[designId]/versions': 'member',
	'/(app)/designs/[designId]/versions/[number]': 'member',
	'/(app)/designs/[designId]/hand-over': 'member',
	'/api/v1/health': 'anyone',
	'/api/v1/designs/[designId]/edits': 'member',
	'/api/v1/designs/[designId]/versions/[number]/report.pdf': 'member',
	'/api/v1/designs/[designId]/report.pdf': 'member',
	'/api/v1/designs/[designId]/document.json': 'member',
	'/api/v1/designs/[designId]/schedule.csv': 'member'
};

/** What the guard does with a request. */
export type Verdict = 'open' | 'absent' | 'sign-in' | 'unlisted';

/** Judges a route for a visitor. Unknown, forbidden and forgotten routes are told apart only in the log. */
export function verdict(routeId: string | null, visitor: Pick<App.Locals, 'person' | 'scope'>): Verdict {
	if (routeId === null) return 'absent';
	if (!Object.hasOwn(ACCESS, routeId)) return 'unlisted';
	const audience = ACCESS[routeId];
	if (audience === 'anyone') return 'open';
	if (!visitor.person) return 'sign-in';
	if (audience === 'signed-in') return 'open';
	if (!visitor.scope) return 'absent';
	return audience === 'member' || mayEdit(visitor.scope) ? 'open' : 'absent';
}
