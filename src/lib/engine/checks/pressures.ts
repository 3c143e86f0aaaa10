import { basis, flagged, foundOf, notApplicable, practice, whole } from './found';
import { INDEX_NOTE, UFGS, VA_OLDER } from './sources';
import { extremeStatic, staticInside } from './static-inside';
import type { CheckDefinition } from './types';

const ROUNDING = 1e-9;
const NO_CLASS = 'No row has a pressure class.';

export const pressureChecks: readonly CheckDefinition[] = [
	{
		key: 'governing-path',
		title: 'The governing path is the one that requires most',
		looksAt: 'total pressure that every path of each side requires',
		severity: 'fault',
		threshold: null,
		basis: basis(
			'common practice',
			INDEX_NOTE,
			'the highest total governs, not the longest run; parallel runs are not added'
		),
		test: ({ solution: { paths, index, fan } }) => {
			const required = (half: 'supply' | 'return') => {
				const path = paths.find(({ outlet }) => outlet === index[half]);
				return path ? path.loss + (half === 'supply' ? path.roomPressure : -path.roomPressure) : 0;
			};
			const sum = required('supply') + required('return');
			const findings = paths.flatMap(({ outlet, spare }) =>
				spare < -ROUNDING * Math.abs(sum)
					? [{ row: outlet, value: spare, unit: 'Pa', message: 'This path requires more than the index path.' }]
					: []
			);
			const isSum = Math.abs(sum - fan.totalPressure) <= ROUNDING * Math.max(1, Math.abs(sum));
			return isSum
				? foundOf(findings)
				: whole(true, 'The duty is not the sum of one index path on each side.', {
						value: fan.totalPressure,
						unit: 'Pa'
					});
		}
	},
	{
		key: 'duty-positive',
		title: 'The fan has something to do',
		looksAt: 'total pressure of the fan',
		severity: 'caution',
		threshold: null,
		basis: practice('rooms at pressure and gravity have their signs'),
		test: (context) => flagged(context, 'negative-duty')
	},
	{
		key: 'pressure-class-named',
		title: 'Pressure classes are named',
		looksAt: 'pressure class of each row',
		severity: 'note',
		threshold: null,
		basis: basis('handbook', `${VA_OLDER}; ${UFGS}`, 'the pressure class of each duct is on the drawings'),
		test: ({ rows }) => {
			const open = rows.filter(([{ pressureClass }]) => pressureClass === undefined);
			if (open.length === rows.length) return whole(true, `${NO_CLASS.slice(0, -1)}: the designer chooses it.`);
			return foundOf(
				open.map(([{ tag }]) => ({ row: tag, message: 'This row has no pressure class, while others do.' }))
			);
		}
	},
	{
		key: 'static-class',
		title: 'Pressure class holds the static pressure',
		looksAt: 'static pressure inside each row, at both ends, against its class and its sign',
		severity: 'fault',
		threshold: null,
		basis: basis('handbook', VA_OLDER, 'classes from ½ to 4 in. w.g., of suction as of pressure'),
		test: ({ rows }) => {
			const classed = rows.filter(([{ pressureClass }]) => pressureClass !== undefined);
			if (classed.length === 0) return notApplicable(NO_CLASS);
			return foundOf(
				classed.flatMap((pair) => {
					const [{ tag, pressureClass: limit = 0 }] = pair;
					const value = extremeStatic(pair);
					const isBeyond = Math.abs(value) > Math.abs(limit);
					// A little suction beside a fitting asks for no other class: the farther end tells the sign.
					const isOpposite = limit * value < 0;
					if (!isBeyond && !isOpposite) return [];
					const message = isOpposite
						? `The class is for ${limit > 0 ? 'pressure' : 'suction'}, and the static pressure is of the other sign.`
						: 'The static pressure is beyond the pressure class.';
					return [{ row: tag, value, unit: 'Pa', limit, message }];
				})
			);
		}
	},
	{
		key: 'sign-of-static-pressure',
		title: 'Static pressure has one sign in a row',
		looksAt: 'supply below the pressure around it, or suction ducts above it',
		severity: 'note',
		threshold: { default: 10, unit: 'Pa', label: 'Static pressure of the other sign, at most' },
		basis: practice('such a duct leaks the other way, and may be built for the wrong class'),
		test: ({ rows }, most) =>
			foundOf(
				rows.flatMap((pair) => {
					const [{ tag, side }] = pair;
					const [near, far] = staticInside(pair);
					const value = side === 'supply' ? Math.min(near, far) : Math.max(near, far);
					const wrong = side === 'supply' ? -value : value;
					return wrong > most
						? [
								{
									row: tag,
									value,
									unit: 'Pa',
									message: `The static pressure is ${value > 0 ? 'above' : 'below'} that around the duct.`
								}
							]
						: [];
				})
			)
	}
];
