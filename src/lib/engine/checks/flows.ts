import { flagged, foundOf, notApplicable, PASS, PRACTICE, basis } from './found';
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
		basis: PRACTICE('conservation of mass; leakage is its own line'),
		test: ({ solution: { massBalance } }) => {
			if (!massBalance) return notApplicable('Engine 1.0.0, which stored these figures, gave no balance of mass.');
			return foundOf(
				(['supply', 'return'] as const).flatMap((side) => {
					const { fan, outlets, leakage } = massBalance[side];
					const open = Math.abs(fan - outlets - leakage);
					return open <= ROUNDING * fan
						? []
						: [{ row: null, value: open, message: `The ${side} side does not close.` }];
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
		basis: PRACTICE('conservation of mass; the half per cent is common practice'),
		test: (context) => {
			const { supplyFlow, returnFlow } = context.solution.totals;
			return supplyFlow === 0 || returnFlow === 0
				? notApplicable('Rows stand on one side of the fan only.')
				: flagged(context, 'fan-flows-differ');
		}
	},
	{
		key: 'room-pressures-stated',
		title: 'Room pressures stated where they matter',
		looksAt: 'gauge pressures of rooms in laboratory and hazardous exhaust',
		severity: 'caution',
		threshold: null,
		basis: basis('handbook', 'practice of laboratory ventilation: pressure relations are part of the design'),
		test: ({ document, rows }) => {
			if (document.service !== 'laboratory' && document.service !== 'hazardous')
				return notApplicable('The service names no pressure relation.');
			return rows.some(([{ outlet }]) => (outlet?.pressure ?? 0) !== 0)
				? PASS
				: foundOf([
						{ row: null, message: 'No room has a pressure of its own, though the service lives by pressure relations.' }
					]);
		}
	},
	{
		key: 'leakage-share',
		title: 'Leakage is a small share of the flow',
		looksAt: 'leakage of all rows over the flow of the fan',
		severity: 'caution',
		threshold: { default: 0.05, unit: '', label: 'Leakage over flow, at most' },
		basis: PRACTICE(),
		test: ({ solution }, limit) => {
			const { leakage } = solution;
			if (!leakage) return notApplicable('No leakage class is named.');
			return leakage.share <= limit
				? PASS
				: foundOf([{ row: null, value: leakage.share, message: 'The ductwork leaks a large part of its flow.' }]);
		}
	},
	{
		key: 'leakage-class-named',
		title: 'A leakage class is named',
		looksAt: 'leakage class of the design or of its rows',
		severity: 'note',
		threshold: null,
		basis: basis('standard', 'pressure and seal class per section; EN 1507 and EN 12237 name the classes'),
		test: ({ document, rows }) =>
			document.leakage || rows.some(([{ leakage }]) => leakage)
				? PASS
				: foundOf([{ row: null, message: 'No leakage is counted: the design names no class.' }])
	},
	{
		key: 'leakage-test-named',
		title: 'A leakage test is named above the low pressures',
		looksAt: 'test pressure where a row stands above the static pressure',
		severity: 'note',
		threshold: { default: 750, unit: 'Pa', label: 'Static pressure without a test, at most' },
		basis: basis('from memory', 'an energy code tests a share of the ducts above 3 in. w.g.'),
		test: ({ document, rows }, limit) => {
			const high = rows.filter(([, { staticPressure }]) => staticPressure.some((p) => Math.abs(p) > limit));
			if (high.length === 0) return notApplicable('No row stands above the static pressure.');
			return document.leakage?.testPressure !== undefined
				? PASS
				: foundOf(
						high.map(
							([
								{ tag },
								{
									staticPressure: [near, far]
								}
							]) => ({
								row: tag,
								value: Math.max(Math.abs(near), Math.abs(far)),
								message: 'This row stands at a high static pressure, and no test pressure is named.'
							})
						)
					);
		}
	}
];
