import { fittingEntry } from '../fitting';
import { above, basis, flagged, foundOf, hasNamed, notApplicable, PASS, PRACTICE } from './found';
import { isDamper } from './shapes';
import type { CheckDefinition } from './types';

const MIL = 'MIL-HDBK-1003/3';
const DAMPER = /damper|\b(vcd|mvd)\b/i;
const END = ['entries', 'exits'];

export const endChecks: readonly CheckDefinition[] = [
	{
		key: 'flexible-length',
		title: 'Length of flexible duct',
		looksAt: 'flexible duct of each row',
		severity: 'caution',
		threshold: { default: 1.5, unit: 'm', label: 'Flexible duct, at most' },
		basis: basis('handbook', `${MIL}: 5 ft, straight, not in place of an elbow`),
		test: (context, most) =>
			above(context, most, 'The flexible duct is long.', ({ flexible }) => (flexible?.length ? flexible.length : null))
	},
	{
		key: 'flexible-compression',
		title: 'Compression of flexible duct',
		looksAt: 'what is missing of the stretched length',
		severity: 'caution',
		threshold: { default: 0.1, unit: '', label: 'Compression, at most' },
		basis: PRACTICE('published tests: the loss grows many times with compression'),
		test: (context, most) =>
			above(context, most, 'The flexible duct is compressed.', ({ flexible }) => flexible?.compression ?? null)
	},
	{
		key: 'flexible-assumption',
		title: 'The assumption on flexible duct is the designer’s',
		looksAt: 'flexible duct without a factor or a compression of its own',
		severity: 'note',
		threshold: null,
		basis: PRACTICE('the compression assumption is printed'),
		test: (context) => flagged(context, 'flexible-default')
	},
	{
		key: 'ends-to-the-open',
		title: 'Intakes and discharges are counted',
		looksAt: 'outdoor intakes and exhaust ends: louvre, screen, cowl or the velocity pressure',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE(),
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
		looksAt: 'an entry or exit beside the loss of an outlet, and losses given as static',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE('an end loses its velocity pressure once'),
		test: (context) => flagged(context, 'end-counted-twice', 'static-loss-at-inlet')
	},
	{
		key: 'terminals-stated',
		title: 'Terminals have a loss',
		looksAt: 'outlets of supply without a loss: taken as an open end',
		severity: 'note',
		threshold: null,
		basis: PRACTICE('catalogue loss at the design flow'),
		test: ({ rows }) =>
			foundOf(
				rows.flatMap(([{ tag, side, outlet }]) =>
					side === 'supply' && outlet && outlet.loss === undefined
						? [{ row: tag, message: 'The outlet has no loss of its own and is taken as an open end.' }]
						: []
				)
			)
	},
	{
		key: 'apparatus-counted',
		title: 'Apparatus stands in the path',
		looksAt: 'equipment in the rows: coils, filters, silencers',
		severity: 'note',
		threshold: null,
		basis: PRACTICE(),
		test: ({ rows }) =>
			rows.some(([{ equipment }]) => (equipment?.length ?? 0) > 0)
				? PASS
				: foundOf([{ row: null, message: 'No equipment is in any row: no coil, filter, silencer or fire damper.' }])
	},
	{
		key: 'filter-basis',
		title: 'Filters are counted dirty for the selection',
		looksAt: 'state of each filter',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE('dirty for the selection; clean to look for overflow'),
		test: ({ rows }) => {
			const filters = rows.flatMap(([{ tag, equipment }]) =>
				(equipment ?? []).flatMap(({ name, filter }) => (filter ? [{ tag, name, state: filter.state }] : []))
			);
			if (filters.length === 0) return notApplicable('No filter states its clean and its final loss.');
			return foundOf(
				filters
					.filter(({ state }) => state === 'clean')
					.map(({ tag, name }) => ({ row: tag, message: `${name} is counted clean.` }))
			);
		}
	},
	{
		key: 'branch-dampers',
		title: 'A damper in every branch',
		looksAt: 'rows with an outlet, where several outlets share a fan',
		severity: 'caution',
		threshold: null,
		basis: basis('handbook', 'a damper for each space, remote from the outlet (MIL-HDBK-1191)'),
		test: ({ rows }) => {
			const ends = rows.filter(([{ outlet, side }]) => outlet && side !== 'outdoor');
			if (ends.length < 2) return notApplicable('There is nothing to balance.');
			return foundOf(
				ends
					.filter(([row]) => !hasNamed(row, DAMPER) && !row.fittings?.some(({ kind }) => isDamper(kind)))
					.map(([{ tag }]) => ({ row: tag, message: 'The branch has no damper.' }))
			);
		}
	},
	{
		key: 'dampers-not-overloaded',
		title: 'No damper takes too much',
		looksAt: 'spare pressure of each path, which its damper must take',
		severity: 'caution',
		threshold: { default: 50, unit: 'Pa', label: 'Pressure on one damper, at most' },
		basis: basis('handbook', 'guides on noise: above 0.20 in. w.g. a quiet device'),
		test: ({ solution }, most) =>
			foundOf(
				solution.paths.flatMap(({ outlet, spare }) =>
					spare > most ? [{ row: outlet, value: spare, message: 'So much on one damper will be heard.' }] : []
				)
			)
	},
	{
		key: 'dampers-open',
		title: 'Dampers are counted as set',
		looksAt: 'dampers without an angle',
		severity: 'note',
		threshold: null,
		basis: PRACTICE(),
		test: (context) => flagged(context, 'damper-open-assumed')
	}
];
