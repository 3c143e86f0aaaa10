import type { DesignDocument } from '../document/types';
import { basis, flagged, foundOf, notApplicable, PASS, practice, whole } from './found';
import { DIFFUSER_SOUND, NAVY, TOLERANCE } from './sources';
import type { Finding } from './finding';
import type { CheckBasis, CheckDefinition } from './types';

type Entry = keyof NonNullable<DesignDocument['record']>;

const stated = (key: string, title: string, entry: Entry, message: string, ground: CheckBasis): CheckDefinition => ({
	key,
	title,
	looksAt: 'record of the design',
	severity: 'note',
	threshold: null,
	basis: ground,
	test: ({ document: { record } }) => whole(!record?.[entry]?.trim(), message)
});

export const recordChecks: readonly CheckDefinition[] = [
	{
		key: 'nothing-to-be-confirmed',
		title: 'Nothing is left to be confirmed',
		looksAt: 'values marked so',
		severity: 'caution',
		threshold: null,
		basis: practice('none is left open before construction'),
		test: (context) => flagged(context, 'to-be-confirmed')
	},
	{
		key: 'everything-read',
		title: 'Everything in the document is read',
		looksAt: 'keys that this version does not know',
		severity: 'note',
		threshold: null,
		basis: practice('what is not read is not counted'),
		test: (context) => flagged(context, 'key-not-read')
	},
	{
		key: 'criteria-stated',
		title: 'The design names its criteria',
		looksAt: 'limits of velocity and friction rate in the basis of design',
		severity: 'note',
		threshold: null,
		basis: basis('handbook', NAVY, 'a summary of the criteria stands on the sheet'),
		test: ({ document: { criteria = {} } }) =>
			whole(
				[criteria.mainVelocity, criteria.runOutVelocity, criteria.frictionRate].every((one) => one === undefined),
				'The design names no limit of velocity or friction rate.'
			)
	},
	stated(
		'codes-stated',
		'Codes and their editions are stated',
		'codes',
		'No code with its edition is named.',
		basis('handbook', NAVY, 'criteria are cited by publication, edition and page')
	),
	stated(
		'noise-criterion-stated',
		'The noise criterion is stated',
		'noiseCriterion',
		'No noise criterion is named.',
		basis('handbook', DIFFUSER_SOUND, 'NC 30 for meeting rooms and 35 to 40 for open offices are published examples')
	),
	stated(
		'tolerance-stated',
		'The tolerance of the balance is stated',
		'tolerance',
		'No tolerance is named within which the measured flows are accepted.',
		basis('handbook', TOLERANCE, 'the designer states it for each system; it is not ±10 % by itself')
	),
	{
		key: 'checked-by-another',
		title: 'Originator and checker are two people',
		looksAt: 'record of the design',
		severity: 'caution',
		threshold: null,
		basis: basis('handbook', NAVY, 'both stand on every sheet, and are not the same'),
		test: ({ document: { record = {} } }) => {
			const [originator, checker] = [record.originator, record.checker].map((name = '') => name.trim().toLowerCase());
			if (!originator || !checker) return notApplicable('Originator and checker are not both named.');
			return originator === checker ? whole(true, 'One person is named as originator and as checker.') : PASS;
		}
	},
	{
		key: 'decisions-count',
		title: 'Decisions on the checks count',
		looksAt: 'overrides, thresholds and checks left out: their reason, name, check and row',
		severity: 'note',
		threshold: null,
		basis: practice('an override says who, when and why, or it does not count'),
		test: ({ document: { checks = {}, overrides = [] }, thresholds, rowOf }) => {
			const keys = Object.entries(checks);
			if (keys.length + overrides.length === 0) return notApplicable('Nothing is decided on the checks.');
			const findings: Finding[] = [];
			const told = (message: string, row: string | null = null) => findings.push({ row, message });
			for (const [key, { threshold, off }] of keys) {
				if (!thresholds.has(key)) told(`No check is called “${key}”.`);
				else if (threshold !== undefined && thresholds.get(key) === null) told(`“${key}” has no threshold to edit.`);
				if (off && off.reason.trim() === '') told(`“${key}” is left out without a reason: it is made.`);
			}
			for (const { check, row, reason, by } of overrides) {
				if (!thresholds.has(check)) told(`An override names no check: “${check}”.`, row);
				else if (row !== null && !rowOf(row))
					told(`An override of “${check}” names a row that is not there: “${row}”.`);
				if (reason.trim() === '' || by.trim() === '')
					told(`An override of “${check}” lacks its reason or its name: it does not count.`, row);
			}
			return foundOf(findings);
		}
	}
];
