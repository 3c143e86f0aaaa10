import type { JunctionDefinition } from './definition';
import {
	bullheadConvergingIdelchik,
	bullheadDivergingIdelchik,
	crossBranch,
	crossStraight,
	plenumLeg
} from './junction-several';
import { branchingOf, noteBranching, noteForms } from './junction-view';
import { SPREAD } from './junctions-tees';
import { choiceParameter, heldWithin, noteOutside, numberParameter } from './parameters';
import { idelchik } from './sources';
import type { CatalogueEntry } from './types';

const FLOW = { min: 0, max: 1 };
const AREA = { min: 0.1, max: 1 };

const common = {
	family: 'junctions-diverging',
	place: 'junction',
	shapes: ['round', 'rectangular', 'oval'],
	reference: 'common leg',
	known: 'published formula',
	picture: 'tee'
} as const satisfies Partial<CatalogueEntry>;

const bullhead: JunctionDefinition = {
	entry: {
		...common,
		key: 'bullhead-tee',
		name: 'Bullhead tee',
		parameters: [choiceParameter('edges', 'Edges where the stream divides', 'sharp', ['sharp', 'rounded'])],
		range:
			'two opposite legs of one size at 90° to the common one, flow ratio 0 to 1, area ratio 0.1 to 1; the value of rounded ' +
			'edges is from memory. Uniting: edges do not count; steps smoothed over 0.04 above Ab/Ac 0.35, Qb/Qc 0.4',
		method: 'Idelchik, symmetrical tee',
		source: idelchik('7-29'),
		uncertainty: 0.4,
		caution: SPREAD
	},
	coefficient(values, { direction, flowRatio, areaRatio, branches, leg }, note) {
		noteOutside(flowRatio, FLOW, 'flow ratio', note);
		noteOutside(areaRatio, AREA, 'area ratio', note);
		if (branches + (leg === 'straight' ? 1 : 0) !== 2) note('the source knows two legs that face each other');
		return direction === 'converging'
			? bullheadConvergingIdelchik(flowRatio, areaRatio)
			: bullheadDivergingIdelchik(flowRatio, areaRatio, values.choice('edges') === 'rounded' ? 0.3 : 1.5);
	}
};

const cross: JunctionDefinition = {
	entry: {
		...common,
		key: 'cross',
		name: 'Cross, 90°',
		parameters: [],
		range:
			'two opposite branches of like flow and size at 90° and a straight leg; flow ratio 0 to 1, branch 0.1 to 1 of the common area',
		method:
			'Two tees by Idelchik in series on the same velocity pressure, each with half of the flow and of the narrowing',
		source: `${idelchik('7-1 to 7-4, 7-20, 7-21')}; in series by common practice`,
		uncertainty: 0.6,
		caution: `No closed form of a cross was verified: the two branches count as two tees in series. ${SPREAD}`
	},
	coefficient(_values, context, note) {
		const junction = branchingOf(context, 90);
		noteBranching(context, junction, 2, note);
		const half = { ...junction, s: (1 + junction.s) / 2 };
		noteForms(context, context.leg === 'branch' ? half : { ...half, q: junction.q / 2 }, note);
		return context.leg === 'branch' ? crossBranch(junction) : crossStraight(junction);
	}
};

const plenum: JunctionDefinition = {
	entry: {
		...common,
		key: 'plenum',
		name: 'Plenum chamber',
		parameters: [
			numberParameter('areaRatio', 'Common leg over section of the chamber', '', 0.1, { min: 0.001, max: 1 })
		],
		plot: { along: 'areaRatio' },
		range: 'a chamber in which the stream comes to rest; sharp openings flush with its walls; any number of legs',
		method: 'Sudden expansion into the chamber and sharp entry out of it',
		source: `Borda & Carnot; ${idelchik('4-1 and 4-9')}`,
		uncertainty: 0.3,
		caution: 'A jet that meets an opening before it spreads loses less, and the legs then share the flow unevenly.'
	},
	coefficient(values, { direction, flowRatio, areaRatio }, note) {
		const r = values.number('areaRatio');
		heldWithin(areaRatio * r, { min: 0, max: 1 }, 'leg over section of the chamber', note);
		return plenumLeg(direction, flowRatio, areaRatio, r);
	}
};

export const severalLegs: readonly JunctionDefinition[] = [bullhead, cross, plenum];
