import { basis, foundOf, notApplicable, PASS, practice, whole } from './found';
import { FAN_TEXTBOOK } from './sources';
import type { CheckDefinition } from './types';

const NO_MARGIN = 'No margin is named.';
const TEXT = '5 % on flow and 10 % on fan total pressure, once';
/** A product of factors comes back with a last bit. */
const ROUNDING = 1e-12;

export const marginChecks: readonly CheckDefinition[] = [
	{
		key: 'margins-once',
		title: 'Each margin stands once',
		looksAt: 'names of the margins',
		severity: 'caution',
		threshold: null,
		basis: basis('handbook', FAN_TEXTBOOK, TEXT),
		test: ({ ledger: { lines, repeated } }) =>
			lines.length === 0
				? notApplicable(NO_MARGIN)
				: foundOf(repeated.map((name) => ({ row: null, message: `“${name}” stands more than once.` })))
	},
	{
		key: 'margins-not-hidden',
		title: 'No allowance hides in a second place',
		looksAt: 'allowances among the losses, margins for what is counted already, and margins on margins',
		severity: 'caution',
		threshold: null,
		basis: basis('handbook', FAN_TEXTBOOK, `${TEXT}; margins that are stacked multiply`),
		test: ({ ledger: { hidden } }) => foundOf(hidden)
	},
	{
		key: 'margins-complete',
		title: 'Every margin has a figure and a reason',
		looksAt: 'margins without a figure, without a reason, or in pascal on a flow',
		severity: 'note',
		threshold: null,
		basis: practice('a margin statement stands on the sheet'),
		test: ({ document: { margins = [] } }) => {
			if (margins.length === 0) return notApplicable(NO_MARGIN);
			return foundOf(
				margins.flatMap(({ name, of, fraction, pressure, reason }) => {
					const told = (what: string) => [{ row: null, message: `“${name}” ${what}.` }];
					if (of === 'flow' && pressure !== undefined)
						return told('is a margin on flow in pascal, which counts for nothing');
					if (fraction === undefined && pressure === undefined) return told('has no figure');
					return reason?.trim() ? [] : told('has no reason');
				})
			);
		}
	},
	{
		key: 'margin-on-flow',
		title: 'Margin on flow',
		looksAt: 'product of the margins on flow',
		severity: 'caution',
		threshold: { default: 0.05, unit: '', label: 'Margin on flow, at most' },
		basis: basis('handbook', FAN_TEXTBOOK, TEXT),
		test: ({ ledger: { lines, flowFactor } }, most) => {
			if (!lines.some(({ of }) => of === 'flow')) return notApplicable('No margin on flow is named.');
			const value = flowFactor - 1;
			return whole(value > most + ROUNDING, 'The margins on flow are large.', { value, unit: '' });
		}
	},
	{
		key: 'margin-on-pressure',
		title: 'Margin on pressure',
		looksAt: 'total pressure of the selection over what the system asks at the flow of the selection',
		severity: 'caution',
		threshold: { default: 0.1, unit: '', label: 'Margin on fan total pressure, at most' },
		basis: basis('handbook', FAN_TEXTBOOK, TEXT),
		test: ({ ledger: { lines, selectionPressure, systemPressure } }, most) => {
			if (!lines.some(({ of }) => of === 'pressure')) return notApplicable('No margin on pressure is named.');
			if (!(systemPressure > 0)) return notApplicable('The system asks no pressure of the fan.');
			const value = selectionPressure / systemPressure - 1;
			return value <= most + ROUNDING
				? PASS
				: foundOf([{ row: null, value, unit: '', message: 'The margins on total pressure are large.' }]);
		}
	}
];
