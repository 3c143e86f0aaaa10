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

/** Every topic of the published checks with what works it out. */
export const publishedEvaluators: Evaluators = {
	...airChecks,
	...shapeChecks,
	...frictionChecks,
	...leakageChecks,
	...elbowChecks,
	...areaChangeChecks,
	...entryChecks,
	...exitChecks,
	...damperChecks,
	...screenChecks,
	...terminalChecks,
	...convergingChecks,
	...divergingChecks,
	...textbookChecks
};
