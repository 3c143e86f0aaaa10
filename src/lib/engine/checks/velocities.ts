import type { FlagRule } from '../document/types';
import { basis, beyond, flagged, notApplicable, practice } from './found';
import { AIR_NOISE, VA } from './sources';
import { extremeStatic } from './static-inside';
import type { CheckDefinition, Pair } from './types';

/** Static pressure up to which supply ductwork counts as low-pressure [Pa]: 2 in. w.g., from memory. */
const LOW_PRESSURE = 500;
const TRANSFER = /\btransfer\b/i;

type Kind = 'low' | 'medium' | 'transfer';
/** Return, exhaust and outdoor air have the limits of low pressure at any pressure. */
function kindOf(pair: Pair): Kind {
	const [{ serves = '', outlet, side }] = pair;
	if (TRANSFER.test(serves) || TRANSFER.test(outlet?.name ?? '')) return 'transfer';
	return side === 'supply' && Math.abs(extremeStatic(pair)) > LOW_PRESSURE ? 'medium' : 'low';
}

const ROWS: Readonly<Record<Kind, string>> = {
	low: `supply rows up to ${LOW_PRESSURE} Pa static and all return, exhaust and outdoor rows`,
	medium: `supply rows above ${LOW_PRESSURE} Pa static`,
	transfer: 'rows that are named as transfer ducts'
};
const NONE: Readonly<Record<Kind, string>> = {
	low: 'No row is of low pressure.',
	medium: `No supply row stands above ${LOW_PRESSURE} Pa static.`,
	transfer: 'No row is named as a transfer duct.'
};

/** Velocity and friction rate of one kind of ductwork. */
function manual(kind: Kind, name: string, velocity: number, rate: number, text: string): CheckDefinition[] {
	const ground = basis('handbook', VA, `${text}; where low pressure ends is from memory`);
	return [
		{
			key: `velocity-${name}`,
			title: `Velocity in ${name} ducts`,
			looksAt: `velocity in ${ROWS[kind]}`,
			severity: 'caution',
			threshold: { default: velocity, unit: 'm/s', label: 'Velocity, at most' },
			basis: ground,
			test: ({ rows }, most) =>
				beyond(
					rows,
					{ most, unit: 'm/s', none: NONE[kind], message: 'The velocity is above that of the manual.' },
					(row, solved) => (kindOf([row, solved]) === kind ? solved.velocity : null)
				)
		},
		{
			key: `friction-${name}`,
			title: `Friction rate in ${name} ducts`,
			looksAt: `friction rate in ${ROWS[kind]}`,
			severity: 'caution',
			threshold: { default: rate, unit: 'Pa/m', label: 'Friction rate, at most' },
			basis: ground,
			test: ({ rows }, most) =>
				beyond(
					rows,
					{ most, unit: 'Pa/m', none: NONE[kind], message: 'The friction rate is above that of the manual.' },
					(row, solved) => (kindOf([row, solved]) === kind ? solved.frictionRate : null)
				)
		}
	];
}

/** A limit that the design has set itself: the engine flags it. */
const own = (
	key: string,
	title: string,
	criterion: 'mainVelocity' | 'runOutVelocity' | 'frictionRate',
	rule: FlagRule
): CheckDefinition => ({
	key,
	title,
	looksAt: 'the limit in the basis of design',
	severity: 'caution',
	threshold: null,
	basis: practice('a design is held to the criteria it names'),
	test: (context) =>
		context.document.criteria?.[criterion] === undefined
			? notApplicable('The design names no such limit.')
			: flagged(context, rule)
});

export const velocityChecks: readonly CheckDefinition[] = [
	...manual('low', 'low-pressure', 8, 0.66, '1,500 fpm and 0.08 in. w.g. in 100 ft'),
	...manual('medium', 'medium-pressure', 13, 1.64, '2,500 fpm and 0.20 in. w.g. in 100 ft'),
	...manual('transfer', 'transfer', 4, 0.33, '750 fpm and 0.04 in. w.g. in 100 ft'),
	{
		key: 'velocity-near-outlets',
		title: 'Velocity near outlets',
		looksAt: 'velocity in rows with an outlet',
		severity: 'caution',
		threshold: { default: 6.1, unit: 'm/s', label: 'Velocity, at most' },
		basis: basis('handbook', AIR_NOISE, '1,200 fpm in branches near outlets'),
		test: ({ rows }, most) =>
			beyond(
				rows,
				{ most, unit: 'm/s', none: 'No row has an outlet.', message: 'So fast near an outlet it may be heard.' },
				({ outlet, side }, { velocity }) => (outlet && side !== 'outdoor' ? velocity : null)
			)
	},
	{
		key: 'static-near-outlets',
		title: 'Static pressure before supply outlets',
		looksAt: 'loss of each supply outlet less the velocity pressure before it: what stands there once dampers are set',
		severity: 'caution',
		threshold: { default: 37, unit: 'Pa', label: 'Static pressure before an outlet, at most' },
		basis: basis('handbook', AIR_NOISE, '0.15 in. w.g. in branches near outlets'),
		test: ({ rows }, most) =>
			beyond(
				rows,
				{
					...{ most, unit: 'Pa', none: 'No row has a supply outlet.' },
					message: 'The static pressure that the outlet throttles may be heard.'
				},
				({ outlet, side }, { outletLoss, velocityPressure }) =>
					outlet && side === 'supply' ? outletLoss - velocityPressure : null
			)
	},
	own('limit-main-velocity', 'The design’s own limit of velocity in mains', 'mainVelocity', 'velocity-main'),
	own('limit-run-out-velocity', 'The design’s own limit of velocity in run-outs', 'runOutVelocity', 'velocity-run-out'),
	own('limit-friction-rate', 'The design’s own limit of friction rate', 'frictionRate', 'friction-rate'),
	{
		key: 'figures-plausible',
		title: 'Velocities and friction rates of a duct',
		looksAt: 'figures that hardly any duct has: mostly a slip of the unit',
		severity: 'caution',
		threshold: null,
		basis: practice('beyond them the unit of a size or of a flow mostly slipped'),
		test: (context) => flagged(context, 'velocity-plausible', 'friction-rate-plausible')
	},
	{
		key: 'flow-turbulent',
		title: 'Flow is turbulent',
		looksAt: 'Reynolds number between 2000 and 4000',
		severity: 'note',
		threshold: null,
		basis: practice('the range of Colebrook–White begins at 4000'),
		test: (context) => flagged(context, 'reynolds-transition')
	}
];
