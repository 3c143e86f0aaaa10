import type { FormulaGroup } from './formula-note';

export const LEAKAGE: FormulaGroup = {
	id: 'leakage',
	title: 'Leakage',
	lead: 'Air that leaks through seams and joints, by the tightness class of the ductwork, its surface and the mean static pressure in each row. Flows and leakage are worked in turn until they suit each other.',
	formulas: [
		{
			name: 'Leakage of a class',
			equation: 'Q = c A |p|^{0.65}',
			where: 'c coefficient of the class [m³/(s m² Pa⁰·⁶⁵)], A surface of the ducts [m²], p static pressure [Pa]',
			range: 'p to 10 000 Pa, by magnitude; below zero air leaks in',
			source: 'EN 1507 and EN 12237 for the form; the exponent is the law of the test, not of each leak'
		},
		{
			name: 'Inch-pound class',
			equation: 'F = CL p^{0.65}',
			where: 'CL leakage class; F in cfm by 100 ft² of surface, p in inches of water',
			range: 'CL 0 to 1000; 3 is the tightest that is specified, 48 unsealed',
			source: 'HVAC Air Duct Leakage Test Manual, as quoted in a maker’s manual of a leakage tester'
		}
	]
};
