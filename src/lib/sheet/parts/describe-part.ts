import { formatPressure, unitOf, type UnitSystem } from '$lib/engine';
import type { PartEquipment, PartFitting, Picture } from './parts';

const LETTERS: Readonly<Record<string, (value: number | string) => string>> = {
	radiusRatio: (value) => `r ${value}`,
	angle: (value) => `${value}°`,
	pieces: (value) => `${value} pieces`,
	areaRatio: (value) => `area ratio ${value}`,
	thicknessRatio: (value) => `t ${value}`,
	lengthRatio: (value) => `l ${value}`,
	freeArea: (value) => `free area ${value}`,
	vanes: (value) => `${value} ${value === 1 ? 'vane' : 'vanes'}`,
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
	const known = part.coefficient === undefined ? 'from the catalogue' : `C ${signed(part.coefficient)}`;
	return [name, ...parameterWords(part.parameters), known];
}

function signed(value: number): string {
	return String(value).replace('-', '−');
}
