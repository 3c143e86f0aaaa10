import { authorOf, formatPressure, unitOf, type UnitSystem } from '$lib/engine';
import type { PartEquipment, PartFitting, Picture } from './parts';

/** Which way an offset's second elbow turns. */
const SECOND: Readonly<Record<string, string>> = {
	back: 'turning back',
	onward: 'turning on',
	across: 'turning across'
};

const LETTERS: Readonly<Record<string, (value: number | string) => string>> = {
	radiusRatio: (value) => `r ${value}`,
	angle: (value) => `${value}°`,
	pieces: (value) => `${value} pieces`,
	areaRatio: (value) => `area ratio ${value}`,
	thicknessRatio: (value) => `t ${value}`,
	lengthRatio: (value) => `l ${value}`,
	freeArea: (value) => `free area ${value}`,
	// A pair is radius and spacing of turning vanes, a number those of a splitter elbow.
	vanes: (value) => (typeof value === 'string' ? `vanes ${value} mm` : `${value} ${value === 1 ? 'vane' : 'vanes'}`),
	bend: (value) => `${value} bend`,
	spacing: (value) => `spacing ${value}`,
	second: (value) => SECOND[value] ?? String(value),
	distanceRatio: (value) => `h/D ${value}`,
	curtain: (value) => `curtain ${value === 'in' ? 'in' : 'out of'} the stream`,
	opening: (value) => `open ${value}`,
	blockage: (value) => `blockage ${value}`,
	form: (value) => String(value),
	straight: (value) => `${value} m straight`,
	edges: (value) => `${value} edges`,
	blades: (value) => `${value} blades`,
	coefficient: (value) => `C ${value}`,
	leg: (value) => (value === 'straight' || value === 'branch' ? '' : `row is the ${value} leg`),
	plane: (value) => `${value} in the plane of the bend`
};

/** The parameters of a fitting as they are said: `r 1, 45°`. */
export function parameterWords(parameters: PartFitting['parameters']): string[] {
	return Object.entries(parameters)
		.map(([name, value]) => LETTERS[name]?.(value) ?? `${name} ${value}`)
		.filter((words) => words !== '');
}

/** A part in words with the key of its symbol. */
export function describePart(
	part: PartFitting | PartEquipment,
	units: UnitSystem = 'SI'
): { readonly words: string; readonly picture: Picture } {
	const words = 'loss' in part ? equipmentWords(part, units) : fittingWords(part);
	if (part.toBeConfirmed) words.push('to be confirmed');
	return { words: words.join(', '), picture: part.picture };
}

/** Pieces of equipment alike, each with its own loss, and what they lose together. */
export function describeSeveral(part: PartEquipment, count: number, units: UnitSystem): string {
	const [name, loss, ...rest] = equipmentWords(part, units);
	const together = `${formatPressure(part.loss * count, units)} ${unitOf('pressure', units)} together`;
	if (part.toBeConfirmed) rest.push('to be confirmed');
	return [`${count} × ${name}`, `${loss} each`, together, ...rest].join(', ');
}

function equipmentWords(part: PartEquipment, units: UnitSystem): string[] {
	const loss = `${formatPressure(part.loss, units)} ${unitOf('pressure', units)}`;
	return part.exponent === 2 ? [part.name, loss] : [part.name, loss, `exponent ${part.exponent}`];
}

function fittingWords(part: PartFitting): string[] {
	const name = part.count > 1 ? `${part.count} × ${part.name}` : part.name;
	const by = part.method === undefined ? [] : [`by ${authorOf(part.method)}`];
	return [name, ...parameterWords(part.parameters), ...by, ...knownBy(part)];
}

function knownBy({ coefficient, parameters }: PartFitting): string[] {
	if (coefficient !== undefined) return [`C ${signed(coefficient)}`];
	return parameters['coefficient'] === undefined ? ['from the catalogue'] : [];
}

function signed(value: number): string {
	return String(value).replace('-', '−');
}
