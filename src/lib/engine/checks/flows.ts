import { basis, flagged, foundOf, notApplicable, practice, whole } from './found';
import { LABORATORIES, ROOM_PRESSURE } from './sources';
import type { CheckDefinition } from './types';

/** Rounding of sums of some thousand flows. */
const ROUNDING = 1e-9;

export const flowChecks: readonly CheckDefinition[] = [
	{
		key: 'flows-close',
		title: 'Flows sum from the outlets to the fan',
		looksAt: 'mass at the fan against the outlets and the leakage, each side of the fan',
		severity: 'fault',
		threshold: null,
		basis: practice('conservation of mass; leakage is its own line'),
		test: ({ solution: { massBalance } }) => {
			if (!massBalance) return notApplicable('Engine 1.0.0, which stored these figures, gave no balance of mass.');
			return foundOf(
				(['supply', 'return'] as const).flatMap((side) => {
					const { fan, outlets, leakage } = massBalance[side];
					const open = Math.abs(fan - outlets - leakage);
					return open <= ROUNDING * fan
						? []
						: [{ row: null, value: open, unit: 'kg/s', message: `The ${side} side does not close.` }];
				})
			);
		}
	},
	{
		key: 'sides-close',
		title: 'Flows of both sides of the fan agree',
		looksAt: 'supply against return, exhaust and outdoor air through one fan',
		severity: 'caution',
		threshold: null,
		basis: practice('outdoor air and return make the supply; the half per cent is common practice'),
		test: (context) => {
			const { supplyFlow, returnFlow } = context.solution.totals;
			return supplyFlow === 0 || returnFlow === 0
				? notApplicable('Rows stand on one side of the fan only.')
				: flagged(context, 'fan-flows-differ');
		}
	},
	{
		key: 'both-sides-in-the-duty',
		title: 'Both sides of the fan are in the duty',
		looksAt: 'rows on the suction side and on the discharge side',
		severity: 'note',
		threshold: null,
		basis: practice(
			'the duty is the worst suction side with the worst discharge side; a side that is missed makes it short'
		),
		test: ({ solution: { totals } }) =>
			whole(
				totals.supplyFlow === 0 || totals.returnFlow === 0,
				`No row stands on the ${totals.supplyFlow === 0 ? 'discharge' : 'suction'} side of the fan: what it loses is not in the duty.`
			)
	},
	{
		key: 'room-pressures-stated',
		title: 'Room pressures stated, and of the right sign',
		looksAt: 'gauge pressures of rooms with laboratory or hazardous exhaust',
		severity: 'caution',
		threshold: null,
		basis: basis(
			'handbook',
			`${LABORATORIES}; ${ROOM_PRESSURE}`,
			'such rooms draw air in; no universal figure of their pressure exists'
		),
		test: ({ document: { service }, rows }) => {
			if (service !== 'laboratory' && service !== 'hazardous')
				return notApplicable('The service names no pressure relation.');
			const drawn = rows.flatMap(([{ tag, side, outlet }]) =>
				side !== 'supply' && side !== 'outdoor' && outlet ? [{ row: tag, value: outlet.pressure ?? 0, unit: 'Pa' }] : []
			);
			if (drawn.every(({ value }) => value === 0))
				return whole(true, 'No room has a pressure of its own, though the service lives by pressure relations.');
			return foundOf(
				drawn
					.filter(({ value }) => value > 0)
					.map((one) => ({ ...one, message: 'This room stands above the pressure around it.' }))
			);
		}
	}
];
