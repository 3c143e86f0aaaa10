import { catalogue, ENGINE_VERSION, materials, type Family } from '$lib/engine';
import type { PageServerLoad } from './$types';

const FAMILIES: Readonly<Record<Family, string>> = {
	'elbows-round': 'Round elbows',
	'elbows-rectangular': 'Rectangular elbows',
	'elbows-oval': 'Oval elbows',
	offsets: 'Offsets',
	'area-changes': 'Changes of size',
	entries: 'Entries',
	exits: 'Exits',
	dampers: 'Dampers',
	screens: 'Screens, plates and obstructions',
	'junctions-diverging': 'Junctions where a stream divides',
	'junctions-converging': 'Junctions where streams unite',
	equipment: 'Equipment and terminals',
	'system-effect': 'System effect at the fan'
};

const families = (Object.keys(FAMILIES) as Family[]).map((family) => ({
	id: family,
	title: FAMILIES[family],
	entries: catalogue.filter((entry) => entry.family === family)
}));

/** The catalogue as the engine holds it: what is not here is not computed. */
export const load: PageServerLoad = ({ locals }) => ({
	families: families.filter(({ entries }) => entries.length > 0),
	materials,
	engineVersion: ENGINE_VERSION,
	signedIn: locals.scope !== null
});
