import type { DesignDocument, Problem, SolvedRow, SolveResult } from '../document/types';
import { fault, locate } from '../document/fault';
import { OutOfRangeError } from '../errors';
import { ENGINE_VERSION } from '../version';
import { flagsOf } from './flags';
import { designFlows } from './flows';
import { buildNetwork, type Network } from './network';
import { pathsOf } from './paths';
import { pressuresOf, type Pressures } from './pressures';
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
	const rowLosses: RowLoss[] = [];
	const problems: Problem[] = [];
	network.rows.forEach((row, place) => {
		const solved = lossOrProblem(() => rowLoss(row, flows[place] ?? 0, settings), place);
		if ('code' in solved) problems.push(solved);
		else rowLosses.push(solved);
	});
	if (problems.length > 0) return { ok: false, problems: locate(problems, document) };

	const losses = Float64Array.from(rowLosses, (one) => one.loss);
	const { paths, required, index, spares } = pathsOf(network, losses);
	const pressures = pressuresOf(network, losses, required);
	const totals = totalsOf(network, flows);
	const supplyPressure = (required.supply ?? 0) + 0;
	const returnPressure = (required.return ?? 0) + 0;
	const totalPressure = supplyPressure + returnPressure;
	const outletPressure = velocityPressureAtFan(network, rowLosses);
	const entries = network.rows.map(
		(row, place) => [row.tag, solvedRow(network, rowLosses, pressures, spares, place)] as const
	);
	return {
		ok: true,
		solution: {
			format: 'evendraft/solution@1',
			engineVersion: ENGINE_VERSION,
			mode: 'design',
			air: { density: settings.air.density, viscosity: settings.air.viscosity },
			rows: Object.fromEntries(entries),
			paths,
			index,
			fan: {
				flow: Math.max(totals.supplyFlow, totals.returnFlow),
				totalPressure,
				supplyPressure,
				returnPressure,
				staticPressure: outletPressure === null ? null : totalPressure - outletPressure
			},
			totals,
			flags: flagsOf(document, network, rowLosses, totals)
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
	const message = `${formula}: ${symbol} = ${value} is outside the range of the formula`;
	return fault('outside-formula', path, message, `${symbol} from ${range.min} to ${range.max}`);
}

function totalsOf({ rows, parents, order }: Network, flows: Float64Array) {
	let supplyFlow = 0;
	let returnFlow = 0;
	for (const place of order) {
		if ((parents[place] ?? -1) >= 0) continue;
		if (rows[place]?.side === 'supply') supplyFlow += flows[place] ?? 0;
		else returnFlow += flows[place] ?? 0;
	}
	return { supplyFlow, returnFlow };
}

/** Velocity pressure where the supply leaves the fan [Pa], weighted by flow; null without a supply row. */
function velocityPressureAtFan({ rows, parents, order }: Network, rowLosses: readonly RowLoss[]): number | null {
	let flow = 0;
	let sum = 0;
	for (const place of order) {
		const solved = rowLosses[place];
		if (solved === undefined || (parents[place] ?? -1) >= 0 || rows[place]?.side !== 'supply') continue;
		flow += solved.hydraulics.flow;
		sum += solved.hydraulics.flow * solved.hydraulics.velocityPressure;
	}
	return flow > 0 ? sum / flow : null;
}

function solvedRow(
	{ rows }: Network,
	rowLosses: readonly RowLoss[],
	pressures: Pressures,
	spares: Float64Array,
	place: number
): SolvedRow {
	const row = rows[place];
	const solved = rowLosses[place];
	if (row === undefined || solved === undefined) throw new Error(`no row at ${place}`);
	const { flow, area, hydraulicDiameter, velocity, velocityPressure: pv, reynolds } = solved.hydraulics;
	const fanEnd = (pressures.fanEnd[place] ?? 0) + 0;
	const farEnd = (pressures.farEnd[place] ?? 0) + 0;
	return {
		side: row.side,
		flow,
		area,
		hydraulicDiameter,
		velocity,
		velocityPressure: pv,
		reynolds,
		frictionFactor: solved.hydraulics.frictionFactor,
		frictionRate: solved.hydraulics.frictionRate,
		frictionLoss: solved.frictionLoss,
		flexibleLoss: solved.flexibleLoss,
		fittingLoss: solved.fittingLoss + 0,
		junctionLoss: solved.junctionLoss + 0,
		equipmentLoss: solved.equipmentLoss,
		outletLoss: solved.outletLoss,
		thermalGravity: solved.thermalGravity,
		loss: solved.loss,
		totalPressure: [fanEnd, farEnd],
		staticPressure: [fanEnd - pv, farEnd - pv],
		spare: spares[place] ?? 0,
		items: solved.items
	};
}
