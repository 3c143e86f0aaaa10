import { fittingEntry } from '../fitting';
import { basis, flagged, foundOf, notApplicable, practice, whole } from './found';
import { FAN_REVIEW, REGAIN_REVIEW } from './sources';
import type { CheckDefinition } from './types';

const END = ['entries', 'exits'];
const COUNTED = { clean: 'clean', mean: 'between clean and dirty' } as const;
const FILTER = /\bfilters?\b/i;

export const endChecks: readonly CheckDefinition[] = [
	{
		key: 'ends-to-the-open',
		title: 'Intakes are counted',
		looksAt: 'intakes of outdoor air: louvre, screen, cowl or the velocity pressure',
		severity: 'caution',
		threshold: null,
		basis: practice('louvre, screen and cowl are in the path'),
		test: ({ rows }) => {
			const ends = rows.filter(([{ outlet, side }]) => outlet && side === 'outdoor');
			if (ends.length === 0) return notApplicable('No row takes in outdoor air.');
			return foundOf(
				ends
					.filter(([row, { outletLoss }]) => {
						const fitted = row.fittings?.some(({ kind }) => END.includes(fittingEntry(kind)?.family ?? ''));
						return outletLoss === 0 && !fitted && !(row.equipment?.length ?? 0);
					})
					.map(([{ tag }]) => ({
						row: tag,
						message: 'The end to the open loses nothing: louvre, screen or cowl is missing.'
					}))
			);
		}
	},
	{
		key: 'ends-once',
		title: 'Each end is counted once',
		looksAt: 'an entry or exit beside the loss of an outlet, and losses of inlets given as static',
		severity: 'caution',
		threshold: null,
		basis: practice('an end loses its velocity pressure once'),
		test: (context) => flagged(context, 'end-counted-twice', 'static-loss-at-inlet')
	},
	{
		key: 'terminals-stated',
		title: 'Terminals have a loss',
		looksAt: 'outlets of supply without a loss: taken as an open end',
		severity: 'note',
		threshold: null,
		basis: practice('the catalogue’s loss at the design flow'),
		test: ({ rows }) => {
			const ends = rows.filter(([{ side, outlet }]) => side === 'supply' && outlet);
			if (ends.length === 0) return notApplicable('No row has a supply outlet.');
			return foundOf(
				ends.flatMap(([{ tag, outlet }]) =>
					outlet?.loss === undefined
						? [{ row: tag, message: 'The outlet has no loss of its own and is taken as an open end.' }]
						: []
				)
			);
		}
	},
	{
		key: 'terminal-loss-basis',
		title: 'Losses of terminals say total or static',
		looksAt: 'outlets with a loss that does not say which it is: taken as total pressure',
		severity: 'note',
		threshold: null,
		basis: basis('handbook', REGAIN_REVIEW, 'total and static pressure are never mixed: catalogues print either'),
		test: ({ rows }) => {
			const stated = rows.flatMap(([{ outlet }]) => (outlet && (outlet.loss ?? 0) > 0 ? [outlet] : []));
			if (stated.length === 0) return notApplicable('No outlet has a loss of its own.');
			const value = stated.filter(({ lossIs }) => lossIs === undefined).length;
			return whole(value > 0, `${value} of ${stated.length} losses of outlets are taken as total pressure unsaid.`, {
				value,
				unit: ''
			});
		}
	},
	{
		key: 'apparatus-counted',
		title: 'Apparatus stands in the path',
		looksAt: 'equipment in the rows: coils, filters, silencers',
		severity: 'note',
		threshold: null,
		basis: practice('coil, filter, silencer, fire damper: what is often missed'),
		test: ({ rows }) =>
			whole(
				!rows.some(([{ equipment }]) => (equipment?.length ?? 0) > 0),
				'No equipment is in any row: no coil, filter, silencer or fire damper.'
			)
	},
	{
		key: 'filter-basis',
		title: 'Filters are counted dirty for the selection',
		looksAt: 'state of each filter, and filters whose loss does not say which it is',
		severity: 'caution',
		threshold: null,
		basis: basis('handbook', FAN_REVIEW, 'dirty for the selection; clean to look for overflow'),
		test: ({ rows }) => {
			const filters = rows.flatMap(([{ tag, equipment = [] }]) =>
				equipment.flatMap(({ name, filter }) =>
					filter || FILTER.test(name) ? [{ tag, name, state: filter?.state ?? null }] : []
				)
			);
			if (filters.length === 0) return notApplicable('No equipment is a filter.');
			return foundOf(
				filters.flatMap(({ tag, name, state }) => {
					if (state === 'dirty') return [];
					const message =
						state === null
							? `${name} does not say whether its loss is clean or dirty.`
							: `${name} is counted ${COUNTED[state]}.`;
					return [{ row: tag, message }];
				})
			);
		}
	}
];
