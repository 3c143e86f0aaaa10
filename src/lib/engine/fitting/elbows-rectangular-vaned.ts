// Rectangular elbows with something in them: turning vanes in a mitre, splitter vanes in a bend.
import type { Shape } from '../shape';
import { BEND_ASPECT } from './bend-idelchik';
import type { FittingDefinition } from './definition';
import { aspectInPlane, plane } from './elbow-aspect';
import { choiceParameter, heldWithin, numberParameter } from './parameters';
import { SMACNA_MEMORY } from './sources';
import { splitterRadii, splitterSmacna, splitterVanes } from './splitter-vanes';
import { DOUBLE_VANES, SINGLE_VANES, VANE_VELOCITY, doubleVanesSmacna, singleVanesSmacna } from './turning-vanes';
import type { CatalogueEntry } from './types';

const shapes: readonly Shape[] = ['rectangular', 'oval'];
const CAUTION = 'A value from memory: enter the coefficient of the vanes that are built in, if it is known.';
const vanesOf = (standard: string, options: readonly string[]) =>
	choiceParameter('vanes', 'Vane radius/spacing in mm', standard, options);

type Vaned = Pick<CatalogueEntry, 'key' | 'name' | 'parameters' | 'range' | 'method' | 'uncertainty' | 'caution'>;
const entryOf = (vaned: Vaned): CatalogueEntry => ({
	...vaned,
	family: 'elbows-rectangular',
	shapes,
	reference: 'row',
	source: SMACNA_MEMORY,
	known: 'from memory',
	picture: 'elbow',
	drawing: 'vaned'
});

const single: FittingDefinition = {
	entry: entryOf({
		key: 'rectangular-elbow-vaned',
		name: 'Rectangular elbow, mitred, with turning vanes',
		parameters: [vanesOf('114/57', SINGLE_VANES)],
		range: '90°, single-thickness vanes; 0.12 to 0.18 by vane radius and spacing, other printings 0.11 to 0.33',
		method: 'One value for each radius and spacing',
		uncertainty: 0.5,
		caution: CAUTION
	}),
	coefficient(values, { size }, note) {
		aspectInPlane(size, 'width', note);
		return singleVanesSmacna(values.choice('vanes'));
	}
};

const double: FittingDefinition = {
	entry: entryOf({
		key: 'rectangular-elbow-vaned-double',
		name: 'Rectangular elbow, mitred, with hollow turning vanes',
		parameters: [vanesOf('50/38', DOUBLE_VANES)],
		range: '90°, vanes of double thickness, 5 to 20 m/s; beyond, the nearer end',
		method: 'Table of the velocity for each radius and spacing',
		uncertainty: 0.5,
		caution: CAUTION
	}),
	coefficient(values, { size, velocity }, note) {
		aspectInPlane(size, 'width', note);
		return doubleVanesSmacna(values.choice('vanes'), heldWithin(velocity, VANE_VELOCITY, 'velocity', note));
	}
};

const splitter: FittingDefinition = {
	entry: {
		...entryOf({
			key: 'rectangular-elbow-splitter',
			name: 'Rectangular elbow, smooth radius, splitter vanes',
			parameters: [
				numberParameter('radiusRatio', 'Radius to centre line over side in the plane', '', 0.75, { min: 0.5, max: 1 }),
				choiceParameter('vanes', 'Splitter vanes', 1, [1, 2, 3]),
				plane
			],
			range:
				'90°, r/W 0.55 to 1 with one vane, to 0.75 with two, to 0.65 with three; H/W 0.25 to 8, vanes by the curve ratio',
			method: 'Table of curve ratio and aspect',
			uncertainty: 0.5,
			caution: null
		}),
		plot: { along: 'radiusRatio' },
		drawing: 'splitter'
	},
	coefficient(values, { size }, note) {
		const vanes = Number(values.choice('vanes'));
		const R = heldWithin(values.number('radiusRatio'), splitterRadii(vanes), 'r/W', note);
		const aspect = heldWithin(aspectInPlane(size, values.choice('plane'), note), BEND_ASPECT, 'H/W', note);
		return splitterSmacna(vanes, splitterVanes(vanes, R - 0.5, 1).curveRatio, aspect);
	}
};

export const elbowsRectangularVaned: readonly FittingDefinition[] = [single, double, splitter];
