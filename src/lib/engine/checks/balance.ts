import type { DesignRow } from '../document/types';
import { basis, beyond, flagged, foundOf, notApplicable, practice } from './found';
import { AIR_NOISE, MIL_MEDICAL, SMACNA_DESIGN, TRAVERSE } from './sources';
import type { CheckContext, CheckDefinition } from './types';

/** Whether a damper stands in the rows that serve this outlet alone. */
function hasDamper({ hintsOf, rowOf, joinedBy }: CheckContext, end: DesignRow): boolean {
	for (let row: DesignRow | undefined = end; row; row = row.joins === null ? undefined : rowOf(row.joins)) {
		if (row !== end && joinedBy(row.tag) > 1) return false;
		if (hintsOf(row).balances) return true;
	}
	return false;
}

export const balanceChecks: readonly CheckDefinition[] = [
	{
		key: 'branch-dampers',
		title: 'A damper in every branch',
		looksAt: 'rows that serve one outlet alone, where several outlets share a side of the fan',
		severity: 'caution',
		threshold: null,
		basis: basis('handbook', `${MIL_MEDICAL}; ${SMACNA_DESIGN}`, 'a damper for each space, remote from the outlet'),
		test: (context) => {
			const ends = context.rows.flatMap(([row]) => (row.outlet && row.side !== 'outdoor' ? [row] : []));
			const several = (supply: boolean) => ends.filter(({ side }) => (side === 'supply') === supply).length > 1;
			const shared = { supply: several(true), other: several(false) };
			const asked = ends.filter(({ side }) => shared[side === 'supply' ? 'supply' : 'other']);
			if (asked.length === 0) return notApplicable('There is nothing to balance.');
			return foundOf(
				asked.flatMap((row) =>
					hasDamper(context, row) ? [] : [{ row: row.tag, message: 'The branch has no damper to balance it.' }]
				)
			);
		}
	},
	{
		key: 'dampers-not-overloaded',
		title: 'No damper takes too much',
		looksAt: 'spare total pressure of each path, which its damper must take',
		severity: 'caution',
		threshold: { default: 50, unit: 'Pa', label: 'Total pressure on one damper, at most' },
		basis: basis('handbook', AIR_NOISE, 'above 0.20 in. w.g. a quiet device'),
		test: ({ solution: { paths } }, most) =>
			paths.length < 2
				? notApplicable('There is nothing to balance.')
				: foundOf(
						paths.flatMap(({ outlet, spare }) =>
							spare > most
								? [{ row: outlet, value: spare, unit: 'Pa', message: 'So much on one damper will be heard.' }]
								: []
						)
					)
	},
	{
		key: 'dampers-open',
		title: 'Dampers are counted as set',
		looksAt: 'dampers without an angle or an opening',
		severity: 'note',
		threshold: null,
		basis: practice('a damper without a setting counts as open'),
		test: (context) =>
			context.rows.some(([row]) => context.hintsOf(row).balances)
				? flagged(context, 'damper-open-assumed')
				: notApplicable('No row has a damper.')
	},
	{
		key: 'traverse-place',
		title: 'A place to measure on each main',
		looksAt: 'length of rows that meet the fan, in hydraulic diameters',
		severity: 'note',
		threshold: { default: 7.5, unit: '', label: 'Straight duct for a traverse, diameters, at least' },
		basis: basis('common practice', TRAVERSE, '6 to 10 diameters downstream; 7.5 is often quoted'),
		test: ({ rows }, least) =>
			beyond(
				rows,
				{ least, unit: '', none: 'No row meets the fan.', message: 'The main is too short for a traverse.' },
				({ joins, length }, { hydraulicDiameter }) => (joins === null ? length / hydraulicDiameter : null)
			)
	}
];
