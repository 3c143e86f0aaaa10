import type { Criteria, DesignRow, Flag } from '../document/types';
import { regime } from '../friction';
import { plausibilityFlag } from './plausibility-flags';
import type { RowLoss } from './row-loss';

const CRITERIA = 'criteria of the design';
/** Longer side to shorter, where the design names none. */
const ASPECT_RATIO = 4;

/** Flow, friction and shape of one row against the criteria and against the range of the formulas. */
export function rowFlags(
	row: DesignRow,
	solved: RowLoss,
	joined: boolean,
	criteria: Criteria | undefined,
	flags: Flag[]
): void {
	const { reynolds, velocity, frictionRate } = solved;
	if (regime(reynolds) === 'transition')
		flags.push({
			rule: 'reynolds-transition',
			row: row.tag,
			severity: 'note',
			message: 'The flow is between laminar and turbulent: the friction factor is a blend, less sure than elsewhere.',
			value: reynolds,
			threshold: 4000,
			basis: 'Colebrook–White holds above a Reynolds number of 4000, the laminar law below 2000'
		});
	if (joined)
		above('velocity-main', row, velocity, criteria?.mainVelocity, 'The velocity is above that of a main.', flags);
	else
		above(
			'velocity-run-out',
			row,
			velocity,
			criteria?.runOutVelocity,
			'The velocity is above that of a run-out.',
			flags
		);
	const velocityLimit = joined ? criteria?.mainVelocity : criteria?.runOutVelocity;
	plausibilityFlag(row, solved, velocityLimit, criteria, flags);
	above('friction-rate', row, frictionRate, criteria?.frictionRate, 'The friction rate is above the criterion.', flags);
	const flexible = row.flexible?.length ?? 0;
	above(
		'flexible-length',
		row,
		flexible,
		criteria?.flexibleLength,
		'The flexible duct is longer than it should be.',
		flags
	);
	aspectFlag(row, criteria, flags);
	if (row.joins !== null && row.junction === undefined)
		flags.push({
			rule: 'no-junction-loss',
			row: row.tag,
			severity: 'note',
			message: 'No loss is counted where this row joins another.',
			basis: 'the row names no junction'
		});
	if (row.joins === null && row.junction !== undefined && row.junction.kind !== 'fixed')
		flags.push({
			rule: 'junction-at-fan',
			row: row.tag,
			severity: 'caution',
			message: 'This row meets the fan, where no stream divides or unites: its junction is not counted.',
			basis: 'a junction stands where a row joins another'
		});
	reversedFlag(row, solved, flags);
	if (solved.loss < 0)
		flags.push({
			rule: 'negative-loss',
			row: row.tag,
			severity: 'caution',
			message: 'The row gains total pressure: a negative coefficient or thermal gravity is greater than its losses.',
			value: solved.loss,
			threshold: 0,
			basis: 'a stream gains only what another one, or gravity, gives'
		});
	const rise = Math.abs(row.rise ?? 0);
	if (rise > row.length + flexible)
		flags.push({
			rule: 'rise-exceeds-length',
			row: row.tag,
			severity: 'caution',
			message: 'The rise is greater than the length of the row.',
			value: rise,
			threshold: row.length + flexible,
			basis: 'geometry'
		});
}

/** The law of leakage knows no direction: it is counted as escaping from supply and entering all other ducts. */
function reversedFlag({ tag, side }: DesignRow, { leakage = 0, leakagePressure = 0 }: RowLoss, flags: Flag[]): void {
	if (leakage === 0 || (side === 'supply') === leakagePressure > 0) return;
	flags.push({
		rule: 'leakage-reversed',
		row: tag,
		severity: 'note',
		message:
			side === 'supply'
				? 'The static pressure here is below that around the duct: air is drawn in, but counted as escaping.'
				: 'The static pressure here is above that around the duct: air escapes, but is counted as drawn in.',
		value: leakagePressure,
		threshold: 0,
		basis: 'leakage follows the static pressure; its amount is counted by magnitude'
	});
}

function above(
	rule: Flag['rule'],
	row: DesignRow,
	value: number,
	threshold: number | undefined,
	message: string,
	flags: Flag[]
): void {
	if (threshold === undefined || value <= threshold) return;
	flags.push({ rule, row: row.tag, severity: 'caution', message, value, threshold, basis: CRITERIA });
}

function aspectFlag(row: DesignRow, criteria: Criteria | undefined, flags: Flag[]): void {
	if (row.size.shape === 'round') return;
	const { width, height } = row.size;
	const value = Math.max(width, height) / Math.min(width, height);
	const threshold = criteria?.aspectRatio ?? ASPECT_RATIO;
	if (value <= threshold) return;
	flags.push({
		rule: 'aspect-ratio',
		row: row.tag,
		severity: 'caution',
		message: 'The section is flat: it costs sheet metal and pressure.',
		value,
		threshold,
		basis: criteria?.aspectRatio === undefined ? 'common practice' : CRITERIA
	});
}
