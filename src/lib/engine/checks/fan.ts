import { basis, flagged, foundOf, notApplicable, PASS, PRACTICE } from './found';
import { marginLedger } from './margin-ledger';
import type { CheckDefinition } from './types';

const atFan = (kinds: readonly string[]) => kinds.some((kind) => /^fan-(inlet|outlet)-effect$/.test(kind));

export const fanChecks: readonly CheckDefinition[] = [
	{
		key: 'governing-path',
		title: 'The governing path is the one that requires most',
		looksAt: 'requirement of every path of each side',
		severity: 'fault',
		threshold: null,
		basis: PRACTICE('highest total, not longest'),
		test: ({ solution }) =>
			foundOf(
				solution.paths.flatMap(({ outlet, spare }) =>
					spare < -1e-9 ? [{ row: outlet, value: spare, message: 'This path requires more than the index path.' }] : []
				)
			)
	},
	{
		key: 'duty-positive',
		title: 'The fan has something to do',
		looksAt: 'total pressure of the fan',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE(),
		test: (context) => flagged(context, 'negative-duty')
	},
	{
		key: 'static-class',
		title: 'Pressure class holds the static pressure',
		looksAt: 'highest static pressure in each row against its pressure class, by sign',
		severity: 'fault',
		threshold: null,
		basis: basis('standard', 'pressure classes of ductwork'),
		test: ({ rows }) => {
			const classed = rows.filter(([{ pressureClass }]) => pressureClass !== undefined);
			if (classed.length === 0) return notApplicable('No row has a pressure class.');
			return foundOf(
				classed.flatMap(
					([
						{ tag, pressureClass = 0 },
						{
							staticPressure: [near, far]
						}
					]) => {
						const value = Math.abs(near) > Math.abs(far) ? near : far;
						const holds = Math.abs(value) <= Math.abs(pressureClass) && (pressureClass > 0 || value <= 0);
						return holds ? [] : [{ row: tag, value, message: 'The static pressure is beyond the pressure class.' }];
					}
				)
			);
		}
	},
	{
		key: 'system-effect',
		title: 'System effect is filled in or declined',
		looksAt: 'straight duct at the fan’s outlet, or an entry of the system effect',
		severity: 'caution',
		threshold: { default: 3, unit: '', label: 'Straight duct at the outlet, diameters, at least' },
		basis: basis('handbook', 'as a screen, 1 D at the inlet and 3 D at the outlet; AMCA 201 for the figure'),
		test: ({ rows }, least) => {
			const first = rows.filter(([{ joins, side }]) => joins === null && side === 'supply');
			if (first.length === 0) return notApplicable('No supply row leaves the fan.');
			return foundOf(
				first.flatMap(([row, { hydraulicDiameter }]) => {
					const value = row.length / hydraulicDiameter;
					const filled = atFan((row.fittings ?? []).map(({ kind }) => kind));
					return filled || value >= least
						? []
						: [
								{
									row: row.tag,
									value,
									message: 'The duct at the fan’s outlet is short, and no system effect is entered.'
								}
							];
				})
			);
		}
	},
	{
		key: 'traverse-place',
		title: 'A place to measure on each main',
		looksAt: 'length of rows that meet the fan, in hydraulic diameters',
		severity: 'note',
		threshold: { default: 7.5, unit: '', label: 'Straight duct for a traverse, diameters, at least' },
		basis: basis('handbook', '6 to 10 diameters downstream; 7.5 is often quoted'),
		test: ({ rows }, least) =>
			foundOf(
				rows.flatMap(([{ tag, joins, length }, { hydraulicDiameter }]) => {
					const value = length / hydraulicDiameter;
					return joins === null && value < least
						? [{ row: tag, value, message: 'The main is too short for a traverse.' }]
						: [];
				})
			)
	},
	{
		key: 'margins-once',
		title: 'Each margin stands once',
		looksAt: 'names of the margins',
		severity: 'caution',
		threshold: null,
		basis: basis('handbook', 'margins appear once, with their product'),
		test: ({ document, solution }) => {
			const { lines, repeated } = marginLedger(document, solution);
			if (lines.length === 0) return notApplicable('No margin is named.');
			return foundOf(repeated.map((name) => ({ row: null, message: `“${name}” stands more than once.` })));
		}
	},
	{
		key: 'margin-on-flow',
		title: 'Margin on flow',
		looksAt: 'product of the margins on flow',
		severity: 'caution',
		threshold: { default: 0.05, unit: '', label: 'Margin on flow, at most' },
		basis: basis('handbook', 'at most 5 % on flow'),
		test: ({ document, solution }, most) => {
			const { flowFactor, lines } = marginLedger(document, solution);
			if (lines.length === 0) return notApplicable('No margin is named.');
			const value = flowFactor - 1;
			return value <= most + 1e-12 ? PASS : foundOf([{ row: null, value, message: 'The margins on flow are large.' }]);
		}
	},
	{
		key: 'margin-on-pressure',
		title: 'Margin on pressure',
		looksAt: 'selection pressure over the duty',
		severity: 'caution',
		threshold: { default: 0.1, unit: '', label: 'Margin on pressure, at most' },
		basis: basis('handbook', 'at most 10 % on pressure'),
		test: ({ document, solution }, most) => {
			const { selectionPressure, lines } = marginLedger(document, solution);
			if (lines.length === 0) return notApplicable('No margin is named.');
			const value = selectionPressure / solution.fan.totalPressure - 1;
			return value <= most + 1e-12
				? PASS
				: foundOf([{ row: null, value, message: 'The margins on pressure are large.' }]);
		}
	}
];
