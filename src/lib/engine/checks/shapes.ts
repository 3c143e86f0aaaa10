import { basis, beyond, flagged, notApplicable, practice } from './found';
import { MIL_AIR, VA_OLDER } from './sources';
import type { CheckContext, CheckDefinition } from './types';

const NO_SIDES = 'Every duct is round.';
const hasSides = ({ rows }: CheckContext) => rows.some(([{ size }]) => size.shape !== 'round');

export const shapeChecks: readonly CheckDefinition[] = [
	{
		key: 'aspect-ratio',
		title: 'Aspect ratio',
		looksAt: 'longer side over shorter, against the limit of the design, or 4 where it names none',
		severity: 'caution',
		threshold: null,
		basis: basis('from memory', MIL_AIR, 'the handbook aims at 3; many firms flag above 4'),
		test: (context) => (hasSides(context) ? flagged(context, 'aspect-ratio') : notApplicable(NO_SIDES))
	},
	{
		key: 'aspect-ratio-greatest',
		title: 'Greatest aspect ratio',
		looksAt: 'longer side over shorter',
		severity: 'fault',
		threshold: { default: 6, unit: '', label: 'Aspect ratio, never above' },
		basis: basis('handbook', MIL_AIR, 'at most 6'),
		test: ({ rows }, most) =>
			beyond(
				rows,
				{ most, unit: '', none: NO_SIDES, message: 'The section is flatter than the handbook has it.' },
				({ size }) =>
					size.shape === 'round' ? null : Math.max(size.width, size.height) / Math.min(size.width, size.height)
			)
	},
	{
		key: 'least-round',
		title: 'Least round size',
		looksAt: 'diameter of round ducts',
		severity: 'note',
		threshold: { default: 0.1, unit: 'm', label: 'Diameter, at least' },
		basis: basis('handbook', MIL_AIR, '4 in., rounded to 100 mm'),
		test: ({ rows }, least) =>
			beyond(
				rows,
				{ least, unit: 'm', none: 'No duct is round.', message: 'The duct is smaller than the least size.' },
				({ size }) => (size.shape === 'round' ? size.diameter : null)
			)
	},
	{
		key: 'least-side',
		title: 'Least side',
		looksAt: 'shorter side of rectangular ducts',
		severity: 'note',
		threshold: { default: 0.15, unit: 'm', label: 'Side, at least' },
		basis: basis('handbook', `${MIL_AIR}; ${VA_OLDER}`, '6 in. by 6 in., rounded to 150 mm; the other has 8 by 6'),
		test: ({ rows }, least) =>
			beyond(
				rows,
				{ least, unit: 'm', none: 'No duct is rectangular.', message: 'A side is shorter than the least one.' },
				({ size }) => (size.shape === 'rectangular' ? Math.min(size.width, size.height) : null)
			)
	},
	{
		key: 'rise-within-length',
		title: 'No row rises more than it is long',
		looksAt: 'rise against length',
		severity: 'caution',
		threshold: null,
		basis: practice('geometry'),
		test: (context) =>
			context.rows.some(([{ rise = 0 }]) => rise !== 0)
				? flagged(context, 'rise-exceeds-length')
				: notApplicable('No row rises or falls.')
	}
];
