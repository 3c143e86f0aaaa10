import {
	junctionCoefficientOf,
	type CatalogueEntry,
	type CoefficientResult,
	type JunctionContext,
	type Leg
} from '$lib/engine';
import { drawnPlot } from './drawn-plot';
import { methodName } from './method-name';
import type { Course, Plot } from './plot';

const AREA_RATIOS = [0.5, 0.25, 1];
const STEPS = 100;
const COMMON_DIAMETER = 0.5; // m
const WORDS = { diverging: 'dividing', converging: 'uniting' } as const;

type Direction = JunctionContext['direction'];

/** Branches of a junction, and whether a leg goes straight on. */
interface Form {
	readonly branches: number;
	readonly isStraight: boolean;
}
const TWO_FACING: Form = { branches: 2, isStraight: false };
const FORMS: Readonly<Record<string, Form>> = {
	'bullhead-tee': TWO_FACING,
	cross: { branches: 2, isStraight: true },
	plenum: TWO_FACING
};
const ONE_BRANCH: Form = { branches: 1, isStraight: true };

/** The node of round ducts at which the branch, or each of two on a cross, takes its share of the flow. */
function nodeOf({ branches, isStraight }: Form, direction: Direction, leg: Leg, q: number, a: number): JunctionContext {
	const each = isStraight ? q / branches : q;
	const size = { shape: 'round', diameter: COMMON_DIAMETER * Math.sqrt(leg === 'branch' ? a : 1) } as const;
	return {
		direction,
		leg,
		flowRatio: leg === 'branch' ? each : 1 - q,
		branchFlowRatio: leg === 'branch' ? each : q,
		areaRatio: leg === 'branch' ? a : 1,
		branchAreaRatio: a,
		straightAreaRatio: isStraight ? 1 : null,
		branches,
		commonSize: { shape: 'round', diameter: COMMON_DIAMETER },
		size
	};
}

interface Asked extends Pick<CoefficientResult, 'coefficient' | 'inRange' | 'rangeNote'> {
	readonly q: number;
}

function ask(entry: CatalogueEntry, method: string | null, direction: Direction, leg: Leg, a: number): Asked[] {
	const parameters = { ...entry.plot?.at, ...(method === null ? {} : { method }) };
	const form = FORMS[entry.key] ?? ONE_BRANCH;
	return Array.from({ length: STEPS + 1 }, (_, i) => {
		const q = i / STEPS;
		return { q, ...junctionCoefficientOf(entry.key, parameters, nodeOf(form, direction, leg, q, a)) };
	});
}

const courseOf = (name: string, asked: readonly Asked[]): Course => ({
	name,
	points: asked.map(({ q, coefficient, inRange }) => ({ x: q, C: inRange ? coefficient : null }))
});

/** The same picture for every junction: C on the common leg over the flow ratio. */
function picture(
	title: string,
	form: Form,
	courses: readonly Course[],
	note: string,
	nameRoom: number,
	scaledBy = ''
): Plot | null {
	if (!courses.some(({ points }) => points.some(({ C }) => C !== null))) return null;
	return drawnPlot({
		title,
		xName:
			form.isStraight && form.branches > 1
				? 'Q of both branches / Q of the common leg'
				: 'Q of the branch / Q of the common leg',
		yName: 'C, on the velocity pressure of the common leg',
		...{ note, courses, outside: [], from: 0, to: 1, width: 330, height: 224, nameRoom, scaledBy, canBeLog: false }
	});
}

/** Both legs over the flow ratio for three area ratios, dividing and uniting; then the rivals beside each other. */
export function junctionPlots(entry: CatalogueEntry): readonly Plot[] {
	const form = FORMS[entry.key] ?? ONE_BRANCH;
	const legs: readonly Leg[] = form.isStraight ? ['branch', 'straight'] : ['branch'];
	const name = (leg: Leg) => (leg === 'branch' ? 'Branch' : 'Straight leg');
	const byArea = (['diverging', 'converging'] as const).flatMap((direction) =>
		legs.map((leg) => {
			const courses = AREA_RATIOS.map((a) => courseOf(`A ${a}`, ask(entry, null, direction, leg, a)));
			return picture(
				`${name(leg)}, ${WORDS[direction]}`,
				form,
				courses,
				'A: area of the branch over that of the common leg',
				62,
				'A 0.5'
			);
		})
	);
	return [...byArea, ...rivalPlots(entry, form)].filter((plot) => plot !== null);
}

function rivalPlots(entry: CatalogueEntry, form: Form): readonly (Plot | null)[] {
	const rivals = entry.rivals ?? [];
	if (rivals.length === 0) return [];
	return (['diverging', 'converging'] as const).map((direction) => {
		const courses = [null, ...rivals.map(({ key }) => key)].map((method) =>
			courseOf(methodName(method ?? entry.standardMethod ?? 'standard'), ask(entry, method, direction, 'branch', 1))
		);
		const title = `Branch, ${WORDS[direction]}, by method`;
		return picture(title, form, courses, 'Legs of one size', 108);
	});
}

/** Why a junction has no answer in a direction; null where it has one. */
export function silentDirection(entry: CatalogueEntry): string | null {
	const silent = (['diverging', 'converging'] as const).flatMap((direction) => {
		const asked = ask(entry, null, direction, 'branch', 0.5);
		if (asked.some(({ inRange }) => inRange)) return [];
		return [
			`${WORDS[direction]}, nothing is drawn: ${asked.find(({ rangeNote }) => rangeNote)?.rangeNote ?? 'no source'}`
		];
	});
	const text = silent.join('; ');
	return text === '' ? null : text.charAt(0).toUpperCase() + text.slice(1);
}
