import type { CatalogueEntry, FittingParameter } from '../fitting';

/** Parameters of a fitting for a reader who computes it again: 'r/D 1, 90°', 'area ratio 0.5, 20°, the row is the larger leg'. */
export function parametersInWords(entry: CatalogueEntry, values: Readonly<Record<string, number | string>>): string {
	return entry.parameters
		.map((parameter) => inWords(parameter, values[parameter.name] ?? parameter.default, entry))
		.join(', ');
}

function inWords({ name, label, unit }: FittingParameter, value: number | string, entry: CatalogueEntry): string {
	if (name === 'leg') return `the row is the ${value} leg`;
	if (name === 'plane') return `bend in the plane of the ${value}`;
	if (name === 'angle') return `${value}°`;
	if (name === 'radiusRatio')
		return `${entry.shapes.includes('rectangular') && !entry.shapes.includes('round') ? 'r/W' : 'r/D'} ${value}`;
	return `${label.toLowerCase()} ${value}${unit === '' ? '' : ` ${unit}`}`;
}
