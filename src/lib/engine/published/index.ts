import { airChecks } from './air';
import { areaChangeChecks } from './area-changes';
import { damperChecks } from './dampers';
import { elbowChecks } from './elbows';
import { entryChecks, exitChecks } from './ends';
import { frictionChecks } from './friction';
import type { Evaluators } from './given';
import { convergingChecks, divergingChecks } from './junctions';
import { leakageChecks } from './leakage';
import { screenChecks } from './screens';
import { shapeChecks } from './shape';
import { terminalChecks } from './terminals';
import { textbookChecks } from './textbook';

export { Given, type Answer, type Evaluators } from './given';
export { subjectsOfTopic } from './subjects';

// A list and no merged object: a page that works out no check then carries none.
const EVALUATORS: readonly Evaluators[] = [
	airChecks,
	shapeChecks,
	frictionChecks,
	leakageChecks,
	elbowChecks,
	areaChangeChecks,
	entryChecks,
	exitChecks,
	damperChecks,
	screenChecks,
	terminalChecks,
	convergingChecks,
	divergingChecks,
	textbookChecks
];

/** What works out the published checks of a topic; null where nothing does. */
export function publishedEvaluator(topic: string): Evaluators[string] | null {
	return EVALUATORS.find((one) => topic in one)?.[topic] ?? null;
}

/** Every topic of the published checks that something works out. */
export function evaluatedTopics(): readonly string[] {
	return [...new Set(EVALUATORS.flatMap((one) => Object.keys(one)))];
}
