import { Given, publishedEvaluator, subjectsOfTopic, type Answer } from '$lib/engine';
import { figureText } from './axis';
import { givenInWords, partInWords } from './given-in-words';
import { publishedFiles, type Check, type PublishedFile } from './published-files';

/** One published figure beside ours. */
export interface PublishedValue {
	readonly id: string;
	readonly given: string;
	readonly part: string;
	readonly printed: string;
	/** Null where nothing of ours answers it */
	readonly ours: string | null;
	readonly allowed: string;
	readonly isWithin: boolean;
	/** Why nothing of ours answers it */
	readonly reason: string | null;
}

/** Published figures of one source. */
export interface PublishedGroup {
	readonly topic: string;
	readonly source: string;
	/** How the figure came here, as it was read or computed */
	readonly certainty: string;
	readonly values: readonly PublishedValue[];
}

type Part = readonly [part: string, value: number];

/** The figures of an answer or of what was printed, each with the name of its part. */
function partsOf(answer: unknown, name = ''): readonly Part[] {
	if (typeof answer === 'number') return [[name, answer]];
	if (typeof answer !== 'object' || answer === null) return [];
	return Object.entries(answer).flatMap(([key, value]) => partsOf(value, [name, key].filter(Boolean).join(' ')));
}

/** Ours with one figure more than is printed, at least four. */
function oursText(value: number, printed: number): string {
	const figures = String(printed).replace(/^-?0?\.?0*|\.|e.*$/g, '').length;
	return figureText(Number(value.toPrecision(Math.max(4, Math.min(figures + 1, 7)))));
}

function allowedText(tolerance: Check['tolerance']): string {
	if (tolerance.type === 'rel') return `±${figureText(Number((tolerance.value * 100).toPrecision(2)))} %`;
	return tolerance.value === 0 ? 'exact' : `±${figureText(tolerance.value)}`;
}

/** Rows of a check: one for each figure that it prints. */
function valuesOf(check: Check, file: PublishedFile): readonly PublishedValue[] {
	const { id, topic, inputs, expected, unit = '' } = check;
	const reason = file.notCovered?.find((one) => one.id === id)?.reason ?? null;
	const evaluate = publishedEvaluator(topic);
	const answer: Answer | null = reason === null && evaluate ? evaluate(new Given(inputs)) : null;
	const ours = new Map(partsOf(answer));
	const halfUnit = file.printedShort?.find((one) => one.id === id)?.halfUnit;
	const tolerance = halfUnit === undefined ? check.tolerance : { type: 'abs', value: halfUnit };
	return partsOf(expected).map(([part, printed]) => {
		const value = ours.get(part) ?? null;
		const most = tolerance.type === 'rel' ? tolerance.value * Math.abs(printed) : tolerance.value;
		return {
			id: part === '' ? id : `${id} ${part}`,
			given: givenInWords(inputs),
			part: partInWords(part, unit),
			printed: figureText(printed),
			ours: value === null ? null : oursText(value, printed),
			allowed: allowedText(tolerance),
			isWithin: value !== null && Math.abs(value - printed) <= most + 1e-14,
			reason
		};
	});
}

/** The published figures that speak of a subject, those of one source together. */
export function publishedGroups(subject: string): readonly PublishedGroup[] {
	const groups = new Map<string, { topic: string; source: string; certainty: string; values: PublishedValue[] }>();
	for (const file of publishedFiles)
		for (const check of file.checks ?? []) {
			const { topic, source, certainty } = check;
			if (!subjectsOfTopic(topic).includes(subject)) continue;
			const key = `${topic} ${source} ${certainty}`;
			const group = groups.get(key) ?? { topic, source, certainty, values: [] };
			// Several files may hold the same check.
			if (!group.values.some(({ id }) => id.split(' ')[0] === check.id)) group.values.push(...valuesOf(check, file));
			groups.set(key, group);
		}
	return [...groups.values()];
}

/** Topics of the published figures, and how many checks each has. */
export function publishedTopics(): ReadonlyMap<string, number> {
	const counts = new Map<string, number>();
	for (const file of publishedFiles)
		for (const { topic } of file.checks ?? []) counts.set(topic, (counts.get(topic) ?? 0) + 1);
	return counts;
}
