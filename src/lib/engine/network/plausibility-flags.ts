import type { Criteria, DesignRow, Flag } from '../document/types';
import type { RowLoss } from './row-loss';

/** Velocities of air in a duct [m/s]: below, hardly a duct; above, faster than the conveying of heavy dust. */
const VELOCITY = { min: 0.3, max: 30 } as const;
/** Friction rate of a duct [Pa/m]: some thirty times that of a usual design. */
const FRICTION_RATE = 30;
const BASIS = 'plausibility, common practice: beyond it the unit of the size or of the flow mostly slipped';
const ASK = 'Is the size in the right unit?';

/**
 * A figure that hardly any duct has, where the design's own limits do not speak of it: whoever types 24x12 in a metric
 * design gets 24 mm. One slip is told once, by the velocity before the friction rate.
 */
export function plausibilityFlag(
	row: DesignRow,
	{ velocity, frictionRate }: RowLoss,
	velocityLimit: number | undefined,
	criteria: Criteria | undefined,
	flags: Flag[]
): void {
	const told = (rule: Flag['rule'], message: string, value: number, threshold: number) =>
		flags.push({ rule, row: row.tag, severity: 'caution', message, value, threshold, basis: BASIS });
	if (velocity < VELOCITY.min)
		told('velocity-plausible', `${ASK} Air hardly moves so slowly in a duct.`, velocity, VELOCITY.min);
	else if (velocity > VELOCITY.max && velocityLimit === undefined)
		told('velocity-plausible', `${ASK} Air hardly moves so fast in a duct.`, velocity, VELOCITY.max);
	else if (frictionRate > FRICTION_RATE && velocityLimit === undefined && criteria?.frictionRate === undefined)
		told('friction-rate-plausible', `${ASK} Hardly a duct has such a friction rate.`, frictionRate, FRICTION_RATE);
}
