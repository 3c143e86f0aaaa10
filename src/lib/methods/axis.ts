import type { Tick } from './plot';

export interface Axis {
	readonly from: number;
	readonly to: number;
	readonly isLog: boolean;
	/** Values of the marks, with the text of each */
	readonly marks: readonly { readonly value: number; readonly text: string }[];
}

const STEPS = [1, 2, 2.5, 5, 10];
const STEPS_OF_ANGLES = [1, 2, 5, 10, 15, 30, 45, 60, 90];

/** The round step that divides a span into at most so many parts. */
function roundStep(span: number, parts: number, isAngle: boolean): number {
	if (isAngle) return STEPS_OF_ANGLES.find((step) => span / step <= parts + 1e-9) ?? 90;
	const decade = 10 ** Math.floor(Math.log10(span / parts));
	return (STEPS.find((step) => span / (step * decade) <= parts + 1e-9) ?? 10) * decade;
}

const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** Figure without rounding noise; a true minus, and powers of ten where there are many noughts. */
export function figureText(value: number): string {
	const size = Math.abs(value);
	if (size !== 0 && (size < 1e-4 || size >= 1e8)) {
		const [figures = '', power = ''] = value.toExponential(5).split('e');
		const raised = [...power.replace('+', '')].map((digit) => RAISED[Number(digit)] ?? '⁻').join('');
		return `${Number(figures)} × 10${raised}`.replace('-', '−');
	}
	return String(Number(value.toPrecision(6))).replace('-', '−');
}

/** A linear axis; with `isRound` its ends go out to whole steps. */
export function linearAxis(from: number, to: number, parts: number, isRound: boolean, isAngle = false): Axis {
	const span = to > from ? to - from : Math.max(Math.abs(to), 1);
	const step = roundStep(span, parts, isAngle);
	const low = isRound ? Math.floor(from / step + 1e-9) * step : from;
	const high = isRound ? Math.ceil((from + span) / step - 1e-9) * step : from + span;
	const decimals = [0, 1, 2, 3, 4].find((n) => Math.abs(step * 10 ** n - Math.round(step * 10 ** n)) < 1e-6) ?? 5;
	const marks = [];
	for (let k = Math.ceil(low / step - 1e-9); k * step <= high + 1e-9 * span; k += 1)
		marks.push({ value: k * step, text: (k * step === 0 ? 0 : k * step).toFixed(decimals).replace('-', '−') });
	return { from: low, to: high, isLog: false, marks };
}

/** A logarithmic axis over whole decades, or their halves marked at 1, 2 and 5 where there are few. */
export function logAxis(from: number, to: number): Axis {
	const low = Math.floor(Math.log10(from) + 1e-9);
	const high = Math.ceil(Math.log10(to) - 1e-9);
	const marks = [];
	for (let decade = low; decade <= high; decade += 1)
		for (const part of high - low <= 3 ? [1, 2, 5] : [1])
			if (part * 10 ** decade <= 10 ** high * 1.001)
				marks.push({ value: part * 10 ** decade, text: figureText(part * 10 ** decade) });
	return { from: 10 ** low, to: 10 ** high, isLog: true, marks };
}

/** Share of the way from the start of the axis to its end. */
export function shareOf({ from, to, isLog }: Axis, value: number): number {
	return isLog ? Math.log(value / from) / Math.log(to / from) : (value - from) / (to - from);
}

export function ticksOf(axis: Axis, place: (value: number) => number): readonly Tick[] {
	return axis.marks.map(({ value, text }) => ({ at: place(value), text }));
}
