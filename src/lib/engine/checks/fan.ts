import type { DesignDocument } from '../document/types';
import { basis, foundOf, notApplicable, whole } from './found';
import { FAN_MOUNTING, FAN_REVIEW, FAN_STORY, VA_CEMETERY } from './sources';
import type { CheckContext, CheckDefinition, Found } from './types';

type Curve = NonNullable<NonNullable<DesignDocument['fan']>['curve']>;
const NO_FAN = 'The design states no fan.';
const NO_CURVE = 'The design states no fan curve.';

/** Total pressure of the fan at a flow [Pa], by straight lines between the points of its curve; null beyond them. */
function pressureAt(curve: Curve, flow: number): number | null {
	for (let at = 1; at < curve.length; at += 1) {
		const [before = 0, p = 0] = curve[at - 1] ?? [];
		const [after = 0, q = 0] = curve[at] ?? [];
		if (flow >= before && flow <= after) return p + ((q - p) * (flow - before)) / (after - before);
	}
	return null;
}

/** What the fan gives at the flow it is selected for, over what is asked of it there [Pa]. */
function given({ document: { fan }, ledger }: CheckContext): { pressure: number | null; asked: number } | null {
	const asked = ledger.selectionPressure;
	if (fan?.curve) return { pressure: pressureAt(fan.curve, ledger.selectionFlow), asked };
	return fan?.totalPressure === undefined ? null : { pressure: fan.totalPressure, asked };
}

/** Straight duct, or an entry of the system effect, where rows of one side meet the fan. */
function straightAtFan({ rows }: CheckContext, supply: boolean, least: number): Found {
	const first = rows.filter(([{ joins, side }]) => joins === null && (side === 'supply') === supply);
	if (first.length === 0) return notApplicable(`No row is at the ${supply ? 'outlet' : 'inlet'} of the fan.`);
	const kind = supply ? 'fan-outlet-effect' : 'fan-inlet-effect';
	return foundOf(
		first.flatMap(([{ tag, length, fittings }, { hydraulicDiameter }]) => {
			const value = length / hydraulicDiameter;
			if (value >= least || fittings?.some((one) => one.kind === kind)) return [];
			const message = `The duct at the ${supply ? 'outlet' : 'inlet'} of the fan is short, and no system effect is entered.`;
			return [{ row: tag, value, unit: '', message }];
		})
	);
}

const systemEffect = (supply: boolean, least: number, key: string): CheckDefinition => {
	const place = supply ? 'outlet' : 'inlet';
	return {
		key,
		title: `System effect at the ${place} is filled in or declined`,
		looksAt: `straight duct at the fan’s ${place}, or an entry of the system effect`,
		severity: 'caution',
		threshold: { default: least, unit: '', label: `Straight duct at the ${place}, diameters, at least` },
		basis: basis('handbook', FAN_MOUNTING, 'as a screen, 1 diameter at the inlet and 3 at the outlet; others ask more'),
		test: (context, limit) => straightAtFan(context, supply, limit)
	};
};

export const fanChecks: readonly CheckDefinition[] = [
	systemEffect(true, 3, 'system-effect'),
	systemEffect(false, 1, 'system-effect-inlet'),
	{
		key: 'fan-gives-the-duty',
		title: 'The fan gives what is asked',
		looksAt: 'total pressure of the stated fan against that of the selection, at the flow of the selection',
		severity: 'fault',
		threshold: null,
		basis: basis('handbook', FAN_REVIEW, 'a fan that is too weak runs short of flow until its speed is raised'),
		test: (context) => {
			const fan = given(context);
			if (!fan) return notApplicable(NO_FAN);
			const { pressure, asked } = fan;
			if (pressure === null)
				return whole(true, 'The flow of the selection lies beyond the fan curve.', {
					value: context.ledger.selectionFlow,
					unit: 'm3/s'
				});
			return pressure >= asked
				? { outcome: 'pass' }
				: foundOf([
						{
							...{ row: null, value: pressure, unit: 'Pa', limit: asked },
							message: 'The fan gives less total pressure than the selection asks.'
						}
					]);
		}
	},
	{
		key: 'fan-not-oversized',
		title: 'The fan is not far too strong',
		looksAt: 'total pressure of the stated fan over that of the selection',
		severity: 'caution',
		threshold: { default: 0.2, unit: '', label: 'Total pressure beyond the selection, at most' },
		basis: basis(
			'from memory',
			FAN_STORY,
			'against too little resistance a forward-curved fan overloads its motor; the figure is from memory'
		),
		test: (context, most) => {
			const fan = given(context);
			if (!fan) return notApplicable(NO_FAN);
			if (fan.pressure === null || !(fan.asked > 0)) return notApplicable('There is no duty on the curve to compare.');
			const value = fan.pressure / fan.asked - 1;
			return whole(value > most, 'The fan gives far more total pressure than is asked: it runs away from its duty.', {
				value,
				unit: ''
			});
		}
	},
	{
		key: 'fan-on-stable-side',
		title: 'The duty lies on the stable side of the curve',
		looksAt: 'flow of the selection over that at the peak of the curve',
		severity: 'caution',
		threshold: { default: 1, unit: '', label: 'Flow over that of the peak, at least' },
		basis: basis('handbook', `${VA_CEMETERY}; ${FAN_REVIEW}`, 'in the stable region, not far left or right'),
		test: ({ document: { fan }, ledger }, least) => {
			if (!fan?.curve) return notApplicable(NO_CURVE);
			const most = Math.max(...fan.curve.map(([, pressure = 0]) => pressure));
			const [peak = 0] = fan.curve.find(([, pressure]) => pressure === most) ?? [];
			if (peak === 0) return notApplicable('The curve falls from its first point: it shows no peak.');
			const value = ledger.selectionFlow / peak;
			return whole(value < least, 'The duty lies left of the peak of the fan curve.', { value, unit: '' });
		}
	}
];
