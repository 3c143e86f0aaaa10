import type { DesignDocument, DesignRow, Problem, Solution, SolvedRow, SolveResult } from '../document/types';
import { fault, locate } from '../document/fault';
import { OutOfRangeError } from '../errors';
import { shortFigure } from '../short-figure';
import { ENGINE_VERSION } from '../version';
import { flagsOf } from './flags';
import { designFlows } from './flows';
import { buildNetwork } from './network';
import { lossesFromFan, pathsOf } from './paths';
import { fanDuty, totalsOf } from './fan-duty';
import type { RangeNote } from './items';
import { placePressures } from './pressures';
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

	const flows = designFlows(network);
	const notes = new Map<string, readonly RangeNote[]>();
	const rowLosses: RowLoss[] = [];
	const problems: Problem[] = [];
	network.rows.forEach((row, place) => {
		const ofRow: RangeNote[] = [];
		const solved = lossOrProblem(() => rowLoss(row, flows[place] ?? 0, settings, ofRow), place);
		if ('code' in solved) problems.push(solved);
		else rowLosses.push(solved);
		if (ofRow.length > 0) notes.set(row.tag, ofRow);
	});
	if (problems.length > 0) return { ok: false, problems: locate(problems, document) };

	const along = lossesFromFan(
		network,
		Float64Array.from(rowLosses, (one) => one.loss)
	);
	const { paths, required, index, spares } = pathsOf(network, along);
	placePressures(network, along, required, spares, rowLosses);
	const totals = totalsOf(network, flows);
	const fan = fanDuty(network, rowLosses, required, totals);
	const flags = flagsOf(document, network, rowLosses, notes, totals, fan.totalPressure, settings.air.density);
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

function lossOrProblem(solve: () => RowLoss, place: number): RowLoss | Problem {
	try {
		const solved = solve();
		if (Number.isFinite(solved.loss)) return solved;
		return fault('too-great', ['rows', place], 'loses more than a number can tell', 'a row of usual size and flow');
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
