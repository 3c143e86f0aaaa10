// What a tee or wye takes from the sheet, and what is said where that lies outside the sources.
import type { Range } from '../errors';
import type { Size } from '../shape';
import { shortFigure } from '../short-figure';
import type { Note } from './definition';
import { addingShare, weightedLoss, type Branching } from './junction-stream';
import { noteOutside } from './parameters';
import type { JunctionContext } from './types';

const FLOW: Range = { min: 0, max: 1 };
const AREA: Range = { min: 0.1, max: 1 };
const SPEED: Range = { min: 0, max: 1 };
/** Up to this share the straight leg counts as wide as the common one; from the same below 1 the areas count as adding. */
const NEAR = 0.1;
/** A gain of both streams together beyond which the formulas are called wrong [-]. */
const GAIN = 0.02;

const heightOf = (size: Size): number => (size.shape === 'round' ? size.diameter : size.height);

/** The junction that the formulas see. Nothing straight on counts as a straight leg as wide as the common one. */
export function branchingOf(context: JunctionContext, angle: number): Branching {
	const { direction, leg, branchFlowRatio: q, branchAreaRatio: a, straightAreaRatio } = context;
	const s = straightAreaRatio ?? (leg === 'straight' ? context.areaRatio : 1);
	// The straight leg does not see the branch's height: that of a round one.
	const heightRatio = leg === 'branch' ? heightOf(context.size) / heightOf(context.commonSize) : Math.sqrt(a);
	return { direction, q, a, s, angle, heightRatio };
}

/** Notes on flows and areas that no source of tees covers. */
export function noteBranching(context: JunctionContext, { q, a }: Branching, branches: number, note: Note): void {
	noteOutside(q, FLOW, 'flow ratio of the branch', note);
	noteOutside(a, AREA, 'area ratio of the branch', note);
	if (context.straightAreaRatio === null && context.leg === 'branch')
		note('nothing goes straight on; the source knows a straight leg');
	if (context.branches !== branches)
		note(`the source knows ${branches === 1 ? 'one branch' : 'two branches'}; here there are ${context.branches}`);
	if (context.size.shape === 'oval' || context.commonSize.shape === 'oval')
		note('no source is for flat oval ducts; taken by the areas');
}

/** Notes on the two forms of Idelchik and on what they give for both streams together. */
export function noteForms(context: JunctionContext, junction: Branching, note: Note): void {
	const { direction, q, a, s, angle, heightRatio } = junction;
	noteWidths(junction, note);
	const w = addingShare(a, s);
	const v = (1 - q) / s;
	if (w > NEAR && direction === 'converging') noteOutside(a, { min: 0, max: 0.5 }, 'Ab/Ac of the additions', note);
	if (w > NEAR && direction === 'diverging' && context.leg === 'straight' && v > 1 + 1e-9)
		note(
			`Vs/Vc ${shortFigure(v, SPEED)} is above 1, where the values${v > 2 ? ', held from 2 on,' : ''} are from memory`
		);
	if (angle > 75 && direction === 'diverging' && context.leg === 'branch' && heightRatio > 2 / 3)
		noteOutside(q / a, SPEED, 'Vb/Vc', note);
	noteGain(weightedLoss(junction), q, note);
}

/** A note where the formulas of both streams together, weighted by their flows, make energy. */
export function noteGain(loss: number, q: number, note: Note): void {
	if (q >= 0 && q <= 1 && loss < -GAIN)
		note(`the published formulas of both streams together gain ${shortFigure(-loss)} of the common velocity pressure`);
}

/** A note unless the straight leg is as wide as the common one, or the areas add up. */
function noteWidths({ a, s }: Branching, note: Note): void {
	const share = (1 - s) / a;
	if (share < -NEAR) note('the straight leg is wider than the common one; taken as equally wide');
	else if (share > 1 + NEAR) note('both legs together are narrower than the common one; taken as areas that add up');
	else if (share > NEAR && share < 1 - NEAR)
		note(
			'the areas lie between a straight leg as wide as the common one and areas that add up; so does the value',
			true
		);
}

/** A note for the methods that know only a straight leg as wide as the common one. */
export function noteEqualRun({ a, s }: Branching, note: Note): void {
	if (Math.abs(1 - s) > NEAR * a) note('the method is for a straight leg as wide as the common one');
}
