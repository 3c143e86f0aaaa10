import { linearAxis, logAxis, shareOf, ticksOf, type Axis } from './axis';
import type { Course, Plot, PlotCurve } from './plot';
import { simplified, type Place } from './simplified';

export interface PlotSpec {
	readonly title: string;
	readonly xName: string;
	readonly yName: string;
	readonly note: string;
	readonly courses: readonly Course[];
	/** Parts of x in which there is no answer by the standard method */
	readonly outside: readonly (readonly [from: number, to: number])[];
	readonly from: number;
	readonly to: number;
	readonly width: number;
	readonly height: number;
	/** Room at the right for the names of the curves */
	readonly nameRoom: number;
	readonly printed?: readonly { readonly x: number; readonly C: number }[];
	readonly canBeLog: boolean;
	readonly isAngle?: boolean;
	/** Name of the course that sets the scale; others may run off it */
	readonly scaledBy?: string;
}

/** Below this a logarithmic axis has no marks. */
const FLOOR = 0.01;
/** Largest over middle value from which a linear axis shows nothing of the smaller ones. */
const STEEP = 12;
/** A logarithmic axis is for coefficients that grow as large as this. */
const LARGE = 10;
/** How far others may rise over the course that sets the scale. */
const HEADROOM = 1.3;
/** Nobody sees that a curve is so far from where it is drawn */
const UNSEEN = 0.15;
/** Least distance between two names */
const NAME_STEP = 14;
const NAME_WIDTH = 90;
/** A curve that ends so far before the edge has its name beside it */
const SHORT = 24;

const tenth = (x: number): number => Math.round(x * 10) / 10;

/** The axis of the coefficients: from zero, or logarithmic where they span decades. */
function coefficientAxis(courses: readonly Course[], parts: number, canBeLog: boolean): Axis {
	const values = courses
		.flatMap(({ points }) => points.flatMap(({ C }) => (C === null ? [] : [C])))
		.sort((a, b) => a - b);
	const [least, most] = [values[0] ?? 0, values[values.length - 1] ?? 1];
	const middle = values[Math.floor(values.length / 2)] ?? 1;
	if (canBeLog && least >= 0 && most > LARGE && most > STEEP * middle)
		return logAxis(Math.max(least, FLOOR, most / 1e4), most);
	return linearAxis(Math.min(0, least), Math.max(most, least + 0.1, 0.1), parts, true);
}

/** Courses that run off the scale of one of them end at its edge. */
function cut(courses: readonly Course[], scaledBy: string | undefined): readonly Course[] {
	const values =
		courses.find(({ name }) => name === scaledBy)?.points.flatMap(({ C }) => (C === null ? [] : [C])) ?? [];
	if (values.length === 0) return courses;
	const high = Math.max(...values, 0.1) * HEADROOM;
	const low = Math.min(...values, -0.1) * HEADROOM;
	const held = (C: number) => Math.max(low, Math.min(high, C));
	return courses.map(({ name, points }) => ({
		name,
		points: points.map(({ x, C }, i) => {
			if (C === null || C === held(C)) return { x, C };
			const next = [points[i - 1], points[i + 1]].find((one) => one && one.C !== null && one.C === held(one.C));
			if (!next || next.C === null) return { x, C: null };
			const share = (held(C) - next.C) / (C - next.C);
			return { x: next.x + share * (x - next.x), C: held(C) };
		})
	}));
}

/** The path of a curve: straight from point to point, broken where there is no answer. */
function pathOf({ points }: Course, x: (value: number) => number, y: (value: number) => number, floor: number): string {
	const stretches: Place[][] = [[]];
	for (const point of points) {
		if (point.C !== null && point.C >= floor) stretches[stretches.length - 1]?.push([x(point.x), y(point.C)]);
		else stretches.push([]);
	}
	return stretches
		.filter((stretch) => stretch.length > 0)
		.map(
			(stretch) =>
				`M${simplified(stretch, UNSEEN)
					.map(([px, py]) => `${px} ${py}`)
					.join('L')}`
		)
		.join('');
}

/** Heights of the names, in order and not closer than they can be read. */
function nameHeights(ends: readonly number[], top: number, bottom: number): number[] {
	const order = ends.map((at, index) => ({ at, index })).sort((a, b) => a.at - b.at);
	let last = -Infinity;
	for (const one of order) last = one.at = Math.max(one.at, last + NAME_STEP);
	let next = Infinity;
	for (const one of [...order].reverse()) next = one.at = Math.max(top, Math.min(one.at, bottom, next - NAME_STEP));
	const heights: number[] = [];
	for (const { at, index } of order) heights[index] = tenth(at);
	return heights;
}

/** Rise over run of the last piece of a path. */
function steepness(path: string): number {
	const [, x1, y1, x2, y2] = /([\d.-]+) ([\d.-]+)L([\d.-]+) ([\d.-]+)$/.exec(path) ?? [];
	const run = Number(x2) - Number(x1);
	return run > 0 ? Math.abs((Number(y2) - Number(y1)) / run) : Infinity;
}

/** The names of the curves: at the right edge, or beside a curve that ends before it. */
function named(
	drawn: readonly Omit<PlotCurve, 'nameAt'>[],
	frame: Plot['frame'],
	isNamed: boolean
): readonly PlotCurve[] {
	const isShort = ({ end }: { readonly end: readonly [number, number] }) => end[0] < frame.right - SHORT;
	const reaching = drawn.filter((curve) => !isShort(curve));
	const heights = nameHeights(
		reaching.map(({ end }) => end[1]),
		frame.top,
		frame.bottom
	);
	const taken: Place[] = [];
	return drawn.map((curve) => {
		if (!isNamed) return { ...curve, nameAt: null };
		const [x, y] = curve.end;
		if (!isShort(curve)) return { ...curve, nameAt: [frame.right + 15, heights[reaching.indexOf(curve)] ?? y] };
		// Beside a steep end there is room; a flat one lies among its neighbours.
		let nameAt: Place = y < frame.top + 30 || steepness(curve.path) > 0.3 ? [x + 5, y] : [x + 4, y - 18];
		while (taken.some(([tx, ty]) => Math.abs(tx - nameAt[0]) < NAME_WIDTH && Math.abs(ty - nameAt[1]) < NAME_STEP))
			nameAt = [nameAt[0], nameAt[1] - NAME_STEP];
		taken.push(nameAt);
		return { ...curve, nameAt };
	});
}

/** Draws courses to scale, with axes, hatching and the name of each at its end. */
export function drawnPlot(given: PlotSpec): Plot {
	const spec = { ...given, courses: cut(given.courses, given.scaledBy) };
	const { width, height } = spec;
	const frame = { left: 40, right: width - spec.nameRoom, top: 22, bottom: height - 38 };
	const xAxis = linearAxis(spec.from, spec.to, Math.floor((frame.right - frame.left) / 50), false, spec.isAngle);
	const yAxis = coefficientAxis(spec.courses, Math.floor((frame.bottom - frame.top) / 34), spec.canBeLog);
	const x = (value: number) => tenth(frame.left + shareOf(xAxis, value) * (frame.right - frame.left));
	const y = (value: number) => tenth(frame.bottom - shareOf(yAxis, value) * (frame.bottom - frame.top));
	const floor = yAxis.isLog ? yAxis.from * 0.999 : -Infinity;
	const drawn = spec.courses.flatMap((course, pattern) => {
		const last = course.points.findLast(({ C }) => C !== null && C >= floor);
		if (!last || last.C === null) return [];
		return [{ name: course.name, pattern, path: pathOf(course, x, y, floor), end: [x(last.x), y(last.C)] as const }];
	});
	const curves = named(drawn, frame, spec.courses.length > 1);
	return {
		title: spec.title,
		width,
		height,
		frame,
		x: { name: spec.xName, ticks: ticksOf(xAxis, x) },
		y: { name: spec.yName, ticks: ticksOf(yAxis, y) },
		zero: !yAxis.isLog && yAxis.from < 0 ? y(0) : null,
		hatched: spec.outside.map(([from, to]) => [x(from), x(to)] as const).filter(([from, to]) => to - from > 1),
		curves,
		marks: (spec.printed ?? [])
			.filter((one) => one.x >= xAxis.from && one.x <= xAxis.to && one.C >= yAxis.from && one.C <= yAxis.to)
			.map((one) => [x(one.x), y(one.C)] as const),
		note: spec.note
	};
}
