import { fault } from '../document/fault';
import type { Problem } from '../document/types';
import { OutOfRangeError } from '../errors';
import { shortFigure } from '../short-figure';
import { designFlows, type RowFlows } from './flows';
import { blankHydraulics, findHydraulics } from './hydraulics';
import type { RangeNote } from './items';
import { junctionViews, type MassFlows } from './junction-views';
import type { Network } from './network';
import { lossesFromFan, pathsOf, type PathsResult } from './paths';
import { placePressures } from './pressures';
import type { RowAir } from './row-airs';
import { rowLoss, type RowLoss } from './row-loss';
import type { Settings } from './settings';

/** What does not change while flows and leakage are worked in turn. */
export interface PassGround {
	readonly network: Network;
	readonly settings: Settings;
	readonly airs: readonly RowAir[];
	/** All rows hold the same air. */
	readonly uniform: boolean;
}

/** Flows, losses and pressures of all rows, with one leakage. */
export interface Pass {
	readonly flows: RowFlows;
	readonly masses: MassFlows;
	readonly rowLosses: readonly RowLoss[];
	readonly notes: ReadonlyMap<string, readonly RangeNote[]>;
	readonly paths: PathsResult;
}

/**
 * One round: flows from the outlets inward, losses of each row at the mean of its two ends, pressures from the fan out.
 *
 * @param leaks what escapes from each row, or is drawn into it [m3/s]; null without leakage
 * @returns the round, or what is wrong with the rows
 */
export function workPass(ground: PassGround, leaks: Float64Array | null): Pass | readonly Problem[] {
	const { network, settings, airs, uniform } = ground;
	const flows = designFlows(network, { airs, uniform, standard: settings.standard, leaks });
	const problems: Problem[] = [];
	const masses = massFlowsOf(airs, flows);
	const views = junctionViews(network, airs, masses, flows.farEnd);
	const notes = new Map<string, readonly RangeNote[]>();
	const rowLosses = new Array<RowLoss>(network.rows.length);
	const losses = new Float64Array(network.rows.length);
	let ofRow: RangeNote[] = [];
	const noOwnAir: RowAir = { ...settings.air, temperature: null, relativeHumidity: null, condenses: false };
	const hydraulics = blankHydraulics(noOwnAir);
	network.rows.forEach((row, place) => {
		const air = airs[place] ?? noOwnAir;
		const far = flows.farEnd[place] ?? 0;
		const flow = leaks ? (far + (flows.fanEnd[place] ?? 0)) / 2 : far;
		try {
			const solved = rowLoss(row, findHydraulics(hydraulics, row, flow, air, settings), views[place], settings, ofRow);
			rowLosses[place] = solved;
			losses[place] = solved.loss;
			if (!Number.isFinite(solved.loss)) problems.push(tooGreat(place));
		} catch (error) {
			problems.push(outsideProblem(error, ['rows', place]));
		}
		if (ofRow.length === 0) return;
		notes.set(row.tag, ofRow);
		ofRow = [];
	});
	if (problems.length > 0) return problems;

	const along = lossesFromFan(network, losses);
	const paths = pathsOf(network, along);
	placePressures(network, along, paths.required, paths.spares, rowLosses);
	return { flows, masses, rowLosses, notes, paths };
}

/** Of each row at the node where it joins, and of the common leg there [kg/s]. */
function massFlowsOf(airs: readonly RowAir[], { fanEnd, farEnd }: RowFlows): MassFlows {
	const common = new Float64Array(farEnd.length);
	const leg = fanEnd === farEnd ? common : new Float64Array(fanEnd.length);
	airs.forEach(({ density }, place) => {
		common[place] = (farEnd[place] ?? 0) * density;
		if (leg !== common) leg[place] = (fanEnd[place] ?? 0) * density;
	});
	return { leg, common };
}

const tooGreat = (place: number): Problem =>
	fault('too-great', ['rows', place], 'loses more than a number can tell', 'a row of usual size and flow');

/** Only a formula asked outside its range is a problem of the document; anything else is a bug and goes on. */
export function outsideProblem(error: unknown, path: readonly (string | number)[]): Problem {
	if (!(error instanceof OutOfRangeError)) throw error;
	const { formula, symbol, value, range } = error;
	const message = `${formula}: ${symbol} = ${shortFigure(value, range)} is outside the range of the formula`;
	return fault('outside-formula', path, message, `${symbol} from ${range.min} to ${range.max}`);
}
