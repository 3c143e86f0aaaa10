import { catalogue, type CatalogueEntry, type Family } from '$lib/engine';
import { fittingPlot, plottedParameter } from './fitting-plot';
import { junctionPlots, silentDirection } from './junction-plots';
import type { Plot } from './plot';
import { publishedGroups, type PublishedGroup } from './published-values';

/** All that the method notes say of an entry beside what the catalogue says. */
export interface EntryNote {
	readonly entry: CatalogueEntry;
	readonly plots: readonly Plot[];
	/** What is not drawn, and why */
	readonly notDrawn: string | null;
	readonly published: readonly PublishedGroup[];
}

export interface FamilyNotes {
	readonly id: Family;
	readonly title: string;
	readonly notes: readonly EntryNote[];
}

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
	equipment: 'Equipment and terminals',
	'system-effect': 'System effect at the fan',
	'junctions-diverging': 'Junctions',
	'junctions-converging': 'Junctions where streams unite'
};

/** Why a fitting has no plot; null where it has one. */
function withoutPlot(entry: CatalogueEntry): string | null {
	if (plottedParameter(entry)) return null;
	if (entry.parameters.some(({ name }) => name === 'coefficient'))
		return 'The coefficient is entered, not computed: there is nothing to plot.';
	return entry.parameters.length > 0
		? 'A value for each choice: there is nothing to plot.'
		: 'One value: there is nothing to plot.';
}

export function entryNote(entry: CatalogueEntry): EntryNote {
	const isJunction = entry.place === 'junction';
	const plot = isJunction ? null : fittingPlot(entry);
	return {
		entry,
		plots: isJunction ? junctionPlots(entry) : plot ? [plot] : [],
		notDrawn: isJunction ? silentDirection(entry) : withoutPlot(entry),
		published: publishedGroups(entry.key)
	};
}

/** The whole catalogue by families, in its own order. */
export function familyNotes(): readonly FamilyNotes[] {
	return (Object.keys(FAMILIES) as Family[])
		.map((id) => ({
			id,
			title: FAMILIES[id],
			notes: catalogue.filter(({ family }) => family === id).map(entryNote)
		}))
		.filter(({ notes }) => notes.length > 0);
}
