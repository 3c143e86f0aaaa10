import { checkList, ENGINE_VERSION, materials, NOT_SHOWN } from '$lib/engine';
import { familyNotes, publishedGroups } from '$lib/methods';
import type { PageServerLoad } from './$types';

/** Worked out once: the catalogue does not change while the program runs. What is not in it is not computed. */
const families = familyNotes();
const published = Object.fromEntries(
	['streams', 'air', 'shape', 'friction', 'leakage'].map((subject) => [subject, publishedGroups(subject)])
);

export const load: PageServerLoad = ({ locals }) => ({
	families,
	published,
	materials,
	checks: checkList,
	notShown: NOT_SHOWN,
	engineVersion: ENGINE_VERSION,
	signedIn: locals.scope !== null
});
