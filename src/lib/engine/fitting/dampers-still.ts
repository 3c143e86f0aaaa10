// Dampers that stand as they are: open ones smaller than their duct, fire dampers, gates at a setting.
import { sectionOf, type Shape } from '../shape';
import { REFERENCE_VELOCITY, openBladeDamper, openDamperCoefficient } from './damper-open';
import { GATE_OPENING, gateDamper } from './damper-tables';
import type { FittingDefinition } from './definition';
import { choiceParameter, heldWithin, numberParameter } from './parameters';

const anyShape: readonly Shape[] = ['round', 'rectangular', 'oval'];

const open: FittingDefinition = {
	entry: {
		key: 'damper-blades-open',
		name: 'Damper of several blades, fully open',
		family: 'dampers',
		shapes: ['rectangular'],
		parameters: [
			numberParameter('areaRatio', 'Area of the damper over that of the duct', '', 1, { min: 0.2, max: 1 }),
			choiceParameter('blades', 'Blades', 'opposed', ['parallel', 'opposed'])
		],
		reference: 'row',
		plot: { along: 'areaRatio' },
		range: 'fully open, frame included; the walls that close the rest of the duct included',
		method: 'Free-area ratio of the damper and power of it',
		source: 'Honeywell, Engineering Manual of Automatic Control, damper selection, tables 6 and 7',
		known: 'published formula',
		uncertainty: 0.3,
		picture: 'damper',
		drawing: 'blades',
		caution: null
	},
	coefficient(values, { size }, note) {
		const Au = sectionOf(size).area;
		const blades = values.choice('blades') === 'parallel' ? 'parallel' : 'opposed';
		const damper = openBladeDamper(blades, values.number('areaRatio') * Au, Au, REFERENCE_VELOCITY);
		if (damper.freeRatio > 1) note('the damper is larger than those of the source, and is counted as nothing');
		return openDamperCoefficient(damper);
	}
};

/** In the middle of the ranges as remembered. */
const CURTAIN: Readonly<Record<string, number>> = { out: 0.16, in: 0.5 };

const fire: FittingDefinition = {
	entry: {
		key: 'damper-fire-curtain',
		name: 'Fire damper, curtain of blades, open',
		family: 'dampers',
		shapes: anyShape,
		parameters: [choiceParameter('curtain', 'Folded curtain and the airstream', 'in', ['out', 'in'])],
		reference: 'row',
		range: 'curtain out of the airstream 0.12 to 0.2, in it 0.2 to 0.8; small dampers more',
		method: 'The middle of each range, from memory',
		source: 'Common practice; the maker gives the loss by size',
		known: 'from memory',
		uncertainty: 0.6,
		picture: 'firedamper',
		drawing: 'firedamper',
		caution:
			'Only its pressure drop is counted. Where it must stand, its rating, listing, installation and access are not checked here.'
	},
	coefficient: (values) => CURTAIN[values.choice('curtain')] ?? NaN
};

const gate: FittingDefinition = {
	entry: {
		key: 'damper-gate',
		name: 'Gate or slide damper',
		family: 'dampers',
		shapes: anyShape,
		parameters: [numberParameter('opening', 'Free height over that of the duct', '', 1, { min: 0.1, max: 1 })],
		reference: 'row',
		plot: { along: 'opening' },
		range: 'free height 0.2 to 1 of the duct, a sharp plate that leaves no slot when it is drawn',
		method: 'Table of the opening, log-linear between',
		source: 'Idelchik, Handbook of Hydraulic Resistance, gate valves, from memory',
		known: 'from memory',
		uncertainty: 0.5,
		picture: 'damper',
		drawing: 'gate',
		caution: 'A value from memory; it rises steeply as the gate closes, so the setting is found by measuring.'
	},
	coefficient(values, { size }, note) {
		if (size.shape === 'oval') note('the table for rectangles stands in for a flat oval');
		const opening = heldWithin(values.number('opening'), GATE_OPENING, 'opening', note);
		return gateDamper(opening, size.shape === 'round' ? 'round' : 'rectangular');
	}
};

export const dampersStill: readonly FittingDefinition[] = [open, fire, gate];
