import {
	formatCoefficient,
	formatLength,
	formatPressure,
	formatRate,
	formatVelocity,
	unitOf,
	type Flag,
	type FlagRule,
	type UnitSystem
} from '$lib/engine';

/** How the figure of a rule is shown. */
export function shownBy(rule: FlagRule, units: UnitSystem): (value: number) => string {
	if (rule === 'velocity-main' || rule === 'velocity-run-out' || rule === 'velocity-plausible')
		return (value) => `${formatVelocity(value, units)}\u00a0${unitOf('velocity', units)}`;
	if (rule === 'friction-rate' || rule === 'friction-rate-plausible')
		return (value) => `${formatRate(value, units)}\u00a0${unitOf('rate', units)}`;
	if (rule === 'flexible-length' || rule === 'rise-exceeds-length')
		return (value) => `${formatLength(value, units)}\u00a0${unitOf('length', units)}`;
	if (rule === 'negative-loss') return (value) => `${formatPressure(value, units)}\u00a0${unitOf('pressure', units)}`;
	if (rule === 'fan-flows-differ') return (value) => `${(value * 100).toFixed(1)}\u00a0%`;
	if (rule === 'aspect-ratio') return (value) => formatCoefficient(value);
	if (rule === 'coefficient-range') return (value) => value.toPrecision(2);
	return (value) => String(Math.round(value));
}

/** A flag in a sentence, with its figure, the limit, and where that comes from. */
export function flagWords({ rule, message, value, threshold, basis }: Flag, units: UnitSystem): string {
	if (value === undefined || threshold === undefined) return message;
	const shown = shownBy(rule, units);
	return `${message.replace(/\.$/, '')}: ${shown(value)}, limit ${shown(threshold)} (${basis}).`;
}
