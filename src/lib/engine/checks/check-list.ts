import { airChecks } from './air-and-service';
import { endChecks } from './ends';
import { fanChecks } from './fan';
import { flowChecks } from './flows';
import { recordChecks } from './record';
import { shapeChecks } from './shapes';
import type { CheckDefinition } from './types';
import { velocityChecks } from './velocities';

export const definitions: readonly CheckDefinition[] = [
	...flowChecks,
	...velocityChecks,
	...shapeChecks,
	...endChecks,
	...fanChecks,
	...airChecks,
	...recordChecks
];

/** Every check as plain data: what a firm may edit, and what the methods page tells. */
export const checkList = definitions.map(({ key, title, looksAt, severity, threshold, basis }) => ({
	...{ key, title, looksAt, severity, threshold, basis }
}));
