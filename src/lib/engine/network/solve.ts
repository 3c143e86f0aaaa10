import type { DesignDocument, DesignRow, Problem, Solution, SolvedRow, SolveResult } from '../document/types';
import { fault, locate } from '../document/fault';
import { OutOfRangeError } from '../errors';
import { shortFigure } from '../short-figure';
import { ENGINE_VERSION } from '../version';
import { flagsOf } from './flags';
import { designFlows, type RowFlows } from './flows';
import { hydraulicsOf, type Hydraulics } from './hydraulics';
import { junctionViews } from './junction-views';
import { buildNetwork, type Network } from './network';
import { lossesFromFan, pathsOf } from './paths';
import { fanDuty, totalsOf } from './fan-duty';
import type { RangeNote } from './items';
import { placePressures } from './pressures';
import { isUniform, rowAirs, type RowAir } from './row-airs';
import { rowLoss, type RowLoss } from './row-loss';
import { settingsOf, type Settings } from './settings';

/**
 * Total pressure of every stream at the design flows, and what the fan must give.
 * Reads its argument and writes nothing. Every number of a solution is finite.
 *
 * @param document a design document that validates, SI units
 * @returns the solution, or all problems: rows that form no trees, formulas asked outside their range
 */
export function solveDesign(document: DesignDocument): SolveResult {
	const built = buildNetwork(document);
	if (!built.ok) return built;
	const { network } = built;
	const settings = settingsOrProblem(document);
	if ('code' in settings) return { ok: false, problems: [settings] };

	const airs = airsOrProblem(network, document, settings);
	if ('code' in airs) return { ok: false, problems: locate([airs], document) };
	const uniform = isUniform(airs);
	const flows = designFlows(network, { airs, uniform, standard: settings.standard, leaks: null });
	const notes = new Map<string, readonly RangeNote[]>();
	const rowLosses: RowLoss[] = [];
	const problems: Problem[] = [];
	const hydraulics: Hydraulics[] = [];
	network.rows.forEach((row, place) => {
		const air = airs[place] ?? { ...settings.air, temperature: null, condenses: false };
		const found = orProblem(() => hydraulicsOf(row, flows.farEnd[place] ?? 0, air, settings), place);
		if ('code' in found) problems.push(found);
		else hydraulics.push(found);
	});
	if (problems.length > 0) return { ok: false, problems: locate(problems, document) };
	const masses = massFlowsOf(airs, flows);
	const views = junctionViews(network, hydraulics, masses);
	network.rows.forEach((row, place) => {
		const ofRow: RangeNote[] = [];
		const view = views[place];
		const tag = view && (network.rows[view.common]?.tag ?? '');
		const own = hydraulics[place];
		const solved =
			own &&
			orProblem(
				() => rowLoss(row, own, view && tag !== undefined ? { ...view, tag } : undefined, settings, ofRow),
				place
			);
		if (solved && 'code' in solved) problems.push(solved);
		else if (solved && Number.isFinite(solved.loss)) rowLosses.push(solved);
		else problems.push(tooGreat(place));
		if (ofRow.length > 0) notes.set(row.tag, ofRow);
	});
	if (problems.length > 0) return { ok: false, problems: locate(problems, document) };

	const along = lossesFromFan(
		network,
		Float64Array.from(rowLosses, (one) => one.loss)
	);
	const { paths, required, index, spares } = pathsOf(network, along);
	placePressures(network, along, required, spares, rowLosses);
	const totals = totalsOf(network, flows.fanEnd);
	// By mass where the densities differ; by volume, with not a bit of difference, where they do not.
	const balance = uniform ? totals : totalsOf(network, masses.leg);
	const fan = fanDuty(network, rowLosses, required, totals);
	const flags = flagsOf(document, network, rowLosses, notes, balance, fan.totalPressure, settings.air.density, airs);
	return {
		ok: true,
		solution: {
			format: 'evendraft/solution@1',
			engineVersion: ENGINE_VERSION,
			mode: 'design',
			air: { density: settings.air.density, viscosity: settings.air.viscosity },
			rows: byTag(network.rows, rowLosses),
			paths,
			index,
			fan,
			totals,
			flags
		}
	};
}

function settingsOrProblem(document: DesignDocument): Settings | Problem {
	try {
		return settingsOf(document);
	} catch (error) {
		return outsideProblem(error, ['air']);
	}
}

function airsOrProblem(network: Network, document: DesignDocument, settings: Settings): readonly RowAir[] | Problem {
	try {
		return rowAirs(network, document, settings.air);
	} catch (error) {
		return outsideProblem(error, ['rows']);
	}
}

/** Of each row at the node where it joins, and of the common leg there [kg/s]. */
function massFlowsOf(airs: readonly RowAir[], { fanEnd, farEnd }: RowFlows) {
	const mass = (flows: Float64Array) => flows.map((flow, place) => flow * (airs[place]?.density ?? 1));
	return { leg: mass(fanEnd), common: mass(farEnd) };
}

const tooGreat = (place: number): Problem =>
	fault('too-great', ['rows', place], 'loses more than a number can tell', 'a row of usual size and flow');

function orProblem<T extends object>(find: () => T, place: number): T | Problem {
	try {
		return find();
	} catch (error) {
		return outsideProblem(error, ['rows', place]);
	}
}

/** Only a formula asked outside its range is a problem of the document; anything else is a bug and goes on. */
function outsideProblem(error: unknown, path: readonly (string | number)[]): Problem {
	if (!(error instanceof OutOfRangeError)) throw error;
	const { formula, symbol, value, range } = error;
	const message = `${formula}: ${symbol} = ${shortFigure(value, range)} is outside the range of the formula`;
	return fault('outside-formula', path, message, `${symbol} from ${range.min} to ${range.max}`);
}

/** Rows by their tags, `__proto__` being a tag like any other. */
function byTag(rows: readonly DesignRow[], rowLosses: readonly RowLoss[]): Solution['rows'] {
	const result: Record<string, SolvedRow> = {};
	rowLosses.forEach((value, place) => {
		const tag = rows[place]?.tag ?? '';
		if (tag !== '__proto__') result[tag] = value;
		else Object.defineProperty(result, tag, { value, enumerable: true, configurable: true, writable: true });
	});
	return result;
}
