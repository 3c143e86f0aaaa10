import type { JunctionDefinition } from './definition';
import { idelchikStream } from './junction-methods';
import { conicalTakeOffMain, conicalTakeOffOblique, conicalTakeOffSquare, TAKE_OFF_SPEEDS } from './junction-tables';
import { branchingOf, noteBranching } from './junction-view';
import { choiceParameter, heldWithin } from './parameters';

const take: JunctionDefinition = {
	entry: {
		key: 'conical-take-off',
		name: 'Conical take-off',
		family: 'junctions-diverging',
		place: 'junction',
		shapes: ['round'],
		parameters: [choiceParameter('angle', 'Angle of the branch', 90, [45, 90])],
		reference: 'common leg',
		range: 'round ducts, dividing stream; Vb/Vc 0 to 1.4 at 90°, to 1.2 at 45°; main path Vs/Vc 0 to 1',
		method: 'Tables on the velocity ratios, from memory; the main path read from 0.8 on',
		source: 'Tables of duct fittings; SMACNA, HVAC Systems Duct Design (1990), worked example, for the main path',
		known: 'from memory',
		uncertainty: 0.5,
		picture: 'tee',
		caution:
			'The table lies far below the formulas of a sharp junction. For the lateral at 45° one printed example has 0.48 at ' +
			'Vb/Vc 0.83, where the table has 0.25.'
	},
	coefficient(values, context, note) {
		const isSquare = values.choice('angle') === '90';
		const junction = branchingOf(context, isSquare ? 90 : 45);
		noteBranching(context, junction, 1, note);
		if (context.direction === 'converging') {
			note('the table is for a dividing stream; a sharp junction by Idelchik stands in');
			return idelchikStream(junction, context, note);
		}
		const { q, a, s } = junction;
		if (context.leg === 'straight')
			return conicalTakeOffMain(heldWithin((1 - q) / s, { min: 0, max: 1 }, 'Vs/Vc', note));
		const x = heldWithin(q / a, TAKE_OFF_SPEEDS[isSquare ? 90 : 45], 'Vb/Vc', note);
		return isSquare ? conicalTakeOffSquare(x) : conicalTakeOffOblique(x);
	}
};

export const conicalTakeOffs: readonly JunctionDefinition[] = [take];
