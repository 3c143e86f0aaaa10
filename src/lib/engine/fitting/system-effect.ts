// What a fan loses by the duct beside it. The charts of K are not free: the engineer enters it.
import { PI } from '../arithmetic';
import { sectionOf } from '../shape';
import type { FittingDefinition } from './definition';
import { numberParameter } from './parameters';
import type { CatalogueEntry } from './types';

/** Velocity to which 2.5 diameters are enough, 2500 fpm, and the step that asks for one more, 1000 fpm [m/s]. */
const SLOW = 12.7;
const STEP = 5.08;

/**
 * Effective duct length: straight duct after a fan in which its jet fills the duct.
 *
 *   L/D = 2.5 + max(0, V - 12.7)/5.08; D of a circle of the same area
 *
 * @param V velocity in the duct [m/s]
 * @returns L/D [-]
 * @source AMCA 201, Fans and Systems, from memory
 * @check none: two points of the rule as it is worded in fpm, in a test
 */
export function effectiveDuctLength(V: number): number {
	return 2.5 + Math.max(0, V - SLOW) / STEP;
}

const coefficient = numberParameter('coefficient', 'System effect coefficient K', '', 0, { min: 0, max: 10 });
const straight = numberParameter('straight', 'Straight duct after the fan', 'm', 0, { min: 0, max: 100 });
const CAUTION =
	'A loss that the fan sees and that cannot be measured in the duct: it is added to the pressure asked of the fan. K is read by the engineer from the charts of AMCA 201 or given by the maker.';

type Effect = Pick<CatalogueEntry, 'key' | 'name' | 'parameters' | 'range' | 'drawing'>;
const entryOf = (effect: Effect): CatalogueEntry => ({
	...effect,
	family: 'system-effect',
	shapes: ['round', 'rectangular', 'oval'],
	reference: 'row',
	method: 'K on the velocity pressure at the plane of the fan, entered',
	source: 'The engineer, by AMCA 201 or the maker of the fan',
	known: 'entered by hand',
	uncertainty: 0.5,
	picture: 'fan',
	caution: CAUTION
});

const NO_COEFFICIENT = 'no K is entered, so that no system effect is counted';

const inlet: FittingDefinition = {
	entry: entryOf({
		key: 'fan-inlet-effect',
		name: 'System effect at the inlet of the fan',
		parameters: [coefficient],
		range: 'the row is the duct at the inlet and of its size; K grows with an elbow or a swirl near the fan',
		drawing: 'fan-inlet'
	}),
	coefficient(values, _context, note) {
		const K = values.number('coefficient');
		if (K === 0) note(NO_COEFFICIENT);
		return K;
	}
};

const outlet: FittingDefinition = {
	entry: entryOf({
		key: 'fan-outlet-effect',
		name: 'System effect at the outlet of the fan',
		parameters: [coefficient, straight],
		range:
			'the row is the duct at the outlet and of its size; none with the effective duct length straight after the fan',
		drawing: 'fan-outlet'
	}),
	coefficient(values, { size, velocity }, note) {
		const K = values.number('coefficient');
		const needed = effectiveDuctLength(velocity) * Math.sqrt((4 * sectionOf(size).area) / PI);
		const isEnough = values.number('straight') >= needed;
		const asked = `the effective duct length is ${Math.floor(needed * 10 + 0.5) / 10} m`;
		if (K > 0 && isEnough) note(`${asked}: with as much straight duct no system effect is to be expected`);
		if (K === 0 && !isEnough) note(`${asked}, and less is straight: ${NO_COEFFICIENT}`);
		return K;
	}
};

export const systemEffects: readonly FittingDefinition[] = [inlet, outlet];
