import { basis, beyond, flagged, notApplicable, practice } from './found';
import { FLEXIBLE_CODE, FLEXIBLE_PRACTICE, FLEXIBLE_TESTS, MIL_AIR } from './sources';
import type { CheckContext, CheckDefinition, Pair } from './types';

const NO_FLEXIBLE = 'No row has flexible duct.';
const lengthOf = ([{ flexible }]: Pair) => (flexible && flexible.length > 0 ? flexible.length : null);
const has = ({ rows }: CheckContext) => rows.some((pair) => lengthOf(pair) !== null);

const longer = (key: string, title: string, most: number, message: string, ground: CheckDefinition['basis']) =>
	({
		key,
		title,
		looksAt: 'flexible duct of each row',
		severity: 'caution',
		threshold: { default: most, unit: 'm', label: 'Flexible duct, at most' },
		basis: ground,
		test: ({ rows }, limit) =>
			beyond(rows, { most: limit, unit: 'm', none: NO_FLEXIBLE, message }, (...pair) => lengthOf(pair))
	}) satisfies CheckDefinition;

export const flexibleChecks: readonly CheckDefinition[] = [
	longer(
		'flexible-length',
		'Length of flexible duct',
		1.5,
		'The flexible duct is long.',
		basis('handbook', MIL_AIR, '5 ft, straight, not in place of an elbow')
	),
	longer(
		'flexible-connector',
		'Length of flexible connectors',
		4.27,
		'Longer than a code allows a flexible air connector; a listed flexible duct has no such limit. Say which it is.',
		basis('standard', FLEXIBLE_CODE, '14 ft for a flexible air connector, which passes no wall, floor or ceiling')
	),
	{
		key: 'limit-flexible-length',
		title: 'The design’s own limit of flexible duct',
		looksAt: 'the limit in the basis of design',
		severity: 'caution',
		threshold: null,
		basis: practice('a design is held to the criteria it names'),
		test: (context) =>
			context.document.criteria?.flexibleLength === undefined
				? notApplicable('The design names no such limit.')
				: flagged(context, 'flexible-length')
	},
	{
		key: 'flexible-compression',
		title: 'Compression of flexible duct',
		looksAt: 'what is missing of the stretched length, where it is stated',
		severity: 'caution',
		threshold: { default: 0.15, unit: '', label: 'Compression, at most' },
		basis: basis(
			'common practice',
			`${FLEXIBLE_TESTS}; ${FLEXIBLE_PRACTICE}`,
			'relaxed duct sits some 15 % short, installed duct often 30 %; compressed, it may lose 4 to 10 times as much'
		),
		test: ({ rows }, most) =>
			beyond(
				rows,
				{
					...{ most, unit: '', none: 'No flexible duct states its compression.' },
					message: 'The flexible duct is compressed more than a relaxed piece.'
				},
				(row) => row.flexible?.compression ?? null
			)
	},
	{
		key: 'flexible-assumption',
		title: 'The assumption on flexible duct is the designer’s',
		looksAt: 'flexible duct without a factor or a compression of its own',
		severity: 'note',
		threshold: null,
		basis: practice('the compression that is assumed is printed'),
		test: (context) => (has(context) ? flagged(context, 'flexible-default') : notApplicable(NO_FLEXIBLE))
	}
];
