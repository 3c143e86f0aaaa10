import { coefficientOf, type CatalogueEntry, type FittingParameter } from '$lib/engine';
import { drawnPlot } from './drawn-plot';
import { methodName } from './method-name';
import type { Course, Plot } from './plot';
import { printedPoints } from './printed-points';
import { typicalRow } from './typical-row';

type Values = Readonly<Record<string, number | string>>;
interface Variant {
	readonly name: string;
	readonly values: Values;
}
interface Asked {
	readonly x: number;
	readonly C: number;
	readonly inRange: boolean;
	readonly rangeNote: string | null;
}

const LOOK = 200;
const DRAWN = 200;

/** A label within a sentence. */
const lowered = (label: string): string => label.charAt(0).toLowerCase() + label.slice(1);

/** The numeric parameter along which an entry is plotted; none where the coefficient is entered. */
export function plottedParameter({ plot, parameters }: CatalogueEntry): FittingParameter | null {
	const chosen = plot && parameters.find(({ name }) => name === plot.along);
	if (chosen) return chosen;
	if (parameters.some(({ name }) => name === 'coefficient')) return null;
	return parameters.find(({ options }) => options === undefined) ?? null;
}

/** One curve for each rival method; without rivals one for each option of the first choice. */
function variantsOf(entry: CatalogueEntry): readonly Variant[] {
	if (entry.rivals && entry.rivals.length > 0)
		return [
			{ name: methodName(entry.standardMethod ?? 'standard'), values: {} },
			...entry.rivals.map(({ key }) => ({ name: methodName(key), values: { method: key } }))
		];
	const choice = entry.parameters.find(({ options, name }) => options && name !== 'leg' && name !== entry.plot?.along);
	if (!choice?.options) return [{ name: '', values: {} }];
	const standardFirst = [choice.default, ...choice.options.filter((option) => option !== choice.default)];
	return standardFirst.map((option) => ({
		name: typeof option === 'number' ? `${choice.label} ${option}` : option,
		values: { [choice.name]: option }
	}));
}

/** Options that change nothing are one curve. */
function distinct(courses: readonly (readonly Asked[])[], variants: readonly Variant[]) {
	const same = (a: readonly Asked[], b: readonly Asked[]) => a.every(({ C }, i) => C === b[i]?.C);
	return variants.filter((_, i) => !courses.slice(0, i).some((course) => same(course, courses[i] ?? [])));
}

/** Where x is worth drawing: not far beyond the range, nor where the curves have come to rest. */
function drawnRange(all: readonly (readonly Asked[])[], { min, max }: FittingParameter): readonly [number, number] {
	const standard = all.find((course) => course.some(({ inRange }) => inRange)) ?? [];
	const inside = standard.filter(({ inRange }) => inRange).map(({ x }) => x);
	const [low, high] = inside.length > 0 ? [Math.min(...inside), Math.max(...inside)] : [min, max];
	const spare = (high - low) * 0.08;
	const from = Math.max(min, low - spare);
	const rest = Math.max(...all.map(lastMove));
	const to = Math.min(max, high + spare);
	return [from, rest > from && rest < from + (to - from) * 0.6 ? Math.min(to, from + (rest - from) * 1.5) : to];
}

/** The first x from which a course stays within 2 % of its end. */
function lastMove(course: readonly Asked[]): number {
	const end = course[course.length - 1]?.C ?? 0;
	const moving = course.findLastIndex(({ C }) => Math.abs(C - end) > Math.abs(end) * 0.02);
	return course[moving + 1]?.x ?? course[course.length - 1]?.x ?? 0;
}

/** The coefficient of an entry over the parameter that matters most; null where there is none. */
export function fittingPlot(entry: CatalogueEntry): Plot | null {
	const along = plottedParameter(entry);
	const [shape = 'round'] = entry.shapes;
	if (!along) return null;
	const { context, words } = typicalRow(shape);
	const onSmaller: Values = entry.reference === 'smaller leg' ? { leg: 'smaller' } : {};
	const at: Values = { ...onSmaller, ...entry.plot?.at };
	const ask = ({ values }: Variant, from: number, to: number, steps: number): Asked[] =>
		Array.from({ length: steps + 1 }, (_, i) => {
			const x = from + ((to - from) * i) / steps;
			const {
				coefficient: C,
				inRange,
				rangeNote
			} = coefficientOf(entry.key, { ...at, ...values, [along.name]: x }, context);
			return { x, C, inRange, rangeNote };
		});
	const whole = variantsOf(entry).map((variant) => ask(variant, along.min, along.max, LOOK));
	const variants = distinct(whole, variantsOf(entry));
	const [from, to] = drawnRange(whole, along);
	const asked = variants.map((variant) => ask(variant, from, to, DRAWN));
	const courses = asked.map((points, i): Course => {
		const answered = points.some(({ inRange }) => inRange);
		return {
			name: variants[i]?.name ?? '',
			points: points.map(({ x, C, inRange }) => ({ x, C: inRange || !answered ? C : null }))
		};
	});
	const free = variants.flatMap(({ values }) => Object.keys(values));
	const printed = printedPoints(entry, along.name, at, free);
	return drawnPlot({
		title: `Coefficient over ${lowered(along.label)}`,
		xName: along.unit === '' ? along.label : `${along.label}, ${along.unit === '°' ? 'degrees' : along.unit}`,
		yName: `C, on the velocity pressure of ${entry.reference === 'row' ? 'the row' : `the ${entry.reference}`}`,
		note: [
			words,
			othersInWords(entry, along, at),
			restInWords(asked),
			printed.length > 0 ? '+ check value of a source' : ''
		]
			.filter((text) => text !== '')
			.join('; '),
		courses,
		outside: gapsOf(asked[0] ?? []),
		printed,
		...{ from, to, width: 430, height: 270, nameRoom: variants.length > 1 ? 104 : 12, canBeLog: true },
		isAngle: along.unit === '°'
	});
}

/** The other parameters as they stand in the plot. */
function othersInWords({ parameters, rivals }: CatalogueEntry, along: FittingParameter, at: Values): string {
	const [first] = rivals ? [] : parameters.filter(({ options, name }) => options && name !== 'leg');
	return parameters
		.filter((one) => one !== along && one !== first && one.name !== 'leg')
		.map(
			({ name, label, unit, default: standard }) =>
				`${lowered(label)} ${at[name] ?? standard}${unit === '°' ? '°' : ''}`
		)
		.join(', ');
}

function restInWords([standard = []]: readonly (readonly Asked[])[]): string {
	if (standard.some(({ inRange }) => inRange)) return '';
	return `drawn although ${standard.find(({ rangeNote }) => rangeNote)?.rangeNote ?? 'the source has no such duct'}`;
}

/** Stretches of x in which the standard method leaves its range. */
function gapsOf(points: readonly Asked[]): readonly (readonly [number, number])[] {
	if (!points.some(({ inRange }) => inRange)) return [];
	const gaps: [number, number][] = [];
	points.forEach(({ x, inRange }, i) => {
		const last = gaps[gaps.length - 1];
		const next = points[i + 1]?.x ?? x;
		if (inRange) return;
		if (last && last[1] >= x) last[1] = points[i + 1]?.inRange === false ? next : x;
		else gaps.push([x, points[i + 1]?.inRange === false ? next : x]);
	});
	return gaps;
}
