import { basis, flagged, foundOf, notApplicable, PASS, PRACTICE } from './found';
import type { CheckDefinition } from './types';

export const recordChecks: readonly CheckDefinition[] = [
	{
		key: 'nothing-to-be-confirmed',
		title: 'Nothing is left to be confirmed',
		looksAt: 'values marked so',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE('none is left open before construction'),
		test: (context) => flagged(context, 'to-be-confirmed')
	},
	{
		key: 'everything-read',
		title: 'Everything in the document is read',
		looksAt: 'keys that this version does not know',
		severity: 'note',
		threshold: null,
		basis: PRACTICE(),
		test: (context) => flagged(context, 'key-not-read')
	},
	{
		key: 'codes-stated',
		title: 'Codes and their editions are stated',
		looksAt: 'record of the design',
		severity: 'note',
		threshold: null,
		basis: basis('handbook', 'criteria and editions stand on the sheet (a naval calculation standard)'),
		test: ({ document }) =>
			document.record?.codes?.trim() ? PASS : foundOf([{ row: null, message: 'No code with its edition is named.' }])
	},
	{
		key: 'noise-criterion-stated',
		title: 'The noise criterion is stated',
		looksAt: 'record of the design',
		severity: 'note',
		threshold: null,
		basis: basis('handbook', 'NC 30 for meeting rooms and 35 to 40 for open offices are published examples'),
		test: ({ document }) =>
			document.record?.noiseCriterion?.trim() ? PASS : foundOf([{ row: null, message: 'No noise criterion is named.' }])
	},
	{
		key: 'checked-by-another',
		title: 'Originator and checker are two people',
		looksAt: 'record of the design',
		severity: 'caution',
		threshold: null,
		basis: basis('handbook', 'a naval calculation standard'),
		test: ({ document }) => {
			const { originator = '', checker = '' } = document.record ?? {};
			if (!originator.trim() || !checker.trim()) return notApplicable('Originator and checker are not both named.');
			return originator.trim().toLowerCase() === checker.trim().toLowerCase()
				? foundOf([{ row: null, message: 'One person is named as originator and as checker.' }])
				: PASS;
		}
	}
];

/** What a reviewer checks and a design document cannot show, with the reason. */
export const NOT_SHOWN: readonly { readonly what: string; readonly why: string }[] = [
	{ what: 'Every fitting on the drawing is in the calculation', why: 'the document holds no drawing to count against' },
	{ what: 'Revision of the calculation is that of drawing and schedule', why: 'other papers are not known here' },
	{ what: 'Rated walls that a duct crosses', why: 'walls are not part of the document' },
	{
		what: 'Fan point against its curve, motor margin, specific fan power',
		why: 'they belong to the selection of the fan'
	},
	{ what: 'Louvre free-area velocity', why: 'it is the maker’s figure, not the duct’s' },
	{ what: 'Supports and weights', why: 'they belong to the take-off' },
	{ what: 'New, existing and demolished work', why: 'rows do not tell them apart' },
	{ what: 'Access to dampers and test holes', why: 'places are not part of the document' }
];
