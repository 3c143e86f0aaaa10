import { basis, beyond, flagged, foundOf, notApplicable, practice, whole } from './found';
import { LBNL_LEAKAGE, UFGS } from './sources';
import { extremeStatic } from './static-inside';
import type { CheckDefinition } from './types';

const NO_CLASS = 'No leakage class is named.';

export const leakageChecks: readonly CheckDefinition[] = [
	{
		key: 'leakage-class-named',
		title: 'A leakage class is named',
		looksAt: 'leakage class of the design or of its rows',
		severity: 'note',
		threshold: null,
		basis: practice('the fan carries what leaks, and its power rises faster than its flow'),
		test: ({ document, rows }) =>
			whole(
				!document.leakage && !rows.some(([{ leakage }]) => leakage),
				'No leakage is counted: the design names no class.'
			)
	},
	{
		key: 'leakage-class-everywhere',
		title: 'Every row has a leakage class, or none has',
		looksAt: 'rows without a class in a design that counts leakage',
		severity: 'caution',
		threshold: null,
		basis: practice('a class per section'),
		test: ({ document, rows }) => {
			if (document.leakage) return notApplicable('The design names a class for all its rows.');
			if (!rows.some(([{ leakage }]) => leakage)) return notApplicable(NO_CLASS);
			return foundOf(
				rows.flatMap(([{ tag, leakage }]) =>
					leakage ? [] : [{ row: tag, message: 'This row counts no leakage, while others do.' }]
				)
			);
		}
	},
	{
		key: 'leakage-share',
		title: 'Leakage is a small share of the flow',
		looksAt: 'leakage of all rows over the flow of the fan',
		severity: 'caution',
		threshold: { default: 0.05, unit: '', label: 'Leakage over flow, at most' },
		basis: basis(
			'common practice',
			LBNL_LEAKAGE,
			'of ten measured systems three leaked less than 5 % of their flow, seven from 9 to 26 %'
		),
		test: ({ solution: { leakage } }, most) =>
			leakage
				? whole(leakage.share > most, 'The ductwork leaks a large part of its flow.', {
						value: leakage.share,
						unit: ''
					})
				: notApplicable(NO_CLASS)
	},
	{
		key: 'leakage-settled',
		title: 'Leakage and pressures suit each other',
		looksAt: 'leakage that does not settle, or goes against the static pressure',
		severity: 'caution',
		threshold: null,
		basis: practice('leakage follows the static pressure'),
		test: (context) =>
			context.solution.leakage ? flagged(context, 'leakage-not-settled', 'leakage-reversed') : notApplicable(NO_CLASS)
	},
	{
		key: 'leakage-test-named',
		title: 'A leakage test is named above the low pressures',
		looksAt: 'test pressure of the design where a row stands at a high static pressure',
		severity: 'note',
		threshold: { default: 750, unit: 'Pa', label: 'Static pressure without a test, at most' },
		basis: basis('from memory', UFGS, 'energy codes test a share of the ducts above 3 in. w.g.'),
		test: ({ document, rows }, most) => {
			const found = beyond(
				rows,
				{
					...{ most, unit: 'Pa', none: 'The design has no row.' },
					message: 'This row stands at a high static pressure, and no test pressure is named.'
				},
				(...pair) => Math.abs(extremeStatic(pair))
			);
			if (found.outcome !== 'flag') return notApplicable('No row stands above the static pressure.');
			return document.leakage?.testPressure === undefined ? found : { outcome: 'pass' };
		}
	},
	{
		key: 'leakage-test-pressure',
		title: 'The leakage test is at the highest static pressure',
		looksAt: 'test pressure against the static pressures of the rows',
		severity: 'note',
		threshold: null,
		basis: basis('handbook', UFGS, 'the construction schedule names class and test pressure of each system'),
		test: ({ document, rows }) => {
			const test = document.leakage?.testPressure;
			if (test === undefined) return notApplicable('No test pressure is named.');
			return beyond(
				rows,
				{
					...{ most: test, unit: 'Pa', none: 'The design has no row.' },
					message: 'The static pressure is above that of the test.'
				},
				(...pair) => Math.abs(extremeStatic(pair))
			);
		}
	}
];
