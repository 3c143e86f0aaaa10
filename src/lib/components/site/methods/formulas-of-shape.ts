import type { FormulaGroup } from './formula-note';

export const SHAPE: FormulaGroup = {
	id: 'shape',
	title: 'Shape',
	lead: 'Areas and perimeters are those of the section itself. The equivalent diameter serves to choose sizes and to read charts, never to compute velocity or friction.',
	formulas: [
		{
			name: 'Flat oval',
			equation: 'A = πa²/4 + a(b − a),  P = πa + 2(b − a)',
			where: 'a minor axis [m], b major axis [m], A area [m²], P perimeter [m]',
			range: 'Straight sides and half-round ends',
			source: 'Geometry'
		},
		{
			name: 'Equivalent diameter, rectangle',
			equation: 'Dₑ = 1.30 (ab)^{0.625} / (a + b)^{0.25}',
			where: 'a, b sides [m]; the round duct of equal flow and equal loss',
			range: 'Aspect ratio to 8',
			source: 'Huebscher (1948)'
		},
		{
			name: 'Equivalent diameter, flat oval',
			equation: 'Dₑ = 1.55 A^{0.625} / P^{0.25}',
			where: 'A area [m²], P perimeter [m]',
			range: 'b/a of 2 to 4 is typical',
			source: 'Heyt & Diaz (1975)'
		}
	]
};
