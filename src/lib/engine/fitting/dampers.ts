import type { Range } from '../errors';
import { BLADES_ANGLE, BUTTERFLY_ANGLE, bladeDamper, butterflyDamper } from './damper-tables';
import { dampersStill } from './dampers-still';
import type { FittingDefinition } from './definition';
import { numberParameter } from './parameters';

const openAngle = (limits: Range) => numberParameter('angle', 'Blade angle from open', '°', 0, limits);
const CAUTION = 'A value from memory; it rises steeply as the blade closes, so the setting is found by measuring.';

const butterfly: FittingDefinition = {
	entry: {
		key: 'damper-butterfly',
		name: 'Butterfly damper',
		family: 'dampers',
		shapes: ['round', 'rectangular', 'oval'],
		parameters: [openAngle(BUTTERFLY_ANGLE)],
		reference: 'row',
		plot: { along: 'angle' },
		range: '0 to 60° from open',
		method: 'Table of the angle, log-linear between',
		source: 'SMACNA, HVAC Systems Duct Design, after Idelchik, from memory',
		known: 'from memory',
		uncertainty: 0.4,
		picture: 'damper',
		drawing: 'damper',
		caution: CAUTION
	},
	coefficient(values, { size }, note) {
		if (size.shape === 'oval') note('the table for rectangles stands in for a flat oval');
		return butterflyDamper(values.number('angle'), size.shape === 'round' ? 'round' : 'rectangular');
	}
};

function bladed(blades: 'parallel' | 'opposed'): FittingDefinition {
	return {
		entry: {
			key: `damper-${blades}-blades`,
			name: `Damper, ${blades} blades`,
			family: 'dampers',
			shapes: ['rectangular'],
			parameters: [openAngle(BLADES_ANGLE)],
			reference: 'row',
			plot: { along: 'angle' },
			range: '0 to 80° from open, total blade length over perimeter of 0.3',
			method: 'Table of the angle, log-linear between',
			source: 'SMACNA, HVAC Systems Duct Design, multi-blade dampers, from memory',
			known: 'from memory',
			uncertainty: 0.4,
			picture: 'damper',
			drawing: 'blades',
			caution: CAUTION
		},
		coefficient: (values) => bladeDamper(values.number('angle'), blades)
	};
}

export const dampers: readonly FittingDefinition[] = [
	butterfly,
	bladed('parallel'),
	bladed('opposed'),
	...dampersStill
];
