import type { CatalogueEntry, Drawing } from '$lib/engine';
import { exitDiffuser, oneSided, pyramid, squareToRound, step, transition } from './area-changes';
import { blades, damper, firedamper, gate, obstruction, plate, screen } from './controls';
import type { PartFigure } from './drawing-board';
import { elbow, mitred, offset, segmented, splitter, vaned } from './elbows';
import { fanInlet, fanOutlet } from './fans';
import { bullhead, conical, cross, plenum, shoe, tee, wye } from './junctions';
import { bellmouth, cap, entry, exit, hood, louvre } from './openings';

export { WIDTH, type PartFigure } from './drawing-board';

/** Each drawing, made for the entry that shows it: those of one kind differ by what they have and where they flow. */
const DRAWINGS: Readonly<Record<Drawing, (key: string) => PartFigure>> = {
	elbow,
	'elbow-rectangular': elbow,
	segmented,
	mitre: mitred,
	vaned,
	splitter,
	offset,
	step,
	transition,
	pyramid,
	'square-to-round': squareToRound,
	'one-sided': oneSided,
	entry,
	bellmouth,
	hood,
	cap,
	louvre,
	exit,
	'exit-diffuser': exitDiffuser,
	damper,
	blades,
	gate,
	firedamper,
	screen,
	plate,
	obstruction,
	'fan-inlet': fanInlet,
	'fan-outlet': fanOutlet,
	tee,
	wye,
	shoe,
	conical,
	cross,
	bullhead,
	plenum
};

/** Junctions whose entry names no drawing of its own. */
const BY_KEY: Readonly<Record<string, Drawing>> = {
	tee: 'tee',
	wye: 'wye',
	'shoe-take-off': 'shoe',
	'conical-take-off': 'conical',
	'bullhead-tee': 'bullhead',
	cross: 'cross',
	plenum: 'plenum'
};

/** The drawing of an entry; null where nobody drew it. */
export function partFigure({ key, drawing }: Pick<CatalogueEntry, 'key' | 'drawing'>): PartFigure | null {
	const kind = drawing ?? BY_KEY[key];
	return kind === undefined ? null : DRAWINGS[kind](key);
}
