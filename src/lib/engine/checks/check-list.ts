import { airChecks } from './air';
import { balanceChecks } from './balance';
import { endChecks } from './ends';
import { fanChecks } from './fan';
import { fittingChecks } from './fittings';
import { flexibleChecks } from './flexible';
import { flowChecks } from './flows';
import { leakageChecks } from './leakage';
import { marginChecks } from './margins';
import { pressureChecks } from './pressures';
import { recordChecks } from './record';
import { serviceChecks } from './services';
import { shapeChecks } from './shapes';
import type { CheckDefinition } from './types';
import { velocityChecks } from './velocities';

export const definitions: readonly CheckDefinition[] = [
	...flowChecks,
	...velocityChecks,
	...shapeChecks,
	...fittingChecks,
	...flexibleChecks,
	...endChecks,
	...pressureChecks,
	...airChecks,
	...leakageChecks,
	...balanceChecks,
	...fanChecks,
	...marginChecks,
	...serviceChecks,
	...recordChecks
];

/** Every check as plain data: what a firm may edit, and what the methods page tells. */
export const checkList = definitions.map(({ key, title, looksAt, severity, threshold, basis }) => ({
	...{ key, title, looksAt, severity, threshold, basis }
}));
