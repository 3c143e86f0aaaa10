import { CONE_ANGLE, coneFriction, conicalExpansionIdelchik } from './area-change-idelchik';
import type { FittingDefinition } from './definition';
import { flatCap } from './flat-cap';
import { byMaker } from './makers-data';
import { numberParameter } from './parameters';
import { idelchik } from './sources';

const CAUTION =
	'The velocity pressure lost in the room: leave it out where the loss of the outlet already contains it.';

/**
 * Plain exit into a room.
 *
 *   C = alpha
 *
 * @param alpha kinetic energy factor of the velocity profile [-]: 1 uniform, about 1.05 developed turbulent, 2 laminar
 * @returns C on the velocity pressure in the duct [-]
 * @source Conservation of energy
 * @check fixtures/published/exits.json
 */
export function plainExit(alpha: number): number {
	return alpha;
}

const plain: FittingDefinition = {
	entry: {
		key: 'exit-plain',
		name: 'Exit, plain duct end',
		family: 'exits',
		shapes: ['round', 'rectangular', 'oval'],
		parameters: [],
		reference: 'row',
		range: 'uniform velocity; 1.05 for a developed turbulent profile',
		method: 'The whole velocity pressure is lost',
		source: 'Conservation of energy',
		known: 'published formula',
		uncertainty: 0.05,
		picture: 'diffuser',
		drawing: 'exit',
		caution: CAUTION
	},
	coefficient: () => plainExit(1)
};

const diffuser: FittingDefinition = {
	entry: {
		key: 'exit-diffuser',
		name: 'Exit by a conical diffuser',
		family: 'exits',
		shapes: ['round', 'rectangular', 'oval'],
		parameters: [
			numberParameter('areaRatio', 'Duct area over outlet area', '', 0.5, { min: 0.01, max: 1 }),
			numberParameter('angle', 'Included angle', '°', 14, CONE_ANGLE)
		],
		reference: 'row',
		range: 'cones; shock term to 60° included, sudden expansion from 90°',
		method: 'Idelchik, shock term and wall friction, and the velocity pressure at the outlet',
		source: idelchik('5-4'),
		known: 'published formula',
		uncertainty: 0.3,
		picture: 'diffuser',
		drawing: 'exit-diffuser',
		plot: { along: 'angle' },
		caution: CAUTION
	},
	coefficient(values, { size, frictionFactor }, note) {
		const a = values.number('areaRatio');
		const d = values.number('angle');
		if (size.shape !== 'round')
			note('the formula is for cones; a pyramid loses some 1.25 to 1.4 times as much (from memory)');
		return conicalExpansionIdelchik(d, a) + coneFriction(d, a, frictionFactor) + plainExit(1) * a * a;
	}
};

const MAKERS_CAUTION =
	'The maker says whether the velocity pressure of the duct is in the coefficient: if it is, add no plain exit.';

/** No figure that could be read was published for it: a person enters one. */
const againstWall = byMaker({
	key: 'discharge-against-wall',
	name: 'Exit against a wall',
	family: 'exits',
	picture: 'diffuser',
	drawing: 'exit',
	caution:
		'The nearer the wall, the more is lost beyond the velocity pressure of a plain exit; most where the way out along the wall is narrower than the duct.'
});

export const exits: readonly FittingDefinition[] = [
	plain,
	diffuser,
	{
		...againstWall,
		entry: {
			...againstWall.entry,
			range:
				'as its source states: distance of the wall, shape of the end, and whether the velocity pressure of the duct is in it',
			method: 'Coefficient entered by hand',
			source: 'No published figure is carried: a measurement or a handbook at hand',
			known: 'entered by hand',
			uncertainty: 0.5
		}
	},
	flatCap('exhaust', {
		key: 'exhaust-cap',
		name: 'Exit under a flat cap',
		family: 'exits',
		caution: 'The velocity pressure of the duct is in the coefficient: add no plain exit.'
	}),
	byMaker({
		key: 'exhaust-hood',
		name: 'Exhaust hood or cowl',
		family: 'exits',
		picture: 'louvre',
		drawing: 'cap',
		caution: MAKERS_CAUTION
	}),
	byMaker({
		key: 'exhaust-louvre',
		name: 'Exhaust louvre',
		family: 'exits',
		picture: 'louvre',
		drawing: 'louvre',
		caution: MAKERS_CAUTION
	})
];
