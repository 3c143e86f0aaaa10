import type { DesignRow } from '../document/types';
import { basis, beyond, flagged, foundOf, hasNamed, notApplicable, practice } from './found';
import { DAMPER_RATING, GREASE_BUILD, GREASE_VELOCITY, LABORATORY_CODE, RATED_WALLS, VA_EXHAUST } from './sources';
import type { CheckContext, CheckDefinition, Found } from './types';

/** What a fire or smoke damper is also called in a count of parts. */
const ABBREVIATED = /\b(fd|fsd)\b/i;
const DAMPER = /damper|\b(vcd|mvd|fd|fsd)\b/i;
const NO_FIRE_DAMPER = 'No row has a fire or smoke damper.';
const hasFireDamper = ({ hintsOf }: CheckContext, row: DesignRow) =>
	hintsOf(row).fireDamper || hasNamed(row, ABBREVIATED);

/** A test of the rows of a design for kitchen grease: all of them, the discharge of its fan too. */
const grease =
	(test: (context: CheckContext, threshold: number) => Found): CheckDefinition['test'] =>
	(context, threshold) =>
		context.document.service === 'kitchen-grease'
			? test(context, threshold)
			: notApplicable('The service is no kitchen grease exhaust.');

export const serviceChecks: readonly CheckDefinition[] = [
	{
		key: 'service-named',
		title: 'Special services are heeded',
		looksAt: 'service of the design and names of its rooms',
		severity: 'caution',
		threshold: null,
		basis: practice('local codes and licensed practice come first'),
		test: (context) => flagged(context, 'service-caution')
	},
	{
		key: 'fire-dampers',
		title: 'Fire and smoke dampers',
		looksAt: 'dampers named as such: only their pressure drop is counted',
		severity: 'note',
		threshold: null,
		basis: basis('standard', RATED_WALLS, 'codes place and rate them: a damper or a written exception, with access'),
		test: (context) =>
			context.rows.some(([row]) => context.hintsOf(row).fireDamper)
				? flagged(context, 'fire-damper-caution')
				: notApplicable(NO_FIRE_DAMPER)
	},
	{
		key: 'fire-damper-velocity',
		title: 'Velocity through fire and smoke dampers',
		looksAt: 'velocity in rows with a fire or smoke damper',
		severity: 'caution',
		threshold: { default: 10.16, unit: 'm/s', label: 'Velocity, at most' },
		basis: basis('standard', DAMPER_RATING, 'dynamic ratings begin at 2,000 fpm and 4 in. w.g.; the maker states his'),
		test: (context, most) =>
			beyond(
				context.rows,
				{
					...{ most, unit: 'm/s', none: NO_FIRE_DAMPER },
					message: 'So fast a stream asks for a damper with a higher rating.'
				},
				(row, { velocity }) => (hasFireDamper(context, row) ? velocity : null)
			)
	},
	{
		key: 'no-damper-in-hood-exhaust',
		title: 'No fire damper in fume-hood exhaust',
		looksAt: 'fire and smoke dampers in laboratory exhaust',
		severity: 'fault',
		threshold: null,
		basis: basis('standard', `${VA_EXHAUST}; ${LABORATORY_CODE}`, 'no fire or smoke damper in fume-hood exhaust'),
		test: (context) =>
			context.document.service !== 'laboratory'
				? notApplicable('The service is no laboratory exhaust.')
				: foundOf(
						context.rows.flatMap(([row]) =>
							row.side === 'exhaust' && hasFireDamper(context, row)
								? [{ row: row.tag, message: 'A fire or smoke damper stands in laboratory exhaust.' }]
								: []
						)
					)
	},
	{
		key: 'exhaust-kept-apart',
		title: 'Special exhaust is joined to no other air',
		looksAt: 'return rows in a design of laboratory, hazardous or grease exhaust',
		severity: 'fault',
		threshold: null,
		basis: basis(
			'standard',
			`${VA_EXHAUST}; ${LABORATORY_CODE}; ${GREASE_BUILD}`,
			'hood exhaust is not combined with general exhaust, grease ducts are joined to no others'
		),
		test: ({ document: { service = 'general' }, rows }) =>
			service === 'general' || service === 'smoke-control'
				? notApplicable('The service asks for no exhaust of its own.')
				: foundOf(
						rows.flatMap(([{ tag, side }]) =>
							side === 'return' ? [{ row: tag, message: 'Return air shares the fan of a special exhaust.' }] : []
						)
					)
	},
	{
		key: 'grease-velocity',
		title: 'Velocity in grease ducts',
		looksAt: 'velocity of kitchen grease exhaust',
		severity: 'fault',
		threshold: { default: 2.54, unit: 'm/s', label: 'Velocity, at least' },
		basis: basis('standard', GREASE_VELOCITY, '500 fpm, formerly 1,500; the local code governs'),
		test: grease(({ rows }, least) =>
			beyond(
				rows,
				{ least, unit: 'm/s', none: 'The design has no row.', message: 'Grease settles at so low a velocity.' },
				(_row, { velocity }) => velocity
			)
		)
	},
	{
		key: 'grease-slope',
		title: 'Grease ducts slope',
		looksAt: 'rise over length of kitchen grease exhaust',
		severity: 'note',
		threshold: { default: 0.02, unit: '', label: 'Rise over length, at least' },
		basis: basis('standard', GREASE_BUILD, '¼ in. in a foot, clean-outs at turns; the local code governs'),
		test: grease(({ rows }, least) =>
			beyond(
				rows,
				{
					...{ least, unit: '', none: 'No row is longer than nothing.' },
					message: 'The row has no slope, or its rise is not entered.'
				},
				({ rise = 0, length }) => (length > 0 ? Math.abs(rise) / length : null)
			)
		)
	},
	{
		key: 'grease-dampers',
		title: 'No dampers in grease ducts',
		looksAt: 'dampers in kitchen grease exhaust',
		severity: 'fault',
		threshold: null,
		basis: basis('standard', GREASE_BUILD, 'no dampers; the local code governs'),
		test: grease(({ rows }) =>
			foundOf(
				rows.flatMap(([row]) =>
					hasNamed(row, DAMPER) ? [{ row: row.tag, message: 'A damper stands in a grease duct.' }] : []
				)
			)
		)
	}
];
