import type { FittingDefinition } from './definition';
import { choiceParameter, numberParameter, noteOutside } from './parameters';
import { obstructionIdelchik } from './screen-formulas';

/** Drag coefficient and blockage factor by form; below the drag crisis of a cylinder. */
const FORMS: Readonly<Record<string, { readonly Cx: number; readonly tau: number }>> = {
	cylinder: { Cx: 1.2, tau: 1 },
	'flat bar': { Cx: 2, tau: 1.5 }
};
/** Blockage to which the formula is trusted [-]. */
const BLOCKAGE = { min: 0, max: 0.3 };

export const obstruction: FittingDefinition = {
	entry: {
		key: 'obstruction',
		name: 'Obstruction across the duct',
		family: 'screens',
		shapes: ['round', 'rectangular', 'oval'],
		parameters: [
			choiceParameter('form', 'Form', 'cylinder', ['cylinder', 'flat bar']),
			numberParameter('blockage', 'Frontal area over that of the duct', '', 0.1, { min: 0, max: 0.5 })
		],
		reference: 'row',
		plot: { along: 'blockage' },
		range: 'frontal area to 0.3 of the duct, a rod or a bar in the middle of it',
		method: 'Drag of the body in the narrowed duct, from memory and with little confidence',
		source: 'Idelchik, Handbook of Hydraulic Resistance, chapter 10',
		known: 'from memory',
		uncertainty: 0.6,
		picture: 'grille',
		drawing: 'obstruction',
		caution: 'Little confidence in the figure: lead pipes and rods round the duct.'
	},
	coefficient(values, _context, note) {
		const s = values.number('blockage');
		noteOutside(s, BLOCKAGE, 'frontal area over duct area', note);
		const { Cx, tau } = FORMS[values.choice('form')] ?? { Cx: NaN, tau: NaN };
		return obstructionIdelchik(s, Cx, tau);
	}
};
