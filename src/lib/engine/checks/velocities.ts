import type { SolvedRow } from '../document/types';
import { above, basis, flagged, PRACTICE } from './found';
import type { CheckDefinition } from './types';

const VA = 'a government design manual (VA, Table 3-3)';
/** Static pressure up to which ductwork counts as low-pressure [Pa]: 2 in. w.g. */
const LOW_PRESSURE = 500;
const highest = ({ staticPressure: [near, far] }: SolvedRow) => Math.max(Math.abs(near), Math.abs(far));
const isLow = (solved: SolvedRow) => highest(solved) <= LOW_PRESSURE;

const velocity = (key: string, title: string, low: boolean, limit: number): CheckDefinition => ({
	key,
	title,
	looksAt: `velocity in rows ${low ? 'up to' : 'above'} ${LOW_PRESSURE} Pa static that others join`,
	severity: 'caution',
	threshold: { default: limit, unit: 'm/s', label: 'Velocity, at most' },
	basis: basis('handbook', VA),
	test: (context, most) =>
		above(context, most, 'The velocity is above what the manual allows.', ({ tag }, solved) =>
			isLow(solved) === low && context.isJoined(tag) ? solved.velocity : null
		)
});

const rate = (key: string, title: string, low: boolean, limit: number): CheckDefinition => ({
	key,
	title,
	looksAt: `friction rate of rows ${low ? 'up to' : 'above'} ${LOW_PRESSURE} Pa static`,
	severity: 'caution',
	threshold: { default: limit, unit: 'Pa/m', label: 'Friction rate, at most' },
	basis: basis('handbook', VA),
	test: (context, most) =>
		above(context, most, 'The friction rate is above what the manual allows.', (_row, solved) =>
			isLow(solved) === low ? solved.frictionRate : null
		)
});

export const velocityChecks: readonly CheckDefinition[] = [
	velocity('velocity-low-pressure', 'Velocity in low-pressure mains', true, 8),
	rate('friction-low-pressure', 'Friction rate in low-pressure ducts', true, 0.66),
	velocity('velocity-medium-pressure', 'Velocity in medium-pressure mains', false, 13),
	rate('friction-medium-pressure', 'Friction rate in medium-pressure ducts', false, 1.64),
	{
		key: 'velocity-near-outlets',
		title: 'Velocity near outlets',
		looksAt: 'velocity in rows with an outlet',
		severity: 'caution',
		threshold: { default: 6.1, unit: 'm/s', label: 'Velocity, at most' },
		basis: basis('handbook', 'guides on noise: 1,200 fpm in branches near outlets'),
		test: (context, most) =>
			above(context, most, 'So fast near an outlet it may be heard.', ({ outlet }, solved) =>
				outlet ? solved.velocity : null
			)
	},
	{
		key: 'limits-of-the-design',
		title: 'The design’s own limits',
		looksAt: 'velocity, friction rate and flexible length against the basis of design',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE('criteria of the design'),
		test: (context) => flagged(context, 'velocity-main', 'velocity-run-out', 'friction-rate', 'flexible-length')
	},
	{
		key: 'figures-plausible',
		title: 'Velocities and friction rates of a duct',
		looksAt: 'figures that hardly any duct has: mostly a slip of the unit',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE(),
		test: (context) => flagged(context, 'velocity-plausible', 'friction-rate-plausible')
	},
	{
		key: 'flow-turbulent',
		title: 'Flow is turbulent',
		looksAt: 'Reynolds number between 2000 and 4000',
		severity: 'note',
		threshold: null,
		basis: PRACTICE('range of Colebrook–White'),
		test: (context) => flagged(context, 'reynolds-transition')
	}
];
