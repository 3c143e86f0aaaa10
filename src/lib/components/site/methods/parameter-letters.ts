import type { CatalogueEntry } from '$lib/engine';

const LETTERS: Readonly<Record<string, string>> = {
	angle: 'θ',
	areaRatio: 'A_1/A_2',
	lengthRatio: 'L/√A_1',
	thicknessRatio: 't/d',
	spacing: 'L/D',
	distanceRatio: 'h/D',
	opening: 'h/H',
	freeArea: 'A_f/A',
	blockage: 'A_m/A',
	coefficient: 'C',
	straight: 'L'
};

/** Letters that mean something else on the drawing of one entry. */
const OF_ENTRY: Readonly<Record<string, Readonly<Record<string, string>>>> = {
	'entry-projecting': { thicknessRatio: 't/D', lengthRatio: 'L/D' },
	'damper-blades-open': { areaRatio: 'A_d/A' },
	plenum: { areaRatio: 'A_c/A_p' },
	'fan-inlet-effect': { coefficient: 'K' },
	'fan-outlet-effect': { coefficient: 'K' }
};

/** The letter of a parameter as the drawing has it; what follows _ is set below the line. Empty where none stands for it. */
export function parameterLetter({ key, shapes }: CatalogueEntry, name: string): string {
	if (name === 'radiusRatio') return shapes[0] === 'round' ? 'r/D' : 'r/W';
	return OF_ENTRY[key]?.[name] ?? LETTERS[name] ?? '';
}
